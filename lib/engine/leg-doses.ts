import { convexHull } from '@/lib/geometry/convex-hull';
import type { Point } from '@/lib/geometry/point';
import { UndefinedReadingError } from './errors';
import { legDoseAt, type PassLeg } from './pass-dose';
import type { PreparedScene } from './prepare-scene';
import { sceneWithin } from './sub-scene';
import { BESIDE, createTracer, type Tracer } from './tracer';
import type { Vector3 } from './types';

/** Share of a leg's dose a spot may be off by: a fifth of the 0.1 % that is promised. */
const RELATIVE = 2e-4;

/** A spot of a surface: where, and which way it looks (unit vector). */
export interface Spot {
  readonly p: Vector3;
  readonly n: Vector3;
}

/**
 * Dose (J/m²) of one leg on spots that lie close together, to 0.1 %. They share the few solids that can stand between
 * them and the leg: only what meets the hull of both can hide one from the other.
 */
export function legDoses(prepared: PreparedScene, leg: PassLeg, spots: readonly Spot[]): number[] {
  if (leg.seconds === 0 || spots.length === 0) return spots.map(() => 0);
  const ends = leg.tubes.flatMap(({ ax, ay, az, ux, uy, uz, length }): Vector3[] => [
    [ax, ay, az],
    [ax + ux * length, ay + uy * length, az + uz * length],
  ]);
  const heights = [...spots.map(({ p }) => p[2]), ...ends.map((p) => p[2])];
  const tracer = createTracer(
    sceneWithin(prepared, {
      hull: convexHull([
        // A millimetre all round for spots that are read beside a tube.
        ...spots.flatMap(({ p: [x, y] }): Point[] => [
          [x - BESIDE, y - BESIDE],
          [x + BESIDE, y + BESIDE],
        ]),
        ...ends.map(([x, y]): Point => [x, y]),
        ...ends.map(([x, y]): Point => [x + leg.vx, y + leg.vy]),
      ]),
      low: Math.min(...heights),
      high: Math.max(...heights),
    }),
  );
  return spots.map((spot) => spotDose(tracer, leg, spot));
}

/** A spot that a tube sweeps over is read beside it, as a still one is. */
function spotDose(tracer: Tracer, leg: PassLeg, { p: [x, y, z], n }: Spot): number {
  try {
    return legDoseAt(tracer, leg, { p: [x, y, z], mode: 'normal', n }, RELATIVE);
  } catch (error) {
    if (!(error instanceof UndefinedReadingError)) throw error;
    // Across the leg: along it the same tube would come by again.
    const length = Math.hypot(leg.vx, leg.vy);
    const beside: Vector3 = [x - (leg.vy / length) * BESIDE, y + (leg.vx / length) * BESIDE, z];
    return legDoseAt(tracer, leg, { p: beside, mode: 'normal', n }, RELATIVE);
  }
}
