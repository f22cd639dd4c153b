import { type Receiver, readTubes } from './irradiance-at';
import { legBreaks } from './pass-breaks';
import { type PlacedTube, placeTubes } from './placed-tube';
import type { PreparedScene } from './prepare-scene';
import { integrate } from './quadrature';
import { createTracer, type Tracer } from './tracer';
import type { Pass } from './types';

/** Share of a leg's dose that the integral may be off by; a hundredth of what is promised. */
const RELATIVE = 1e-5;

/** A tube on the move: on one leg only its plan position changes. */
type MovingTube = { -readonly [K in keyof PlacedTube]: PlacedTube[K] };

/** One straight leg of a pass. */
export interface PassLeg {
  readonly x: number;
  readonly y: number;
  readonly vx: number;
  readonly vy: number;
  /** Seconds the leg takes. */
  readonly seconds: number;
  readonly tubes: readonly PlacedTube[];
}

/** The legs of a pass; legs of no length take no time and are kept, so that indices match the path. */
export function passLegs({ emitter, path, speed, headingDeg }: Pass): PassLeg[] {
  if (!(speed > 0)) throw new Error(`A pass needs a speed above 0 (given ${speed} m/s).`);
  return path.slice(1).map(([x1, y1], i) => {
    const [x, y] = path[i];
    const vx = x1 - x;
    const vy = y1 - y;
    const heading = headingDeg ?? (Math.atan2(vy, vx) * 180) / Math.PI;
    const tubes = placeTubes({ emitter, x, y, headingDeg: heading });
    return { x, y, vx, vy, seconds: Math.hypot(vx, vy) / speed, tubes };
  });
}

/** Dose (J/m²) of a pass at a receiver, leg by leg, to 0.1 % and better. `facing` follows the moving emitter. */
export function passLegDosesAt(prepared: PreparedScene, pass: Pass, receiver: Receiver): number[] {
  const tracer = createTracer(prepared);
  return passLegs(pass).map((leg) => legDoseAt(tracer, leg, receiver));
}

/** Dose (J/m²) of a whole pass at a receiver. */
export function passDoseAt(prepared: PreparedScene, pass: Pass, receiver: Receiver): number {
  return passLegDosesAt(prepared, pass, receiver).reduce((sum, dose) => sum + dose, 0);
}

/** Dose (J/m²) of one leg at a receiver, off by at most the share `relative` of it. */
export function legDoseAt(
  tracer: Tracer,
  leg: PassLeg,
  receiver: Receiver,
  relative: number = RELATIVE,
): number {
  const { x, y, vx, vy, seconds } = leg;
  if (seconds === 0) return 0;
  const [px, py, pz] = receiver.p;
  let dose = 0;
  for (const tube of leg.tubes) {
    const moving: MovingTube = { ...tube };
    const tubes = [moving];
    const at = (tau: number) => {
      moving.ax = tube.ax + tau * vx;
      moving.ay = tube.ay + tau * vy;
      return readTubes(tracer, tubes, x + tau * vx, y + tau * vy, receiver);
    };
    const breaks = legBreaks(tracer.scene, { tube, vx, vy, px, py, pz });
    dose += seconds * integrate(at, 0, 1, breaks, relative);
  }
  return dose;
}
