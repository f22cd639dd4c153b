'use client';

import { useMemo } from 'react';
import { Arc, Group, Line, Shape } from 'react-konva';
import { innerSlabs, type OpeningShape, openingShape, outerFace } from '@/lib/drawing/wall-shapes';
import type { FloorPlan } from '@/lib/room';
import { wallRuns } from '@/lib/room/wall-geometry';
import { toDegrees } from '@/lib/units';
import { ink } from './ink';

/** Walls with their thickness, and the doors and windows cut into them. Metres. */
export function WallsLayer({
  plan,
  selectedId = null,
}: {
  plan: Pick<FloorPlan, 'outline' | 'outlineWalls' | 'innerWalls' | 'openings'>;
  selectedId?: string | null;
}) {
  const outer = useMemo(() => outerFace(plan), [plan]);
  const slabs = useMemo(() => innerSlabs(plan), [plan]);
  const openings = useMemo(() => {
    const runs = wallRuns(plan);
    return plan.openings.map((opening) => openingShape(opening, runs)).filter((shape) => shape !== null);
  }, [plan]);
  const chosen = selectedId ? wallRuns(plan).find((run) => run.id === selectedId) : undefined;
  return (
    <Group listening={false}>
      <Shape
        fill={ink.wall}
        fillRule="evenodd"
        sceneFunc={(context, shape) => {
          context.beginPath();
          for (const ring of [outer, plan.outline]) {
            ring.forEach(([x, y], i) => {
              if (i === 0) context.moveTo(x, y);
              else context.lineTo(x, y);
            });
            context.closePath();
          }
          context.fillStrokeShape(shape);
        }}
      />
      {slabs.map((slab, i) => (
        <Line key={plan.innerWalls[i].id} points={slab.flat()} closed fill={ink.wall} />
      ))}
      {chosen ? (
        <Line
          points={[...chosen.a, ...chosen.b]}
          stroke={ink.link}
          strokeWidth={5}
          strokeScaleEnabled={false}
        />
      ) : null}
      {openings.map((shape) => (
        <OpeningMark key={shape.opening.id} shape={shape} selected={shape.opening.id === selectedId} />
      ))}
    </Group>
  );
}

function OpeningMark({ shape, selected }: { shape: OpeningShape; selected: boolean }) {
  const { opening, hinge, leafEnd, cut, run, width } = shape;
  const line = { strokeScaleEnabled: false, stroke: selected ? ink.link : ink.wall } as const;
  // The arc runs from the closed leaf to the leaf swung square into the room.
  const along = toDegrees(Math.atan2(run.along[1], run.along[0]));
  const clockwise = run.along[0] * -run.across[1] - run.along[1] * -run.across[0] > 0;
  return (
    <Group>
      <Line
        points={cut.flat()}
        closed
        fill={ink.paper}
        stroke={selected ? ink.link : ink.paper}
        strokeWidth={selected ? 3 : 0.5}
        strokeScaleEnabled={false}
      />
      {opening.kind === 'window' ? (
        <>
          <Line points={[...cut[0], ...cut[1]]} {...line} strokeWidth={1.2} />
          <Line points={[...cut[3], ...cut[2]]} {...line} strokeWidth={1.2} />
          <Line
            points={[
              (cut[0][0] + cut[3][0]) / 2,
              (cut[0][1] + cut[3][1]) / 2,
              (cut[1][0] + cut[2][0]) / 2,
              (cut[1][1] + cut[2][1]) / 2,
            ]}
            {...line}
            strokeWidth={opening.open ? 0.6 : 2}
            dash={opening.open ? [4, 4] : undefined}
          />
        </>
      ) : (
        <>
          <Line points={[...hinge, ...leafEnd]} {...line} strokeWidth={3} />
          <Arc
            x={hinge[0]}
            y={hinge[1]}
            innerRadius={width}
            outerRadius={width}
            rotation={clockwise ? along : along - 90}
            angle={90}
            {...line}
            strokeWidth={0.8}
            opacity={0.7}
          />
        </>
      )}
    </Group>
  );
}
