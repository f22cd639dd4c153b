import type { Pass as EnginePass, Placement } from '@/lib/engine/types';
import type { Emitters } from './schema/emitter';
import type { StopSet } from './schema/stop-set';
import { emitterOf } from './times';
import { toEnginePass, toPlacement } from './to-scene';

/**
 * One lit thing of a stop set as the engine reads it, apart from how long it takes: `field` × `weight` is its dose.
 * A stop's field is an irradiance and its weight the dwell (s); a pass's is its dose at 1 m/s and its weight 1 ÷ speed (s/m).
 */
export interface Lamp {
  readonly id: string;
  readonly name: string;
  readonly kind: 'stop' | 'pass';
  readonly job:
    | { readonly kind: 'stop'; readonly placement: Placement }
    | { readonly kind: 'pass'; readonly pass: EnginePass };
  readonly weight: number;
}

/** The stops and passes of a set, in order; those whose emitter is not there are left out. */
export const lampsOf = (set: StopSet, emitters: Emitters): Lamp[] => [
  ...set.stops.flatMap((stop): Lamp[] => {
    const emitter = emitterOf(set, stop, emitters);
    if (!emitter) return [];
    const job = { kind: 'stop', placement: toPlacement(stop, emitter) } as const;
    return [{ id: stop.id, name: stop.name, kind: 'stop', job, weight: stop.dwell }];
  }),
  ...set.passes.flatMap((pass): Lamp[] => {
    const emitter = emitterOf(set, pass, emitters);
    if (!emitter) return [];
    const job = { kind: 'pass', pass: { ...toEnginePass(pass, emitter), speed: 1 } } as const;
    return [{ id: pass.id, name: pass.name, kind: 'pass', job, weight: 1 / pass.speed }];
  }),
];

/** The same as the engine asks why a spot is under target: stops with their dwells, passes at their real speed. */
export function litPlanOf(set: StopSet, emitters: Emitters) {
  const lamps = lampsOf(set, emitters);
  return {
    stops: lamps.flatMap(({ job, weight }) =>
      job.kind === 'stop' ? [{ placement: job.placement, dwell: weight }] : [],
    ),
    passes: lamps.flatMap(({ job, weight }) =>
      job.kind === 'pass' ? [{ ...job.pass, speed: 1 / weight }] : [],
    ),
  };
}
