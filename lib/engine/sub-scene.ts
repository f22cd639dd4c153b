import type { Point } from '@/lib/geometry/point';
import type { Pieces, PreparedScene, Walls } from './prepare-scene';

/**
 * What of a scene can stand between two bundles of points: pieces and walls that meet the convex plan area round both
 * and reach into the heights between them. Nothing else can hide one from the other.
 */
export interface Reach {
  /** Corners of a convex plan area, positive turn (x towards y). */
  readonly hull: readonly Point[];
  readonly low: number;
  readonly high: number;
}

export function sceneWithin(prepared: PreparedScene, { hull, low, high }: Reach): PreparedScene {
  const { pieces, walls } = prepared;
  const keptPieces = [...Array(pieces.count).keys()].filter(
    (k) => pieces.base[k] < high && pieces.top[k] > low && pieceMeets(pieces, k, hull),
  );
  const keptWalls = [...Array(walls.count).keys()].filter((k) => wallMeets(walls, k, hull));
  return {
    scene: prepared.scene,
    pieces: pickPieces(pieces, keptPieces),
    walls: pickWalls(walls, keptWalls),
  };
}

/** Separating axes (two convex areas are apart when a side of one has all of the other beyond it). */
function pieceMeets(pieces: Pieces, k: number, hull: readonly Point[]): boolean {
  const first = pieces.start[k];
  const end = pieces.start[k + 1];
  for (let i = first; i < end; i++) {
    const { nx, ny, c } = pieces;
    if (hull.every(([x, y]) => nx[i] * x + ny[i] * y > c[i])) return false;
  }
  return !apartFrom(hull, (visit) => {
    for (let i = first; i < end; i++) visit(pieces.x[i], pieces.y[i]);
  });
}

function wallMeets(walls: Walls, k: number, hull: readonly Point[]): boolean {
  const [ax, ay, ux, uy] = [walls.ax[k], walls.ay[k], walls.ux[k], walls.uy[k]];
  const across = hull.map(([x, y]) => (x - ax) * uy - (y - ay) * ux);
  if (across.every((d) => d > SLACK) || across.every((d) => d < -SLACK)) return false;
  return !apartFrom(hull, (visit) => {
    visit(ax, ay);
    visit(ax + ux * walls.length[k], ay + uy * walls.length[k]);
  });
}

/** Metres: a wall's ends are a hair longer than they are stored. */
const SLACK = 1e-9;

function apartFrom(hull: readonly Point[], each: (visit: (x: number, y: number) => void) => void): boolean {
  return hull.some(([x0, y0], i) => {
    const [x1, y1] = hull[(i + 1) % hull.length];
    let beyond = true;
    // Outside a side of positive turn is where (dy, −dx) points.
    each((x, y) => {
      if ((x - x0) * (y1 - y0) - (y - y0) * (x1 - x0) <= SLACK) beyond = false;
    });
    return beyond;
  });
}

const startsOf = (counts: readonly number[]): Int32Array => {
  const start = new Int32Array(counts.length + 1);
  counts.forEach((count, i) => {
    start[i + 1] = start[i] + count;
  });
  return start;
};

/** The entries of `values` that belong to the kept groups, in order. */
function gather(
  values: Float64Array,
  start: Int32Array,
  kept: readonly number[],
  total: number,
): Float64Array {
  const out = new Float64Array(total);
  let at = 0;
  for (const k of kept) {
    out.set(values.subarray(start[k], start[k + 1]), at);
    at += start[k + 1] - start[k];
  }
  return out;
}

function pickPieces(pieces: Pieces, kept: readonly number[]): Pieces {
  const start = startsOf(kept.map((k) => pieces.start[k + 1] - pieces.start[k]));
  const sides = (values: Float64Array) => gather(values, pieces.start, kept, start[kept.length]);
  return {
    count: kept.length,
    start,
    x: sides(pieces.x),
    y: sides(pieces.y),
    nx: sides(pieces.nx),
    ny: sides(pieces.ny),
    c: sides(pieces.c),
    base: Float64Array.from(kept, (k) => pieces.base[k]),
    top: Float64Array.from(kept, (k) => pieces.top[k]),
    solid: Int32Array.from(kept, (k) => pieces.solid[k]),
  };
}

function pickWalls(walls: Walls, kept: readonly number[]): Walls {
  const start = startsOf(kept.map((k) => walls.start[k + 1] - walls.start[k]));
  const holes = (values: Float64Array) => gather(values, walls.start, kept, start[kept.length]);
  const own = (values: Float64Array) => Float64Array.from(kept, (k) => values[k]);
  return {
    count: kept.length,
    ax: own(walls.ax),
    ay: own(walls.ay),
    ux: own(walls.ux),
    uy: own(walls.uy),
    length: own(walls.length),
    start,
    from: holes(walls.from),
    to: holes(walls.to),
    sill: holes(walls.sill),
    head: holes(walls.head),
    transmittance: holes(walls.transmittance),
  };
}
