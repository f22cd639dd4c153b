import { SKIN } from '@/lib/geometry/degenerate';
import type { Pieces, PreparedScene, Walls } from './prepare-scene';

/** Where a lattice's cell centres lie; centre (i, j) is at column i and row j exactly. */
export interface GridFrame {
  readonly originX: number;
  readonly originY: number;
  readonly step: number;
  readonly columns: number;
  readonly rows: number;
}

/**
 * Straight lines as the rows of a grid meet them: on row j at column `column + slope·(j − row)`, through a pivot so
 * that nearly level lines keep their digits. `isFrom` says which side counts: columns from the line on, or up to it.
 */
export interface RowLines {
  readonly column: Float64Array;
  readonly row: Float64Array;
  readonly slope: Float64Array;
  readonly isFrom: Uint8Array;
}

/**
 * Sides of the casters, as seen from a lamp at S, in the order in which a sweep from left to right meets them.
 * `g` is the distance outside a side, linear over the grid: g = g0 + gi·i + gj·j; gLamp is its value at S. A ray from
 * a cell crosses the side at the fraction g/(g − gLamp) of its way. `cutAt` holds, row by row, the column at which the ray
 * through the side's first corner is met; `cutIsFrom` 1 when the side's sector begins there, 0 when it ends there.
 */
export interface ShadowSides {
  readonly g0: Float64Array;
  readonly gi: Float64Array;
  readonly gj: Float64Array;
  readonly gLamp: Float64Array;
  readonly count: number;
  readonly cutAt: Int32Array;
  readonly cutIsFrom: Uint8Array;
}

/**
 * The plan shadows that all convex pieces, and all walls after them, cast from one point S. The shadow of a convex
 * caster, {S + λ(k − S), λ ≥ 1}, is convex: it is bounded by the rays through its outermost corners and by the sides
 * that face the lamp, so on each grid row it is one stretch. Rays through the other corners cut that stretch into
 * sectors, on each of which rays enter through one far side and leave through one near side.
 */
export interface Silhouettes {
  readonly count: number;
  /** The pieces from the nearest to S to the farthest: near shadows swallow far ones. */
  readonly nearestFirst: Int32Array;
  /** Columns of row j in the shadow of caster k: from ≤ i < to, at j·count + k. */
  readonly stretchFrom: Int32Array;
  readonly stretchTo: Int32Array;
  /** Sides turned away from the lamp, which a ray from a cell meets first: farStart[k] to farStart[k+1]. */
  readonly farStart: Int32Array;
  /** Sides facing the lamp, through which it leaves; for a wall, the wall itself. */
  readonly nearStart: Int32Array;
  readonly far: ShadowSides;
  readonly near: ShadowSides;
  /** 1 when S lies within the footprint: there is no outermost corner, and the sectors go all the way round. */
  readonly around: Uint8Array;
  /** Rays through the jambs of opening o of the walls, at 2·o and 2·o + 1 in sweep order. */
  readonly jambs: RowLines;
}

/** Coefficients closer to 0 than this are taken as this, so that every line crosses every row (far outside any room). */
const LEVEL = 1e-15;
const awayFromZero = (v: number) => (Math.abs(v) < LEVEL ? (v < 0 ? -LEVEL : LEVEL) : v);

class LineList {
  readonly column: number[] = [];
  readonly row: number[] = [];
  readonly slope: number[] = [];
  readonly isFrom: number[] = [];
  constructor(private readonly frame: GridFrame) {}

  /** The line through (x, y) on whose counted side α·dx + β·dy is positive. */
  add(x: number, y: number, alpha: number, beta: number): void {
    const a = awayFromZero(alpha);
    this.column.push((x - this.frame.originX) / this.frame.step - 0.5);
    this.row.push((y - this.frame.originY) / this.frame.step - 0.5);
    this.slope.push(-beta / a);
    this.isFrom.push(a > 0 ? 1 : 0);
  }

  get length(): number {
    return this.column.length;
  }

  toArrays(): RowLines {
    return {
      column: new Float64Array(this.column),
      row: new Float64Array(this.row),
      slope: new Float64Array(this.slope),
      isFrom: new Uint8Array(this.isFrom),
    };
  }
}

