import type { FloorPlan, Opening } from '@/lib/room/schema/floor-plan';
import type { PlanPoint } from '@/lib/room/schema/primitives';
import { slabOf } from '@/lib/room/to-scene';
import { onWall, outward, type WallRun } from '@/lib/room/wall-geometry';

/** A mitre longer than this many thicknesses is cut: a needle of wall is not built either. */
const LONGEST_MITRE = 3;

/**
 * The outer face of the outline's walls, corner by corner: each side moved outward by its own thickness and
 * met with its neighbour's. Same number and order of corners as the outline.
 */
export function outerFace(plan: Pick<FloorPlan, 'outline' | 'outlineWalls'>): PlanPoint[] {
  const { outline, outlineWalls } = plan;
  return outline.map((corner, i) => {
    const before = (i + outline.length - 1) % outline.length;
    const [n1x, n1y] = outward(outline, before);
    const [n2x, n2y] = outward(outline, i);
    const t1 = outlineWalls[before]?.thickness ?? 0;
    const t2 = outlineWalls[i]?.thickness ?? 0;
    const cross = n1x * n2y - n1y * n2x;
    if (Math.abs(cross) < 1e-6) {
      const t = Math.max(t1, t2);
      return [corner[0] + n2x * t, corner[1] + n2y * t];
    }
    // Both moved sides: n1·p = t1 and n2·p = t2, solved for p from the corner.
    let dx = (t1 * n2y - t2 * n1y) / cross;
    let dy = (t2 * n1x - t1 * n2x) / cross;
    const reach = Math.hypot(dx, dy);
    const limit = LONGEST_MITRE * Math.max(t1, t2);
    if (reach > limit) {
      dx *= limit / reach;
      dy *= limit / reach;
    }
    return [corner[0] + dx, corner[1] + dy];
  });
}

export interface OpeningShape {
  readonly opening: Opening;
  /** The stretch of wall that is cut out. */
  readonly cut: readonly PlanPoint[];
  readonly hinge: PlanPoint;
  /** Free end of the leaf: along the wall when closed, square to it into the room when open. */
  readonly leafEnd: PlanPoint;
  readonly width: number;
  readonly run: WallRun;
}

/** Where an opening is drawn; `null` when its wall is gone. */
export function openingShape(opening: Opening, runs: readonly WallRun[]): OpeningShape | null {
  const run = runs.find((wall) => wall.id === opening.wall);
  if (!run) return null;
  const { from, to } = opening;
  return {
    opening,
    run,
    width: to - from,
    cut: [
      onWall(run, from, -run.behind),
      onWall(run, to, -run.behind),
      onWall(run, to, run.ahead),
      onWall(run, from, run.ahead),
    ],
    hinge: onWall(run, from, -run.behind),
    leafEnd: opening.open ? onWall(run, from, -run.behind - (to - from)) : onWall(run, to, -run.behind),
  };
}

export const innerSlabs = (plan: Pick<FloorPlan, 'innerWalls'>): PlanPoint[][] =>
  plan.innerWalls.map(slabOf).filter((slab) => slab !== null);
