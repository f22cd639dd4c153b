import { convexPieces } from '@/lib/geometry/convex-pieces';
import { SKIN } from '@/lib/geometry/degenerate';
import { selfCrossing, signedArea, tidyRing } from '@/lib/geometry/polygon';
import type { Scene, Solid, Wall } from './types';

/**
 * Convex upright prisms in flat arrays. Corners and sides of piece k are `start[k]` to `start[k+1]`; side i runs from
 * corner i to the next and keeps the inside at nx·x + ny·y ≤ c. Free sides are drawn in by `SKIN` and seams pushed out;
 * the corners x, y lie on the moved sides, so that shadows cast by corners and by sides agree.
 */
export interface Pieces {
  readonly count: number;
  readonly start: Int32Array;
  readonly x: Float64Array;
  readonly y: Float64Array;
  readonly nx: Float64Array;
  readonly ny: Float64Array;
  readonly c: Float64Array;
  readonly base: Float64Array;
  readonly top: Float64Array;
  /** Which solid of the scene a piece belongs to. */
  readonly solid: Int32Array;
}

/** Walls as a start, a unit direction and a length; openings of wall k are `start[k]` to `start[k+1]`, their jambs drawn in by `SKIN`. */
export interface Walls {
  readonly count: number;
  readonly ax: Float64Array;
  readonly ay: Float64Array;
  readonly ux: Float64Array;
  readonly uy: Float64Array;
  readonly length: Float64Array;
  readonly start: Int32Array;
  readonly from: Float64Array;
  readonly to: Float64Array;
  readonly sill: Float64Array;
  readonly head: Float64Array;
  readonly transmittance: Float64Array;
}

/** A scene with everything worked out that does not depend on a lamp. Plain data: it survives a structured clone. */
export interface PreparedScene {
  readonly scene: Scene;
  readonly pieces: Pieces;
  readonly walls: Walls;
}

/** Throws an `Error` that names the solid or wall and the value when the geometry cannot be traced. */
export function prepareScene(scene: Scene): PreparedScene {
  return {
    scene,
    pieces: preparePieces(scene.solids),
    walls: prepareWalls(scene.walls),
  };
}

function preparePieces(solids: readonly Solid[]): Pieces {
  const all = solids.flatMap((solid, index) => {
    checkSolid(solid, index);
    try {
      return convexPieces(solid.polygon).map((piece) => ({ ...piece, solid, index }));
    } catch (cause) {
      throw new Error(`Solid ${index + 1}: ${(cause as Error).message}`, { cause });
    }
  });
  const start = Int32Array.from([0, ...all.map((piece) => piece.ring.length)]);
  for (let k = 1; k < start.length; k++) start[k] += start[k - 1];
  const sides = start[all.length];
  const pieces = {
    count: all.length,
    start,
    x: new Float64Array(sides),
    y: new Float64Array(sides),
    nx: new Float64Array(sides),
    ny: new Float64Array(sides),
    c: new Float64Array(sides),
    base: Float64Array.from(all, (piece) => piece.solid.base + SKIN),
    top: Float64Array.from(all, (piece) => piece.solid.top - SKIN),
    solid: Int32Array.from(all, (piece) => piece.index),
  };
  all.forEach(({ ring, seams }, k) => {
    // Sides first: the corners are where the moved sides meet.
    ring.forEach(([x, y], i) => {
      const [x2, y2] = ring[(i + 1) % ring.length];
      const length = Math.hypot(x2 - x, y2 - y);
      const side = start[k] + i;
      // Positive area turns x towards y, so (dy, −dx) points out.
      pieces.nx[side] = (y2 - y) / length;
      pieces.ny[side] = (x - x2) / length;
      pieces.c[side] = pieces.nx[side] * x + pieces.ny[side] * y + (seams[i] ? SKIN : -SKIN);
    });
    ring.forEach(([x, y], i) => {
      const side = start[k] + i;
      const before = start[k] + ((i + ring.length - 1) % ring.length);
      const [nx1, ny1, nx2, ny2] = [pieces.nx[before], pieces.ny[before], pieces.nx[side], pieces.ny[side]];
      // How far each side moved, taken at the old corner, so that the corner moves by that and keeps its digits.
      const move1 = pieces.c[before] - nx1 * x - ny1 * y;
      const move2 = pieces.c[side] - nx2 * x - ny2 * y;
      const det = nx1 * ny2 - nx2 * ny1;
      pieces.x[side] = x + (move1 * ny2 - move2 * ny1) / det;
      pieces.y[side] = y + (nx1 * move2 - nx2 * move1) / det;
    });
  });
  return pieces;
}

