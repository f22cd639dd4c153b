import { EDGE, MERGE, SKIN } from '@/lib/geometry/degenerate';
import type { PlacedTube } from './placed-tube';
import { RETRACE, RowShadows } from './row-shadows';
import { castSilhouettes } from './silhouettes';
import { type Tracer, traceCell } from './tracer';
import type { GridSurface } from './types';

/**
 * Adds what an upright tube gives to every cell, facing up.
 *
 * With v the height of a tube element above the cell, sin θ = D/r and the cosine at the cell is v/r:
 *   E = strength · ∫ D v / r⁴ dv = strength · D/2 · [ 1/(D² + v²) ] from the upper end to the lower
 * (Keitz's formula turned to a level receiver; the arctangent drops out). Elements below the cell give nothing.
 */
export function addUprightTube(
  tracer: Tracer,
  tube: PlacedTube,
  surface: GridSurface,
  out: Float32Array,
): void {
  const { columns, rows, z, step, originX, originY } = surface;
  const dx0 = originX + 0.5 * step - tube.ax;
  const silhouettes = castSilhouettes(tracer.scene, surface, tube.ax, tube.ay);
  const shadows = new RowShadows(columns, tracer.scene);
  for (let j = 0; j < rows; j++) {
    const dy = originY + (j + 0.5) * step - tube.ay;
    const front = frontOf(tube, dx0, dy, step, columns);
    if (typeof z === 'number') {
      lightRun(tracer, tube, surface, silhouettes, shadows, j, front.first, front.end, z, out);
      continue;
    }
    const start = j * columns;
    for (let i = front.first; i < front.end; ) {
      let end = i + 1;
      while (end < front.end && z[start + end] === z[start + i]) end++;
      lightRun(tracer, tube, surface, silhouettes, shadows, j, i, end, z[start + i], out);
      i = end;
    }
  }
}

/** The columns of a row in front of a backed tube: (p − q)·m > 0, linear along the row. All of them for a bare one. */
function frontOf(
  { backed, mx, my }: PlacedTube,
  dx0: number,
  dy: number,
  step: number,
  columns: number,
): { first: number; end: number } {
  if (!backed) return { first: 0, end: columns };
  const ahead = (i: number) => (dx0 + i * step) * mx + dy * my > SKIN;
  if (ahead(0) === ahead(columns - 1)) return { first: 0, end: ahead(0) ? columns : 0 };
  // Rounding may put the crossing a column off: the test itself decides.
  let crossing = Math.floor((-(dy * my) / mx - dx0) / step);
  const before = ahead(0);
  while (crossing > 0 && ahead(crossing) !== before) crossing--;
  while (crossing < columns - 1 && ahead(crossing + 1) === before) crossing++;
  return before ? { first: 0, end: crossing + 1 } : { first: crossing + 1, end: columns };
}

/** Lights the columns first ≤ i < end of row j, all at one height. */
function lightRun(
  tracer: Tracer,
  tube: PlacedTube,
  surface: GridSurface,
  silhouettes: ReturnType<typeof castSilhouettes>,
  shadows: RowShadows,
  j: number,
  first: number,
  end: number,
  z: number,
  out: Float32Array,
): void {
  const v0 = Math.max(0, tube.az - z);
  const v1 = tube.az + tube.length - z;
  if (v1 <= 0) return;
  const { columns, step, originX, originY, mask } = surface;
  const y = originY + (j + 0.5) * step;
  const dx0 = originX + 0.5 * step - tube.ax;
  const dy = y - tube.ay;
  const start = j * columns;
  shadows.cast(silhouettes, j, first, end, z, v0, v1);
  const touching = Math.abs(dy) <= EDGE && v0 === 0 ? Math.round(-dx0 / step) : -1;
  if (touching >= first && touching < end && Math.abs(dx0 + touching * step) <= EDGE) {
    // A cell whose centre touches the tube is read beside it.
    shadows.lit.remove(touching, touching + 1);
    shadows.open.remove(touching, touching + 1);
    if (mask[start + touching] !== 0)
      out[start + touching] += traceCell(tracer, tube, originX + (touching + 0.5) * step, y, z);
  }

  const half = tube.strength / 2;
  const { lit, open } = shadows;
  for (let span = 0; span < open.count; span++)
    openRun(mask, out, start, open.from[span], open.to[span], dx0, step, dy, v0, v1, half);
  // Between the open stretches, in the lit ones, something hides part of the tube.
  let next = 0;
  for (let span = 0; span < lit.count; span++) {
    const end = lit.to[span];
    for (let i = lit.from[span]; i < end; ) {
      while (next < open.count && open.to[next] <= i) next++;
      const opens = next < open.count && open.from[next] < end ? open.from[next] : end;
      if (i < opens) partRun(tracer, tube, surface, shadows, j, i, opens, dx0, dy, z, out);
      i = opens < end ? open.to[next] : end;
    }
  }
}

