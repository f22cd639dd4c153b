import { type Receiver, readTubes } from './irradiance-at';
import { placeTubes } from './placed-tube';
import { prepareScene } from './prepare-scene';
import { integrate } from './quadrature';
import { createTracer } from './tracer';
import type { Emitter } from './types';

export interface SpeedOptions {
  /** Height of the surface's spot in metres; the tubes' mid-height unless said. */
  readonly height?: number;
  /**
   * Heading of the emitter, clockwise from the direction of travel, with the surface on its right-hand side.
   * Unless said: 90 (facing the surface) when a tube is backed, else 0 (straight along).
   */
  readonly headingDeg?: number;
}

const RELATIVE = 1e-7;

/**
 * The greatest speed (m/s) per stand-off (m) at which one very long straight pass gives `target` (J/m²) to an upright
 * surface parallel to the path. Dose × speed is constant: v = ∫ E dx / target, over an endless path.
 */
export function requiredSpeed(
  emitter: Emitter,
  standoffs: readonly number[],
  target: number,
  options: SpeedOptions = {},
): number[] {
  if (!(target > 0)) throw new Error(`Target dose ${target} J/m² must be more than 0.`);
  return standoffs.map((standoff) => endlessPathIntegral(emitter, standoff, options) / target);
}

/** The tubes' mid-height: halfway between their lowest and highest point. */
export function midHeight(emitter: Emitter): number {
  const heights = emitter.tubes.flatMap((tube) => [tube.a[2], tube.b[2]]);
  return (Math.min(...heights) + Math.max(...heights)) / 2;
}

/**
 * ∫ E dx along an endless path past a surface at stand-off d, with x = d·tan ψ so that the path's far ends fold into
 * ψ = ±90°, where E falls off as cos³ψ and dx only grows as 1/cos²ψ.
 */
function endlessPathIntegral(emitter: Emitter, standoff: number, options: SpeedOptions): number {
  if (!(standoff > 0)) throw new Error(`Stand-off ${standoff} m must be more than 0.`);
  const backed = emitter.tubes.some((tube) => tube.backed !== null);
  const headingDeg = options.headingDeg ?? (backed ? 90 : 0);
  const height = options.height ?? midHeight(emitter);
  const tracer = createTracer(prepareScene({ solids: [], walls: [] }));
  const tubes = placeTubes({ emitter, x: 0, y: 0, headingDeg });
  const at = (psi: number) => {
    const x = -standoff * Math.tan(psi);
    const receiver: Receiver = { p: [x, standoff, height], mode: 'normal', n: [0, -1, 0] };
    return (readTubes(tracer, tubes, 0, 0, receiver) * standoff) / Math.cos(psi) ** 2;
  };
  // Where the surface passes from behind a backed tube to its front: (p − a)·m = 0.
  const turns = tubes
    .filter((tube) => tube.backed && tube.mx !== 0)
    .map((tube) => tube.ax - ((standoff - tube.ay) * tube.my + (height - tube.az) * tube.mz) / tube.mx)
    .map((x) => Math.atan2(-x, standoff));
  return integrate(at, -Math.PI / 2, Math.PI / 2, [0, ...turns], RELATIVE);
}
