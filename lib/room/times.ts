import type { Emitter, Emitters } from './schema/emitter';
import type { PlanPoint } from './schema/primitives';
import type { Pass, StopSet } from './schema/stop-set';

/** Walking pace of a crew pushing a switched-off emitter, m/s (common practice: unhurried). */
export const WALKING_PACE = 0.5;
/** Setting an emitter down on its mark: measure twice, lock the castors, leave. Seconds a stop (common practice). */
export const SET_DOWN_SECONDS = 40;

export interface Times {
  readonly lampOn: number;
  readonly moving: number;
  readonly total: number;
}

/** The emitter a stop or pass uses: its own, or the set's. */
export const emitterOf = (
  set: Pick<StopSet, 'emitter'>,
  item: { readonly emitter: string | null },
  emitters: Emitters,
): Emitter | undefined => {
  const key = item.emitter ?? set.emitter;
  return Object.hasOwn(emitters, key) ? emitters[key] : undefined;
};

const distance = (from: PlanPoint, to: PlanPoint): number => Math.hypot(to[0] - from[0], to[1] - from[1]);

export const pathLength = (path: readonly PlanPoint[]): number =>
  path.slice(1).reduce((sum, to, i) => sum + distance(path[i], to), 0);

export const passSeconds = (pass: Pick<Pass, 'path' | 'speed'>): number => pathLength(pass.path) / pass.speed;

/**
 * Seconds of a stop set. Lamp-on: dwell (or time along a pass) plus warm-up of every lit start. Moving:
 * straight pushing distance from one to the next at walking pace, plus a set-down per stop. Total: both.
 */
export function timesOf(set: Pick<StopSet, 'emitter' | 'stops' | 'passes'>, emitters: Emitters): Times {
  const warmUps = [...set.stops, ...set.passes].reduce(
    (sum, item) => sum + (emitterOf(set, item, emitters)?.warmUp ?? 0),
    0,
  );
  const lit =
    set.stops.reduce((sum, stop) => sum + stop.dwell, 0) +
    set.passes.reduce((sum, pass) => sum + passSeconds(pass), 0);
  const ends = [
    ...set.stops.map((stop) => ({ start: stop.at, end: stop.at })),
    ...set.passes.map((pass) => ({ start: pass.path[0], end: pass.path[pass.path.length - 1] })),
  ];
  const pushed = ends.slice(1).reduce((sum, next, i) => sum + distance(ends[i].end, next.start), 0);
  const lampOn = lit + warmUps;
  const moving = pushed / WALKING_PACE + set.stops.length * SET_DOWN_SECONDS;
  return { lampOn, moving, total: lampOn + moving };
}
