'use client';

import { Button } from '@/components/ui/button';
import { NameField } from '@/components/ui/name-field';
import { NumberField } from '@/components/ui/number-field';
import { newId } from '@/lib/client/new-id';
import {
  changePart,
  changePiece,
  LEAST_PIECE,
  movePiece,
  resizePiece,
  setPieceTop,
  turnPiece,
} from '@/lib/editor/furniture-actions';
import { addTouchPointTo } from '@/lib/editor/spot-actions';
import type { Furniture } from '@/lib/room';
import { pieceSize } from '@/lib/room/piece-size';
import type { PlanRef } from '@/lib/room/plan-ref';
import type { DetailsProps } from './details-props';

export function FurnitureDetails({
  piece,
  document,
  editable,
  onAct,
  onSelect,
}: DetailsProps & { piece: Furniture; onSelect: (ref: PlanRef | null) => void }) {
  const size = pieceSize(piece);
  const disabled = !editable;
  const { id } = piece;
  return (
    <>
      <NameField
        className="col-span-2"
        value={piece.name}
        disabled={disabled}
        onChange={(name) => onAct((value) => changePiece(value, id, (held) => ({ ...held, name })))}
      />
      <NumberField
        label="x"
        unit="m"
        value={piece.at[0]}
        disabled={disabled}
        onChange={(x) => onAct((value) => movePiece(value, id, [x, piece.at[1]]))}
      />
      <NumberField
        label="y"
        unit="m"
        value={piece.at[1]}
        disabled={disabled}
        onChange={(y) => onAct((value) => movePiece(value, id, [piece.at[0], y]))}
      />
      <NumberField
        label="Width"
        unit="m"
        value={size.width}
        min={LEAST_PIECE}
        max={50}
        disabled={disabled}
        onChange={(width) =>
          onAct((value) => changePiece(value, id, (held) => resizePiece(held, width, size.depth)))
        }
      />
      <NumberField
        label="Depth"
        unit="m"
        value={size.depth}
        min={LEAST_PIECE}
        max={50}
        disabled={disabled}
        onChange={(depth) =>
          onAct((value) => changePiece(value, id, (held) => resizePiece(held, size.width, depth)))
        }
      />
      <NumberField
        label="Height"
        unit="m"
        value={size.top}
        min={0.02}
        max={document.ceiling}
        disabled={disabled}
        onChange={(top) => onAct((value) => changePiece(value, id, (held) => setPieceTop(held, top)))}
      />
      <NumberField
        label="Turn"
        unit="°"
        digits={1}
        value={piece.turn}
        min={-360}
        max={720}
        disabled={disabled}
        onChange={(turn) => onAct((value) => turnPiece(value, id, turn))}
      />
      <div className="col-span-2">
        <p className="text-sm text-ink-2">Parts, with the height of underside and top (m)</p>
        {piece.parts.map((part, index) => (
          <div key={part.name} className="mt-1.5 grid grid-cols-[1fr_84px_84px] items-end gap-2">
            <span className="truncate pb-2">{part.name}</span>
            <NumberField
              label="Underside"
              value={part.base}
              min={0}
              max={part.top - 0.001}
              disabled={disabled}
              onChange={(base) => onAct((value) => changePart(value, id, index, { base }))}
            />
            <NumberField
              label="Top"
              value={part.top}
              min={part.base + 0.001}
              max={document.ceiling}
              disabled={disabled}
              onChange={(top) => onAct((value) => changePart(value, id, index, { top }))}
            />
          </div>
        ))}
      </div>
      {editable ? (
        <div className="col-span-2">
          <Button
            size="small"
            onClick={() => {
              const point = newId();
              if (onAct((value) => addTouchPointTo(value, id, point)))
                onSelect({ kind: 'touch-point', id: point });
            }}
          >
            Add a touch point to it
          </Button>
        </div>
      ) : null}
    </>
  );
}
