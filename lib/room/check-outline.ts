import { selfCrossing, signedArea } from '@/lib/geometry/polygon';
import type { PlanPoint } from './schema/primitives';

/** A room smaller than this is a slip of the hand, m². */
export const LEAST_FLOOR = 0.25;
/** A side shorter than this cannot be built or measured, metres. */
export const LEAST_SIDE = 0.01;

export interface OutlineFault {
  readonly message: string;
  readonly at: PlanPoint;
  /** First corner of the side it is about, when it is about one. */
  readonly edge: number | null;
}

const middle = (outline: readonly PlanPoint[], edge: number): PlanPoint => {
  const [ax, ay] = outline[edge];
  const [bx, by] = outline[(edge + 1) % outline.length];
  return [(ax + bx) / 2, (ay + by) / 2];
};

/** Where two sides cross, or the middle of the first when they run alongside. */
function crossingPoint(outline: readonly PlanPoint[], i: number, j: number): PlanPoint {
  const [p, q] = [outline[i], outline[(i + 1) % outline.length]];
  const [a, b] = [outline[j], outline[(j + 1) % outline.length]];
  const cross = (q[0] - p[0]) * (b[1] - a[1]) - (q[1] - p[1]) * (b[0] - a[0]);
  if (Math.abs(cross) < 1e-12) return middle(outline, i);
  const t = ((a[0] - p[0]) * (b[1] - a[1]) - (a[1] - p[1]) * (b[0] - a[0])) / cross;
  return [p[0] + (q[0] - p[0]) * t, p[1] + (q[1] - p[1]) * t];
}

/** Why an outline cannot be a room, in words; `null` when it can. Neighbouring sides that fold back count as crossing. */
export function outlineFault(
  outline: readonly PlanPoint[],
  nameOf: (edge: number) => string = (edge) => `side ${edge + 1}`,
): OutlineFault | null {
  if (outline.length < 3)
    return { message: 'A room needs at least 3 corners.', at: outline[0] ?? [0, 0], edge: null };
  if (!outline.flat().every(Number.isFinite))
    return { message: 'A corner has no place that can be read.', at: [0, 0], edge: null };
  for (const [edge, [ax, ay]] of outline.entries()) {
    const [bx, by] = outline[(edge + 1) % outline.length];
    if (Math.hypot(bx - ax, by - ay) < LEAST_SIDE)
      return { message: `The ${nameOf(edge)} has no length.`, at: [ax, ay], edge };
  }
  const fold = outline.findIndex((corner, i) => {
    const before = outline[(i + outline.length - 1) % outline.length];
    const after = outline[(i + 1) % outline.length];
    const [ux, uy] = [before[0] - corner[0], before[1] - corner[1]];
    const [vx, vy] = [after[0] - corner[0], after[1] - corner[1]];
    const flat = Math.abs(ux * vy - uy * vx) < 1e-9 * Math.hypot(ux, uy) * Math.hypot(vx, vy);
    return flat && ux * vx + uy * vy > 0;
  });
  if (fold >= 0)
    return { message: `The ${nameOf(fold)} folds back on its neighbour.`, at: outline[fold], edge: fold };
  const crossing = selfCrossing(outline);
  if (crossing) {
    const [i, j] = crossing;
    return {
      message: `The ${nameOf(i)} and the ${nameOf(j)} cross or touch.`,
      at: crossingPoint(outline, i, j),
      edge: i,
    };
  }
  if (Math.abs(signedArea(outline)) < LEAST_FLOOR)
    return { message: 'The outline encloses next to no floor.', at: outline[0], edge: null };
  return null;
}
