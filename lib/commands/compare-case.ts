import { irradianceAt, passLegDosesAt, prepareScene } from '@/lib/engine';
import type { ReferenceCase } from './case-file';

/** What engine values may differ from the reference by, as a fraction of it. A reference of 0 must come out as 0. */
export const TOLERANCE = { still: 1e-4, pass: 1e-3 } as const;

export interface CaseResult {
  readonly id: string;
  readonly receivers: number;
  /** Largest of irradiances, pass legs and doses; Infinity where a reference 0 did not come out as 0. */
  readonly worst: number;
  /** The single worst figure, in words. */
  readonly where: string;
  readonly passed: boolean;
}

export function compareCase(reference: ReferenceCase): CaseResult {
  const { scene, stops, passes, receivers, expected } = reference;
  const prepared = prepareScene(scene);
  let worst = 0;
  let where = 'all exact';
  let passed = true;
  const hold = (what: string, value: number, wanted: number, tolerance: number) => {
    const error = wanted === 0 ? (value === 0 ? 0 : Infinity) : Math.abs(value - wanted) / Math.abs(wanted);
    if (!(error <= tolerance)) passed = false;
    if (error > worst || Number.isNaN(error)) {
      worst = Number.isNaN(error) ? Infinity : error;
      where = `${what}: ${value} for ${wanted}`;
    }
  };
  receivers.forEach((receiver, r) => {
    let dose = 0;
    stops.forEach(({ placement, dwell }, s) => {
      const irradiance = irradianceAt(prepared, placement, receiver);
      dose += irradiance * dwell;
      hold(`receiver ${r}, stop ${s}`, irradiance, expected.irradiance[s][r], TOLERANCE.still);
    });
    passes.forEach((pass, k) => {
      passLegDosesAt(prepared, pass, receiver).forEach((legDose, leg) => {
        dose += legDose;
        const wanted = expected.pass_leg_dose?.[k][leg][r];
        if (wanted !== undefined)
          hold(`receiver ${r}, pass ${k}, leg ${leg}`, legDose, wanted, TOLERANCE.pass);
      });
    });
    const tolerance = passes.length > 0 ? TOLERANCE.pass : TOLERANCE.still;
    hold(`receiver ${r}, dose`, dose, expected.dose[r], tolerance);
  });
  return { id: reference.id, receivers: receivers.length, worst, where, passed };
}
