import type { Pass, PlanPoint, StopSet } from '@/lib/room';

/** Named pure edits of the passes of a stop set. */

/** A pace that a hand can hold: 3 m a minute, common practice. */
const DEFAULT_SPEED = 0.05;

function freeName(set: StopSet): string {
  const taken = new Set(set.passes.map((pass) => pass.name));
  let number = 1;
  while (taken.has(`P${number}`)) number += 1;
  return `P${number}`;
}

export const addPass = (set: StopSet, id: string, path: readonly PlanPoint[]): StopSet => ({
  ...set,
  passes: [
    ...set.passes,
    { id, name: freeName(set), path: [...path], speed: DEFAULT_SPEED, heading: null, emitter: null },
  ],
});

export const changePass = (set: StopSet, id: string, change: Partial<Omit<Pass, 'id'>>): StopSet => ({
  ...set,
  passes: set.passes.map((pass) => (pass.id === id ? { ...pass, ...change } : pass)),
});

export const movePassPoint = (set: StopSet, id: string, index: number, at: PlanPoint): StopSet => ({
  ...set,
  passes: set.passes.map((pass) =>
    pass.id === id ? { ...pass, path: pass.path.map((point, i) => (i === index ? at : point)) } : pass,
  ),
});

/** Moves a whole pass by so many metres. */
export const movePass = (set: StopSet, id: string, [dx, dy]: PlanPoint): StopSet => ({
  ...set,
  passes: set.passes.map((pass) =>
    pass.id === id ? { ...pass, path: pass.path.map(([x, y]): PlanPoint => [x + dx, y + dy]) } : pass,
  ),
});

export const removePass = (set: StopSet, id: string): StopSet => ({
  ...set,
  passes: set.passes.filter((pass) => pass.id !== id),
});
