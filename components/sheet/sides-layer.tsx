'use client';

import { useMemo } from 'react';
import { Group, Line, Shape } from 'react-konva';
import { doseSteps } from '@/lib/drawing/dose-scale';
import { sideEdges } from '@/lib/drawing/side-edges';
import { type SideStrip, stripStarts } from '@/lib/engine';
import { ink } from './ink';
import { useSheetScale } from './sheet-scale';

/** Upright faces as coloured edges: each stretch in the colour of its worst spot. Under target it is ticked across too. */
export function SidesLayer({
  strips,
  ratio,
  chosen,
}: {
  strips: readonly SideStrip[];
  ratio: Float32Array;
  /** The strip that is unrolled beside the sheet. */
  chosen: number | null;
}) {
  const px = 1 / useSheetScale();
  const edges = useMemo(() => sideEdges(strips, stripStarts(strips), ratio, 4 * px), [strips, ratio, px]);
  const face = chosen === null ? null : strips[chosen];
  return (
    <Group listening={false}>
      {doseSteps.map(({ label, colour, under }, step) => (
        <Group key={label}>
          <Edges segments={edges[step]} stroke={under ? ink.umber : '#9aa7a5'} width={8} />
          <Edges segments={edges[step]} stroke={colour} width={6} />
          {under ? <Edges segments={edges[step]} stroke={ink.umber} width={6} dash={[1.2, 5]} /> : null}
        </Group>
      ))}
      {face ? (
        <Line
          points={[
            face.a[0] + face.normal[0] * 9 * px,
            face.a[1] + face.normal[1] * 9 * px,
            face.b[0] + face.normal[0] * 9 * px,
            face.b[1] + face.normal[1] * 9 * px,
          ]}
          stroke={ink.link}
          strokeWidth={3}
          strokeScaleEnabled={false}
        />
      ) : null}
    </Group>
  );
}

function Edges({
  segments,
  stroke,
  width,
  dash,
}: {
  segments: readonly number[];
  stroke: string;
  width: number;
  dash?: number[];
}) {
  return (
    <Shape
      stroke={stroke}
      strokeWidth={width}
      dash={dash}
      strokeScaleEnabled={false}
      perfectDrawEnabled={false}
      sceneFunc={(context, shape) => {
        context.beginPath();
        for (let i = 0; i < segments.length; i += 4) {
          context.moveTo(segments[i], segments[i + 1]);
          context.lineTo(segments[i + 2], segments[i + 3]);
        }
        context.strokeShape(shape);
      }}
    />
  );
}
