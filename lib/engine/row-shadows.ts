import { EDGE } from '@/lib/geometry/degenerate';
import { LitSpans } from './lit-spans';
import type { PreparedScene } from './prepare-scene';
import type { RowLines, ShadowSides, Silhouettes } from './silhouettes';

/** Stretches hidden in the middle of the tube that a cell can hold; a cell with more is traced on its own. */
export const SLOTS = 6;

/** In `count`: the cell is to be traced on its own. */
export const RETRACE = 255;

/**
 * Where the sector of side n, in a chain first ≤ n < end, begins on a row, not before `lo`. Each side's cut begins its
 * sector and ends the one before; going all the way round, the first follows the last.
 */
function sectorFrom(
  sides: ShadowSides,
  row: number,
  n: number,
  first: number,
  end: number,
  around: number,
  lo: number,
): number {
  const { cutAt, cutIsFrom } = sides;
  if ((n > first || around === 1) && cutIsFrom[n] === 1 && cutAt[row + n] > lo) lo = cutAt[row + n];
  const next = n < end - 1 ? n + 1 : around === 1 ? first : -1;
  return next >= 0 && cutIsFrom[next] === 0 && cutAt[row + next] > lo ? cutAt[row + next] : lo;
}

/** Where it ends, not past `hi`. */
function sectorTo(
  sides: ShadowSides,
  row: number,
  n: number,
  first: number,
  end: number,
  around: number,
  hi: number,
): number {
  const { cutAt, cutIsFrom } = sides;
  if ((n > first || around === 1) && cutIsFrom[n] === 0 && cutAt[row + n] < hi) hi = cutAt[row + n];
  const next = n < end - 1 ? n + 1 : around === 1 ? first : -1;
  return next >= 0 && cutIsFrom[next] === 1 && cutAt[row + next] < hi ? cutAt[row + next] : hi;
}

/**
 * What hides an upright tube from the cells of one grid row, as heights above the surface (metres).
 * Light comes from low..high, less `count` stretches in between; a count of `RETRACE` marks cells to be traced on their own.
 */
export class RowShadows {
  readonly low: Float64Array;
  readonly high: Float64Array;
  readonly count: Uint8Array;
  /** Stretch s of column i lies at s·columns + i. */
  readonly from: Float64Array;
  readonly to: Float64Array;
  /** Columns that any light may reach; the rest of the row is dark. */
  readonly lit: LitSpans;
  /** Lit columns that nothing touches: the whole tube is seen from them. */
  readonly open: LitSpans;
  /** Columns that anything touched: touchedFrom ≤ i < touchedTo. Beside them the arrays above hold nothing. */
  touchedFrom = 0;
  touchedTo = 0;

  /** Stretches of standing parts that hide some of the tube: far side, from column, to column. */
  private readonly partSide: Int32Array;
  private readonly partFrom: Int32Array;
  private readonly partTo: Int32Array;
  private readonly partTop: Float64Array;
  private parts = 0;
  /** Stretches of hanging parts: the part, its near side (−1 for none), from column, to column. */
  private readonly hanging: Int32Array;
  private readonly hangSide: Int32Array;
  private readonly hangFrom: Int32Array;
  private readonly hangTo: Int32Array;
  private hangs = 0;
  private lo = 0;
  private hi = 0;

  constructor(
    private readonly columns: number,
    private readonly scene: PreparedScene,
  ) {
    this.low = new Float64Array(columns);
    this.high = new Float64Array(columns);
    this.count = new Uint8Array(columns);
    this.from = new Float64Array(columns * SLOTS);
    this.to = new Float64Array(columns * SLOTS);
    this.lit = new LitSpans(columns);
    this.open = new LitSpans(columns);
    const { pieces } = scene;
    const sides = pieces.start[pieces.count];
    this.partSide = new Int32Array(sides);
    this.partFrom = new Int32Array(sides);
    this.partTo = new Int32Array(sides);
    this.partTop = new Float64Array(sides);
    this.hanging = new Int32Array(sides + pieces.count);
    this.hangSide = new Int32Array(sides + pieces.count);
    this.hangFrom = new Int32Array(sides + pieces.count);
    this.hangTo = new Int32Array(sides + pieces.count);
  }