/** The columns first ≤ i < end of row j, each of which sees a part of the tube or none. */
function partRun(
  tracer: Tracer,
  tube: PlacedTube,
  { columns, step, originX, originY, mask }: GridSurface,
  shadows: RowShadows,
  j: number,
  first: number,
  end: number,
  dx0: number,
  dy: number,
  z: number,
  out: Float32Array,
): void {
  const { low, high, count } = shadows;
  const half = tube.strength / 2;
  const least = MERGE * tube.length;
  const start = j * columns;
  const dy2 = dy * dy;
  for (let i = first; i < end; i++) {
    if (mask[start + i] === 0) continue;
    if (count[i] === RETRACE) {
      out[start + i] += traceCell(tracer, tube, originX + (i + 0.5) * step, originY + (j + 0.5) * step, z);
      continue;
    }
    const from = low[i];
    const to = high[i];
    if (from + least >= to) continue;
    const dx = dx0 + i * step;
    const d2 = dx * dx + dy2;
    const a = from * from;
    const b = to * to;
    let sum = (b - a) / ((d2 + a) * (d2 + b));
    if (count[i] > 0) sum -= hiddenBetween(shadows, i, columns, d2, least);
    out[start + i] += half * Math.sqrt(d2) * sum;
  }
}

/** The open field: no shadow, no look-up, no branch but the mask. */
function openRun(
  mask: Uint8Array,
  out: Float32Array,
  start: number,
  first: number,
  end: number,
  dx0: number,
  step: number,
  dy: number,
  v0: number,
  v1: number,
  half: number,
): void {
  const a = v0 * v0;
  const b = v1 * v1;
  const k = half * (b - a);
  const dy2 = dy * dy;
  for (let i = first; i < end; i++) {
    if (mask[start + i] === 0) continue;
    const dx = dx0 + i * step;
    const d2 = dx * dx + dy2;
    out[start + i] += (k * Math.sqrt(d2)) / ((d2 + a) * (d2 + b));
  }
}

/**
 * ∑ [1/(D² + from²) − 1/(D² + to²)] over the union of a cell's hidden stretches, within its low..high.
 * Slivers of light narrower than `least` between them or at the ends are taken as hidden too.
 */
function hiddenBetween(shadows: RowShadows, i: number, columns: number, d2: number, least: number): number {
  const { from, to, low, high } = shadows;
  let sum = 0;
  let reached = low[i];
  for (let n = 0; n < shadows.count[i]; n++) {
    // Selection instead of sorting: there are one or two stretches, seldom more.
    let next = -1;
    let nextFrom = Infinity;
    for (let s = 0; s < shadows.count[i]; s++) {
      const at = s * columns + i;
      if (to[at] > reached && from[at] < nextFrom) {
        next = at;
        nextFrom = from[at];
      }
    }
    if (next < 0 || nextFrom >= high[i]) break;
    const start = nextFrom <= reached + least ? reached : nextFrom;
    const end = to[next] + least >= high[i] ? high[i] : to[next];
    sum += (end * end - start * start) / ((d2 + start * start) * (d2 + end * end));
    reached = end;
  }
  return sum;
}
