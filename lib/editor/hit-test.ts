import { sideOf } from '@/lib/geometry/polygon';
import { type FloorPlanDocument, footprintInPlan, type PlanPoint } from '@/lib/room';
import { pieceCorners, pieceSize } from '@/lib/room/piece-size';
import type { PlanRef } from '@/lib/room/plan-ref';
import { placedTouchPoints } from '@/lib/room/touch-points';
import {
  againstWall,
  distanceToWall,
  edgeOf,
  onWall,
  type WallRun,
  wallRuns,
} from '@/lib/room/wall-geometry';

/** What the hand can take hold of on a chosen thing. */
export type Handle =
  | { readonly kind: 'corner'; readonly corner: number; readonly at: PlanPoint }
  | { readonly kind: 'wall-end'; readonly id: string; readonly end: 'a' | 'b'; readonly at: PlanPoint }
  | { readonly kind: 'opening-end'; readonly id: string; readonly end: 'from' | 'to'; readonly at: PlanPoint }
  | {
      readonly kind: 'piece-side';
      readonly id: string;
      /** Which side or corner: −1, 0 or 1 along the piece's own axes. */
      readonly side: readonly [number, number];
      readonly at: PlanPoint;
    }
  | { readonly kind: 'turn'; readonly ref: PlanRef; readonly about: PlanPoint; readonly at: PlanPoint };

const near = (a: PlanPoint, b: PlanPoint, reach: number) => Math.hypot(a[0] - b[0], a[1] - b[1]) <= reach;

const pieceSides: readonly (readonly [number, number])[] = [
  [-1, -1],
  [1, -1],
  [1, 1],
  [-1, 1],
  [0, -1],
  [1, 0],
  [0, 1],
  [-1, 0],
];

/** The handles of a chosen thing. `px` is a pixel in metres: handles keep their distance from each other on screen. */
export function handlesOf(document: FloorPlanDocument, ref: PlanRef, px: number): Handle[] {
  const { floorPlan } = document;
  switch (ref.kind) {
    case 'outline-wall':
      return floorPlan.outline.map((at, corner) => ({ kind: 'corner', corner, at }));
    case 'inner-wall': {
      const wall = floorPlan.innerWalls.find(({ id }) => id === ref.id);
      if (!wall) return [];
      return (['a', 'b'] as const).map((end) => ({ kind: 'wall-end', id: wall.id, end, at: wall[end] }));
    }
    case 'opening': {
      const opening = floorPlan.openings.find(({ id }) => id === ref.id);
      const run = wallRuns(floorPlan).find(({ id }) => id === opening?.wall);
      if (!opening || !run) return [];
      const middle = (run.ahead - run.behind) / 2;
      return (['from', 'to'] as const).map((end) => ({
        kind: 'opening-end',
        id: opening.id,
        end,
        at: onWall(run, opening[end], middle),
      }));
    }
    case 'furniture': {
      const piece = floorPlan.furniture.find(({ id }) => id === ref.id);
      if (!piece) return [];
      const [p, q, r, s] = pieceCorners(piece);
      const spot = (u: number, v: number): PlanPoint => {
        const [i, j] = [(u + 1) / 2, (v + 1) / 2];
        const mix = (k: 0 | 1) =>
          p[k] * (1 - i) * (1 - j) + q[k] * i * (1 - j) + r[k] * i * j + s[k] * (1 - i) * j;
        return [mix(0), mix(1)];
      };
      const { width, depth } = pieceSize(piece);
      const roomy = Math.min(width, depth) / px > 44;
      const about = spot(0, 0);
      const front = spot(0, -1);
      const reach = Math.hypot(front[0] - about[0], front[1] - about[1]) || 1;
      const stretch = (reach + 26 * px) / reach;
      return [
        ...pieceSides
          .filter(([u, v]) => roomy || (u !== 0 && v !== 0))
          .map((side): Handle => ({ kind: 'piece-side', id: piece.id, side, at: spot(...side) })),
        {
          kind: 'turn',
          ref,
          about,
          at: [about[0] + (front[0] - about[0]) * stretch, about[1] + (front[1] - about[1]) * stretch],
        },
      ];
    }
    case 'touch-point': {
      const spot = placedTouchPoints(document.floorPlan).find(({ point }) => point.id === ref.id);
      if (!spot) return [];
      const angle = (spot.facing * Math.PI) / 180;
      const at: PlanPoint = [spot.at[0] + Math.cos(angle) * 34 * px, spot.at[1] + Math.sin(angle) * 34 * px];
      return [{ kind: 'turn', ref, about: spot.at, at }];
    }
    case 'watch-point':
      return [];
  }
}

export const handleAt = (handles: readonly Handle[], at: PlanPoint, reach: number): Handle | null =>
  handles.find((handle) => near(handle.at, at, reach)) ?? null;

/** The wall whose body, or the strip of `reach` round it, is under a point. */
export function wallAt(runs: readonly WallRun[], at: PlanPoint, reach: number): WallRun | null {
  let best: { run: WallRun; off: number } | null = null;
  for (const run of runs) {
    const off = distanceToWall(run, at);
    if (off <= reach && off < (best?.off ?? Number.POSITIVE_INFINITY)) best = { run, off };
  }
  return best?.run ?? null;
}

/** The touch point under a point; those that come with furniture only when `ofPiece` says so. */
export function touchPointAt(
  { floorPlan }: FloorPlanDocument,
  at: PlanPoint,
  reach: number,
  ofPiece: (pieceId: string) => boolean,
): PlanRef | null {
  const spot = placedTouchPoints(floorPlan).find(
    (one) => near(one.at, at, reach) && (one.pieceId === null || ofPiece(one.pieceId)),
  );
  return spot ? { kind: 'touch-point', id: spot.point.id } : null;
}

/**
 * What is under a point: small things before large ones, furniture before walls. `reach` in metres. Touch points
 * that come with a piece are part of it here, or a piece could not be taken by its middle.
 */
export function thingAt(document: FloorPlanDocument, at: PlanPoint, reach: number): PlanRef | null {
  const { floorPlan } = document;
  const touch = touchPointAt(document, at, reach, () => false);
  if (touch) return touch;
  const watch = floorPlan.watchPoints.find((spot) => near(spot.at, at, reach));
  if (watch) return { kind: 'watch-point', id: watch.id };
  const runs = wallRuns(floorPlan);
  const opening = floorPlan.openings.find((candidate) => {
    const run = runs.find(({ id }) => id === candidate.wall);
    if (!run) return false;
    const { s } = againstWall(run, at);
    return s >= candidate.from && s <= candidate.to && distanceToWall(run, at) <= reach / 2;
  });
  if (opening) return { kind: 'opening', id: opening.id };
  const pieces = floorPlan.furniture
    .filter((piece) => piece.parts.some((part) => sideOf(...at, footprintInPlan(piece, part)) !== 'outside'))
    .sort((one, two) => size(one) - size(two));
  if (pieces[0]) return { kind: 'furniture', id: pieces[0].id };
  const wall = wallAt(runs, at, reach / 2);
  if (!wall) return null;
  return edgeOf(wall.id) === null
    ? { kind: 'inner-wall', id: wall.id }
    : { kind: 'outline-wall', id: wall.id };
}

const size = (piece: Parameters<typeof pieceSize>[0]): number => {
  const { width, depth } = pieceSize(piece);
  return width * depth;
};
