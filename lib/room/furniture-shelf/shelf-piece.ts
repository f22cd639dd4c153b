import type { Part, TouchPoint } from '../schema/floor-plan';
import type { PlanPoint } from '../schema/primitives';

/** Where a default size comes from: shown beside it, so that nobody takes it for a measurement of their own room. */
export type SizeSource = 'usual hospital sizes' | 'common practice';

export interface ShelfPiece {
  /** Kept in the floor plan as the piece's kind. */
  readonly kind: string;
  readonly label: string;
  readonly group: 'Ward' | 'Furniture' | 'Gym' | 'Other';
  readonly source: SizeSource;
  /** In the piece's own axes, about its middle; the side that goes to the wall is −y, a bed's head −x. */
  readonly parts: readonly Part[];
  readonly touchPoints: readonly Omit<TouchPoint, 'id'>[];
}

/** An upright block over the rectangle x0…x1 by y0…y1, from `base` to `top`; metres. */
export const block = (
  name: string,
  [x0, x1]: readonly [number, number],
  [y0, y1]: readonly [number, number],
  base: number,
  top: number,
): Part => ({
  name,
  footprint: [
    [x0, y0],
    [x1, y0],
    [x1, y1],
    [x0, y1],
  ],
  base,
  top,
});

/** A touch point with its normal `facing` (plan degrees) and `tilt` (90 looks up). */
export const touch = (
  name: string,
  at: PlanPoint,
  height: number,
  facing: number,
  tilt = 0,
): Omit<TouchPoint, 'id'> => ({ name, at, height, facing, tilt });