class SideList {
  readonly g0: number[] = [];
  readonly gi: number[] = [];
  readonly gj: number[] = [];
  readonly gLamp: number[] = [];
  readonly cuts: LineList;
  constructor(
    private readonly frame: GridFrame,
    private readonly lampX: number,
    private readonly lampY: number,
  ) {
    this.cuts = new LineList(frame);
  }

  /** The side with outward normal n through distance c, whose sector begins at the ray through (x, y). */
  add(nx: number, ny: number, c: number, x: number, y: number): void {
    const { originX, originY, step } = this.frame;
    this.g0.push(nx * (originX + step / 2) + ny * (originY + step / 2) - c);
    this.gi.push(nx * step);
    this.gj.push(ny * step);
    this.gLamp.push(nx * this.lampX + ny * this.lampY - c);
    // cross(corner − S, p − S) ≥ 0
    this.cuts.add(this.lampX, this.lampY, -(y - this.lampY), x - this.lampX);
  }

  get length(): number {
    return this.g0.length;
  }

  toArrays(start: readonly number[], casters: CasterRows): ShadowSides {
    const cuts = this.cuts.toArrays();
    return {
      g0: new Float64Array(this.g0),
      gi: new Float64Array(this.gi),
      gj: new Float64Array(this.gj),
      gLamp: new Float64Array(this.gLamp),
      count: this.g0.length,
      cutAt: cutColumns(cuts, this.frame, start, casters),
      cutIsFrom: cuts.isFrom,
    };
  }
}

/** Casts every piece, then every wall, from the plan point S = (lampX, lampY). Costs a few microseconds per caster. */
export function castSilhouettes(
  { pieces, walls }: PreparedScene,
  frame: GridFrame,
  lampX: number,
  lampY: number,
): Silhouettes {
  const cast = new Cast(frame, lampX, lampY);
  for (let k = 0; k < pieces.count; k++) cast.piece(pieces, k);
  for (let k = 0; k < walls.count; k++) cast.wall(walls, k);
  return cast.toSilhouettes();
}

type Corner = readonly [x: number, y: number];

const isFar = ({ nx, ny, c }: Pieces, side: number, lampX: number, lampY: number): boolean =>
  nx[side] * lampX + ny[side] * lampY <= c[side];

const cornerOf = ({ x, y }: Pieces, i: number): Corner => [x[i], y[i]];

/** Two points along a wall, in the order a sweep round the lamp meets them. */
function sweepOf(
  { ax, ay, ux, uy }: Walls,
  k: number,
  side: number,
  low: number,
  high: number,
): [Corner, Corner] {
  const first = side > 0 ? high : low;
  const last = side > 0 ? low : high;
  return [
    [ax[k] + first * ux[k], ay[k] + first * uy[k]],
    [ax[k] + last * ux[k], ay[k] + last * uy[k]],
  ];
}

class Cast {
  private readonly bounds: LineList;
  private readonly far: SideList;
  private readonly near: SideList;
  private readonly jambs: LineList;
  /** Rows each caster's shadow can touch: rowFrom ≤ j ≤ rowTo. */
  readonly rowFrom: number[] = [];
  readonly rowTo: number[] = [];
  readonly around: number[] = [];
  /** Of each piece, by one of its corners: near enough to put them in order. */
  private readonly distance: number[] = [];
  private readonly boundStart = [0];
  private readonly farStart = [0];
  private readonly nearStart = [0];

  constructor(
    private readonly frame: GridFrame,
    private readonly lampX: number,
    private readonly lampY: number,
  ) {
    this.bounds = new LineList(frame);
    this.jambs = new LineList(frame);
    this.far = new SideList(frame, lampX, lampY);
    this.near = new SideList(frame, lampX, lampY);
  }

