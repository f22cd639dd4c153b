'use client';

import { Group, Label, Tag, Text } from 'react-konva';
import { doseStepOf, formatRatio } from '@/lib/drawing/dose-scale';
import type { PlacedTouchPoint } from '@/lib/room';
import { ink } from './ink';
import { useSheetScale } from './sheet-scale';
import { TouchMark } from './spots-layer';

/** Pixels per metre below which the ratios would lie on each other; the ledger has them. */
const ROOM_FOR_RATIOS = 70;

/** Touch points in the colour of their dose; those under target say how much they get. */
export function TouchDoseLayer({
  spots,
  ratioOf,
  chosen,
}: {
  spots: readonly PlacedTouchPoint[];
  ratioOf: ReadonlyMap<string, number>;
  chosen: string | null;
}) {
  const scale = useSheetScale();
  const px = 1 / scale;
  return (
    <Group listening={false}>
      {spots.map(({ point, at, facing }) => {
        const ratio = ratioOf.get(point.id);
        const under = ratio !== undefined && ratio < 1;
        const on = point.id === chosen;
        return (
          <Group key={point.id}>
            <TouchMark
              at={at}
              facing={facing}
              tilt={point.tilt}
              px={on ? px * 1.6 : px}
              fill={ratio === undefined ? ink.paper : doseStepOf(ratio).colour}
            />
            {ratio !== undefined && (on || (under && scale > ROOM_FOR_RATIOS)) ? (
              <Label x={at[0]} y={at[1]} scaleX={px} scaleY={px} offsetX={-12} offsetY={9}>
                <Tag fill={ink.paper} stroke={under ? ink.umber : ink.rule} strokeWidth={1.2} />
                <Text
                  text={formatRatio(ratio)}
                  fontFamily="IBM Plex Mono"
                  fontSize={11.5}
                  padding={3}
                  fill={under ? ink.umber : ink.text}
                />
              </Label>
            ) : null}
          </Group>
        );
      })}
    </Group>
  );
}
