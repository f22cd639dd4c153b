import { legDoses, type Spot } from './leg-doses';
import { passLegs } from './pass-dose';
import type { PreparedScene } from './prepare-scene';
import { type SideStrip, stripPoint } from './side-strips';
import type { GridSurface, Pass, Vector3 } from './types';

const UP: Vector3 = [0, 0, 1];

/** Cells along the side of a block of neighbours. */
const BLOCK = 6;

/** Dose (J/m²) of a pass on every cell of a surface, facing up, to 0.1 %; 0 where the mask is 0. */
export function passDoseMap(
  prepared: PreparedScene,
  pass: Pass,
  surface: GridSurface,
  out: Float32Array = new Float32Array(surface.columns * surface.rows),
): Float32Array {
  const { columns, step, originX, originY, z } = surface;
  return addBlocks(prepared, pass, surface, out, (i, j) => ({
    p: [
      originX + (i + 0.5) * step,
      originY + (j + 0.5) * step,
      typeof z === 'number' ? z : z[j * columns + i],
    ],
    n: UP,
  }));
}

/** Dose (J/m²) of a pass on every cell of a strip, on its outward normal, to 0.1 %; 0 where the mask is 0. */
export const passDoseStrip = (prepared: PreparedScene, pass: Pass, face: SideStrip): Float32Array =>
  addBlocks(prepared, pass, face, new Float32Array(face.columns * face.rows), (i, j) => ({
    p: stripPoint(face, i, j),
    n: face.normal,
  }));

function addBlocks(
  prepared: PreparedScene,
  pass: Pass,
  { columns, rows, mask }: { columns: number; rows: number; mask: Uint8Array },
  out: Float32Array,
  spotAt: (i: number, j: number) => Spot,
): Float32Array {
  out.fill(0);
  for (const leg of passLegs(pass)) {
    for (let row = 0; row < rows; row += BLOCK) {
      for (let column = 0; column < columns; column += BLOCK) {
        const cells: number[] = [];
        const spots: Spot[] = [];
        for (let j = row; j < Math.min(rows, row + BLOCK); j++) {
          for (let i = column; i < Math.min(columns, column + BLOCK); i++) {
            if (mask[j * columns + i] === 0) continue;
            cells.push(j * columns + i);
            spots.push(spotAt(i, j));
          }
        }
        legDoses(prepared, leg, spots).forEach((dose, k) => {
          out[cells[k]] += dose;
        });
      }
    }
  }
  return out;
}
