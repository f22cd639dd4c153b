import { signedArea } from '@/lib/geometry/polygon';
import type { FloorPlan, InnerWall } from './schema/floor-plan';
import type { PlanPoint } from './schema/primitives';

/** Unit vector out of the room across side `edge` of the outline, whichever way its corners run. */
export function outward(outline: readonly PlanPoint[], edge: number): PlanPoint {
  const [ax, ay] = outline[edge];
  const [bx, by] = outline[(edge + 1) % outline.length];
  const span = Math.hypot(bx - ax, by - ay) || 1;
  const turn = signedArea(outline) > 0 ? 1 : -1;
  return [(turn * (by - ay)) / span, (-turn * (bx - ax)) / span];
}

/** Where a wall runs and how thick it is on each side of that line. */
export interface WallRun {
  /** `outline:<edge>` or the inner wall's id, as openings name it. */
  readonly id: string;
  readonly name: string;
  readonly a: PlanPoint;
  readonly b: PlanPoint;
  /** Metres. */
  readonly length: number;
  /** Unit vector from a to b. */
  readonly along: PlanPoint;
  /** Unit vector across it: out of the room for the outline. */
  readonly across: PlanPoint;
  /** From the line a→b: metres of wall toward `across` and away from it. */
  readonly ahead: number;
  readonly behind: number;
}

const span = (a: PlanPoint, b: PlanPoint): number => Math.hypot(b[0] - a[0], b[1] - a[1]);

const direction = (a: PlanPoint, b: PlanPoint): PlanPoint => {
  const length = span(a, b);
  return length === 0 ? [1, 0] : [(b[0] - a[0]) / length, (b[1] - a[1]) / length];
};

const innerRun = ({ id, name, a, b, thickness }: InnerWall): WallRun => {
  const along = direction(a, b);
  return {
    id,
    name,
    a,
    b,
    length: span(a, b),
    along,
    across: [-along[1], along[0]],
    ahead: thickness / 2,
    behind: thickness / 2,
  };
};

/** Every wall of the plan, outline first, in the order openings count them. */
export const wallRuns = (plan: Pick<FloorPlan, 'outline' | 'outlineWalls' | 'innerWalls'>): WallRun[] => [
  ...plan.outline.map((a, edge): WallRun => {
    const b = plan.outline[(edge + 1) % plan.outline.length];
    return {
      id: outlineWallId(edge),
      name: plan.outlineWalls[edge]?.name ?? `wall ${edge + 1}`,
      a,
      b,
      length: span(a, b),
      along: direction(a, b),
      across: outward(plan.outline, edge),
      ahead: plan.outlineWalls[edge]?.thickness ?? 0,
      behind: 0,
    };
  }),
  ...plan.innerWalls.map(innerRun),
];

export const outlineWallId = (edge: number): string => `outline:${edge}`;

/** Which side of the outline an opening's wall names; `null` for an inner wall. */
export function edgeOf(wallId: string): number | null {
  const digits = /^outline:(\d+)$/.exec(wallId)?.[1];
  return digits === undefined ? null : Number(digits);
}

/** A spot `s` metres along a wall and `t` across it. */
export const onWall = ({ a, along, across }: WallRun, s: number, t: number): PlanPoint => [
  a[0] + along[0] * s + across[0] * t,
  a[1] + along[1] * s + across[1] * t,
];

/** Where a point stands against a wall: metres along it, and across (positive toward `across`). */
export const againstWall = ({ a, along, across }: WallRun, [x, y]: PlanPoint): { s: number; t: number } => ({
  s: (x - a[0]) * along[0] + (y - a[1]) * along[1],
  t: (x - a[0]) * across[0] + (y - a[1]) * across[1],
});

/** How far a point is from the body of a wall, metres; 0 in it. */
export function distanceToWall(run: WallRun, at: PlanPoint): number {
  const { s, t } = againstWall(run, at);
  const ds = Math.max(0, -s, s - run.length);
  const dt = Math.max(0, t - run.ahead, -run.behind - t);
  return Math.hypot(ds, dt);
}
