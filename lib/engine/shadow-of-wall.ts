import { SKIN } from '@/lib/geometry/degenerate';
import type { PlacedTube } from './placed-tube';
import type { Walls } from './prepare-scene';
import type { Shadows } from './shadows';

/** A stretch lo..hi of the tube that linear conditions cut down, one after the other. */
class Stretch {
  lo = 0;
  hi = 1;
  set(lo: number, hi: number): void {
    this.lo = lo;
    this.hi = hi;
  }
  /** Keeps the part where c0 + c1·t ≥ 0. */
  keep(c0: number, c1: number): void {
    if (c1 > 0) this.lo = Math.max(this.lo, -c0 / c1);
    else if (c1 < 0) this.hi = Math.min(this.hi, -c0 / c1);
    else if (c0 < 0) this.hi = -Infinity;
  }
}

const wall = new Stretch();
const hole = new Stretch();

/**
 * Adds what wall k hides of a tube from receiver p, between the fractions t0 and t1.
 *
 * With g the distance to the wall's plane, the ray to fraction t meets it at s(t) = −g(p)/(gs + gw t). A quantity
 * linear in space (way along the wall, height) is there v0 + s(t)·(vs + vw t), so "at least U" is, times gs + gw t,
 * the linear condition (v0 − U)(gs + gw t) − g(p)(vs + vw t) against 0: every edge of an opening is one cut.
 */
export function shadeByWall(
  walls: Walls,
  k: number,
  tube: PlacedTube,
  px: number,
  py: number,
  pz: number,
  t0: number,
  t1: number,
  shadows: Shadows,
): void {
  const ux = walls.ux[k];
  const uy = walls.uy[k];
  const rx = px - walls.ax[k];
  const ry = py - walls.ay[k];
  const g0 = uy * rx - ux * ry;
  if (Math.abs(g0) <= SKIN) return;
  const dx = tube.ax - px;
  const dy = tube.ay - py;
  const bx = tube.ux * tube.length;
  const by = tube.uy * tube.length;
  const gs = uy * dx - ux * dy;
  const gw = uy * bx - ux * by;
  const side = g0 > 0 ? 1 : -1;

  wall.set(t0, t1);
  wall.keep(-side * (g0 + gs) - SKIN, -side * gw);
  if (wall.lo >= wall.hi) return;

  const v0 = ux * rx + uy * ry;
  const vs = ux * dx + uy * dy;
  const vw = ux * bx + uy * by;
  keepFrom(wall, -SKIN, v0, vs, vw, g0, gs, gw, side);
  keepUpTo(wall, walls.length[k] + SKIN, v0, vs, vw, g0, gs, gw, side);
  if (wall.lo >= wall.hi) return;

  const zs = tube.az - pz;
  const zw = tube.uz * tube.length;
  let free = wall.lo;
  // Openings are few and their stretches apart; each round takes the first that starts at or after the last.
  for (;;) {
    let next = -1;
    let nextLo = Infinity;
    let nextHi = Infinity;
    for (let i = walls.start[k]; i < walls.start[k + 1]; i++) {
      if (walls.transmittance[i] === 0) continue;
      hole.set(free, wall.hi);
      keepFrom(hole, walls.from[i], v0, vs, vw, g0, gs, gw, side);
      keepUpTo(hole, walls.to[i], v0, vs, vw, g0, gs, gw, side);
      keepFrom(hole, walls.sill[i], pz, zs, zw, g0, gs, gw, side);
      keepUpTo(hole, walls.head[i], pz, zs, zw, g0, gs, gw, side);
      if (hole.lo < hole.hi && hole.lo < nextLo) {
        next = i;
        nextLo = hole.lo;
        nextHi = hole.hi;
      }
    }
    if (next < 0) break;
    if (nextLo > free) shadows.hide(free, nextLo);
    if (walls.transmittance[next] < 1) shadows.dim(nextLo, nextHi, walls.transmittance[next]);
    free = nextHi;
  }
  if (free < wall.hi) shadows.hide(free, wall.hi);
}

function keepFrom(
  stretch: Stretch,
  limit: number,
  v0: number,
  vs: number,
  vw: number,
  g0: number,
  gs: number,
  gw: number,
  side: number,
): void {
  const v = v0 - limit;
  stretch.keep(-side * (v * gs - g0 * vs), -side * (v * gw - g0 * vw));
}

function keepUpTo(
  stretch: Stretch,
  limit: number,
  v0: number,
  vs: number,
  vw: number,
  g0: number,
  gs: number,
  gw: number,
  side: number,
): void {
  const v = v0 - limit;
  stretch.keep(side * (v * gs - g0 * vs), side * (v * gw - g0 * vw));
}
