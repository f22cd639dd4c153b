import { MERGE } from '@/lib/geometry/degenerate';
import type { PlacedTube } from './placed-tube';
import type { Pieces } from './prepare-scene';
import type { Shadows } from './shadows';

/**
 * The stretch of an upright tube hidden by convex piece k from receiver p.
 *
 * In plan all rays run along one line; it lies inside the footprint for s in (sIn, sOut), s the fraction of the
 * way from p. The ray to tube height h passes height p.z + s (h − p.z), so a point of the solid at height z and
 * fraction s hides h = p.z + (z − p.z)/s: the stretch runs from the least such h (underside) to the greatest (top).
 * Answers whether it is the whole tube.
 */
export function shadeUpright(
  pieces: Pieces,
  k: number,
  tube: PlacedTube,
  px: number,
  py: number,
  pz: number,
  shadows: Shadows,
): boolean {
  const { start, nx, ny, c } = pieces;
  const dx = tube.ax - px;
  const dy = tube.ay - py;
  let sIn = 0;
  let sOut = 1;
  for (let i = start[k], end = start[k + 1]; i < end; i++) {
    const out = nx[i] * px + ny[i] * py - c[i];
    const rate = nx[i] * dx + ny[i] * dy;
    if (rate > 0) {
      if (out + sOut * rate > 0) sOut = -out / rate;
    } else if (rate < 0) {
      if (out + sIn * rate > 0) sIn = -out / rate;
    } else if (out > 0) return false;
    if (sIn >= sOut) return false;
  }
  const base = pieces.base[k] - pz;
  const top = pieces.top[k] - pz;
  const low = base >= 0 ? base / sOut : sIn > 0 ? base / sIn : -Infinity;
  const high = top <= 0 ? top / sOut : sIn > 0 ? top / sIn : Infinity;
  const shift = pz - tube.az;
  const lo = (shift + low) / tube.length;
  const hi = (shift + high) / tube.length;
  if (lo < 1 && hi > 0) shadows.hide(lo, hi);
  return lo <= 0 && hi >= 1;
}

/** Scratch for clipping: a triangle cut by n faces has at most n + 3 corners. */
export class ClipBuffer {
  readonly s: Float64Array;
  readonly w: Float64Array;
  readonly s2: Float64Array;
  readonly w2: Float64Array;
  /** g0, gs, gw of every face that cuts. */
  readonly faces: Float64Array;
  constructor(mostSides: number) {
    const corners = mostSides + 5;
    this.s = new Float64Array(corners);
    this.w = new Float64Array(corners);
    this.s2 = new Float64Array(corners);
    this.w2 = new Float64Array(corners);
    this.faces = new Float64Array(3 * (mostSides + 2));
  }
}

/**
 * The stretch of any tube hidden by convex piece k from receiver p.
 *
 * A point of the plane through p and the tube is p + s (a − p) + w (b − a), where w = s·t on the ray to the tube's
 * fraction t. Every face of the solid is linear in (s, w), so its slice is the triangle of all rays clipped by the
 * faces; t = w/s is projective, so over that convex slice it is least and greatest at corners.
 * Answers whether all of t0..t1 is hidden by this piece alone.
 */
