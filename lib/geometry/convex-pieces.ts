import { quickDecomp } from 'poly-decomp-es';
import { EDGE } from './degenerate';
import type { Point } from './point';
import { distanceToSegment, type Ring, signedArea, tidyRing } from './polygon';

/** A convex piece, wound so that its signed area is positive; `seams[i]` marks the side from corner i that cuts the whole. */
export interface ConvexPiece {
  readonly ring: readonly Point[];
  readonly seams: readonly boolean[];
}

/** A ring turns right all the way round when no corner bends back by more than rounding. */
function isConvex(ring: Ring): boolean {
  return ring.every((p, i) => {
    const q = ring[(i + 1) % ring.length];
    const r = ring[(i + 2) % ring.length];
    const cross = (q[0] - p[0]) * (r[1] - q[1]) - (q[1] - p[1]) * (r[0] - q[0]);
    return cross >= -EDGE * Math.hypot(q[0] - p[0], q[1] - p[1]);
  });
}

/**
 * Splits a simple footprint, either orientation, into convex pieces that cover it exactly.
 * Throws when the pieces do not add up to the footprint, so that a wrong split can never leak light.
 */
export function convexPieces(footprint: Ring): ConvexPiece[] {
  const tidy = tidyRing(footprint);
  const whole = signedArea(tidy) < 0 ? tidy.reverse() : tidy;
  if (isConvex(whole)) return [{ ring: whole, seams: whole.map(() => false) }];

  const rings = quickDecomp(whole.map(([x, y]): [number, number] => [x, y]))
    .map((ring) => tidyRing(ring))
    .filter((ring) => ring.length >= 3);
  const covered = rings.reduce((sum, ring) => sum + signedArea(ring), 0);
  const area = signedArea(whole);
  if (!rings.every(isConvex) || Math.abs(covered - area) > 1e-9 * Math.max(1, area)) {
    throw new Error(`Footprint could not be split: its pieces cover ${covered} m² of ${area} m².`);
  }
  return rings.map((ring) => ({
    ring,
    seams: ring.map((p, i) => !liesOnOutline(p, ring[(i + 1) % ring.length], whole)),
  }));
}

function liesOnOutline(p: Point, q: Point, whole: Ring): boolean {
  return whole.some((a, i) => {
    const b = whole[(i + 1) % whole.length];
    return distanceToSegment(p[0], p[1], a, b) <= EDGE && distanceToSegment(q[0], q[1], a, b) <= EDGE;
  });
}