  /**
   * Fills in row j, columns first ≤ i < end, for a tube from v0 to v1 above a surface at height z. Dark stretches are
   * taken out first, by their ends alone; only what is left is worked out cell by cell.
   */
  cast(sil: Silhouettes, j: number, first: number, end: number, z: number, v0: number, v1: number): void {
    const { pieces, walls } = this.scene;
    this.lit.reset(first, end);
    this.open.reset(first, end);
    this.touchedFrom = end;
    this.touchedTo = first;
    this.parts = 0;
    this.hangs = 0;
    let windows = 0;
    for (let k = 0; k < walls.count; k++) {
      if (!this.stretch(sil, pieces.count + k, j, first, end)) continue;
      if (this.letsThrough(k)) windows++;
      else this.darken(this.lo, this.hi);
    }
    const { stretchFrom, stretchTo } = sil;
    for (let n = 0; n < pieces.count; n++) {
      const k = sil.nearestFirst[n];
      const at = j * sil.count + k;
      // Most shadows miss most rows: nothing is called for those.
      if (stretchFrom[at] >= stretchTo[at] || stretchTo[at] <= first || stretchFrom[at] >= end) continue;
      const base = pieces.base[k] - z;
      const top = pieces.top[k] - z;
      if (base >= v1 || top <= 0 || !this.stretch(sil, k, j, first, end)) continue;
      if (!this.lit.meets(this.lo, this.hi)) continue;
      // Parts are drawn in by a skin: what stands on the surface is that much above it.
      if (base <= EDGE) this.sortStanding(sil, k, j, top, v1);
      else this.sortHanging(sil, k, j, base, v1);
    }
    if (windows > 0) {
      this.touch(first, end);
      this.clear(first, end, v0, v1);
      for (let k = 0; k < walls.count; k++) {
        if (this.letsThrough(k) && this.stretch(sil, pieces.count + k, j, first, end))
          this.castWall(sil, k, j, z, v1);
      }
    } else this.clear(this.touchedFrom, this.touchedTo, v0, v1);
    // Parts that stand on the surface only raise `low`; with that done, most hanging parts join on to it.
    for (let n = 0; n < this.parts; n++) this.castStanding(sil, j, n);
    for (let n = 0; n < this.hangs; n++) this.castHanging(sil, j, n, z);
  }

  private darken(lo: number, hi: number): void {
    this.lit.remove(lo, hi);
    this.open.remove(lo, hi);
  }

  private touch(lo: number, hi: number): void {
    this.open.remove(lo, hi);
    if (lo < this.touchedFrom) this.touchedFrom = lo;
    if (hi > this.touchedTo) this.touchedTo = hi;
  }

  private clear(from: number, to: number, v0: number, v1: number): void {
    const { low, high, count } = this;
    for (let n = 0; n < this.lit.count; n++) {
      const lo = Math.max(from, this.lit.from[n]);
      const hi = Math.min(to, this.lit.to[n]);
      if (lo >= hi) continue;
      // By hand: filling short stretches of three arrays costs more in calls than in writing.
      for (let i = lo; i < hi; i++) {
        low[i] = v0;
        high[i] = v1;
        count[i] = 0;
      }
    }
  }

  private letsThrough(wall: number): boolean {
    const { start, transmittance } = this.scene.walls;
    for (let o = start[wall]; o < start[wall + 1]; o++) if (transmittance[o] > 0) return true;
    return false;
  }

  /** Sets lo..hi to the columns of row j in the shadow of caster k. */
  private stretch(sil: Silhouettes, k: number, j: number, first: number, end: number): boolean {
    const at = j * sil.count + k;
    const from = sil.stretchFrom[at];
    const to = sil.stretchTo[at];
    this.lo = Math.max(from, first);
    this.hi = Math.min(to, end);
    return this.lo < this.hi;
  }

  /** Keeps the counted side of a line, the line itself included. */
  private keep(lines: RowLines, n: number, j: number): void {
    const at = lines.column[n] + lines.slope[n] * (j - lines.row[n]);
    if (lines.isFrom[n] === 1) {
      if (at > this.lo) this.lo = Math.ceil(at);
    } else if (at < this.hi - 1) this.hi = Math.floor(at) + 1;
  }

