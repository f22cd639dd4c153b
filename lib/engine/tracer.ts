import { EDGE, SKIN } from '@/lib/geometry/degenerate';
import { planarStretch, sphericalStretch } from './line-source';
import type { PlacedTube } from './placed-tube';
import type { PreparedScene } from './prepare-scene';
import { ClipBuffer, shadeGeneral, shadeUpright } from './shadow-of-piece';
import { shadeByWall } from './shadow-of-wall';
import { Shadows } from './shadows';
import { StandingBetween } from './standing-between';

/** Everything one thread needs to trace receivers in a scene, allocated once. */
export interface Tracer {
  readonly scene: PreparedScene;
  readonly shadows: Shadows;
  readonly buffer: ClipBuffer;
  /** What is looked at: everything, until a block of receivers narrows it. */
  readonly between: StandingBetween;
}

export function createTracer(scene: PreparedScene): Tracer {
  const { pieces, walls } = scene;
  let mostSides = 0;
  for (let k = 0; k < pieces.count; k++) {
    mostSides = Math.max(mostSides, pieces.start[k + 1] - pieces.start[k]);
  }
  const openings = walls.start[walls.count];
  return {
    scene,
    // A piece hides one stretch; a wall one more than it has openings.
    shadows: new Shadows(pieces.count + walls.count + openings + 1),
    buffer: new ClipBuffer(mostSides),
    between: new StandingBetween(scene),
  };
}

/** Thrown past the hot loop as a value, because a map must survive a cell that touches a tube. */
export const ON_TUBE = -1;

/**
 * Irradiance (W/m²) at p from one tube: planar on the unit normal n, or the fluence rate when `spherical`.
 * `ON_TUBE` when p touches the tube.
 */
export function traceTube(
  tracer: Tracer,
  tube: PlacedTube,
  px: number,
  py: number,
  pz: number,
  spherical: boolean,
  nx: number,
  ny: number,
  nz: number,
): number {
  const rx = px - tube.ax;
  const ry = py - tube.ay;
  const rz = pz - tube.az;
  const along = rx * tube.ux + ry * tube.uy + rz * tube.uz;
  const wx = rx - along * tube.ux;
  const wy = ry - along * tube.uy;
  const wz = rz - along * tube.uz;
  const D = Math.sqrt(wx * wx + wy * wy + wz * wz);
  if (D <= EDGE) return along >= -EDGE && along <= tube.length + EDGE ? ON_TUBE : 0;
  if (tube.backed && rx * tube.mx + ry * tube.my + rz * tube.mz <= SKIN) return 0;

  const A = -(nx * wx + ny * wy + nz * wz);
  const B = nx * tube.ux + ny * tube.uy + nz * tube.uz;
  let l0 = -along;
  let l1 = tube.length - along;
  if (!spherical) {
    // Only the stretch in front of the receiver's face counts: A + B l ≥ 0.
    const front0 = A + B * l0;
    const front1 = A + B * l1;
    if (front0 <= SKIN && front1 <= SKIN) return 0;
    if (front0 < 0) l0 = -A / B;
    else if (front1 < 0) l1 = -A / B;
  }
  const t0 = (l0 + along) / tube.length;
  const t1 = (l1 + along) / tube.length;
  if (traceShadows(tracer, tube, px, py, pz, t0, t1)) return 0;

  const { shadows } = tracer;
  let sum = 0;
  for (let t = t0; t < t1; ) {
    const end = shadows.nextVisible(t, t1);
    t = shadows.visibleFrom;
    while (t < end) {
      const stop = shadows.glassCount === 0 ? end : shadows.nextGlassEdge(t, end);
      const tau = shadows.glassCount === 0 ? 1 : shadows.transmittanceAt((t + stop) / 2);
      const from = t === t0 ? l0 : t * tube.length - along;
      const to = stop === t1 ? l1 : stop * tube.length - along;
      sum += spherical
        ? tau * sphericalStretch(tube.strength, D, from, to)
        : tau * planarStretch(tube.strength, A, B, D, from, to);
      t = stop;
    }
  }
  return sum;
}

/** How far beside a tube a cell that touches it is read (m): a tube is about this thick, and a map must not fail on it. */
export const BESIDE = 1e-3;

/** Irradiance (W/m²) of a map cell, facing up. */
export function traceCell(tracer: Tracer, tube: PlacedTube, x: number, y: number, z: number): number {
  const value = traceTube(tracer, tube, x, y, z, false, 0, 0, 1);
  return value === ON_TUBE ? traceTube(tracer, tube, x + BESIDE, y + BESIDE, z, false, 0, 0, 1) : value;
}

/**
 * Fills the tracer's shadows with all that hides or dims the tube between the fractions t0 and t1. Answers true, and
 * leaves the rest unseen, as soon as one piece hides all of it.
 */
export function traceShadows(
  { scene, shadows, buffer, between }: Tracer,
  tube: PlacedTube,
  px: number,
  py: number,
  pz: number,
  t0: number,
  t1: number,
): boolean {
  shadows.clear();
  for (let i = 0; i < between.wallCount; i++) {
    shadeByWall(scene.walls, between.walls[i], tube, px, py, pz, t0, t1, shadows);
  }
  for (let i = 0; i < between.pieceCount; i++) {
    const k = between.pieces[i];
    const dark = tube.upright
      ? shadeUpright(scene.pieces, k, tube, px, py, pz, shadows)
      : shadeGeneral(scene.pieces, k, tube, px, py, pz, t0, t1, shadows, buffer);
    if (dark) {
      between.lookFirstAt(i);
      return true;
    }
  }
  return false;
}
