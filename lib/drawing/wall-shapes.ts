import { signedArea } from '@/lib/geometry/polygon';
import type { FloorPlan, InnerWall, Opening } from '@/lib/room/schema/floor-plan';
import type { PlanPoint } from '@/lib/room/schema/primitives';
import { slabOf } from '@/lib/room/to-scene';

/** Unit vector out of the room across side `edge` of the outline. */
export function outward(outline: readonly PlanPoint[], edge: number): PlanPoint {
  const [ax, ay] = outline[edge];
  const [bx, by] = outline[(edge + 1) % outline.length];
  const span = Math.hypot(bx - ax, by - ay) || 1;
  const turn = signedArea(outline) > 0 ? 1 : -1;
  return [(turn * (by - ay)) / span, (-turn * (bx - ax)) / span];
}

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

/** Where a wall runs and how thick it is on each side of that line. */
export interface WallRun {
  /** `outline:<edge>` or the inner wall's id, as openings name it. */
  readonly id: string;
  readonly name: string;
  readonly a: PlanPoint;
  readonly b: PlanPoint;
  readonly length: number;
  /** Unit vector along the wall. */
  readonly along: PlanPoint;
  /** Unit vector across it: out of the room for the outline. */
  readonly across: PlanPoint;
  /** From the line a→b: metres of wall toward `across` and away from it. */
  readonly ahead: number;
  readonly behind: number;
}

function runOf(
  id: string,
  name: string,
  a: PlanPoint,
  b: PlanPoint,
  across: PlanPoint,
  ahead: number,
  behind: number,
): WallRun {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const along: PlanPoint = length ? [(b[0] - a[0]) / length, (b[1] - a[1]) / length] : [1, 0];
  return { id, name, a, b, length, along, across, ahead, behind };
}

const innerRun = ({ id, name, a, b, thickness }: InnerWall): WallRun => {
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]) || 1;
  const across: PlanPoint = [-(b[1] - a[1]) / length, (b[0] - a[0]) / length];
  return runOf(id, name, a, b, across, thickness / 2, thickness / 2);
};

/** Every wall of the plan, outline first, in the order openings count them. */
export const wallRuns = (plan: Pick<FloorPlan, 'outline' | 'outlineWalls' | 'innerWalls'>): WallRun[] => [
  ...plan.outline.map((a, edge) =>
    runOf(
      `outline:${edge}`,
      plan.outlineWalls[edge]?.name ?? `wall ${edge + 1}`,
      a,
      plan.outline[(edge + 1) % plan.outline.length],
      outward(plan.outline, edge),
      plan.outlineWalls[edge]?.thickness ?? 0,
      0,
    ),
  ),
  ...plan.innerWalls.map(innerRun),
];

/** A spot `s` metres along a wall and `t` across it. */
export const onWall = ({ a, along, across }: WallRun, s: number, t: number): PlanPoint => [
  a[0] + along[0] * s + across[0] * t,
  a[1] + along[1] * s + across[1] * t,
];

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
