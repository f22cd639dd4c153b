/**
 * The columns of a row that some light may still reach, as stretches in order and apart. Dark stretches are taken out;
 * what is left is all that later work has to look at.
 */
export class LitSpans {
  count = 0;
  readonly from: Int32Array;
  readonly to: Int32Array;

  constructor(columns: number) {
    // Every other column dark is the most there can be.
    const most = (columns >> 1) + 2;
    this.from = new Int32Array(most);
    this.to = new Int32Array(most);
  }

  reset(from: number, to: number): void {
    this.count = from < to ? 1 : 0;
    this.from[0] = from;
    this.to[0] = to;
  }

  /** Takes the columns lo ≤ i < hi out. */
  remove(lo: number, hi: number): void {
    if (lo >= hi) return;
    const { from, to } = this;
    let first = 0;
    while (first < this.count && to[first] <= lo) first++;
    let end = first;
    while (end < this.count && from[end] < hi) end++;
    if (first === end) return;
    const left = from[first] < lo;
    const right = to[end - 1] > hi;
    const rest = to[end - 1];
    const kept = (left ? 1 : 0) + (right ? 1 : 0);
    const shift = kept - (end - first);
    if (shift !== 0) {
      from.copyWithin(end + shift, end, this.count);
      to.copyWithin(end + shift, end, this.count);
      this.count += shift;
    }
    if (left) to[first] = lo;
    if (right) {
      const at = left ? first + 1 : first;
      from[at] = hi;
      to[at] = rest;
    }
  }

  /** Is any column of lo ≤ i < hi left? */
  meets(lo: number, hi: number): boolean {
    for (let n = 0; n < this.count; n++) {
      if (this.to[n] <= lo) continue;
      return this.from[n] < hi;
    }
    return false;
  }
}