export function shadeGeneral(
  pieces: Pieces,
  k: number,
  tube: PlacedTube,
  px: number,
  py: number,
  pz: number,
  t0: number,
  t1: number,
  shadows: Shadows,
  buffer: ClipBuffer,
): boolean {
  const { start, nx, ny, c } = pieces;
  const dx = tube.ax - px;
  const dy = tube.ay - py;
  const dz = tube.az - pz;
  const bx = tube.ux * tube.length;
  const by = tube.uy * tube.length;
  const bz = tube.uz * tube.length;

  const first = start[k];
  const sides = start[k + 1] - first;
  const { faces } = buffer;
  // Faces that cut the triangle; one that has all of it outside means that nothing is hidden. Underside and top come first:
  // most pieces near the way are passed over or under.
  let cutting = 0;
  for (let i = sides + 1; i >= 0; i--) {
    // g0 + gs·s + gw·w ≤ 0 keeps the inside of this face.
    let g0: number;
    let gs: number;
    let gw: number;
    if (i < sides) {
      const n = nx[first + i];
      const m = ny[first + i];
      g0 = n * px + m * py - c[first + i];
      gs = n * dx + m * dy;
      gw = n * bx + m * by;
    } else if (i === sides) {
      g0 = pz - pieces.top[k];
      gs = dz;
      gw = bz;
    } else {
      g0 = pieces.base[k] - pz;
      gs = -dz;
      gw = -bz;
    }
    const q0 = g0 + gs + gw * t0;
    const q1 = g0 + gs + gw * t1;
    if (g0 > 0) {
      if (q0 > 0 && q1 > 0) return false;
    } else if (q0 <= 0 && q1 <= 0) continue;
    faces[cutting] = g0;
    faces[cutting + 1] = gs;
    faces[cutting + 2] = gw;
    cutting += 3;
  }

  if (endsHidden(faces, cutting, t0, t1)) {
    shadows.hide(t0, t1);
    return true;
  }

  let { s, w, s2, w2 } = buffer;
  s[0] = 0;
  w[0] = 0;
  s[1] = 1;
  w[1] = t0;
  s[2] = 1;
  w[2] = t1;
  let corners = 3;
  for (let f = 0; f < cutting; f += 3) {
    const g0 = faces[f];
    const gs = faces[f + 1];
    const gw = faces[f + 2];
    let kept = 0;
    let ls = s[corners - 1];
    let lw = w[corners - 1];
    let lg = g0 + gs * ls + gw * lw;
    for (let j = 0; j < corners; j++) {
      const cs = s[j];
      const cw = w[j];
      const g = g0 + gs * cs + gw * cw;
      if (g > 0 !== lg > 0) {
        const share = lg / (lg - g);
        s2[kept] = ls + share * (cs - ls);
        w2[kept++] = lw + share * (cw - lw);
      }
      if (g <= 0) {
        s2[kept] = cs;
        w2[kept++] = cw;
      }
      ls = cs;
      lw = cw;
      lg = g;
    }
    if (kept < 3) return false;
    corners = kept;
    const usedS = s;
    const usedW = w;
    s = s2;
    w = w2;
    s2 = usedS;
    w2 = usedW;
  }
  let lo = Infinity;
  let hi = -Infinity;
  for (let j = 0; j < corners; j++) {
    if (s[j] <= 0) continue;
    const t = w[j] / s[j];
    if (t < lo) lo = t;
    if (t > hi) hi = t;
  }
  if (lo < hi) shadows.hide(lo, hi);
  return lo <= t0 + MERGE && hi >= t1 - MERGE;
}

/** A ray must run this share of its way through the solid to count here; closer calls are left to the clipping. */
const CLEARLY = 1e-6;

/**
 * Are the rays to t0 and to t1 both stopped, clearly? Then so is every ray between them: the slice is convex, and holds
 * the line from a point of the one ray to a point of the other, which they all cross.
 */
function endsHidden(faces: Float64Array, cutting: number, t0: number, t1: number): boolean {
  let in0 = 0;
  let out0 = 1;
  let in1 = 0;
  let out1 = 1;
  for (let f = 0; f < cutting; f += 3) {
    const g = faces[f];
    const q0 = g + faces[f + 1] + faces[f + 2] * t0;
    const q1 = g + faces[f + 1] + faces[f + 2] * t1;
    if (g > 0) {
      // Outside at p: the ray enters here, or never.
      if (q0 >= 0 || q1 >= 0) return false;
      const enter0 = g / (g - q0);
      const enter1 = g / (g - q1);
      if (enter0 > in0) in0 = enter0;
      if (enter1 > in1) in1 = enter1;
    } else {
      if (q0 > 0) {
        const leave = g / (g - q0);
        if (leave < out0) out0 = leave;
      }
      if (q1 > 0) {
        const leave = g / (g - q1);
        if (leave < out1) out1 = leave;
      }
    }
  }
  return out0 - in0 > CLEARLY && out1 - in1 > CLEARLY;
}
