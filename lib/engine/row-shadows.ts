import type { PreparedScene } from './prepare-scene';
import type { RowLines, ShadowSides, Silhouettes } from './silhouettes';

/** Stretches hidden in the middle of the tube that a cell can hold; a cell with more is traced on its own. */
export const SLOTS = 6;

/**
 * What hides an upright tube from the cells of one grid row, as heights above the surface (metres).
 * Light comes from low..high, less `count` stretches in between; `retrace` marks cells to be traced on their own.
 */
export class RowShadows {
  readonly low: Float64Array;
  readonly high: Float64Array;
  readonly count: Uint8Array;
  /** Stretch s of column i lies at s·columns + i. */
  readonly from: Float64Array;
  readonly to: Float64Array;
  readonly retrace: Uint8Array;
  /** Columns that anything touched: touchedFrom ≤ i < touchedTo. */
  touchedFrom = 0;
  touchedTo = 0;

  private readonly reach: Float64Array;
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
    this.retrace = new Uint8Array(columns);
    this.reach = new Float64Array(columns);
  }

  /** Fills in row j, columns first ≤ i < end, for a tube from v0 to v1 above a surface at height z. */
  cast(sil: Silhouettes, j: number, first: number, end: number, z: number, v0: number, v1: number): void {
    const { pieces, walls } = this.scene;
    this.low.fill(v0, first, end);
    this.high.fill(v1, first, end);
    this.count.fill(0, first, end);
    this.retrace.fill(0, first, end);
    this.touchedFrom = end;
    this.touchedTo = first;
    for (let k = 0; k < walls.count; k++) {
      if (this.stretch(sil, pieces.count + k, j, first, end)) this.castWall(sil, k, j, z, v1);
    }
    // Parts that stand on the surface only raise `low`; with that done, most hanging parts join on to it.
    for (let k = 0; k < pieces.count; k++) {
      if (pieces.base[k] > z || pieces.top[k] <= z) continue;
      if (this.stretch(sil, k, j, first, end)) this.castStanding(sil, k, j, pieces.top[k] - z);
    }
    for (let k = 0; k < pieces.count; k++) {
      const base = pieces.base[k] - z;
      if (base <= 0 || base >= v1) continue;
      if (this.stretch(sil, k, j, first, end)) this.castHanging(sil, k, j, base, pieces.top[k] - z);
    }
  }

  /** Sets lo..hi to the columns of row j in the shadow of caster k. */
  private stretch(sil: Silhouettes, k: number, j: number, first: number, end: number): boolean {
    if (j < sil.rowFrom[k] || j > sil.rowTo[k]) return false;
    const { bounds } = sil;
    this.lo = first;
    this.hi = end;
    for (let b = sil.boundStart[k]; b < sil.boundStart[k + 1]; b++) {
      this.keep(bounds, b, j);
      if (this.lo >= this.hi) return false;
    }
    if (this.lo < this.touchedFrom) this.touchedFrom = this.lo;
    if (this.hi > this.touchedTo) this.touchedTo = this.hi;
    return true;
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

  /** Narrows lo..hi to the sector of side n in a chain first ≤ n < end. */
  private sector(cuts: RowLines, n: number, first: number, end: number, j: number, around: number): void {
    if (n > first || around === 1) this.keep(cuts, n, j);
    if (n < end - 1) this.drop(cuts, n + 1, j);
    else if (around === 1) this.drop(cuts, first, j);
  }

  /**
   * A part standing on the surface hides the tube up to top/s, s the fraction of the way at which the ray enters it:
   * top·(1 − gLamp/g). A cell inside the footprint sees nothing.
   */
  private castStanding(sil: Silhouettes, k: number, j: number, top: number): void {
    const { low } = this;
    const { lo, hi } = this;
    const first = sil.farStart[k];
    const end = sil.farStart[k + 1];
    for (let n = first; n < end; n++) {
      this.lo = lo;
      this.hi = hi;
      this.sector(sil.far.cuts, n, first, end, j, sil.around[k]);
      const g0 = sil.far.g0[n] + sil.far.gj[n] * j;
      const gi = sil.far.gi[n];
      const q = -top * sil.far.gLamp[n];
      for (let i = this.lo; i < this.hi; i++) {
        const g = g0 + gi * i;
        const up = g > 0 ? top + q / g : Infinity;
        if (up > low[i]) low[i] = up;
      }
    }
  }

  /** A part with air under it hides from base/sOut to top/sIn. */
  private castHanging(sil: Silhouettes, k: number, j: number, base: number, top: number): void {
    const { lo, hi } = this;
    this.reachInto(sil.far, sil.farStart[k], sil.farStart[k + 1], sil.around[k], j, top);
    const first = sil.nearStart[k];
    const end = sil.nearStart[k + 1];
    this.lo = lo;
    this.hi = hi;
    if (first === end) {
      for (let i = lo; i < hi; i++) this.hide(i, base, this.reach[i]);
      return;
    }
    for (let n = first; n < end; n++) {
      this.lo = lo;
      this.hi = hi;
      this.sector(sil.near.cuts, n, first, end, j, 0);
      const g0 = sil.near.g0[n] + sil.near.gj[n] * j;
      const gi = sil.near.gi[n];
      const q = -base * sil.near.gLamp[n];
      for (let i = this.lo; i < this.hi; i++) this.hide(i, base + q / (g0 + gi * i), this.reach[i]);
    }
  }

  /** Fills `reach` with top/sIn over lo..hi. */
  private reachInto(
    far: ShadowSides,
    first: number,
    end: number,
    around: number,
    j: number,
    top: number,
  ): void {
    const { lo, hi, reach } = this;
    for (let n = first; n < end; n++) {
      this.lo = lo;
      this.hi = hi;
      this.sector(far.cuts, n, first, end, j, around);
      const g0 = far.g0[n] + far.gj[n] * j;
      const gi = far.gi[n];
      const q = -top * far.gLamp[n];
      for (let i = this.lo; i < this.hi; i++) {
        const g = g0 + gi * i;
        reach[i] = g > 0 ? top + q / g : Infinity;
      }
    }
  }

  private hide(i: number, from: number, to: number): void {
    if (from <= this.low[i]) {
      if (to > this.low[i]) this.low[i] = to;
    } else if (to >= this.high[i]) {
      if (from < this.high[i]) this.high[i] = from;
    } else {
      const slot = this.count[i];
      if (slot === SLOTS) {
        this.retrace[i] = 1;
        return;
      }
      this.from[slot * this.columns + i] = from;
      this.to[slot * this.columns + i] = to;
      this.count[i] = slot + 1;
    }
  }

  /** A wall hides everything but what its openings leave: sill/s to head/s. Glazing, and openings above one another, are retraced. */
  private castWall(sil: Silhouettes, k: number, j: number, z: number, v1: number): void {
    const { walls } = this.scene;
    const { lo, hi } = this;
    const { near } = sil;
    const n = sil.nearStart[this.scene.pieces.count + k];
    const g0 = near.g0[n] + near.gj[n] * j;
    let open = 0;
    for (let o = walls.start[k]; o < walls.start[k + 1]; o++) if (walls.transmittance[o] > 0) open++;
    if (open === 0) {
      this.low.fill(v1, lo, hi);
      return;
    }
    // `count` is still unused on this row: here it tells how many openings a cell looks through.
    for (let o = walls.start[k]; o < walls.start[k + 1]; o++) {
      if (walls.transmittance[o] === 0) continue;
      this.lo = lo;
      this.hi = hi;
      this.keep(sil.jambs, 2 * o, j);
      this.drop(sil.jambs, 2 * o + 1, j);
      for (let i = this.lo; i < this.hi; i++) {
        const scale = 1 - near.gLamp[n] / (g0 + near.gi[n] * i);
        if (this.count[i]++ > 0 || walls.transmittance[o] < 1) this.retrace[i] = 1;
        const sill = (walls.sill[o] - z) * scale;
        const head = (walls.head[o] - z) * scale;
        if (sill > this.low[i]) this.low[i] = sill;
        if (head < this.high[i]) this.high[i] = head;
      }
    }
    for (let i = lo; i < hi; i++) {
      if (this.count[i] === 0) this.low[i] = v1;
      this.count[i] = 0;
    }
  }
}
