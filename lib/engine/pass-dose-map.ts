import { legDoseAt, passLegs } from './pass-dose';
import type { PreparedScene } from './prepare-scene';
import { createTracer } from './tracer';
import type { GridSurface, Pass, Vector3 } from './types';

const UP: Vector3 = [0, 0, 1];

/** Dose (J/m²) of a pass on every cell of a surface, facing up; 0 where the mask is 0. Same figures as `passDoseAt`. */
export function passDoseMap(
  prepared: PreparedScene,
  pass: Pass,
  surface: GridSurface,
  out: Float32Array = new Float32Array(surface.columns * surface.rows),
): Float32Array {
  const { columns, step, originX, originY, mask, z } = surface;
  const tracer = createTracer(prepared);
  const legs = passLegs(pass);
  out.fill(0);
  for (let cell = 0; cell < mask.length; cell++) {
    if (mask[cell] === 0) continue;
    const p: Vector3 = [
      originX + ((cell % columns) + 0.5) * step,
      originY + (Math.floor(cell / columns) + 0.5) * step,
      typeof z === 'number' ? z : z[cell],
    ];
    for (const leg of legs) out[cell] += legDoseAt(tracer, leg, { p, mode: 'normal', n: UP });
  }
  return out;
}
