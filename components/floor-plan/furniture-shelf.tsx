'use client';

import { signedArea } from '@/lib/geometry/polygon';
import { shelfPieces } from '@/lib/room/furniture-shelf/pieces';
import type { ShelfPiece } from '@/lib/room/furniture-shelf/shelf-piece';
import { pieceSize } from '@/lib/room/piece-size';

/** Pieces to drag onto the sheet, or to pick and put down with a click; the keyboard puts one into the middle. */
export function FurnitureShelf({
  placing,
  onPlace,
  onPut,
}: {
  placing: ShelfPiece | null;
  onPlace: (piece: ShelfPiece | null) => void;
  onPut: (piece: ShelfPiece) => void;
}) {
  return (
    <section aria-labelledby="shelf-heading">
      <h2 id="shelf-heading" className="label">
        Furniture shelf
      </h2>
      <ul className="mt-2 grid grid-cols-5 gap-1.5">
        {shelfPieces.map((piece) => (
          <li key={piece.kind}>
            <button
              type="button"
              draggable
              aria-pressed={placing?.kind === piece.kind}
              title={sizeInWords(piece)}
              onDragStart={(event) => {
                event.dataTransfer.setData('text/plain', piece.label);
                event.dataTransfer.effectAllowed = 'copy';
                onPlace(piece);
              }}
              onDragEnd={(event) => {
                if (event.dataTransfer.dropEffect === 'none') onPlace(null);
              }}
              onClick={(event) => {
                // A click by keyboard has no place on the sheet: the piece goes into the middle of the room.
                if (event.detail === 0) onPut(piece);
                else onPlace(placing?.kind === piece.kind ? null : piece);
              }}
              className={`flex h-[72px] w-full flex-col items-center gap-1 rounded border px-0.5 py-1.5 text-center ${
                placing?.kind === piece.kind
                  ? 'border-action bg-action text-on-action'
                  : 'border-rule bg-field hover:bg-wash'
              }`}
            >
              <Outline piece={piece} />
              <span className="font-condensed text-[13px] leading-[1.05] font-medium">{piece.label}</span>
            </button>
          </li>
        ))}
      </ul>
      <p className="mt-2 text-sm text-ink-2">
        Usual sizes to start from, not measurements. Measure what stands in the room.
      </p>
    </section>
  );
}

const sizeInWords = (piece: ShelfPiece): string => {
  const { width, depth, top } = pieceSize(piece);
  return `${piece.label}: ${width.toFixed(2)} × ${depth.toFixed(2)} m, ${top.toFixed(2)} m high (${piece.source})`;
};

/** The piece in plan, to the scale of its own box: the largest part filled, the rest as lines. */
function Outline({ piece }: { piece: ShelfPiece }) {
  const { minX, minY, width, depth } = pieceSize(piece);
  const margin = Math.max(width, depth) * 0.03;
  return (
    <svg
      aria-hidden="true"
      viewBox={`${minX - margin} ${minY - margin} ${width + 2 * margin} ${depth + 2 * margin}`}
      className="h-8 w-12 shrink-0"
    >
      {[...piece.parts]
        .sort((one, two) => Math.abs(signedArea(two.footprint)) - Math.abs(signedArea(one.footprint)))
        .map((part, i) => (
          <polygon
            key={part.name}
            points={part.footprint.map((corner) => corner.join(',')).join(' ')}
            fill={i === 0 ? 'currentColor' : 'none'}
            fillOpacity={0.14}
            stroke="currentColor"
            strokeWidth={1.2}
            vectorEffect="non-scaling-stroke"
          />
        ))}
    </svg>
  );
}
