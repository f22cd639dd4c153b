import type { GridSurface } from '@/lib/engine/types';

/**
 * Hatching at 45° over the cells for which `inside` holds, as flat x1,y1,x2,y2 in plan metres: lines where
 * x + y is a multiple of `spacing`, cut to half a cell. Vectors, so screen, print and PDF hatch alike.
 */
export function hatchLines(
  { originX, originY, step, columns, rows, mask }: Omit<GridSurface, 'z'>,
  inside: (cell: number) => boolean,
  spacing: number,
): number[] {
  const segments: number[] = [];
  const half = step / 2;
  const height = rows * step;
  const first = Math.ceil((originX + originY) / spacing);
  const last = Math.floor((originX + originY + columns * step + height) / spacing);
  for (let line = first; line <= last; line++) {
    // On this line x = across − y, both from the grid's corner.
    const across = line * spacing - originX - originY;
    let start = -1;
    for (let k = 0; k <= rows * 2; k++) {
      const y = (k + 0.5) * half;
      const i = Math.floor((across - y) / step);
      const cell = (k >> 1) * columns + i;
      const drawn = k < rows * 2 && i >= 0 && i < columns && mask[cell] === 1 && inside(cell);
      if (drawn && start < 0) start = k;
      if (!drawn && start >= 0) {
        const from = start * half;
        const to = k * half;
        segments.push(originX + across - from, originY + from, originX + across - to, originY + to);
        start = -1;
      }
    }
  }
  return segments;
}
