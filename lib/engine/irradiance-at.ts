import { EDGE } from '@/lib/geometry/degenerate';
import { UndefinedReadingError } from './errors';
import { type PlacedTube, placeTubes } from './placed-tube';
import type { PreparedScene } from './prepare-scene';
import { createTracer, ON_TUBE, type Tracer, traceTube } from './tracer';
import type { Placement, ReadingMode, Vector3 } from './types';

/** A spot to be read: position in metres, what the reading means, and for `normal` a unit direction `n`. */
export interface Receiver {
  readonly p: Vector3;
  readonly mode: ReadingMode;
  readonly n?: Vector3;
}

/**
 * Irradiance (W/m²) at a receiver from one emitter where it stands.
 * Throws `UndefinedReadingError` on a tube, and for `facing` straight under or over the stop.
 */
export function irradianceAt(prepared: PreparedScene, placement: Placement, receiver: Receiver): number {
  return readTubes(createTracer(prepared), placeTubes(placement), placement.x, placement.y, receiver);
}

/** The same for tubes already placed, with the emitter's mark at (x, y): for many receivers or moments. */
export function readTubes(
  tracer: Tracer,
  tubes: readonly PlacedTube[],
  x: number,
  y: number,
  receiver: Receiver,
): number {
  const [px, py, pz] = receiver.p;
  const [nx, ny, nz] = directionOf(receiver, x, y);
  const spherical = receiver.mode === 'spherical';
  let sum = 0;
  for (const tube of tubes) {
    const value = traceTube(tracer, tube, px, py, pz, spherical, nx, ny, nz);
    if (value === ON_TUBE) throw new UndefinedReadingError('on a tube', receiver.p);
    sum += value;
  }
  return sum;
}

const UP: Vector3 = [0, 0, 1];

function directionOf({ p, mode, n }: Receiver, x: number, y: number): Vector3 {
  if (mode === 'spherical') return UP;
  if (mode === 'normal') {
    if (!n) throw new Error('A normal reading needs the direction it faces.');
    return n;
  }
  const dx = x - p[0];
  const dy = y - p[1];
  const distance = Math.hypot(dx, dy);
  if (distance <= EDGE) throw new UndefinedReadingError('facing straight under a stop', p);
  return [dx / distance, dy / distance, 0];
}
