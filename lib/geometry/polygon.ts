import { EDGE } from './degenerate';
import type { Point } from './point';

/** A closed ring of corners; the last is joined to the first and not repeated. */
export type Ring = readonly Point[];

/** Area in m², positive when x turns towards y (clockwise on a screen with y down). */
export function signedArea(ring: Ring): number {
  let twice = 0;
  const [ox, oy] = ring[0] ?? [0, 0];
  for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
    // Taken from the first corner, so that a small footprint far from the origin keeps its digits.
    twice += (ring[j][0] - ox) * (ring[i][1] - oy) - (ring[i][0] - ox) * (ring[j][1] - oy);
  }
  return twice / 2;
}

export interface Box {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}

export function boundingBox(ring: Ring): Box {
  let [minX, minY, maxX, maxY] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const [x, y] of ring) {
    minX = Math.min(minX, x);
    minY = Math.min(minY, y);
    maxX = Math.max(maxX, x);
    maxY = Math.max(maxY, y);
  }
  return { minX, minY, maxX, maxY };
}

/** Drops repeated corners and corners on a straight line; the order is kept. */
export function tidyRing(ring: Ring): Point[] {
  const kept = ring.filter((p, i) => {
    const q = ring[(i + ring.length - 1) % ring.length];
    return Math.hypot(p[0] - q[0], p[1] - q[1]) > EDGE;
  });
  return kept.filter((p, i) => {
    const before = kept[(i + kept.length - 1) % kept.length];
    const after = kept[(i + 1) % kept.length];
    return distanceToSegment(p[0], p[1], before, after) > EDGE;
  });
}

export function distanceToSegment(x: number, y: number, a: Point, b: Point): number {
  const dx = b[0] - a[0];
  const dy = b[1] - a[1];
  const square = dx * dx + dy * dy;
  const t = square === 0 ? 0 : Math.min(1, Math.max(0, ((x - a[0]) * dx + (y - a[1]) * dy) / square));
  return Math.hypot(x - a[0] - t * dx, y - a[1] - t * dy);
}

export type Side = 'inside' | 'edge' | 'outside';

/** Where a point lies; within `EDGE` of a side it is on the `edge`. */
export function sideOf(x: number, y: number, ring: Ring): Side {
  let inside = false;
  for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
    const a = ring[j];
    const b = ring[i];
    if (distanceToSegment(x, y, a, b) <= EDGE) return 'edge';
    const crosses = a[1] > y !== b[1] > y && x < ((b[0] - a[0]) * (y - a[1])) / (b[1] - a[1]) + a[0];
    if (crosses) inside = !inside;
  }
  return inside ? 'inside' : 'outside';
}

const turn = (a: Point, b: Point, c: Point) => (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);

function segmentsMeet(a: Point, b: Point, c: Point, d: Point): boolean {
  const d1 = turn(a, b, c);
  const d2 = turn(a, b, d);
  const d3 = turn(c, d, a);
  const d4 = turn(c, d, b);
  if (((d1 > 0 && d2 < 0) || (d1 < 0 && d2 > 0)) && ((d3 > 0 && d4 < 0) || (d3 < 0 && d4 > 0))) return true;
  return (
    distanceToSegment(c[0], c[1], a, b) <= EDGE ||
    distanceToSegment(d[0], d[1], a, b) <= EDGE ||
    distanceToSegment(a[0], a[1], c, d) <= EDGE ||
    distanceToSegment(b[0], b[1], c, d) <= EDGE
  );
}

/** The first pair of sides (by their first corner) that cross or touch where they should not; `null` for a simple ring. */
export function selfCrossing(ring: Ring): readonly [number, number] | null {
  const n = ring.length;
  for (let i = 0; i < n; i++) {
    for (let j = i + 2; j < n; j++) {
      if (i === 0 && j === n - 1) continue;
      if (segmentsMeet(ring[i], ring[i + 1], ring[j], ring[(j + 1) % n])) return [i, j];
    }
  }
  return null;
}