  /** Keeps exactly what `keep` would drop. */
  private drop(lines: RowLines, n: number, j: number): void {
    const at = lines.column[n] + lines.slope[n] * (j - lines.row[n]);
    if (lines.isFrom[n] === 1) {
      if (at <= this.hi - 1) this.hi = Math.ceil(at);
    } else if (at >= this.lo) this.lo = Math.floor(at) + 1;
  }

  /**
   * A part standing on the surface hides the tube up to top/s, s the fraction of the way at which the ray enters it:
   * top·(1 − gLamp/g). A cell inside the footprint sees nothing. What reaches v1 is dark: as g is linear along the row,
   * that is one end of the side's stretch; the other end is noted for `castStanding`.
   */
  private sortStanding(sil: Silhouettes, k: number, j: number, top: number, v1: number): void {
    const { lo, hi } = this;
    const first = sil.farStart[k];
    const end = sil.farStart[k + 1];
    const row = j * sil.far.count;
    for (let n = first; n < end; n++) {
      let from = sectorFrom(sil.far, row, n, first, end, sil.around[k], lo);
      let to = sectorTo(sil.far, row, n, first, end, sil.around[k], hi);
      if (from >= to) continue;
      if (top >= v1) {
        this.darken(from, to);
        continue;
      }
      // Dark where g ≤ limit: top + q/g ≥ v1.
      const limit = (-top * sil.far.gLamp[n]) / (v1 - top);
      const g0 = sil.far.g0[n] + sil.far.gj[n] * j;
      const gi = sil.far.gi[n];
      const edge = (limit - g0) / gi;
      if (gi > 0) {
        if (edge >= from) {
          const beyond = Math.min(to, Math.floor(edge) + 1);
          this.darken(from, beyond);
          from = beyond;
        }
      } else if (gi < 0) {
        if (edge <= to - 1) {
          const before = Math.max(from, Math.ceil(edge));
          this.darken(before, to);
          to = before;
        }
      } else if (g0 <= limit) {
        this.darken(from, to);
        continue;
      }
      if (from >= to) continue;
      this.partSide[this.parts] = n;
      this.partFrom[this.parts] = from;
      this.partTo[this.parts] = to;
      this.partTop[this.parts++] = top;
      this.touch(from, to);
    }
  }

  private castStanding(sil: Silhouettes, j: number, part: number): void {
    const { low, lit } = this;
    const n = this.partSide[part];
    const top = this.partTop[part];
    const g0 = sil.far.g0[n] + sil.far.gj[n] * j;
    const gi = sil.far.gi[n];
    const q = -top * sil.far.gLamp[n];
    for (let span = 0; span < lit.count; span++) {
      const from = Math.max(this.partFrom[part], lit.from[span]);
      const to = Math.min(this.partTo[part], lit.to[span]);
      for (let i = from; i < to; i++) {
        // Not dark, so g > 0: the cell lies beyond the part.
        const up = top + q / (g0 + gi * i);
        if (up > low[i]) low[i] = up;
      }
    }
  }

  /**
   * A part with air under it hides from base/sOut to top/sIn. Where base/sOut is past the tube's upper end it hides
   * nothing: base + q/g < v1, with g < 0 behind a near side, keeps one end of that side's stretch.
   */
  private sortHanging(sil: Silhouettes, k: number, j: number, base: number, v1: number): void {
    const { lo, hi } = this;
    const first = sil.nearStart[k];
    const end = sil.nearStart[k + 1];
    if (first === end) this.noteHanging(k, -1, lo, hi);
    const row = j * sil.near.count;
    for (let n = first; n < end; n++) {
      let from = sectorFrom(sil.near, row, n, first, end, 0, lo);
      let to = sectorTo(sil.near, row, n, first, end, 0, hi);
      if (from >= to) continue;
      const limit = (-base * sil.near.gLamp[n]) / (v1 - base);
      const g0 = sil.near.g0[n] + sil.near.gj[n] * j;
      const gi = sil.near.gi[n];
      const edge = (limit - g0) / gi;
      // Rounding must not cut a cell that is touched: one more is kept, and hides nothing.
      if (gi > 0) {
        if (edge < to - 2) to = Math.max(from, Math.ceil(edge) + 2);
      } else if (gi < 0) {
        if (edge > from + 1) from = Math.min(to, Math.floor(edge) - 1);
      }
      if (from < to) this.noteHanging(k, n, from, to);
    }
  }

