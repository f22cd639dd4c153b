'use client';

import { Group, Line, Text } from 'react-konva';
import { signedArea } from '@/lib/geometry/polygon';
import { type Furniture, footprintInPlan } from '@/lib/room';
import { ink } from './ink';
import { useSheetScale } from './sheet-scale';

/** Top of the largest part, as written beside the name: a bed's mattress, not its headboard. */
const topOf = (piece: Furniture): number =>
  piece.parts.reduce((largest, part) =>
    Math.abs(signedArea(part.footprint)) > Math.abs(signedArea(largest.footprint)) ? part : largest,
  ).top;

/**
 * Furniture in plan. On a dose map the parts that the chosen plane cuts are filled, since no dose is read in
 * them; the rest is dashed, since the map goes on over or under it. Metres.
 */
export function FurnitureLayer({
  furniture,
  plane,
  selectedIds = [],
  faultyIds = [],
  dimmed = false,
}: {
  furniture: readonly Furniture[];
  /** Height of the plane the map is on; `null`: no map, everything filled; 'tops': outlines only. */
  plane: number | 'tops' | null;
  selectedIds?: readonly string[];
  faultyIds?: readonly string[];
  dimmed?: boolean;
}) {
  return (
    <Group listening={false} opacity={dimmed ? 0.5 : 1}>
      {furniture.map((piece) => (
        <FurniturePiece
          key={piece.id}
          piece={piece}
          plane={plane}
          selected={selectedIds.includes(piece.id)}
          faulty={faultyIds.includes(piece.id)}
        />
      ))}
    </Group>
  );
}

function FurniturePiece({
  piece,
  plane,
  selected,
  faulty,
}: {
  piece: Furniture;
  plane: number | 'tops' | null;
  selected: boolean;
  faulty: boolean;
}) {
  const px = 1 / useSheetScale();
  const stroke = faulty ? ink.danger : selected ? ink.link : ink.wall;
  const corners = piece.parts.flatMap((part) => footprintInPlan(piece, part));
  const xs = corners.map(([x]) => x);
  const ys = corners.map(([, y]) => y);
  const width = (Math.max(...xs) - Math.min(...xs)) / px;
  const height = (Math.max(...ys) - Math.min(...ys)) / px;
  const label = `${piece.name} ${topOf(piece).toFixed(2)}`.toUpperCase();
  const roomForLabel = width > label.length * 5.4 && height > 16;
  return (
    <Group name="furniture" id={piece.id}>
      {/* Highest last, as seen from above. */}
      {[...piece.parts]
        .sort((one, two) => one.top - two.top)
        .map((part) => {
          const cut = plane === null || (plane !== 'tops' && part.base <= plane && plane < part.top);
          return (
            <Line
              key={`${part.name}-${part.base}`}
              points={footprintInPlan(piece, part).flat()}
              closed
              fill={cut ? ink.furniture : undefined}
              stroke={stroke}
              strokeWidth={selected || faulty ? 2.2 : 1.1}
              dash={cut ? undefined : [4, 3]}
              strokeScaleEnabled={false}
            />
          );
        })}
      {roomForLabel ? (
        <Text
          text={label}
          x={(Math.max(...xs) + Math.min(...xs)) / 2}
          y={(Math.max(...ys) + Math.min(...ys)) / 2}
          scaleX={px}
          scaleY={px}
          width={width}
          offsetX={width / 2}
          offsetY={6}
          align="center"
          wrap="none"
          ellipsis
          fontFamily="Barlow Condensed"
          fontStyle="500"
          fontSize={12}
          fill={ink.text}
          stroke={ink.paper}
          strokeWidth={3}
          fillAfterStrokeEnabled
          lineJoin="round"
        />
      ) : null}
    </Group>
  );
}
