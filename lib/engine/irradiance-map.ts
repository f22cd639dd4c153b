import { addUprightTube } from './map-upright';
import { type PlacedTube, placeTubes } from './placed-tube';
import type { PreparedScene } from './prepare-scene';
import { lampCylinder } from './standing-between';
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
  const tubes = placeTubes(placement);
  for (const tube of tubes) if (tube.upright) addUprightTube(tracer, tube, surface, out);
  const leaning = tubes.filter(({ upright }) => !upright);
  if (leaning.length > 0) addLeaningTubes(tracer, leaning, surface, out);
  return out;
}

/** Cells along the side of a block; a block's cells and the emitter share what can stand between them. */
const BLOCK = 8;

function addLeaningTubes(
  tracer: Tracer,
  tubes: readonly PlacedTube[],
  surface: GridSurface,
  out: Float32Array,
): void {
  const { columns, rows, step, originX, originY, mask, z } = surface;
  const lamp = lampCylinder(tubes);
  for (let row = 0; row < rows; row += BLOCK) {
    const endRow = Math.min(rows, row + BLOCK);
    for (let column = 0; column < columns; column += BLOCK) {
      const endColumn = Math.min(columns, column + BLOCK);
      const heights = heightsIn(surface, column, endColumn, row, endRow);
      if (!heights) continue;
      tracer.between.narrow(
        originX + ((column + endColumn) / 2) * step,
        originY + ((row + endRow) / 2) * step,
        BLOCK_RADIUS * step,
        heights.low,
        heights.high,
        lamp,
      );
      for (let j = row; j < endRow; j++) {
        const y = originY + (j + 0.5) * step;
        for (let i = column, cell = j * columns + column; i < endColumn; i++, cell++) {
          if (mask[cell] === 0) continue;
          const height = typeof z === 'number' ? z : z[cell];
          const x = originX + (i + 0.5) * step;
          tracer.between.focus(x, y, height, lamp);
          let sum = 0;
          for (let t = 0; t < tubes.length; t++) sum += traceCell(tracer, tubes[t], x, y, height);
          out[cell] += sum;
        }
      }
    }
  }
}

/** From a block's middle to its farthest cell centre and a hair beyond, in steps. */
const BLOCK_RADIUS = (BLOCK / 2) * Math.SQRT2;

/** Least and greatest height of a block's cells that count; `null` when none does. */
function heightsIn(
  { columns, mask, z }: GridSurface,
  column: number,
  endColumn: number,
  row: number,
  endRow: number,
): { low: number; high: number } | null {
  let [low, high] = [Infinity, -Infinity];
  for (let j = row; j < endRow; j++) {
    for (let cell = j * columns + column; cell < j * columns + endColumn; cell++) {
      if (mask[cell] === 0) continue;
      const height = typeof z === 'number' ? z : z[cell];
      if (height < low) low = height;
      if (height > high) high = height;
    }
  }
  return low <= high ? { low, high } : null;
}
