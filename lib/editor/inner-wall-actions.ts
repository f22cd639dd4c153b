import type { FloorPlanDocument, InnerWall, PlanPoint } from '@/lib/room';
import { keepOnWall } from './keep-openings';
import { type Outcome, tidyPoint } from './outcome';

/** Named edits of inner walls; doors and windows in them stay on them. */

const DEFAULT_THICKNESS = 0.1;
/** Metres. */
const LEAST_LENGTH = 0.05;

const span = ({ a, b }: Pick<InnerWall, 'a' | 'b'>) => Math.hypot(b[0] - a[0], b[1] - a[1]);

const tooShort: Outcome = { refused: 'An inner wall must be 5 cm or longer. The walls are as they were.' };

export function addInnerWall(
  document: FloorPlanDocument,
  id: string,
  name: string,
  a: PlanPoint,
  b: PlanPoint,
): Outcome {
  const wall = { id, name, a: tidyPoint(a), b: tidyPoint(b), thickness: DEFAULT_THICKNESS };
  if (span(wall) < LEAST_LENGTH) return tooShort;
  return {
    ...document,
    floorPlan: { ...document.floorPlan, innerWalls: [...document.floorPlan.innerWalls, wall] },
  };
}

/** Puts the ends of an inner wall where they are said to be. */
export function placeInnerWall(
  document: FloorPlanDocument,
  id: string,
  ends: { a?: PlanPoint; b?: PlanPoint },
): Outcome {
  const { floorPlan } = document;
  const held = floorPlan.innerWalls.find((wall) => wall.id === id);
  if (!held) return document;
  const next = { ...held, a: tidyPoint(ends.a ?? held.a), b: tidyPoint(ends.b ?? held.b) };
  if (span(next) < LEAST_LENGTH) return tooShort;
  const moved = (one: PlanPoint, two: PlanPoint) => one[0] !== two[0] || one[1] !== two[1];
  const change = {
    before: span(held),
    after: span(next),
    firstEndMoved: moved(held.a, next.a),
    lastEndMoved: moved(held.b, next.b),
  };
  return {
    ...document,
    floorPlan: {
      ...floorPlan,
      innerWalls: floorPlan.innerWalls.map((wall) => (wall.id === id ? next : wall)),
      openings: floorPlan.openings.map((opening) =>
        opening.wall === id ? keepOnWall(opening, change) : opening,
      ),
    },
  };
}

/** Makes an inner wall `length` metres long from its first end. */
export function setInnerWallLength(document: FloorPlanDocument, id: string, length: number): Outcome {
  const wall = document.floorPlan.innerWalls.find((candidate) => candidate.id === id);
  if (!wall) return document;
  const factor = length / span(wall);
  return placeInnerWall(document, id, {
    b: [wall.a[0] + (wall.b[0] - wall.a[0]) * factor, wall.a[1] + (wall.b[1] - wall.a[1]) * factor],
  });
}

export const changeInnerWall = (
  document: FloorPlanDocument,
  id: string,
  change: Partial<Pick<InnerWall, 'name' | 'thickness'>>,
): FloorPlanDocument => ({
  ...document,
  floorPlan: {
    ...document.floorPlan,
    innerWalls: document.floorPlan.innerWalls.map((wall) => (wall.id === id ? { ...wall, ...change } : wall)),
  },
});

/** Takes an inner wall out, and the doors and windows in it. */
export const removeInnerWall = (document: FloorPlanDocument, id: string): FloorPlanDocument => ({
  ...document,
  floorPlan: {
    ...document.floorPlan,
    innerWalls: document.floorPlan.innerWalls.filter((wall) => wall.id !== id),
    openings: document.floorPlan.openings.filter((opening) => opening.wall !== id),
  },
});
