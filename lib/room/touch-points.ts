import type { Vector3 } from '@/lib/engine/types';
import { normaliseDegrees, toRadians } from '@/lib/units';
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

/** A touch point as the engine reads it: where it is, and the unit vector it faces along. */
export function toSpot({ at, point, facing }: PlacedTouchPoint): { p: Vector3; n: Vector3 } {
  const level = Math.cos(toRadians(point.tilt));
  const angle = toRadians(facing);
  return {
    p: [at[0], at[1], point.height],
    n: [level * Math.cos(angle), level * Math.sin(angle), Math.sin(toRadians(point.tilt))],
  };
}
