'use client';

import { Arrow, Circle, Group, Label, Line, Tag, Text } from 'react-konva';
import type { Pass } from '@/lib/room';
import { ink } from './ink';
import { useSheetScale } from './sheet-scale';

/** Passes on the sheet: the path with its direction, the name where it starts, and points to pull on the chosen one. */
export function PassesLayer({
  passes,
  selectedId,
  editable,
  draft,
  onSelect,
  onMovePoint,
  onMoveEnd,
}: {
  passes: readonly Pass[];
  selectedId: string | null;
  editable: boolean;
  /** A path that is being drawn, its last point under the hand. */
  draft: readonly (readonly [number, number])[] | null;
  onSelect: (id: string) => void;
  onMovePoint: (id: string, index: number, at: [number, number], free: boolean) => void;
  onMoveEnd: () => void;
}) {
  const px = 1 / useSheetScale();
  return (
    <Group>
      {passes.map((pass) => {
        const selected = pass.id === selectedId;
        return (
          <Group key={pass.id} name="pass" id={pass.id}>
            <Arrow
              points={pass.path.flat()}
              stroke={selected ? ink.link : ink.harbour}
              fill={selected ? ink.link : ink.harbour}
              strokeWidth={3}
              strokeScaleEnabled={false}
              pointerLength={11 * px}
              pointerWidth={10 * px}
              hitStrokeWidth={16 * px}
              lineJoin="round"
              onPointerDown={(event) => {
                event.cancelBubble = true;
                onSelect(pass.id);
              }}
            />
            <Label
              x={pass.path[0][0]}
              y={pass.path[0][1]}
              scaleX={px}
              scaleY={px}
              offsetX={16}
              offsetY={34}
              onPointerDown={(event) => {
                event.cancelBubble = true;
                onSelect(pass.id);
              }}
            >
              <Tag
                fill={ink.harbour}
                stroke={selected ? ink.lamp : ink.paper}
                strokeWidth={2}
                cornerRadius={3}
              />
              <Text
                text={pass.name.slice(0, 4)}
                fontFamily="Barlow Condensed"
                fontStyle="600"
                fontSize={14}
                padding={4}
                fill={ink.paper}
              />
            </Label>
            {selected && editable
              ? pass.path.map(([x, y], index) => (
                  <Circle
                    // biome-ignore lint/suspicious/noArrayIndexKey: points of a path have no other name than their place.
                    key={index}
                    x={x}
                    y={y}
                    radius={6.5 * px}
                    hitStrokeWidth={16 * px}
                    fill={ink.lamp}
                    stroke={ink.harbour}
                    strokeWidth={1.5}
                    strokeScaleEnabled={false}
                    draggable
                    onPointerDown={(event) => {
                      event.cancelBubble = true;
                    }}
                    onDragMove={(event) =>
                      onMovePoint(pass.id, index, [event.target.x(), event.target.y()], event.evt.altKey)
                    }
                    onDragEnd={onMoveEnd}
                  />
                ))
              : null}
          </Group>
        );
      })}
      {draft && draft.length > 0 ? (
        <Line
          listening={false}
          points={draft.flat()}
          stroke={ink.link}
          strokeWidth={3}
          dash={[8, 5]}
          strokeScaleEnabled={false}
        />
      ) : null}
    </Group>
  );
}