function checkSolid({ polygon, base, top }: Solid, index: number): void {
  const who = `Solid ${index + 1}`;
  polygon.forEach(([x, y], i) => {
    if (!Number.isFinite(x) || !Number.isFinite(y))
      throw new Error(`${who}: corner ${i + 1} is (${x}, ${y}); both must be numbers.`);
  });
  if (!Number.isFinite(base) || !Number.isFinite(top) || top <= base)
    throw new Error(`${who}: top ${top} m must be above its underside ${base} m.`);
  const ring = tidyRing(polygon);
  if (ring.length < 3) throw new Error(`${who}: ${ring.length} separate corners; a footprint needs three.`);
  const crossing = selfCrossing(ring);
  if (crossing) throw new Error(`${who}: its sides ${crossing[0] + 1} and ${crossing[1] + 1} cross.`);
  if (Math.abs(signedArea(ring)) < 1e-9) throw new Error(`${who}: its footprint has no area.`);
}

function prepareWalls(walls: readonly Wall[]): Walls {
  walls.forEach(checkWall);
  const openings = walls.flatMap((wall) => wall.openings);
  const start = Int32Array.from([0, ...walls.map((wall) => wall.openings.length)]);
  for (let k = 1; k < start.length; k++) start[k] += start[k - 1];
  const length = Float64Array.from(walls, ({ a, b }) => Math.hypot(b[0] - a[0], b[1] - a[1]));
  return {
    count: walls.length,
    ax: Float64Array.from(walls, (wall) => wall.a[0]),
    ay: Float64Array.from(walls, (wall) => wall.a[1]),
    ux: Float64Array.from(walls, ({ a, b }, k) => (b[0] - a[0]) / length[k]),
    uy: Float64Array.from(walls, ({ a, b }, k) => (b[1] - a[1]) / length[k]),
    length,
    start,
    from: Float64Array.from(openings, (opening) => opening.from + SKIN),
    to: Float64Array.from(openings, (opening) => opening.to - SKIN),
    sill: Float64Array.from(openings, (opening) => opening.sill),
    head: Float64Array.from(openings, (opening) => opening.head),
    transmittance: Float64Array.from(openings, (opening) => opening.transmittance),
  };
}

function checkWall({ a, b, openings }: Wall, index: number): void {
  const who = `Wall ${index + 1}`;
  if (![...a, ...b].every(Number.isFinite))
    throw new Error(`${who}: runs from (${a.join(', ')}) to (${b.join(', ')}); all must be numbers.`);
  if (a[0] === b[0] && a[1] === b[1])
    throw new Error(`${who}: starts and ends at (${a.join(', ')}); a wall needs a length.`);
  openings.forEach((opening, i) => {
    const { from, to, sill, head, transmittance } = opening;
    if (![from, to, sill, head, transmittance].every(Number.isFinite))
      throw new Error(`${who}, opening ${i + 1}: ${JSON.stringify(opening)} must hold numbers only.`);
    if (transmittance < 0 || transmittance > 1)
      throw new Error(`${who}, opening ${i + 1}: transmittance ${transmittance} must lie between 0 and 1.`);
  });
}
