import type { GridSurface } from '@/lib/engine/types';

export interface DrawnField {
  readonly surface: GridSurface;
  readonly ratio: Float32Array;
}

/**
 * The field with every cell cut into `parts` × `parts`, values between cell centres interpolated (bilinear).
 * For the picture only: figures stay those of the cells. A cell that does not count lends nothing to its
 * neighbours, so a map does not fade towards furniture and walls.
 */
export function finerGrid(surface: GridSurface, ratio: Float32Array, parts: number): DrawnField {
  if (parts <= 1) return { surface, ratio };
  const { columns, rows, mask } = surface;
  const wide = columns * parts;
  const high = rows * parts;
  const values = new Float32Array(wide * high);
  const counts = new Uint8Array(wide * high);
  // Where each sub-cell's centre stands between cell centres, the same in x and y.
  const offsets = Array.from({ length: parts }, (_, part) => (part + 0.5) / parts - 0.5);
  for (let j = 0; j < rows; j++) {
    for (let i = 0; i < columns; i++) {
      const cell = j * columns + i;
      if (mask[cell] === 0) continue;
      const own = ratio[cell];
      const at = (ni: number, nj: number): number => {
        if (ni < 0 || nj < 0 || ni >= columns || nj >= rows) return own;
        const neighbour = nj * columns + ni;
        return mask[neighbour] === 0 ? own : ratio[neighbour];
      };
      for (let sj = 0; sj < parts; sj++) {
        const dy = offsets[sj];
        const nj = j + Math.sign(dy);
        const wy = Math.abs(dy);
        for (let si = 0; si < parts; si++) {
          const dx = offsets[si];
          const ni = i + Math.sign(dx);
          const wx = Math.abs(dx);
          const sub = (j * parts + sj) * wide + i * parts + si;
          values[sub] =
            (own * (1 - wx) + at(ni, j) * wx) * (1 - wy) + (at(i, nj) * (1 - wx) + at(ni, nj) * wx) * wy;
          counts[sub] = 1;
        }
      }
    }
  }
  return {
    surface: { ...surface, step: surface.step / parts, columns: wide, rows: high, mask: counts },
    ratio: values,
  };
}
