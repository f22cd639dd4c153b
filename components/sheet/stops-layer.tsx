'use client';

import { Arrow, Circle, Group, Label, Line, Tag, Text } from 'react-konva';
import type { Stop } from '@/lib/room';
import { formatDuration, toDegrees } from '@/lib/units';
import { useSheetScale } from './sheet-scale';

const HARBOUR = '#12323f';
const PAPER = '#fcfbf7';
const LAMP = '#e0b45c';
/** Pixels per metre below which dwells would lie on top of each other; the ledger has them. */
const ROOM_FOR_DWELL = 30;
/** Distance of the turning handle from the stop's mark, in pixels. */
const HANDLE_PX = 38;

/** The stops on the sheet in their order, joined by the way the crew pushes. Metres. */
export function StopsLayer({
  stops,
  selectedId,
  editable,
  onSelect,
  onMove,
  onMoveEnd,
  onTurn,
  onTurnEnd,
}: {
  stops: readonly Stop[];
  selectedId: string | null;
  editable: boolean;
  onSelect: (id: string) => void;
  /** While the hand moves, in plan metres; `free` when Alt is held: no snapping. */
  onMove: (id: string, at: [number, number], free: boolean) => void;
  onMoveEnd: () => void;
  onTurn: (id: string, headingDeg: number) => void;
  onTurnEnd: () => void;
}) {
  const scale = useSheetScale();
  const px = 1 / scale;
  return (
    <Group>
      <Line
        listening={false}
        points={stops.flatMap((stop) => stop.at)}
        stroke="#1e2326"
        strokeWidth={1.6}
        strokeScaleEnabled={false}
        dash={[2, 6]}
        lineCap="round"
      />
      {stops.map((stop) => {
        const selected = stop.id === selectedId;
        return (
          <Group
            key={stop.id}
            id={stop.id}
            name="stop"
            x={stop.at[0]}
            y={stop.at[1]}
            draggable={editable}
            onPointerDown={(event) => {
              event.cancelBubble = true;
              onSelect(stop.id);
            }}
            onDragMove={(event) => {
              if (event.target.name() !== 'stop') return;
              onMove(stop.id, [event.target.x(), event.target.y()], event.evt.altKey);
            }}
            onDragEnd={(event) => {
              if (event.target.name() !== 'stop') return;
              onMove(stop.id, [event.target.x(), event.target.y()], event.evt.altKey);
              onMoveEnd();
            }}
          >
            {selected && editable ? (
              <TurnHandle stop={stop} px={px} onTurn={onTurn} onTurnEnd={onTurnEnd} />
            ) : null}
            <Group scaleX={px} scaleY={px}>
              <Arrow
                listening={false}
                points={[0, 0, 21, 0]}
                rotation={stop.heading}
                pointerLength={6}
                pointerWidth={8}
                fill={HARBOUR}
                stroke={HARBOUR}
                strokeWidth={2}
              />
              <Circle radius={22} fill="transparent" />
              <Circle
                radius={13.5}
                fill={HARBOUR}
                stroke={selected ? LAMP : PAPER}
                strokeWidth={selected ? 3.5 : 2.5}
              />
              <Text
                listening={false}
                text={stop.name.slice(0, 3)}
                width={40}
                height={20}
                offsetX={20}
                offsetY={9}
                align="center"
                verticalAlign="middle"
                fontFamily="Barlow Condensed"
                fontStyle="600"
                fontSize={15}
                fill={PAPER}
              />
              <Label x={26} y={-10} listening={false} visible={selected || scale >= ROOM_FOR_DWELL}>
                <Tag fill={PAPER} stroke="#1e2326" strokeWidth={1.2} />
                <Text
                  text={formatDuration(stop.dwell)}
                  fontFamily="IBM Plex Mono"
                  fontSize={12.5}
                  padding={4}
                  fill="#1e2326"
                />
              </Label>
            </Group>
          </Group>
        );
      })}
    </Group>
  );
}

/** Pulled round the stop to turn the emitter; steps of 5°, or free with Shift held. */
function TurnHandle({
  stop,
  px,
  onTurn,
  onTurnEnd,
}: {
  stop: Stop;
  px: number;
  onTurn: (id: string, headingDeg: number) => void;
  onTurnEnd: () => void;
}) {
  const reach = HANDLE_PX * px;
  const angle = (stop.heading * Math.PI) / 180;
  return (
    <Circle
      name="turn-handle"
      x={Math.cos(angle) * reach}
      y={Math.sin(angle) * reach}
      radius={7 * px}
      hitStrokeWidth={18 * px}
      fill={LAMP}
      stroke={HARBOUR}
      strokeWidth={1.5}
      strokeScaleEnabled={false}
      draggable
      onPointerDown={(event) => {
        event.cancelBubble = true;
      }}
      onDragMove={(event) => {
        event.cancelBubble = true;
        const free = toDegrees(Math.atan2(event.target.y(), event.target.x()));
        const heading = event.evt.shiftKey ? Math.round(free) : Math.round(free / 5) * 5;
        const at = (heading * Math.PI) / 180;
        event.target.position({ x: Math.cos(at) * reach, y: Math.sin(at) * reach });
        onTurn(stop.id, heading);
      }}
      onDragEnd={(event) => {
        event.cancelBubble = true;
        onTurnEnd();
      }}
    />
  );
}
