import type { Furniture, PlanPoint } from '@/lib/room';
import { pieceCorners } from '@/lib/room/piece-size';
import { againstWall, onWall, type WallRun } from '@/lib/room/wall-geometry';
import { tidyPoint } from './outcome';

/** What a crew can read off a tape. */
export const GRID = 0.05;

/** A line to show while something snaps to it. */
export interface Guide {
  readonly from: PlanPoint;
  readonly to: PlanPoint;
}

export interface Snapped {
  readonly at: PlanPoint;
  readonly guides: readonly Guide[];
}

/** How far the hand may be off, in metres, and whether snapping is off for now. */
export interface SnapReach {
  readonly reach: number;
  readonly free: boolean;
}

export const onGrid = (value: number): number => Math.round(value / GRID) * GRID;
const gridPoint = ([x, y]: PlanPoint): PlanPoint => tidyPoint([onGrid(x), onGrid(y)]);

const distance = (a: PlanPoint, b: PlanPoint): number => Math.hypot(a[0] - b[0], a[1] - b[1]);

/** The long faces of a wall that a room sees: one of an outer wall, two of an inner one. */
export function roomFaces(run: WallRun): { offset: number; facing: number }[] {
  const back = { offset: -run.behind, facing: -1 };
  return run.behind === 0 ? [back] : [back, { offset: run.ahead, facing: 1 }];
}

/**
 * Where a point goes: to a corner, else into line with corners (a guide shows which), else onto the nearest
 * wall, else onto the grid. What is in line in one direction still takes the grid in the other.
 */
export function snapPoint(
  at: PlanPoint,
  corners: readonly PlanPoint[],
  walls: readonly WallRun[],
  { reach, free }: SnapReach,
): Snapped {
  if (free) return { at: tidyPoint(at), guides: [] };
  const nearest = corners.reduce<PlanPoint | null>(
    (best, corner) => (distance(corner, at) < (best ? distance(best, at) : reach) ? corner : best),
    null,
  );
  if (nearest) return { at: nearest, guides: [] };
  const inLine = (axis: 0 | 1) =>
    corners.reduce<PlanPoint | null>((best, corner) => {
      const off = Math.abs(corner[axis] - at[axis]);
      return off < (best ? Math.abs(best[axis] - at[axis]) : reach / 2) ? corner : best;
    }, null);
  const [column, row] = [inLine(0), inLine(1)];
  if (column || row) {
    const to = tidyPoint([column?.[0] ?? onGrid(at[0]), row?.[1] ?? onGrid(at[1])]);
    return {
      at: to,
      guides: [column, row].filter((corner) => corner !== null).map((corner) => ({ from: corner, to })),
    };
  }
  const wall = nearestFace(at, walls, reach);
  if (wall) {
    const s = Math.max(0, Math.min(wall.run.length, onGrid(wall.s)));
    return {
      at: tidyPoint(onWall(wall.run, s, wall.offset)),
      guides: [
        { from: onWall(wall.run, 0, wall.offset), to: onWall(wall.run, wall.run.length, wall.offset) },
      ],
    };
  }
  return { at: gridPoint(at), guides: [] };
}

/** The room-side face nearest to a point within `reach`, and how far along it. */
export function nearestFace(
  at: PlanPoint,
  walls: readonly WallRun[],
  reach: number,
): { run: WallRun; s: number; offset: number; facing: number; off: number } | null {
  let best: ReturnType<typeof nearestFace> = null;
  for (const run of walls) {
    const { s, t } = againstWall(run, at);
    if (s < -reach || s > run.length + reach) continue;
    for (const { offset, facing } of roomFaces(run)) {
      const off = Math.abs(t - offset);
      if (off < (best?.off ?? reach)) best = { run, s, offset, facing, off };
    }
  }
  return best;
}

/** Walls turned against each other by less than this count as parallel, sine. */
const PARALLEL = 0.02;

/**
 * Where a piece goes when its middle is pulled to `at`: flush with up to two walls that its sides run along and
 * are near to, and on the grid along what is left. A piece pulled through a wall stops at it as long as its own
 * middle is on this side.
 */
export function snapPiece(
  piece: Furniture,
  at: PlanPoint,
  walls: readonly WallRun[],
  { reach, free }: SnapReach,
): Snapped {
  if (free) return { at: tidyPoint(at), guides: [] };
  const start = gridPoint(at);
  const corners = pieceCorners({ ...piece, at: start });
  const touches = walls
    .flatMap((run) =>
      roomFaces(run).map(({ offset, facing }) => {
        const reached = corners.map((corner) => againstWall(run, corner));
        // The piece's side toward this face: its least distance in front of it.
        const gap = Math.min(...reached.map(({ t }) => facing * (t - offset)));
        const beside = reached.some(({ s }) => s > 0) && reached.some(({ s }) => s < run.length);
        const turned = Math.min(...[0, 1].map((i) => alignment(corners[i], corners[i + 1], run)));
        const before = facing * (againstWall(run, start).t - offset) >= 0;
        const near = Math.abs(gap) < reach || (gap < 0 && before);
        return { run, offset, facing, gap, fits: beside && turned < PARALLEL && near };
      }),
    )
    .filter(({ fits }) => fits)
    .sort((one, two) => Math.abs(one.gap) - Math.abs(two.gap));
  const first = touches[0];
  if (!first) return { at: start, guides: [] };
  const normal = ({ run, facing }: typeof first): PlanPoint => [
    run.across[0] * facing,
    run.across[1] * facing,
  ];
  const n1 = normal(first);
  const second = touches.find((touch) => {
    const n2 = normal(touch);
    return Math.abs(n1[0] * n2[1] - n1[1] * n2[0]) > 0.5;
  });
  // Moved by d so that n1·d = −gap1 (and n2·d = −gap2): flush with one wall, or with two that meet.
  const shift: PlanPoint = second
    ? solve(n1, -first.gap, normal(second), -second.gap)
    : [-n1[0] * first.gap, -n1[1] * first.gap];
  return {
    at: tidyPoint([start[0] + shift[0], start[1] + shift[1]]),
    guides: [first, ...(second ? [second] : [])].map(({ run, offset }) => ({
      from: onWall(run, 0, offset),
      to: onWall(run, run.length, offset),
    })),
  };
}

function alignment(a: PlanPoint, b: PlanPoint, { along }: WallRun): number {
  const span = distance(a, b) || 1;
  return Math.abs(((b[0] - a[0]) * along[1] - (b[1] - a[1]) * along[0]) / span);
}

const solve = (u: PlanPoint, p: number, v: PlanPoint, q: number): PlanPoint => {
  const cross = u[0] * v[1] - u[1] * v[0];
  return [(p * v[1] - q * u[1]) / cross, (u[0] * q - v[0] * p) / cross];
};

/** From `from`, the way to `at` straightened to the nearest eighth turn: for walls drawn with Shift held. */
export function straighten(from: PlanPoint, at: PlanPoint): PlanPoint {
  const length = distance(from, at);
  const angle = Math.round(Math.atan2(at[1] - from[1], at[0] - from[0]) / (Math.PI / 4)) * (Math.PI / 4);
  return [from[0] + length * Math.cos(angle), from[1] + length * Math.sin(angle)];
}