  /** Rings turn x towards y, so along the far sides the sweep runs with the ring and along the near sides against it. */
  piece(pieces: Pieces, k: number): void {
    const { start, x, y, nx, ny, c } = pieces;
    const { lampX, lampY } = this;
    const first = start[k];
    const n = start[k + 1] - first;
    let begin = 0;
    while (
      begin < n &&
      !(
        isFar(pieces, first + begin, lampX, lampY) &&
        !isFar(pieces, first + ((begin + n - 1) % n), lampX, lampY)
      )
    )
      begin++;
    const inside = begin === n;
    if (inside) begin = 0;
    let end = begin;
    while (end < begin + n && isFar(pieces, first + (end % n), lampX, lampY)) {
      const i = first + (end % n);
      this.far.add(nx[i], ny[i], c[i], x[i], y[i]);
      end++;
    }
    for (let j = begin + n - 1; j >= end; j--) {
      const i = first + (j % n);
      const next = first + ((j + 1) % n);
      this.near.add(nx[i], ny[i], c[i], x[next], y[next]);
      this.bounds.add(x[i], y[i], -nx[i], -ny[i]);
    }
    this.distance.push(Math.hypot(x[first] - lampX, y[first] - lampY));
    let [low, high] = [Infinity, -Infinity];
    for (let i = first; i < first + n; i++) {
      low = Math.min(low, y[i]);
      high = Math.max(high, y[i]);
    }
    if (inside) this.close(null, low, high);
    else this.close([cornerOf(pieces, first + (begin % n)), cornerOf(pieces, first + (end % n))], low, high);
  }

  wall(walls: Walls, k: number): void {
    const { ax, ay, ux, uy, length, start, from, to } = walls;
    // The normal that points to the lamp; the sweep meets b first when a lies to its right.
    const distance = uy[k] * (this.lampX - ax[k]) - ux[k] * (this.lampY - ay[k]);
    const side = distance > 0 ? 1 : -1;
    const [nx, ny] = [side * uy[k], -side * ux[k]];
    const ends = sweepOf(walls, k, side, -SKIN, length[k] + SKIN);
    this.near.add(nx, ny, nx * ax[k] + ny * ay[k], ...ends[0]);
    // Beyond the wall by more than the skin, so that a receiver on it is not hidden by it.
    this.bounds.add(ends[0][0] - SKIN * nx, ends[0][1] - SKIN * ny, -nx, -ny);
    for (let o = start[k]; o < start[k + 1]; o++) {
      for (const [x, y] of sweepOf(walls, k, side, from[o], to[o])) {
        this.jambs.add(this.lampX, this.lampY, -(y - this.lampY), x - this.lampX);
      }
    }
    this.close(ends, Math.min(ends[0][1], ends[1][1]), Math.max(ends[0][1], ends[1][1]));
    // A lamp on the wall's line is not hidden by it.
    if (Math.abs(distance) <= SKIN) this.rowTo[this.rowTo.length - 1] = -1;
  }

  /** Ends a caster: the rays through its outermost corners, first and last in the sweep, and the rows they leave it. */
  private close(outermost: readonly [Corner, Corner] | null, lowY: number, highY: number): void {
    const { lampX, lampY, frame } = this;
    let rowFrom = 0;
    let rowTo = frame.rows - 1;
    if (outermost) {
      const [first, last] = outermost;
      this.bounds.add(lampX, lampY, -(first[1] - lampY), first[0] - lampX);
      this.bounds.add(lampX, lampY, last[1] - lampY, -(last[0] - lampX));
      if (first[1] >= lampY && last[1] >= lampY)
        rowFrom = Math.max(0, Math.ceil((lowY - frame.originY) / frame.step - 0.5));
      if (first[1] <= lampY && last[1] <= lampY)
        rowTo = Math.min(rowTo, Math.floor((highY - frame.originY) / frame.step - 0.5));
    }
    this.rowFrom.push(rowFrom);
    this.rowTo.push(rowTo);
    this.around.push(outermost ? 0 : 1);
    this.boundStart.push(this.bounds.length);
    this.farStart.push(this.far.length);
    this.nearStart.push(this.near.length);
  }

