import type { GridSurface } from './types';

/** One connected under-dosed zone. */
export interface Gap {
  /** 1 for the largest, as in G1. */
  readonly number: number;
  /** m² */
  readonly area: number;
  readonly cells: number;
  readonly lowestRatio: number;
  /** A spot as far inside as any, for its number on the drawing. */
  readonly x: number;
  readonly y: number;
}

export interface GapReport {
  readonly gaps: readonly Gap[];
  /** m² of under-dosed zones too small to number. */
  readonly specksArea: number;
  /** Gap number per cell, 0 where there is none; specks are −1. */
  readonly labels: Int32Array;
}

/** Zones below this many m² are summed as specks. */
export const SMALLEST_GAP = 0.01;

/** Finds the 4-connected zones with ratio < 1, numbered by area (ties: the one met first, row by row). */
export function findGaps(
  surface: GridSurface,
  ratio: Float32Array | Float64Array,
  { smallest = SMALLEST_GAP }: { readonly smallest?: number } = {},
): GapReport {
  const { columns, rows, step, mask } = surface;
  const under = (cell: number) => mask[cell] !== 0 && ratio[cell] < 1;
  const labels = new Int32Array(columns * rows);
  const stack = new Int32Array(columns * rows);
  const zones: { zone: number; cells: number; lowest: number }[] = [];
  for (let seed = 0; seed < labels.length; seed++) {
    if (labels[seed] !== 0 || !under(seed)) continue;
    const zone = zones.length + 1;
    let cells = 0;
    let lowest = Infinity;
    let depth = 0;
    const reach = (cell: number) => {
      if (labels[cell] !== 0 || !under(cell)) return;
      labels[cell] = zone;
      stack[depth++] = cell;
    };
    reach(seed);
    while (depth > 0) {
      const cell = stack[--depth];
      cells++;
      lowest = Math.min(lowest, ratio[cell]);
      const column = cell % columns;
      if (column > 0) reach(cell - 1);
      if (column < columns - 1) reach(cell + 1);
      if (cell >= columns) reach(cell - columns);
      if (cell < labels.length - columns) reach(cell + columns);
    }
    zones.push({ zone, cells, lowest });
  }

  const cellArea = step * step;
  // A hair under the limit, so that four 5 cm cells are 0.01 m² whatever the rounding.
  const isGap = (zone: { cells: number }) => zone.cells * cellArea >= smallest * (1 - 1e-9);
  const numbered = zones.filter(isGap).sort((a, b) => b.cells - a.cells || a.zone - b.zone);
  const numberOf = new Int32Array(zones.length + 1).fill(-1);
  numberOf[0] = 0;
  numbered.forEach(({ zone }, i) => {
    numberOf[zone] = i + 1;
  });
  for (let cell = 0; cell < labels.length; cell++) labels[cell] = numberOf[labels[cell]];

  const spots = deepestCells(labels, columns, rows, numbered.length);
  return {
    gaps: numbered.map(({ cells, lowest }, i) => ({
      number: i + 1,
      area: cells * cellArea,
      cells,
      lowestRatio: lowest,
      x: surface.originX + ((spots[i] % columns) + 0.5) * step,
      y: surface.originY + (Math.floor(spots[i] / columns) + 0.5) * step,
    })),
    specksArea: zones.filter((zone) => !isGap(zone)).reduce((sum, { cells }) => sum + cells * cellArea, 0),
    labels,
  };
}

/** For each gap the cell with the most cells of the same gap all round: two sweeps of the chessboard distance. */
function deepestCells(labels: Int32Array, columns: number, rows: number, gaps: number): Int32Array {
  const depth = new Int32Array(labels.length);
  const at = (i: number, j: number, label: number) =>
    i >= 0 && i < columns && j >= 0 && j < rows && labels[j * columns + i] === label
      ? depth[j * columns + i]
      : 0;
  for (let j = 0, cell = 0; j < rows; j++) {
    for (let i = 0; i < columns; i++, cell++) {
      const label = labels[cell];
      if (label <= 0) continue;
      const least = Math.min(
        at(i - 1, j, label),
        at(i - 1, j - 1, label),
        at(i, j - 1, label),
        at(i + 1, j - 1, label),
      );
      depth[cell] = 1 + least;
    }
  }
  const spots = new Int32Array(gaps);
  const deepest = new Int32Array(gaps);
  for (let j = rows - 1, cell = labels.length - 1; j >= 0; j--) {
    for (let i = columns - 1; i >= 0; i--, cell--) {
      const label = labels[cell];
      if (label <= 0) continue;
      const least = Math.min(
        at(i + 1, j, label),
        at(i + 1, j + 1, label),
        at(i, j + 1, label),
        at(i - 1, j + 1, label),
      );
      depth[cell] = Math.min(depth[cell], 1 + least);
      if (depth[cell] >= deepest[label - 1]) {
        deepest[label - 1] = depth[cell];
        spots[label - 1] = cell;
      }
    }
  }
  return spots;
}
