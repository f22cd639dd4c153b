import type { Furniture } from '../schema/floor-plan';
import type { PlanPoint } from '../schema/primitives';
import type { ShelfPiece } from './shelf-piece';

/** A piece of its own, made from the shelf's; `newId` is asked for it and for each of its touch points. */
export const takeFromShelf = (
  piece: ShelfPiece,
  name: string,
  at: PlanPoint,
  turn: number,
  newId: () => string,
): Furniture => ({
  id: newId(),
  name,
  kind: piece.kind,
  at,
  turn,
  parts: piece.parts.map((part) => ({ ...part, footprint: part.footprint.map(([x, y]) => [x, y]) })),
  touchPoints: piece.touchPoints.map((point) => ({ ...point, at: [...point.at], id: newId() })),
});
