import type { GridSurface } from './types';

/** Adds irradiance (W/m²) held for some seconds to a dose (J/m²). Casts no ray. */
export function addDose(target: Float32Array | Float64Array, map: Float32Array, seconds: number): void {
  for (let i = 0; i < target.length; i++) target[i] += map[i] * seconds;
}

/** Dose (J/m²) of a stop set from one irradiance map per stop and its dwell; clears and fills `out`. */
export function sumDose(
  maps: readonly Float32Array[],
  dwells: readonly number[],
  out: Float32Array = new Float32Array(maps[0]?.length ?? 0),
): Float32Array {
  if (maps.length !== dwells.length) throw new Error(`${maps.length} maps but ${dwells.length} dwells.`);
  out.fill(0);
  maps.forEach((map, k) => {
    addDose(out, map, dwells[k]);
  });
  return out;
}

export interface Coverage {
  /** Cells that count. */
  readonly cells: number;
  readonly met: number;
  /** met ÷ cells, 0 when no cell counts. */
  readonly share: number;
  /** Least dose ÷ target. */
  readonly lowestRatio: number;
}

/** How much of a surface reaches the target (J/m²). */
export function coverage(
  surface: Pick<GridSurface, 'mask'>,
  dose: Float32Array | Float64Array,
  target: number,
): Coverage {
  if (!(target > 0)) throw new Error(`Target dose ${target} J/m² must be more than 0.`);
  let cells = 0;
  let met = 0;
  let lowest = Infinity;
  for (let i = 0; i < dose.length; i++) {
    if (surface.mask[i] === 0) continue;
    cells++;
    if (dose[i] >= target) met++;
    if (dose[i] < lowest) lowest = dose[i];
  }
  return {
    cells,
    met,
    share: cells === 0 ? 0 : met / cells,
    lowestRatio: cells === 0 ? 0 : lowest / target,
  };
}

/** The dose (J/m²) that all but the share `below` of the counting cells reach; 0 when none counts. Sorts: not for every frame. */
export function doseReached(
  surface: Pick<GridSurface, 'mask'>,
  dose: Float32Array | Float64Array,
  below: number,
): number {
  const counted = dose.filter((_, cell) => surface.mask[cell] !== 0).sort();
  return counted[Math.floor(below * (counted.length - 1))] ?? 0;
}
