import { distanceToSegment, type Ring, sideOf } from '@/lib/geometry/polygon';
import type { PlanPoint } from './schema/primitives';

export interface Reach {
  /** Metres from the outline to the farthest spot found outside it; 0 when all is inside or on it. */
  readonly metres: number;
  readonly at: PlanPoint;
}

/** Distance from a point to the nearest side of a ring. */
export const distanceToRing = (x: number, y: number, ring: Ring): number =>
  ring.reduce(
    (least, corner, i) => Math.min(least, distanceToSegment(x, y, corner, ring[(i + 1) % ring.length])),
    Number.POSITIVE_INFINITY,
  );

/** Where the segment p→q meets a→b, as a share of p→q; `null` when they run alongside or pass by. */
function meeting(p: PlanPoint, q: PlanPoint, a: PlanPoint, b: PlanPoint): number | null {
  const [dx, dy] = [q[0] - p[0], q[1] - p[1]];
  const [ex, ey] = [b[0] - a[0], b[1] - a[1]];
  const cross = dx * ey - dy * ex;
  if (Math.abs(cross) < 1e-12) return null;
  const t = ((a[0] - p[0]) * ey - (a[1] - p[1]) * ex) / cross;
  const u = ((a[0] - p[0]) * dy - (a[1] - p[1]) * dx) / cross;
  return t > 0 && t < 1 && u >= 0 && u <= 1 ? t : null;
}

/**
 * How far a footprint reaches out of the room. Looks at its corners, at the middle of every stretch of its
 * sides between crossings (a piece can bridge a recess with all its corners inside), and at corners of the room that poke into it.
 */
export function reachOutside(footprint: readonly PlanPoint[], outline: readonly PlanPoint[]): Reach {
  let worst: Reach = { metres: 0, at: footprint[0] };
  const look = (metres: number, at: PlanPoint) => {
    if (metres > worst.metres) worst = { metres, at };
  };
  footprint.forEach((p, i) => {
    const q = footprint[(i + 1) % footprint.length];
    const cuts = outline
      .map((a, j) => meeting(p, q, a, outline[(j + 1) % outline.length]))
      .filter((t) => t !== null)
      .sort((one, two) => one - two);
    const ends = [0, ...cuts, 1];
    const looked = [0, ...ends.slice(1).map((t, k) => (t + ends[k]) / 2)];
    for (const t of looked) {
      const at: PlanPoint = [p[0] + (q[0] - p[0]) * t, p[1] + (q[1] - p[1]) * t];
      if (sideOf(at[0], at[1], outline) === 'outside') look(distanceToRing(at[0], at[1], outline), at);
    }
  });
  for (const corner of outline) {
    if (sideOf(corner[0], corner[1], footprint) === 'inside')
      look(distanceToRing(corner[0], corner[1], footprint), corner);
  }
  return worst;
}
