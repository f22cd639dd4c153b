import type { FloorPlanDocument, PlanPoint, TouchPoint, WatchPoint } from '@/lib/room';
import { pieceSize } from '@/lib/room/piece-size';
import { normaliseDegrees } from '@/lib/units';
import { freeName } from './free-name';
import { tidy, tidyPoint } from './outcome';

/** Named edits of touch points, the room's own and those that come with furniture, and of watch points. */

/** Height of a light switch or a door handle, metres; common practice. */
const TOUCH_HEIGHT = 1.05;
/** Eye height of a standing person, metres: ISO 15858. */
const WATCH_HEIGHT = 1.73;

const withPlan = (
  document: FloorPlanDocument,
  change: Partial<FloorPlanDocument['floorPlan']>,
): FloorPlanDocument => ({ ...document, floorPlan: { ...document.floorPlan, ...change } });

/** A touch point that faces `facing` (plan degrees). */
export const addTouchPoint = (
  document: FloorPlanDocument,
  id: string,
  name: string,
  at: PlanPoint,
  facing: number,
): FloorPlanDocument =>
  withPlan(document, {
    touchPoints: [
      ...document.floorPlan.touchPoints,
      { id, name, at: tidyPoint(at), height: TOUCH_HEIGHT, facing: normaliseDegrees(facing), tilt: 0 },
    ],
  });

/** A touch point in the middle of a piece's top, facing up: to be moved to where hands go. */
export const addTouchPointTo = (
  document: FloorPlanDocument,
  pieceId: string,
  id: string,
): FloorPlanDocument =>
  withPlan(document, {
    furniture: document.floorPlan.furniture.map((piece) => {
      if (piece.id !== pieceId) return piece;
      const { minX, minY, width, depth, top } = pieceSize(piece);
      const at = tidyPoint([minX + width / 2, minY + depth / 2]);
      const name = freeName(
        'touch point',
        piece.touchPoints.map((point) => point.name),
      );
      return {
        ...piece,
        touchPoints: [...piece.touchPoints, { id, name, at, height: top, facing: 90, tilt: 90 }],
      };
    }),
  });

export const addWatchPoint = (
  document: FloorPlanDocument,
  id: string,
  name: string,
  at: PlanPoint,
): FloorPlanDocument =>
  withPlan(document, {
    watchPoints: [...document.floorPlan.watchPoints, { id, name, at: tidyPoint(at), height: WATCH_HEIGHT }],
  });

const edited = <T extends { readonly id: string }>(
  list: readonly T[],
  id: string,
  edit: (item: T) => T,
): T[] => list.map((item) => (item.id === id ? edit(item) : item));

/** Edits a touch point wherever it belongs; a piece's are in the piece's own axes. */
export function changeTouchPoint(
  document: FloorPlanDocument,
  id: string,
  change: Partial<Omit<TouchPoint, 'id'>>,
): FloorPlanDocument {
  const edit = (point: TouchPoint): TouchPoint => ({ ...point, ...change });
  return withPlan(document, {
    touchPoints: edited(document.floorPlan.touchPoints, id, edit),
    furniture: document.floorPlan.furniture.map((piece) =>
      piece.touchPoints.some((point) => point.id === id)
        ? { ...piece, touchPoints: edited(piece.touchPoints, id, edit) }
        : piece,
    ),
  });
}

export const changeWatchPoint = (
  document: FloorPlanDocument,
  id: string,
  change: Partial<Omit<WatchPoint, 'id'>>,
): FloorPlanDocument =>
  withPlan(document, {
    watchPoints: edited(document.floorPlan.watchPoints, id, (point) => ({ ...point, ...change })),
  });

/** Puts a touch point at a place in plan. */
export function moveTouchPoint(document: FloorPlanDocument, id: string, at: PlanPoint): FloorPlanDocument {
  const piece = document.floorPlan.furniture.find(({ touchPoints }) => touchPoints.some((p) => p.id === id));
  if (!piece) return changeTouchPoint(document, id, { at: tidyPoint(at) });
  const [dx, dy] = [at[0] - piece.at[0], at[1] - piece.at[1]];
  const angle = (piece.turn * Math.PI) / 180;
  const own: PlanPoint = [
    dx * Math.cos(angle) + dy * Math.sin(angle),
    dy * Math.cos(angle) - dx * Math.sin(angle),
  ];
  return changeTouchPoint(document, id, { at: tidyPoint(own) });
}

/** Turns a touch point to a direction in plan. */
export function turnTouchPoint(document: FloorPlanDocument, id: string, facing: number): FloorPlanDocument {
  const piece = document.floorPlan.furniture.find(({ touchPoints }) => touchPoints.some((p) => p.id === id));
  return changeTouchPoint(document, id, { facing: tidy(normaliseDegrees(facing - (piece?.turn ?? 0))) });
}

export const removeSpot = (document: FloorPlanDocument, id: string): FloorPlanDocument =>
  withPlan(document, {
    touchPoints: document.floorPlan.touchPoints.filter((point) => point.id !== id),
    watchPoints: document.floorPlan.watchPoints.filter((point) => point.id !== id),
    furniture: document.floorPlan.furniture.map((piece) =>
      piece.touchPoints.some((point) => point.id === id)
        ? { ...piece, touchPoints: piece.touchPoints.filter((point) => point.id !== id) }
        : piece,
    ),
  });
