import { addUprightTube } from './map-upright';
import { type PlacedTube, placeTubes } from './placed-tube';
import type { PreparedScene } from './prepare-scene';
import { createTracer, type Tracer, traceCell } from './tracer';
import type { GridSurface, Placement } from './types';

/**
 * Irradiance (W/m²) of every cell of a surface, planar and facing up, from one emitter where it stands.
 * Returns `out` (columns·rows, row by row), or a new array; 0 where the mask is 0. A cell whose centre touches a
 * tube is read a millimetre beside it.
 */
export function irradianceMap(
  prepared: PreparedScene,
  placement: Placement,
  surface: GridSurface,
  out: Float32Array = new Float32Array(surface.columns * surface.rows),
): Float32Array {
  const tracer = createTracer(prepared);
  out.fill(0);
  for (const tube of placeTubes(placement)) {
    if (tube.upright) addUprightTube(tracer, tube, surface, out);
    else addTube(tracer, tube, surface, out);
  }
  return out;
}

function addTube(tracer: Tracer, tube: PlacedTube, surface: GridSurface, out: Float32Array): void {
  const { columns, rows, step, originX, originY, mask, z } = surface;
  for (let j = 0, cell = 0; j < rows; j++) {
    const y = originY + (j + 0.5) * step;
    for (let i = 0; i < columns; i++, cell++) {
      if (mask[cell] === 0) continue;
      const height = typeof z === 'number' ? z : z[cell];
      out[cell] += traceCell(tracer, tube, originX + (i + 0.5) * step, y, height);
    }
  }
}
