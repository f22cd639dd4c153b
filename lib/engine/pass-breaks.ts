import type { PlacedTube } from './placed-tube';
import type { Pieces, PreparedScene, Walls } from './prepare-scene';

/**
 * Where along one leg the irradiance at p can jump or bend, as fractions of the leg.
 *
 * The tube keeps its direction on a leg and its start moves as a + τ·v, so each meeting below is linear in τ:
 * an upright edge and a tube's end (or, for an upright tube, its whole plan position) in line with p; a level edge and a
 * tube's end in line with p; a corner and any point of a leaning tube in line with p; the emitter turning its back.
 */
export interface Leg {
  readonly tube: PlacedTube;
  readonly vx: number;
  readonly vy: number;
  readonly px: number;
  readonly py: number;
  readonly pz: number;
}

export function legBreaks({ pieces, walls }: PreparedScene, leg: Leg): number[] {
  const breaks: number[] = [];
  nearestApproach(leg, breaks);
  if (leg.tube.backed) turnOfBack(leg, breaks);
  for (let k = 0; k < pieces.count; k++) pieceBreaks(pieces, k, leg, breaks);
  for (let k = 0; k < walls.count; k++) wallBreaks(walls, k, leg, breaks);
  return breaks;
}

/** Not a kink, but the peak: with an end there, both halves are easy. */
function nearestApproach({ tube, vx, vy, px, py }: Leg, breaks: number[]): void {
  const square = vx * vx + vy * vy;
  if (square > 0) breaks.push(((px - tube.ax) * vx + (py - tube.ay) * vy) / square);
}

/** (p − a − τ v)·m = 0 */
function turnOfBack({ tube, vx, vy, px, py, pz }: Leg, breaks: number[]): void {
  const rate = vx * tube.mx + vy * tube.my;
  if (rate === 0) return;
  breaks.push(((px - tube.ax) * tube.mx + (py - tube.ay) * tube.my + (pz - tube.az) * tube.mz) / rate);
}

function pieceBreaks(pieces: Pieces, k: number, leg: Leg, breaks: number[]): void {
  const first = pieces.start[k];
  const end = pieces.start[k + 1];
  for (let i = first, j = end - 1; i < end; j = i++) {
    const { x, y } = pieces;
    uprightEdge(leg, x[i], y[i], pieces.base[k], pieces.top[k], breaks);
    levelEdge(leg, x[j], y[j], x[i], y[i], pieces.base[k], breaks);
    levelEdge(leg, x[j], y[j], x[i], y[i], pieces.top[k], breaks);
    if (leg.tube.upright) continue;
    corner(leg, x[i], y[i], pieces.base[k], breaks);
    corner(leg, x[i], y[i], pieces.top[k], breaks);
  }
}

function wallBreaks(walls: Walls, k: number, leg: Leg, breaks: number[]): void {
  const at = (along: number): [number, number] => [
    walls.ax[k] + along * walls.ux[k],
    walls.ay[k] + along * walls.uy[k],
  ];
  for (const along of [0, walls.length[k]]) uprightEdge(leg, ...at(along), -Infinity, Infinity, breaks);
  for (let i = walls.start[k]; i < walls.start[k + 1]; i++) {
    const sill = walls.sill[i];
    const head = walls.head[i];
    const jambs = [at(walls.from[i]), at(walls.to[i])] as const;
    for (const [x, y] of jambs) {
      uprightEdge(leg, x, y, sill, head, breaks);
      if (leg.tube.upright) continue;
      corner(leg, x, y, sill, breaks);
      corner(leg, x, y, head, breaks);
    }
    levelEdge(leg, ...jambs[0], ...jambs[1], sill, breaks);
    levelEdge(leg, ...jambs[0], ...jambs[1], head, breaks);
  }
}

/** An upright edge at (x, y) in line with p and an end of the tube: cross((c − p), (q + τ v − p)) = 0. */
function uprightEdge(leg: Leg, x: number, y: number, low: number, high: number, breaks: number[]): void {
  const { tube, vx, vy, px, py, pz } = leg;
  const cx = x - px;
  const cy = y - py;
  const rate = cx * vy - cy * vx;
  if (rate === 0) return;
  for (let end = 0; end < (tube.upright ? 1 : 2); end++) {
    const qx = tube.ax + end * tube.ux * tube.length - px;
    const qy = tube.ay + end * tube.uy * tube.length - py;
    const tau = -(cx * qy - cy * qx) / rate;
    if (tau <= 0 || tau >= 1) continue;
    const dx = qx + tau * vx;
    const dy = qy + tau * vy;
    const s = (cx * cx + cy * cy) / (cx * dx + cy * dy);
    if (!(s > 0 && s < 1)) continue;
    if (!tube.upright) {
      const z = pz + s * (tube.az + end * tube.uz * tube.length - pz);
      if (z < low || z > high) continue;
    }
    breaks.push(tau);
  }
}

/** A level edge at height z in line with p and an end of the tube: the ray meets that height at a fixed fraction. */
function levelEdge(
  leg: Leg,
  x0: number,
  y0: number,
  x1: number,
  y1: number,
  z: number,
  breaks: number[],
): void {
  const { tube, vx, vy, px, py, pz } = leg;
  const ex = x1 - x0;
  const ey = y1 - y0;
  const rate = ex * vy - ey * vx;
  if (rate === 0) return;
  for (let end = 0; end < 2; end++) {
    const rise = tube.az + end * tube.uz * tube.length - pz;
    const s = (z - pz) / rise;
    if (!(s > 0 && s < 1)) continue;
    const qx = px + s * (tube.ax + end * tube.ux * tube.length - px);
    const qy = py + s * (tube.ay + end * tube.uy * tube.length - py);
    const tau = -(ex * (qy - y0) - ey * (qx - x0)) / (s * rate);
    if (tau <= 0 || tau >= 1) continue;
    const along = ((qx + tau * s * vx - x0) * ex + (qy + tau * s * vy - y0) * ey) / (ex * ex + ey * ey);
    if (along > -1e-6 && along < 1 + 1e-6) breaks.push(tau);
  }
}

/** A corner in line with p and some point of a leaning tube: ((V − p) × u)·(a + τ v − p) = 0. */
function corner(leg: Leg, x: number, y: number, z: number, breaks: number[]): void {
  const { tube, vx, vy, px, py, pz } = leg;
  const cx = x - px;
  const cy = y - py;
  const cz = z - pz;
  const nx = cy * tube.uz - cz * tube.uy;
  const ny = cz * tube.ux - cx * tube.uz;
  const nz = cx * tube.uy - cy * tube.ux;
  const rate = nx * vx + ny * vy;
  if (rate === 0) return;
  const tau = -(nx * (tube.ax - px) + ny * (tube.ay - py) + nz * (tube.az - pz)) / rate;
  if (tau > 0 && tau < 1) breaks.push(tau);
}
