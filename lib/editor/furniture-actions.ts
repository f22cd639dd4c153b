import type { FloorPlanDocument, Furniture, Part, PlanPoint } from '@/lib/room';
import { pieceSize } from '@/lib/room/piece-size';
import { normaliseDegrees } from '@/lib/units';
import { tidy, tidyPoint } from './outcome';

/** Named edits of furniture. */

const withFurniture = (document: FloorPlanDocument, furniture: Furniture[]): FloorPlanDocument => ({
  ...document,
  floorPlan: { ...document.floorPlan, furniture },
});

export const changePiece = (
  document: FloorPlanDocument,
  id: string,
  edit: (piece: Furniture) => Furniture,
): FloorPlanDocument =>
  withFurniture(
    document,
    document.floorPlan.furniture.map((piece) => (piece.id === id ? edit(piece) : piece)),
  );

export const addPiece = (document: FloorPlanDocument, piece: Furniture): FloorPlanDocument =>
  withFurniture(document, [...document.floorPlan.furniture, { ...piece, at: tidyPoint(piece.at) }]);

export const movePiece = (document: FloorPlanDocument, id: string, at: PlanPoint): FloorPlanDocument =>
  changePiece(document, id, (piece) => ({ ...piece, at: tidyPoint(at) }));

export const turnPiece = (document: FloorPlanDocument, id: string, turn: number): FloorPlanDocument =>
  changePiece(document, id, (piece) => ({ ...piece, turn: tidy(normaliseDegrees(turn)) }));

/** Smallest side a piece can be given, metres. */
export const LEAST_PIECE = 0.02;

/**
 * A piece made `width` by `depth` metres along its own axes: its parts and touch points stretch with it, and
 * its own point `anchor` (by default its origin) stays where it is in the room.
 */
export function resizePiece(
  piece: Furniture,
  width: number,
  depth: number,
  anchor: PlanPoint = [0, 0],
): Furniture {
  const size = pieceSize(piece);
  const sx = Math.max(LEAST_PIECE, width) / size.width;
  const sy = Math.max(LEAST_PIECE, depth) / size.depth;
  const stretch = ([x, y]: PlanPoint): PlanPoint => [tidy(x * sx), tidy(y * sy)];
  const [dx, dy] = [anchor[0] * (1 - sx), anchor[1] * (1 - sy)];
  const angle = (piece.turn * Math.PI) / 180;
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  return {
    ...piece,
    at: tidyPoint([piece.at[0] + dx * cos - dy * sin, piece.at[1] + dx * sin + dy * cos]),
    parts: piece.parts.map((part) => ({ ...part, footprint: part.footprint.map(stretch) })),
    touchPoints: piece.touchPoints.map((point) => ({ ...point, at: stretch(point.at) })),
  };
}

/** A piece made `top` metres high: every height in it stretches, so a gap under it stays a gap. */
export function setPieceTop(piece: Furniture, top: number): Furniture {
  const factor = top / pieceSize(piece).top;
  return {
    ...piece,
    parts: piece.parts.map((part) => ({
      ...part,
      base: tidy(part.base * factor),
      top: tidy(part.top * factor),
    })),
    touchPoints: piece.touchPoints.map((point) => ({ ...point, height: tidy(point.height * factor) })),
  };
}

export const changePart = (
  document: FloorPlanDocument,
  id: string,
  index: number,
  change: Partial<Pick<Part, 'name' | 'base' | 'top'>>,
): FloorPlanDocument =>
  changePiece(document, id, (piece) => ({
    ...piece,
    parts: piece.parts.map((part, i) => (i === index ? { ...part, ...change } : part)),
  }));

export const removePiece = (document: FloorPlanDocument, id: string): FloorPlanDocument =>
  withFurniture(
    document,
    document.floorPlan.furniture.filter((piece) => piece.id !== id),
  );
