import type { PlacedTube } from './placed-tube';
import type { PreparedScene } from './prepare-scene';

/** The upright cylinder round an emitter's tubes, metres. */
export interface LampCylinder {
  readonly x: number;
  readonly y: number;
  readonly radius: number;
  readonly low: number;
  readonly high: number;
}

const clamp = (share: number): number => Math.max(0, Math.min(share, 1));

/**
 * Which pieces and walls can stand between receivers and an emitter: lists that one thread narrows for every block of
 * receivers, and again for every receiver in it, so that tracing looks at a handful and not at all.
 *
 * All rays from receivers within r of c to lamps within R of S lie in the hull of both circles. At the share s of the way
 * that hull is (r + s (R − r)) / √(1 − ((R − r)/d)²) wide to each side, d from c to S; there the rays pass between the
 * heights z + s (low − z) and z + s (high − z).
 */
export class StandingBetween {
  /** Indices of pieces to look at; the first `pieceCount` hold. */
  readonly pieces: Int32Array;
  pieceCount: number;
  readonly walls: Int32Array;
  wallCount: number;
  private readonly block: Int32Array;
  private blockCount = 0;
  /** Circle round each piece, metres. */
  private readonly x: Float64Array;
  private readonly y: Float64Array;
  private readonly radius: Float64Array;

  /** All of the scene, until a block narrows it. */
  constructor(private readonly scene: PreparedScene) {
    const { pieces, walls } = scene;
    this.pieces = Int32Array.from({ length: pieces.count }, (_, k) => k);
    this.walls = Int32Array.from({ length: walls.count }, (_, k) => k);
    this.block = new Int32Array(pieces.count);
    this.pieceCount = pieces.count;
    this.wallCount = walls.count;
    this.x = new Float64Array(pieces.count);
    this.y = new Float64Array(pieces.count);
    this.radius = new Float64Array(pieces.count);
    for (let k = 0; k < pieces.count; k++) {
      const first = pieces.start[k];
      const end = pieces.start[k + 1];
      let [x, y] = [0, 0];
      for (let i = first; i < end; i++) {
        x += pieces.x[i] / (end - first);
        y += pieces.y[i] / (end - first);
      }
      this.x[k] = x;
      this.y[k] = y;
      for (let i = first; i < end; i++) {
        this.radius[k] = Math.max(this.radius[k], Math.hypot(pieces.x[i] - x, pieces.y[i] - y));
      }
    }
  }

  /** Narrows the lists to receivers within `radius` of (x, y) at heights zLow to zHigh. */
  narrow(x: number, y: number, radius: number, zLow: number, zHigh: number, lamp: LampCylinder): void {
    const { pieces, walls } = this.scene;
    this.blockCount = 0;
    for (let k = 0; k < pieces.count; k++) {
      if (this.canStand(k, x, y, radius, zLow, zHigh, lamp)) this.block[this.blockCount++] = k;
    }
    this.pieces.set(this.block.subarray(0, this.blockCount));
    this.pieceCount = this.blockCount;
    const dx = lamp.x - x;
    const dy = lamp.y - y;
    this.wallCount = 0;
    for (let k = 0; k < walls.count; k++) {
      // Distances to the wall's line: when both circles lie wholly on one side, no ray crosses it.
      const here = walls.uy[k] * (x - walls.ax[k]) - walls.ux[k] * (y - walls.ay[k]);
      const there = here + walls.uy[k] * dx - walls.ux[k] * dy;
      const apart =
        here > 0
          ? Math.min(here - radius, there - lamp.radius)
          : Math.min(-here - radius, -there - lamp.radius);
      if (apart <= 0) this.walls[this.wallCount++] = k;
    }
  }

  /** Narrows the block's pieces once more, to one receiver in it. */
  focus(x: number, y: number, z: number, lamp: LampCylinder): void {
    // One piece is looked at as quickly as it is ruled out.
    if (this.blockCount <= 1) return;
    this.pieceCount = 0;
    for (let i = 0; i < this.blockCount; i++) {
      const k = this.block[i];
      if (this.canStand(k, x, y, 0, z, z, lamp) && !this.apart(k, x, y, lamp))
        this.pieces[this.pieceCount++] = k;
    }
  }

  /** Is there a side of piece k with the receiver and all the lamps outside it? Then no ray between them meets the piece. */
  private apart(k: number, x: number, y: number, lamp: LampCylinder): boolean {
    const { start, nx, ny, c } = this.scene.pieces;
    for (let i = start[k]; i < start[k + 1]; i++) {
      if (nx[i] * x + ny[i] * y > c[i] && nx[i] * lamp.x + ny[i] * lamp.y - c[i] > lamp.radius) return true;
    }
    return false;
  }

  /** A piece that hid everything is looked at first from now on: it most likely hides the neighbours' light too. */
  lookFirstAt(index: number): void {
    if (index === 0) return;
    const k = this.pieces[index];
    this.pieces[index] = this.pieces[0];
    this.pieces[0] = k;
    const at = this.block.indexOf(k);
    if (at > 0) {
      this.block[at] = this.block[0];
      this.block[0] = k;
    }
  }

  private canStand(
    k: number,
    x: number,
    y: number,
    radius: number,
    zLow: number,
    zHigh: number,
    lamp: LampCylinder,
  ): boolean {
    const dx = lamp.x - x;
    const dy = lamp.y - y;
    const px = this.x[k] - x;
    const py = this.y[k] - y;
    const square = dx * dx + dy * dy;
    const flare = lamp.radius - radius;
    // Circles one in the other: everything near may be between.
    if (square <= 4 * flare * flare) {
      const reach = Math.max(radius, lamp.radius) + this.radius[k] + Math.sqrt(square);
      return px * px + py * py <= reach * reach;
    }
    const length = Math.sqrt(square);
    const along = (px * dx + py * dy) / length;
    const across = Math.abs(px * dy - py * dx) / length;
    // Not flatter than twice as wide: √(1 − ((R − r)/d)²) ≥ √¾ here, and 1.1548 is its inverse and a hair.
    const widest = 1.1548;
    const from = along - this.radius[k] * widest;
    const to = along + this.radius[k] * widest;
    if (to < -radius || from > length + lamp.radius) return false;
    const half = widest * (radius + flare * clamp((flare > 0 ? to : from) / length));
    if (across > half + this.radius[k]) return false;
    // Shares of the way at which a ray can be beside the piece, whichever ends it has.
    const s0 = clamp((from - radius) / (length + flare));
    const s1 = clamp((to + radius) / (length - flare));
    const up = lamp.high - zHigh;
    const down = lamp.low - zLow;
    const { base, top } = this.scene.pieces;
    return top[k] > zLow + down * (down > 0 ? s0 : s1) && base[k] < zHigh + up * (up > 0 ? s1 : s0);
  }
}

export function lampCylinder(tubes: readonly PlacedTube[]): LampCylinder {
  const ends = tubes.flatMap(({ ax, ay, az, ux, uy, uz, length }) => [
    [ax, ay, az],
    [ax + ux * length, ay + uy * length, az + uz * length],
  ]);
  const middle = (axis: 0 | 1) =>
    (Math.min(...ends.map((end) => end[axis])) + Math.max(...ends.map((end) => end[axis]))) / 2;
  const [x, y] = [middle(0), middle(1)];
  return {
    x,
    y,
    radius: Math.max(...ends.map((end) => Math.hypot(end[0] - x, end[1] - y))),
    low: Math.min(...ends.map((end) => end[2])),
    high: Math.max(...ends.map((end) => end[2])),
  };
}
