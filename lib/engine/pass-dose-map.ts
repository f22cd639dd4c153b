import { convexHull } from '@/lib/geometry/convex-hull';
import type { Point } from '@/lib/geometry/point';
import { UndefinedReadingError } from './errors';
import { legDoseAt, type PassLeg, passLegs } from './pass-dose';
import type { PreparedScene } from './prepare-scene';
import { sceneWithin } from './sub-scene';
import { BESIDE, createTracer, type Tracer } from './tracer';
import type { GridSurface, Pass, Vector3 } from './types';

const UP: Vector3 = [0, 0, 1];

/** Share of a leg's dose a cell may be off by: a fifth of the 0.1 % that is promised. */
const RELATIVE = 2e-4;

/** Cells along the side of a block; its cells share the few solids that can stand between them and the leg. */
const BLOCK = 6;

/**
 * Dose (J/m²) of a pass on every cell of a surface, facing up, to 0.1 %; 0 where the mask is 0. Works block by block:
 * only what meets the hull of a block and a leg can hide the one from the other.
 */
export function passDoseMap(
  prepared: PreparedScene,
  pass: Pass,
  surface: GridSurface,
  out: Float32Array = new Float32Array(surface.columns * surface.rows),
): Float32Array {
  const { columns, rows } = surface;
  out.fill(0);
  for (const leg of passLegs(pass)) {
    if (leg.seconds === 0) continue;
    for (let row = 0; row < rows; row += BLOCK) {
      for (let column = 0; column < columns; column += BLOCK) {
        const toColumn = Math.min(columns, column + BLOCK);
        addBlock(prepared, leg, surface, [column, toColumn, row, Math.min(rows, row + BLOCK)], out);
      }
    }
  }
  return out;
}

function addBlock(
  prepared: PreparedScene,
  leg: PassLeg,
  surface: GridSurface,
  [fromColumn, toColumn, fromRow, toRow]: readonly [number, number, number, number],
  out: Float32Array,
): void {
  const { columns, step, originX, originY, mask, z } = surface;
  const centre = (cell: number): Vector3 => [
    originX + ((cell % columns) + 0.5) * step,
    originY + (Math.floor(cell / columns) + 0.5) * step,
    typeof z === 'number' ? z : z[cell],
  ];
  const cells: number[] = [];
  for (let row = fromRow; row < toRow; row++) {
    for (let cell = row * columns + fromColumn; cell < row * columns + toColumn; cell++) {
      if (mask[cell] !== 0) cells.push(cell);
    }
  }
  if (cells.length === 0) return;
  const spots = cells.map(centre);
  const ends = leg.tubes.flatMap(({ ax, ay, az, ux, uy, uz, length }): Vector3[] => [
    [ax, ay, az],
    [ax + ux * length, ay + uy * length, az + uz * length],
  ]);
  const heights = [...spots, ...ends].map((p) => p[2]);
  const plan = ([x, y]: Vector3): Point => [x, y];
  const tracer = createTracer(
    sceneWithin(prepared, {
      hull: convexHull([
        // A millimetre all round for cells that are read beside a tube.
        ...spots.flatMap(([x, y]): Point[] => [
          [x - BESIDE, y - BESIDE],
          [x + BESIDE, y + BESIDE],
        ]),
        ...ends.map(plan),
        ...ends.map(([x, y]): Point => [x + leg.vx, y + leg.vy]),
      ]),
      low: Math.min(...heights),
      high: Math.max(...heights),
    }),
  );
  cells.forEach((cell, i) => {
    out[cell] += cellDose(tracer, leg, spots[i]);
  });
}

/** Dose of a leg on a cell; a cell that a tube sweeps over is read beside it, as a still one is. */
function cellDose(tracer: Tracer, leg: PassLeg, [x, y, z]: Vector3): number {
  try {
    return legDoseAt(tracer, leg, { p: [x, y, z], mode: 'normal', n: UP }, RELATIVE);
  } catch (error) {
    if (!(error instanceof UndefinedReadingError)) throw error;
    // Across the leg: along it the same tube would come by again.
    const length = Math.hypot(leg.vx, leg.vy);
    const beside: Vector3 = [x - (leg.vy / length) * BESIDE, y + (leg.vx / length) * BESIDE, z];
    return legDoseAt(tracer, leg, { p: beside, mode: 'normal', n: UP }, RELATIVE);
  }
}
