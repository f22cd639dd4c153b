import type { Furniture, Part } from './schema/floor-plan';
import type { PlanPoint } from './schema/primitives';
import { inPlan } from './to-scene';

/** A piece's extent in its own axes, and its heights; metres. */
export interface PieceSize {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
  /** Along its own x. */
  readonly width: number;
  /** Along its own y. */
  readonly depth: number;
  readonly base: number;
  readonly top: number;
}

export function pieceSize(piece: { readonly parts: readonly Part[] }): PieceSize {
  const corners = piece.parts.flatMap((part) => part.footprint);
  const xs = corners.map(([x]) => x);
  const ys = corners.map(([, y]) => y);
  const [minX, maxX, minY, maxY] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  return {
    minX,
    minY,
    maxX,
    maxY,
    width: maxX - minX,
    depth: maxY - minY,
    base: Math.min(...piece.parts.map((part) => part.base)),
    top: Math.max(...piece.parts.map((part) => part.top)),
  };
}

/** The corners, in plan, of the rectangle round a piece that is turned with it. */
export function pieceCorners(piece: Furniture): PlanPoint[] {
  const { minX, minY, maxX, maxY } = pieceSize(piece);
  const corners: PlanPoint[] = [
    [minX, minY],
    [maxX, minY],
    [maxX, maxY],
    [minX, maxY],
  ];
  return corners.map((corner) => inPlan(piece, corner));
}
