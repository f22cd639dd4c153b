import { irradianceAt } from './irradiance-at';
import { prepareScene } from './prepare-scene';
import type { Emitter } from './types';

/** A meter reading in free air: held `distance` metres from the emitter's mark at `height`, aimed level at the mark. */
export interface Measurement {
  /** W/m² */
  readonly irradiance: number;
  /** m */
  readonly distance: number;
  /** m above the floor */
  readonly height: number;
  /** Degrees clockwise from the emitter's heading to the meter; 0, straight ahead, unless said. */
  readonly bearingDeg?: number;
}

/**
 * The emitter with its tubes' outputs scaled, all alike, so that it gives the measured irradiance.
 * Irradiance is proportional to output, so Φ = Φ_assumed · E_measured / E_assumed through the same closed forms.
 */
export function emitterFromMeasurement(
  emitter: Emitter,
  { irradiance, distance, height, bearingDeg = 0 }: Measurement,
): Emitter {
  if (!(irradiance > 0)) throw new Error(`A measured irradiance of ${irradiance} W/m² must be more than 0.`);
  if (!(distance > 0)) throw new Error(`A meter distance of ${distance} m must be more than 0.`);
  const assumed = irradianceAt(
    prepareScene({ solids: [], walls: [] }),
    { emitter, x: 0, y: 0, headingDeg: -bearingDeg },
    { p: [distance, 0, height], mode: 'facing' },
  );
  if (assumed === 0) {
    throw new Error(
      `No tube lights a meter ${distance} m off at ${height} m: move it in front of the emitter.`,
    );
  }
  const factor = irradiance / assumed;
  return { tubes: emitter.tubes.map((tube) => ({ ...tube, watts: tube.watts * factor })) };
}
