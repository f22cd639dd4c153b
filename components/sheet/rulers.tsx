'use client';

import { Group, Line, Rect, Text } from 'react-konva';
import { rulerStep, type Size, type Viewport } from '@/lib/drawing/viewport';
import { ink } from './ink';

/** Width of the strip that a ruler stands in, pixels. */
export const RULER_PX = 38;

/** Rulers in metres along the sheet's top and left edges; they follow zoom and pan. Screen pixels. */
export function Rulers({ viewport, size }: { viewport: Viewport; size: Size }) {
  const step = rulerStep(viewport.scale);
  const digits = step < 0.1 ? 2 : step < 1 ? 1 : 0;
  const marks = (offset: number, length: number) => {
    const first = Math.ceil((RULER_PX - offset) / viewport.scale / (step / 2));
    const last = Math.floor((length - offset) / viewport.scale / (step / 2));
    return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => {
      const half = first + i;
      return {
        at: offset + (half * step * viewport.scale) / 2,
        metres: (half * step) / 2,
        major: half % 2 === 0,
      };
    });
  };
  const text = { fontFamily: 'IBM Plex Mono', fontSize: 11.5, fill: ink.text } as const;
  return (
    <Group listening={false}>
      <Rect width={size.width} height={RULER_PX} fill={ink.paper} opacity={0.94} />
      <Rect width={RULER_PX} height={size.height} fill={ink.paper} opacity={0.94} />
      {marks(viewport.x, size.width).map(({ at, metres, major }) => (
        <Group key={metres}>
          <Line points={[at, RULER_PX - (major ? 9 : 5), at, RULER_PX]} stroke={ink.wall} strokeWidth={0.8} />
          {major ? (
            <Text {...text} text={metres.toFixed(digits)} x={at - 20} y={7} width={40} align="center" />
          ) : null}
        </Group>
      ))}
      {marks(viewport.y, size.height).map(({ at, metres, major }) => (
        <Group key={metres}>
          <Line points={[RULER_PX - (major ? 9 : 5), at, RULER_PX, at]} stroke={ink.wall} strokeWidth={0.8} />
          {major ? (
            <Text
              {...text}
              text={metres.toFixed(digits)}
              x={0}
              y={at - 6}
              width={RULER_PX - 11}
              align="right"
            />
          ) : null}
        </Group>
      ))}
      <Rect width={RULER_PX} height={RULER_PX} fill={ink.paper} />
    </Group>
  );
}
