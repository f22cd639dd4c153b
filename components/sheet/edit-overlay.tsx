'use client';

import { Circle, Group, Label, Line, Rect, Tag, Text } from 'react-konva';
import type { Handle } from '@/lib/editor/hit-test';
import type { Guide } from '@/lib/editor/snapping';
import type { PlanPoint } from '@/lib/room';
import { formatMetres } from '@/lib/units';
import { ink } from './ink';
import { useSheetScale } from './sheet-scale';

/** Handles of the chosen thing: squares to pull, a ring to turn. They are drawn only; the hand finds them by place. */
export function Handles({ handles }: { handles: readonly Handle[] }) {
  const px = 1 / useSheetScale();
  return (
    <Group listening={false}>
      {handles.map((handle) => {
        const [x, y] = handle.at;
        const look = { fill: ink.paper, stroke: ink.link, strokeWidth: 1.8, strokeScaleEnabled: false };
        if (handle.kind === 'turn')
          return (
            <Group key="turn">
              <Line
                points={[...handle.about, x, y]}
                stroke={ink.link}
                strokeWidth={1}
                dash={[3, 3]}
                strokeScaleEnabled={false}
              />
              <Circle {...look} x={x} y={y} radius={6 * px} fill={ink.lamp} />
            </Group>
          );
        return (
          <Rect
            {...look}
            key={`${x} ${y}`}
            x={x - 4.5 * px}
            y={y - 4.5 * px}
            width={9 * px}
            height={9 * px}
          />
        );
      })}
    </Group>
  );
}

/** Lines that say what a thing has snapped to. */
export function Guides({ guides }: { guides: readonly Guide[] }) {
  return (
    <Group listening={false}>
      {guides.map(({ from, to }) => (
        <Line
          key={[...from, ...to].join(' ')}
          points={[...from, ...to]}
          stroke={ink.link}
          strokeWidth={1.4}
          dash={[6, 4]}
          strokeScaleEnabled={false}
        />
      ))}
    </Group>
  );
}

/** Walls that are being drawn, each with its length. */
export function DraftLine({ points, closed }: { points: readonly PlanPoint[]; closed: boolean }) {
  const px = 1 / useSheetScale();
  const sides = points.flatMap((a, i): [PlanPoint, PlanPoint][] => {
    const b = points[i + 1] ?? (closed ? points[0] : null);
    return b ? [[a, b]] : [];
  });
  return (
    <Group listening={false}>
      <Line
        points={points.flat()}
        closed={closed}
        stroke={ink.wall}
        strokeWidth={4}
        strokeScaleEnabled={false}
        lineJoin="miter"
        fill={closed ? '#e6e2d755' : undefined}
      />
      {sides.map(([a, b], i) => (
        <LengthLabel
          // biome-ignore lint/suspicious/noArrayIndexKey: sides of a draft have no other name than their place.
          key={i}
          at={[(a[0] + b[0]) / 2, (a[1] + b[1]) / 2]}
          metres={Math.hypot(b[0] - a[0], b[1] - a[1])}
        />
      ))}
      {points.map((at, i) => (
        <Circle
          // biome-ignore lint/suspicious/noArrayIndexKey: as above.
          key={i}
          x={at[0]}
          y={at[1]}
          radius={(i === 0 ? 6 : 3.5) * px}
          fill={ink.paper}
          stroke={ink.wall}
          strokeWidth={1.6}
          strokeScaleEnabled={false}
        />
      ))}
    </Group>
  );
}

/** A length written on the sheet where it is measured. */
export function LengthLabel({ at, metres }: { at: PlanPoint; metres: number }) {
  const px = 1 / useSheetScale();
  if (metres < 1e-6) return null;
  return (
    <Label x={at[0]} y={at[1]} scaleX={px} scaleY={px} offsetX={30} offsetY={11} listening={false}>
      <Tag fill={ink.paper} stroke={ink.link} strokeWidth={1} />
      <Text
        text={formatMetres(metres)}
        fontFamily="IBM Plex Mono"
        fontSize={12.5}
        padding={5}
        width={66}
        align="center"
        fill={ink.text}
      />
    </Label>
  );
}

/** Where something on the plan cannot be as it is drawn. */
export function ProblemMarks({
  problems,
}: {
  problems: readonly { readonly at: PlanPoint; readonly severity: 'wrong' | 'odd' }[];
}) {
  const px = 1 / useSheetScale();
  return (
    <Group listening={false}>
      {problems.map(({ at, severity }, i) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: marks are drawn afresh with the plan.
        <Group key={i} x={at[0]} y={at[1]} scaleX={px} scaleY={px}>
          <Line
            points={[0, -12, 12, 9, -12, 9]}
            closed
            fill={severity === 'wrong' ? ink.danger : ink.lamp}
            stroke={ink.paper}
            strokeWidth={1.5}
          />
          <Text text="!" x={-3} y={-7} fontSize={15} fontStyle="700" fill={ink.paper} />
        </Group>
      ))}
    </Group>
  );
}
