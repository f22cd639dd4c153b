import type { PlanPoint } from '@/lib/room';
import { outward } from '@/lib/room/wall-geometry';
import { tidyPoint } from './outcome';

/** Walls that meet at less than this are taken as one straight line: sin 3°. */
const LEAST_SINE = 0.05;

/** The point on the line through p along u nearest to crossing the line through q along v; `null` when they run alongside. */
function lineCrossing(p: PlanPoint, u: PlanPoint, q: PlanPoint, v: PlanPoint): PlanPoint | null {
  const cross = u[0] * v[1] - u[1] * v[0];
  const size = Math.hypot(...u) * Math.hypot(...v);
  if (size === 0 || Math.abs(cross) < LEAST_SINE * size) return null;
  const t = ((q[0] - p[0]) * v[1] - (q[1] - p[1]) * v[0]) / cross;
  return [p[0] + u[0] * t, p[1] + u[1] * t];
}

/**
 * The outline with one side moved outward by `offset` metres (inward when negative). Its corners slide along
 * the neighbouring sides, which keep their direction; where a neighbour runs alongside, the corner moves square.
 */
export function withSideMoved(outline: readonly PlanPoint[], edge: number, offset: number): PlanPoint[] {
  const n = outline.length;
  const [i, j] = [edge, (edge + 1) % n];
  const [a, b] = [outline[i], outline[j]];
  const [nx, ny] = outward(outline, edge);
  const moved = ([x, y]: PlanPoint): PlanPoint => [x + nx * offset, y + ny * offset];
  const along: PlanPoint = [b[0] - a[0], b[1] - a[1]];
  const slide = (corner: PlanPoint, neighbour: PlanPoint): PlanPoint =>
    lineCrossing(moved(a), along, corner, [neighbour[0] - corner[0], neighbour[1] - corner[1]]) ??
    moved(corner);
  const next = [...outline];
  next[i] = tidyPoint(slide(a, outline[(i + n - 1) % n]));
  next[j] = tidyPoint(slide(b, outline[(j + 1) % n]));
  return next;
}

/** The outline with one side made `length` long by moving the side after it, which keeps its direction. */
export function withSideLength(outline: readonly PlanPoint[], edge: number, length: number): PlanPoint[] {
  const n = outline.length;
  const j = (edge + 1) % n;
  const [a, b] = [outline[edge], outline[j]];
  const span = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const end: PlanPoint = [a[0] + ((b[0] - a[0]) / span) * length, a[1] + ((b[1] - a[1]) / span) * length];
  const [nx, ny] = outward(outline, j);
  const offset = (end[0] - b[0]) * nx + (end[1] - b[1]) * ny;
  const next = withSideMoved(outline, j, offset);
  // Where the next side runs nearly alongside, moving it square would miss: then the corner itself moves.
  next[j] = tidyPoint(end);
  return next;
}

const sideNames = ['right wall', 'bottom wall', 'left wall', 'top wall'] as const;

/** Names for the sides of a new outline, by where they lie on the sheet: the crew's tapes refer to them. */
export function sideNamesOf(outline: readonly PlanPoint[]): string[] {
  const plain = outline.map((_, edge) => {
    const [x, y] = outward(outline, edge);
    return sideNames[(Math.round(Math.atan2(y, x) / (Math.PI / 2)) + 4) % 4];
  });
  return plain.map((name, edge) =>
    plain.filter((other) => other === name).length === 1
      ? name
      : `${name} ${plain.slice(0, edge + 1).filter((other) => other === name).length}`,
  );
}
