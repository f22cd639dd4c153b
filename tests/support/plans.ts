import { isRefused, type Outcome } from '@/lib/editor/outcome';
import { drawRectangle } from '@/lib/editor/outline-actions';
import type { FloorPlanDocument, Furniture } from '@/lib/room';

/** The plan that an action answers; a refusal fails the test with its words. */
export function done(outcome: Outcome): FloorPlanDocument {
  if (isRefused(outcome)) throw new Error(outcome.refused);
  return outcome;
}

export const refusalOf = (outcome: Outcome): string | null => (isRefused(outcome) ? outcome.refused : null);

/** An empty room of 6 by 4 m: top wall is outline:0, right wall outline:1, bottom wall outline:2, left wall outline:3. */
export const sixByFour = (): FloorPlanDocument => done(drawRectangle(null, 6, 4));

/** A box of 1 by 0.5 m, 1 m high, about its own middle. */
export const box = (id: string, at: [number, number], turn = 0): Furniture => ({
  id,
  name: `Box ${id}`,
  kind: 'box',
  at,
  turn,
  parts: [
    {
      name: 'body',
      footprint: [
        [-0.5, -0.25],
        [0.5, -0.25],
        [0.5, 0.25],
        [-0.5, 0.25],
      ],
      base: 0.2,
      top: 1,
    },
  ],
  touchPoints: [{ id: `${id}-t`, name: 'handle', at: [0.5, 0], height: 0.9, facing: 0, tilt: 0 }],
});
