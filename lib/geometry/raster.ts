import { EDGE } from './degenerate';
import { boundingBox, type Ring } from './polygon';

/** A lattice of cell centres at (originX + (i+½)·step, originY + (j+½)·step). */
export interface Lattice {
  readonly originX: number;
  readonly originY: number;
  readonly step: number;
  readonly columns: number;
  readonly rows: number;
}

/** What to do with centres that lie on a side of the ring, within `EDGE`. */
export type Border = 'strict' | 'closed';

/**
 * Calls `visit(from, to, row)` for every run of cells from ≤ i < to whose centres lie in the ring; runs of one row come
 * in no order and may repeat cells when `closed`. Works a row at a time, so it costs rows × sides and not cells × sides.
 */
export function forEachRun(
  ring: Ring,
  lattice: Lattice,
  border: Border,
  visit: (from: number, to: number, row: number) => void,
): void {
  const { originX, originY, step, columns, rows } = lattice;
  const box = boundingBox(ring);
  const firstRow = Math.max(0, Math.floor((box.minY - originY) / step - 0.5));
  const lastRow = Math.min(rows - 1, Math.ceil((box.maxY - originY) / step - 0.5));
  const column = (x: number) => (x - originX) / step - 0.5;
  const slack = EDGE / step;
  const run = (x0: number, x1: number, pad: number, row: number) => {
    const from = Math.max(0, Math.ceil(column(x0) - pad));
    const to = Math.min(columns, Math.floor(column(x1) + pad) + 1);
    if (from < to) visit(from, to, row);
  };
  for (let row = firstRow; row <= lastRow; row++) {
    const y = originY + (row + 0.5) * step;
    // On a row through a corner or along a side, strict rings take what is inside both just above and just below.
    const near = sidesAt(ring, y);
    if (!near) {
      crossings(ring, y).forEach(([x0, x1]) => {
        run(x0, x1, border === 'closed' ? slack : -slack, row);
      });
    } else if (border === 'closed') {
      for (const dy of [-2 * EDGE, 2 * EDGE]) {
        crossings(ring, y + dy).forEach(([x0, x1]) => {
          run(x0, x1, slack * 4, row);
        });
      }
    } else {
      const above = crossings(ring, y - 2 * EDGE);
      for (const [a0, a1] of crossings(ring, y + 2 * EDGE)) {
        for (const [b0, b1] of above) run(Math.max(a0, b0), Math.min(a1, b1), -slack * 4, row);
      }
    }
  }
}

/** Whether a corner lies on the line at y, where counting crossings is not to be trusted. */
const sidesAt = (ring: Ring, y: number): boolean => ring.some((p) => Math.abs(p[1] - y) <= EDGE);

/** The stretches of the line at y inside the ring, from even–odd crossings in order. */
function crossings(ring: Ring, y: number): [number, number][] {
  const xs: number[] = [];
  for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
    const [x0, y0] = ring[j];
    const [x1, y1] = ring[i];
    if (y0 > y !== y1 > y) xs.push(x0 + ((y - y0) / (y1 - y0)) * (x1 - x0));
  }
  xs.sort((a, b) => a - b);
  const spans: [number, number][] = [];
  for (let i = 0; i + 1 < xs.length; i += 2) spans.push([xs[i], xs[i + 1]]);
  return spans;
}
