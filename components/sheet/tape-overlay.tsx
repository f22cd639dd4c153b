'use client';

import { Group, Line } from 'react-konva';
import type { PlanPoint } from '@/lib/room';
import { LengthLabel } from './edit-overlay';
import { ink } from './ink';

/** A length measured on the sheet. Metres. */
export function TapeOverlay({ from, to }: { from: PlanPoint; to: PlanPoint }) {
  return (
    <Group listening={false}>
      <Line
        points={[...from, ...to]}
        stroke={ink.link}
        strokeWidth={1.8}
        dash={[7, 4]}
        strokeScaleEnabled={false}
      />
      <LengthLabel
        at={[(from[0] + to[0]) / 2, (from[1] + to[1]) / 2]}
        metres={Math.hypot(to[0] - from[0], to[1] - from[1])}
      />
    </Group>
  );
}
