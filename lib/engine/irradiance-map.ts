import { placeTubes } from './placed-tube';
import type { PreparedScene } from './prepare-scene';
import { createTracer, ON_TUBE, traceTube } from './tracer';
import type { GridSurface, Placement } from './types';

/**
 * Irradiance (W/m²) of every cell of a surface, planar and facing up, from one emitter where it stands.
 * Returns `out` (columns·rows, row by row), or a new array; 0 where the mask is 0.
 */
export function irradianceMap(
  prepared: PreparedScene,
  placement: Placement,
  surface: GridSurface,
  out: Float32Array = new Float32Array(surface.columns * surface.rows),
): Float32Array {
  const { columns, rows, step, originX, originY, mask, z } = surface;
  const tracer = createTracer(prepared);
  const tubes = placeTubes(placement);
  out.fill(0);
  for (let j = 0, cell = 0; j < rows; j++) {
    const y = originY + (j + 0.5) * step;
    for (let i = 0; i < columns; i++, cell++) {
      if (mask[cell] === 0) continue;
      const x = originX + (i + 0.5) * step;
      const height = typeof z === 'number' ? z : z[cell];
      for (const tube of tubes) {
        const value = traceTube(tracer, tube, x, y, height, false, 0, 0, 1);
        if (value !== ON_TUBE) out[cell] += value;
      }
    }
  }
  return out;
}