  toSilhouettes(): Silhouettes {
    return {
      count: this.rowFrom.length,
      nearestFirst: new Int32Array(
        this.distance.map((_, k) => k).sort((a, b) => this.distance[a] - this.distance[b]),
      ),
      ...this.stretches(this.bounds.toArrays()),
      farStart: new Int32Array(this.farStart),
      nearStart: new Int32Array(this.nearStart),
      far: this.far.toArrays(this.farStart, this),
      near: this.near.toArrays(this.nearStart, this),
      around: new Uint8Array(this.around),
      jambs: this.jambs.toArrays(),
    };
  }

  /**
   * Each caster's stretch on each row: what all its bounds keep. Bound by bound, so that the loops are plain; the rays come
   * first, and leave most casters few rows for the rest, which later work is told of.
   */
  private stretches(bounds: RowLines): Pick<Silhouettes, 'stretchFrom' | 'stretchTo'> {
    const { rowFrom, rowTo, boundStart } = this;
    const count = rowFrom.length;
    const { rows, columns } = this.frame;
    const stretchFrom = new Int32Array(rows * count);
    const stretchTo = new Int32Array(rows * count);
    for (let k = 0; k < count; k++) {
      let first = rowFrom[k];
      let last = rowTo[k];
      for (let j = first; j <= last; j++) stretchTo[j * count + k] = columns;
      const rays = boundStart[k + 1] - 2;
      for (let b = boundStart[k + 1] - 1; b >= boundStart[k]; b--) {
        keepBound(bounds, b, first, last, count, k, columns, stretchFrom, stretchTo);
        if (b !== rays) continue;
        while (first <= last && stretchFrom[first * count + k] >= stretchTo[first * count + k]) first++;
        while (first <= last && stretchFrom[last * count + k] >= stretchTo[last * count + k]) last--;
      }
      rowFrom[k] = first;
      rowTo[k] = last;
    }
    return { stretchFrom, stretchTo };
  }
}

/** Narrows the stretches of caster k on the rows first to last to the counted side of bound b. */
function keepBound(
  { column, row, slope, isFrom }: RowLines,
  b: number,
  first: number,
  last: number,
  count: number,
  k: number,
  columns: number,
  stretchFrom: Int32Array,
  stretchTo: Int32Array,
): void {
  const at0 = column[b];
  const pivot = row[b];
  const rise = slope[b];
  if (isFrom[b] === 1) {
    for (let j = first, at = j * count + k; j <= last; j++, at += count) {
      const edge = at0 + rise * (j - pivot);
      if (edge > stretchFrom[at]) stretchFrom[at] = edge < columns ? Math.ceil(edge) : columns;
    }
  } else {
    for (let j = first, at = j * count + k; j <= last; j++, at += count) {
      const edge = at0 + rise * (j - pivot);
      if (edge < stretchTo[at] - 1) stretchTo[at] = edge < 0 ? 0 : Math.floor(edge) + 1;
    }
  }
}

interface CasterRows {
  readonly rowFrom: readonly number[];
  readonly rowTo: readonly number[];
  readonly around: readonly number[];
}

/**
 * The column at which each side's cut parts each row its caster's shadow can touch, row by row: the first one counted, or
 * the first one beyond.
 */
function cutColumns(
  { column, row, slope, isFrom }: RowLines,
  { rows, columns }: GridFrame,
  start: readonly number[],
  { rowFrom, rowTo, around }: CasterRows,
): Int32Array {
  const count = column.length;
  const cutAt = new Int32Array(rows * count);
  for (let k = 0; k < rowFrom.length; k++) {
    // Where the sectors do not go all the way round, nothing is cut before the first.
    for (let n = start[k] + (around[k] === 1 ? 0 : 1); n < start[k + 1]; n++) {
      const at0 = column[n];
      const pivot = row[n];
      const rise = slope[n];
      const up = isFrom[n];
      for (let j = rowFrom[k], at = j * count + n; j <= rowTo[k]; j++, at += count) {
        const edge = at0 + rise * (j - pivot);
        if (edge < 0) cutAt[at] = 0;
        else if (edge >= columns) cutAt[at] = columns;
        else cutAt[at] = up === 1 ? Math.ceil(edge) : Math.floor(edge) + 1;
      }
    }
  }
  return cutAt;
}
