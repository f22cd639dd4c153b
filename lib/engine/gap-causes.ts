import { addDose } from './dose';
import type { Gap } from './gaps';
import { irradianceMap } from './irradiance-map';
import { passDoseMap } from './pass-dose-map';
import { prepareScene } from './prepare-scene';
import type { GapCause, GridSurface, Pass, Placement, Scene } from './types';

/** In the order in which they are decided; the index is what `cellCauses` holds. */
export const GAP_CAUSES: readonly GapCause[] = [
  'facing away',
  'walled off',
  'hidden',
  'partly hidden',
  'short',
];

/** In `cellCauses`, a cell that does not count or meets its target. */
export const NO_CAUSE = 255;

export interface TimedStop {
  readonly placement: Placement;
  /** Seconds. */
  readonly dwell: number;
}

export interface CausesInput {
  readonly scene: Scene;
  readonly stops: readonly TimedStop[];
  readonly passes?: readonly Pass[];
  readonly surface: GridSurface;
  /** J/m² per cell, as is. */
  readonly dose: Float32Array | Float64Array;
  /** J/m² */
  readonly target: number;
  readonly gaps: readonly Gap[];
  readonly labels: Int32Array;
}

export interface CausesReport {
  /** One per gap, in the order of `gaps`: the cause of most of its area. */
  readonly gapCauses: readonly GapCause[];
  /** Index into `GAP_CAUSES` per cell, `NO_CAUSE` where the target is met or the cell does not count. */
  readonly cellCauses: Uint8Array;
}

/** Why each cell is under target: the doses with furniture out, and with walls out too, are evaluated on those cells alone. */
export function gapCauses(input: CausesInput): CausesReport {
  const { scene, surface, dose, target } = input;
  const mask = surface.mask.map((counts, cell) => (counts !== 0 && dose[cell] < target ? 1 : 0));
  const underDosed = { ...surface, mask };
  const furnitureOut = doseIn({ solids: [], walls: scene.walls }, underDosed, input);
  const allOut =
    scene.walls.length === 0 ? furnitureOut : doseIn({ solids: [], walls: [] }, underDosed, input);
  return causesFromDoses(input, furnitureOut, allOut);
}

function doseIn(scene: Scene, surface: GridSurface, { stops, passes = [] }: CausesInput): Float32Array {
  const prepared = prepareScene(scene);
  const dose = new Float32Array(surface.mask.length);
  for (const { placement, dwell } of stops) {
    if (dwell > 0) addDose(dose, irradianceMap(prepared, placement, surface), dwell);
  }
  for (const pass of passes) addDose(dose, passDoseMap(prepared, pass, surface), 1);
  return dose;
}

/** The decision alone, for callers that have the two further doses at hand. */
export function causesFromDoses(
  {
    surface,
    dose,
    target,
    gaps,
    labels,
  }: Omit<CausesInput, 'scene' | 'stops' | 'passes' | 'surface'> & {
    readonly surface: Pick<GridSurface, 'mask'>;
  },
  furnitureOut: Float32Array,
  allOut: Float32Array,
): CausesReport {
  const cellCauses = new Uint8Array(surface.mask.length).fill(NO_CAUSE);
  const votes = new Int32Array(gaps.length * GAP_CAUSES.length);
  for (let cell = 0; cell < cellCauses.length; cell++) {
    if (surface.mask[cell] === 0 || dose[cell] >= target) continue;
    const cause = causeOf(dose[cell], furnitureOut[cell], allOut[cell], target);
    cellCauses[cell] = cause;
    if (labels[cell] > 0) votes[(labels[cell] - 1) * GAP_CAUSES.length + cause]++;
  }
  return {
    cellCauses,
    gapCauses: gaps.map((_, g) => {
      const share = votes.subarray(g * GAP_CAUSES.length, (g + 1) * GAP_CAUSES.length);
      return GAP_CAUSES[share.indexOf(Math.max(...share))];
    }),
  };
}

function causeOf(asIs: number, furnitureOut: number, allOut: number, target: number): number {
  if (furnitureOut === 0) return allOut === 0 ? 0 : 1;
  if (asIs === 0) return 2;
  return furnitureOut >= target ? 3 : 4;
}
