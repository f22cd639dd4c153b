import { normaliseDegrees } from '@/lib/units';
import type { FloorPlan, TouchPoint } from './schema/floor-plan';
import type { PlanPoint } from './schema/primitives';
import { inPlan } from './to-scene';

/** A touch point with its place and direction in plan, and the piece it comes with, if any. */
export interface PlacedTouchPoint {
  readonly point: TouchPoint;
  readonly at: PlanPoint;
  /** Plan degrees. */
  readonly facing: number;
  readonly pieceId: string | null;
  readonly pieceName: string | null;
}

export const placedTouchPoints = (
  floorPlan: Pick<FloorPlan, 'furniture' | 'touchPoints'>,
): PlacedTouchPoint[] => [
  ...floorPlan.furniture.flatMap((piece) =>
    piece.touchPoints.map((point) => ({
      point,
      at: inPlan(piece, point.at),
      facing: normaliseDegrees(point.facing + piece.turn),
      pieceId: piece.id,
      pieceName: piece.name,
    })),
  ),
  ...floorPlan.touchPoints.map((point) => ({
    point,
    at: point.at,
    facing: normaliseDegrees(point.facing),
    pieceId: null,
    pieceName: null,
  })),
];
