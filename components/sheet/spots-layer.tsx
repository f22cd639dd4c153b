'use client';

import { Circle, Group, Line } from 'react-konva';
import type { WatchPoint } from '@/lib/room';
import type { PlacedTouchPoint } from '@/lib/room/touch-points';
import { ink } from './ink';
import { useSheetScale } from './sheet-scale';

/** Touch points as darts that look where the point faces (a ring when it looks up), watch points as an eye. Metres. */
export function SpotsLayer({
  touchPoints,
  watchPoints,
  selectedId = null,
}: {
  touchPoints: readonly PlacedTouchPoint[];
  watchPoints: readonly WatchPoint[];
  selectedId?: string | null;
}) {
  const px = 1 / useSheetScale();
  return (
    <Group listening={false}>
      {touchPoints.map(({ point, at, facing }) => (
        <TouchMark
          key={point.id}
          at={at}
          facing={facing}
          tilt={point.tilt}
          px={px}
          fill={point.id === selectedId ? ink.link : ink.paper}
        />
      ))}
      {watchPoints.map((point) => (
        <Group key={point.id} x={point.at[0]} y={point.at[1]} scaleX={px} scaleY={px}>
          <Line
            points={[-11, 0, 0, -8, 11, 0, 0, 8]}
            tension={0.4}
            closed
            fill={point.id === selectedId ? ink.link : ink.paper}
            stroke={ink.wall}
            strokeWidth={1.4}
          />
          <Circle radius={3} fill={ink.wall} />
        </Group>
      ))}
    </Group>
  );
}

/** One touch point: a dart along its facing, or a ring when it looks up or down. */
export function TouchMark({
  at,
  facing,
  tilt,
  px,
  fill,
}: {
  at: readonly [number, number];
  facing: number;
  tilt: number;
  px: number;
  fill: string;
}) {
  return (
    <Group x={at[0]} y={at[1]} scaleX={px} scaleY={px} rotation={facing}>
      {Math.abs(tilt) > 60 ? (
        <Circle radius={6} fill={fill} stroke={ink.wall} strokeWidth={1.4} />
      ) : (
        <Line points={[10, 0, -5, 6.5, -5, -6.5]} closed fill={fill} stroke={ink.wall} strokeWidth={1.4} />
      )}
    </Group>
  );
}
