'use client';

import { Group, Label, Line, Tag, Text } from 'react-konva';
import type { PlanPoint } from '@/lib/room';
import { formatMetres } from '@/lib/units';
import { ink } from './ink';
import { useSheetScale } from './sheet-scale';

/** A length measured on the sheet. Metres. */
export function TapeOverlay({ from, to }: { from: PlanPoint; to: PlanPoint }) {
  const px = 1 / useSheetScale();
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  return (
    <Group listening={false}>
      <Line
        points={[...from, ...to]}
        stroke={ink.link}
        strokeWidth={1.8}
        dash={[7, 4]}
        strokeScaleEnabled={false}
      />
      <Label
        x={(from[0] + to[0]) / 2}
        y={(from[1] + to[1]) / 2}
        scaleX={px}
        scaleY={px}
        offsetX={28}
        offsetY={11}
      >
        <Tag fill={ink.paper} stroke={ink.link} strokeWidth={1.2} />
        <Text
          text={formatMetres(length)}
          fontFamily="IBM Plex Mono"
          fontSize={12.5}
          padding={5}
          width={64}
          align="center"
          fill={ink.text}
        />
      </Label>
    </Group>
  );
}
