import type { FloorPlan } from './schema/floor-plan';
import type { PlanPoint } from './schema/primitives';
import { slabOf } from './to-scene';

/** Walls closer to parallel than this do not fix a place between them: sin 20°. */
const LEAST_SINE = Math.sin((20 * Math.PI) / 180);

/** One tape measurement: square to a named wall, metres to the emitter's floor mark. */
export interface Tape {
  readonly wall: string;
  readonly distance: number;
  /** Where the tape meets the wall. */
  readonly foot: PlanPoint;
}

interface Face {
  readonly wall: string;
  readonly a: PlanPoint;
  readonly b: PlanPoint;
}

/** Every straight face a tape can be held against: the outline's sides and both faces of each inner wall. */
export function wallFaces(plan: Pick<FloorPlan, 'outline' | 'outlineWalls' | 'innerWalls'>): Face[] {
  const outline = plan.outline.map((a, i) => ({
    wall: plan.outlineWalls[i].name,
    a,
    b: plan.outline[(i + 1) % plan.outline.length],
  }));
  const inner = plan.innerWalls.flatMap((wall) => {
    const slab = slabOf(wall);
    if (!slab) return [];
    const [a1, b1, b2, a2] = slab;
    return [
      { wall: wall.name, a: a1, b: b1 },
      { wall: wall.name, a: a2, b: b2 },
    ];
  });
  return [...outline, ...inner];
}

/** Do the open segments p→q and a→b cross? Touching at an end is not crossing. */
function crosses(p: PlanPoint, q: PlanPoint, a: PlanPoint, b: PlanPoint): boolean {
  const side = (o: PlanPoint, s: PlanPoint, t: PlanPoint) =>
    (s[0] - o[0]) * (t[1] - o[1]) - (s[1] - o[1]) * (t[0] - o[0]);
  const slack = 1e-9;
  const d1 = side(a, b, p);
  const d2 = side(a, b, q);
  const d3 = side(p, q, a);
  const d4 = side(p, q, b);
  return d1 * d2 < -slack && d3 * d4 < -slack;
}

/**
 * Two tape measurements that fix a mark: square to two walls that are not parallel, the shortest pair
 * whose tapes meet their wall and cross no other. Fewer than two when the room offers none (a round
 * room of short walls): the caller says so.
 */
export function tapesTo(
  plan: Pick<FloorPlan, 'outline' | 'outlineWalls' | 'innerWalls'>,
  mark: PlanPoint,
): Tape[] {
  const faces = wallFaces(plan);
  const candidates = faces
    .flatMap((face) => {
      const dx = face.b[0] - face.a[0];
      const dy = face.b[1] - face.a[1];
      const span = Math.hypot(dx, dy);
      if (span === 0) return [];
      const along = ((mark[0] - face.a[0]) * dx + (mark[1] - face.a[1]) * dy) / span;
      if (along < 0 || along > span) return [];
      const foot: PlanPoint = [face.a[0] + (dx * along) / span, face.a[1] + (dy * along) / span];
      if (faces.some((other) => other !== face && crosses(mark, foot, other.a, other.b))) return [];
      const distance = Math.hypot(mark[0] - foot[0], mark[1] - foot[1]);
      return [{ wall: face.wall, distance, foot, ux: dx / span, uy: dy / span }];
    })
    .sort((one, two) => one.distance - two.distance);
  let best: (typeof candidates)[number][] = candidates.slice(0, 1);
  let least = Number.POSITIVE_INFINITY;
  for (const [i, one] of candidates.entries()) {
    for (const two of candidates.slice(i + 1)) {
      const sine = Math.abs(one.ux * two.uy - one.uy * two.ux);
      const sum = one.distance + two.distance;
      if (sine > LEAST_SINE && sum < least) {
        least = sum;
        best = [one, two];
      }
    }
  }
  return best.map(({ wall, distance, foot }) => ({ wall, distance, foot }));
}
