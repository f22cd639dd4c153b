import { MAX_DWELL_SECONDS, type Stop, type StopSet } from '@/lib/room';
import { normaliseDegrees } from '@/lib/units';

/** Named pure edits of a stop set: each takes the set and answers the next one, or the same one when nothing changes. */

const DEFAULT_DWELL_SECONDS = 300;

/** The least whole number no stop is named by yet: names stay when stops are reordered, as crews know them by name. */
function freeNumber(set: StopSet): string {
  const taken = new Set([...set.stops, ...set.passes].map((item) => item.name));
  let number = 1;
  while (taken.has(String(number))) number += 1;
  return String(number);
}

export const addStop = (set: StopSet, id: string, at: Stop['at']): StopSet => ({
  ...set,
  stops: [
    ...set.stops,
    { id, name: freeNumber(set), at, heading: 0, dwell: DEFAULT_DWELL_SECONDS, emitter: null },
  ],
});

const change = (set: StopSet, stopId: string, edit: (stop: Stop) => Stop): StopSet => ({
  ...set,
  stops: set.stops.map((stop) => (stop.id === stopId ? edit(stop) : stop)),
});

export const moveStop = (set: StopSet, stopId: string, at: Stop['at']): StopSet =>
  change(set, stopId, (stop) => ({ ...stop, at }));

export const turnStop = (set: StopSet, stopId: string, heading: number): StopSet =>
  change(set, stopId, (stop) => ({ ...stop, heading: normaliseDegrees(heading) }));

export const setDwell = (set: StopSet, stopId: string, seconds: number): StopSet =>
  change(set, stopId, (stop) => ({ ...stop, dwell: Math.max(0, Math.min(MAX_DWELL_SECONDS, seconds)) }));

export const renameStop = (set: StopSet, stopId: string, name: string): StopSet =>
  change(set, stopId, (stop) => ({ ...stop, name }));

export const setStopEmitter = (set: StopSet, stopId: string, emitter: string | null): StopSet =>
  change(set, stopId, (stop) => ({ ...stop, emitter }));

export const removeStop = (set: StopSet, stopId: string): StopSet => ({
  ...set,
  stops: set.stops.filter((stop) => stop.id !== stopId),
});

/** Moves a stop `by` places in the order; stays within it. */
export function reorderStop(set: StopSet, stopId: string, by: number): StopSet {
  const from = set.stops.findIndex((stop) => stop.id === stopId);
  const to = Math.max(0, Math.min(set.stops.length - 1, from + by));
  if (from < 0 || from === to) return set;
  const stops = [...set.stops];
  const [moved] = stops.splice(from, 1);
  stops.splice(to, 0, moved);
  return { ...set, stops };
}
