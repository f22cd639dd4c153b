import { MERGE } from '@/lib/geometry/degenerate';

/**
 * What stands between one receiver and one tube: hidden stretches of the tube, and stretches seen through
 * glazing, as fractions 0..1 from its start. One of these is reused for every receiver, so tracing allocates nothing.
 */
export class Shadows {
  count = 0;
  readonly lo: Float64Array;
  readonly hi: Float64Array;

  glassCount = 0;
  readonly glassLo: Float64Array;
  readonly glassHi: Float64Array;
  readonly glassTau: Float64Array;

  /** `capacity`: the most stretches a scene can cast on one tube (see `shadowCapacity`). */
  constructor(capacity: number) {
    this.lo = new Float64Array(capacity);
    this.hi = new Float64Array(capacity);
    this.glassLo = new Float64Array(capacity);
    this.glassHi = new Float64Array(capacity);
    this.glassTau = new Float64Array(capacity);
  }

  clear(): void {
    this.count = 0;
    this.glassCount = 0;
  }

  /** Adds a hidden stretch, kept in order of its start: there are few, so insertion is the quickest sort. */
  hide(lo: number, hi: number): void {
    let i = this.count++;
    for (; i > 0 && this.lo[i - 1] > lo; i--) {
      this.lo[i] = this.lo[i - 1];
      this.hi[i] = this.hi[i - 1];
    }
    this.lo[i] = lo;
    this.hi[i] = hi;
  }

  dim(lo: number, hi: number, transmittance: number): void {
    const i = this.glassCount++;
    this.glassLo[i] = lo;
    this.glassHi[i] = hi;
    this.glassTau[i] = transmittance;
  }

  /** Where the visible stretch found last begins; at or past `end` when none was left. */
  visibleFrom = 0;

  /** The end of the first visible stretch between `t` and `end`. Gaps within `MERGE` do not count. */
  nextVisible(t: number, end: number): number {
    let i = 0;
    for (; i < this.count; i++) {
      if (this.hi[i] <= t) continue;
      if (this.lo[i] > t + MERGE) break;
      t = this.hi[i];
    }
    const stop = i < this.count && this.lo[i] < end ? this.lo[i] : end;
    this.visibleFrom = t + MERGE < end ? t : end;
    return stop;
  }

  /** The next place after `t`, up to `end`, where glazing begins or ends. */
  nextGlassEdge(t: number, end: number): number {
    let next = end;
    for (let i = 0; i < this.glassCount; i++) {
      if (this.glassLo[i] > t && this.glassLo[i] < next) next = this.glassLo[i];
      if (this.glassHi[i] > t && this.glassHi[i] < next) next = this.glassHi[i];
    }
    return next;
  }

  /** Product of the transmittances crossed on the way to the tube at `t`. */
  transmittanceAt(t: number): number {
    let tau = 1;
    for (let i = 0; i < this.glassCount; i++) {
      if (this.glassLo[i] <= t && t <= this.glassHi[i]) tau *= this.glassTau[i];
    }
    return tau;
  }
}