  private noteHanging(k: number, side: number, from: number, to: number): void {
    this.hanging[this.hangs] = k;
    this.hangSide[this.hangs] = side;
    this.hangFrom[this.hangs] = from;
    this.hangTo[this.hangs++] = to;
    this.touch(from, to);
  }

  private castHanging(sil: Silhouettes, j: number, hang: number, z: number): void {
    const { lit, low, high } = this;
    const { far, near } = sil;
    const k = this.hanging[hang];
    const base = this.scene.pieces.base[k] - z;
    const top = this.scene.pieces.top[k] - z;
    const side = this.hangSide[hang];
    const n0 = side < 0 ? 1 : near.g0[side] + near.gj[side] * j;
    const ni = side < 0 ? 0 : near.gi[side];
    const nq = side < 0 ? 0 : -base * near.gLamp[side];
    const first = sil.farStart[k];
    const end = sil.farStart[k + 1];
    const row = j * far.count;
    for (let m = first; m < end; m++) {
      const sectorLo = sectorFrom(far, row, m, first, end, sil.around[k], this.hangFrom[hang]);
      const sectorHi = sectorTo(far, row, m, first, end, sil.around[k], this.hangTo[hang]);
      if (sectorLo >= sectorHi) continue;
      const f0 = far.g0[m] + far.gj[m] * j;
      const fi = far.gi[m];
      const fq = -top * far.gLamp[m];
      for (let span = 0; span < lit.count; span++) {
        const from = Math.max(sectorLo, lit.from[span]);
        const to = Math.min(sectorHi, lit.to[span]);
        for (let i = from; i < to; i++) {
          // Once nothing is left of the tube there is nothing more to hide.
          if (low[i] >= high[i]) continue;
          const g = f0 + fi * i;
          this.hide(i, base + nq / (n0 + ni * i), g > 0 ? top + fq / g : Infinity);
        }
      }
    }
  }

  /** Adds a hidden stretch to a cell: joined on to what is hidden already where they meet, else in a slot of its own. */
  private hide(i: number, from: number, to: number): void {
    const { low, high, columns } = this;
    if (to <= low[i] || from >= high[i]) return;
    if (from <= low[i]) {
      low[i] = to;
      return;
    }
    if (to >= high[i]) {
      high[i] = from;
      return;
    }
    const slots = this.count[i];
    if (slots === RETRACE) return;
    for (let slot = slots - 1; slot >= 0; slot--) {
      const at = slot * columns + i;
      if (to < this.from[at] || from > this.to[at]) continue;
      if (from < this.from[at]) this.from[at] = from;
      if (to > this.to[at]) this.to[at] = to;
      return;
    }
    if (slots === SLOTS) {
      this.count[i] = RETRACE;
      return;
    }
    this.from[slots * columns + i] = from;
    this.to[slots * columns + i] = to;
    this.count[i] = slots + 1;
  }

  /** A wall with openings hides everything but what they leave: sill/s to head/s. Glazing, and openings above one another, are retraced. */
  private castWall(sil: Silhouettes, k: number, j: number, z: number, v1: number): void {
    const { walls } = this.scene;
    const { lo, hi } = this;
    const { near } = sil;
    const n = sil.nearStart[this.scene.pieces.count + k];
    const g0 = near.g0[n] + near.gj[n] * j;
    // `count` is still unused on this row: here it tells how many openings a cell looks through.
    for (let o = walls.start[k]; o < walls.start[k + 1]; o++) {
      if (walls.transmittance[o] === 0) continue;
      this.lo = lo;
      this.hi = hi;
      this.keep(sil.jambs, 2 * o, j);
      this.drop(sil.jambs, 2 * o + 1, j);
      for (let i = this.lo; i < this.hi; i++) {
        const scale = 1 - near.gLamp[n] / (g0 + near.gi[n] * i);
        this.count[i] = this.count[i] > 0 || walls.transmittance[o] < 1 ? RETRACE : 1;
        const sill = (walls.sill[o] - z) * scale;
        const head = (walls.head[o] - z) * scale;
        if (sill > this.low[i]) this.low[i] = sill;
        if (head < this.high[i]) this.high[i] = head;
      }
    }
    for (let i = lo; i < hi; i++) {
      if (this.count[i] === 0) this.low[i] = v1;
      else if (this.count[i] === 1) this.count[i] = 0;
    }
  }
}
