import type { GridSurface } from '@/lib/engine/types';
import { doseBreaks, doseSteps } from './dose-scale';

const parse = (hex: string) => [1, 3, 5].map((at) => Number.parseInt(hex.slice(at, at + 2), 16));

/** Little-endian RGBA words, one a dose step: one store a cell instead of four. */
const words = Uint32Array.from(doseSteps, ({ colour }) => {
  const [red, green, blue] = parse(colour);
  return (0xff000000 | (blue << 16) | (green << 8) | red) >>> 0;
});

const [BREAK_1, BREAK_2, BREAK_3, BREAK_4, BREAK_5] = doseBreaks;

// Written out: this runs over every cell on every frame of a drag.
const stepIndex = (ratio: number): number =>
  ratio < BREAK_3
    ? ratio < BREAK_1
      ? 0
      : ratio < BREAK_2
        ? 1
        : 2
    : ratio < BREAK_4
      ? 3
      : ratio < BREAK_5
        ? 4
        : 5;

/** Umber, for hatching that is set in the image itself. */
const HATCH = 0xff082f5a;
const HATCH_EVERY = 5;

/**
 * One RGBA pixel a cell; see-through where a cell does not count. With `hatched`, every fifth diagonal of what is under
 * target is dark: quicker than lines, for a map that follows the hand.
 */
export function doseImage(
  { columns, rows, mask }: Pick<GridSurface, 'columns' | 'rows' | 'mask'>,
  ratio: Float32Array,
  hatched = false,
): Uint8ClampedArray<ArrayBuffer> {
  const pixels = new Uint32Array(columns * rows);
  for (let i = 0; i < pixels.length; i++) {
    if (mask[i] === 1) pixels[i] = words[stepIndex(ratio[i])];
  }
  if (hatched) {
    for (let j = 0; j < rows; j++) {
      for (let i = (HATCH_EVERY - (j % HATCH_EVERY)) % HATCH_EVERY; i < columns; i += HATCH_EVERY) {
        const cell = j * columns + i;
        if (mask[cell] === 1 && ratio[cell] < 1) pixels[cell] = HATCH;
      }
    }
  }
  return new Uint8ClampedArray(pixels.buffer);
}

/**
 * The drawn edge between cells for which `inside` holds and counting cells for which it does not, as flat
 * x1,y1,x2,y2 in plan metres. Straight runs come as one segment.
 */
export function regionEdges(
  { originX, originY, step, columns, rows, mask }: GridSurface,
  inside: (cell: number) => boolean,
): number[] {
  const segments: number[] = [];
  const differs = (one: number, two: number) =>
    mask[one] === 1 && mask[two] === 1 && inside(one) !== inside(two);
  for (let j = 1; j < rows; j++) {
    let start = -1;
    for (let i = 0; i <= columns; i++) {
      const edge = i < columns && differs((j - 1) * columns + i, j * columns + i);
      if (edge && start < 0) start = i;
      if (!edge && start >= 0) {
        segments.push(originX + start * step, originY + j * step, originX + i * step, originY + j * step);
        start = -1;
      }
    }
  }
  for (let i = 1; i < columns; i++) {
    let start = -1;
    for (let j = 0; j <= rows; j++) {
      const edge = j < rows && differs(j * columns + i - 1, j * columns + i);
      if (edge && start < 0) start = j;
      if (!edge && start >= 0) {
        segments.push(originX + i * step, originY + start * step, originX + i * step, originY + j * step);
        start = -1;
      }
    }
  }
  return segments;
}
