import type { FloorPlanDocument, Opening } from '@/lib/room';
import { wallRuns } from '@/lib/room/wall-geometry';
import { fitOpening, LEAST_OPENING } from './keep-openings';
import { type Outcome, tidy } from './outcome';

/** Named edits of doors and windows. They always stay on a wall. */

/** Clear width and heights to start from, metres; common practice. */
const usual = {
  door: { width: 0.9, sill: 0, head: 2.1 },
  window: { width: 1.2, sill: 0.9, head: 2.1 },
} as const;

const withOpenings = (document: FloorPlanDocument, openings: Opening[]): FloorPlanDocument => ({
  ...document,
  floorPlan: { ...document.floorPlan, openings },
});

/** A usual door or window with its middle `s` metres along a wall. Doors start closed, panes opaque to 254 nm. */
export function newOpening(
  { floorPlan, ceiling }: FloorPlanDocument,
  id: string,
  kind: Opening['kind'],
  wall: string,
  s: number,
): Opening | null {
  const run = wallRuns(floorPlan).find((candidate) => candidate.id === wall);
  if (!run || run.length < LEAST_OPENING) return null;
  const { width, sill, head } = usual[kind];
  const opening: Opening = {
    id,
    wall,
    kind,
    from: Math.max(0, s - width / 2),
    to: Math.max(0, s - width / 2) + width,
    sill,
    head: Math.min(head, ceiling),
    open: false,
    transmittance: 0,
  };
  return fitOpening({ ...opening, from: tidy(opening.from), to: tidy(opening.to) }, run.length);
}

export function addOpening(
  document: FloorPlanDocument,
  id: string,
  kind: Opening['kind'],
  wall: string,
  s: number,
): Outcome {
  const opening = newOpening(document, id, kind, wall, s);
  return opening
    ? withOpenings(document, [...document.floorPlan.openings, opening])
    : { refused: `A ${kind} needs a wall of 10 cm or more. Nothing was drawn.` };
}

/** Changes an opening and keeps it on its wall. */
export function changeOpening(
  document: FloorPlanDocument,
  id: string,
  change: Partial<Omit<Opening, 'id'>>,
): Outcome {
  const { floorPlan } = document;
  const held = floorPlan.openings.find((opening) => opening.id === id);
  if (!held) return document;
  const next = { ...held, ...change };
  const run = wallRuns(floorPlan).find((wall) => wall.id === next.wall);
  if (next.to - next.from < LEAST_OPENING - 1e-9)
    return { refused: `A ${held.kind} must be 10 cm wide or more. It is as it was.` };
  if (next.head <= next.sill)
    return { refused: `The head of a ${held.kind} must be above its sill. It is as it was.` };
  if (run && next.to - next.from > run.length + 1e-9)
    return { refused: `The ${run.name} is ${run.length.toFixed(2)} m long. The ${held.kind} is as it was.` };
  const fitted = run ? fitOpening(next, run.length) : next;
  const opening = { ...fitted, from: tidy(fitted.from), to: tidy(fitted.to) };
  return withOpenings(
    document,
    floorPlan.openings.map((candidate) => (candidate.id === id ? opening : candidate)),
  );
}

/** Puts the middle of an opening `s` metres along a wall, its width kept. */
export function slideOpening(document: FloorPlanDocument, id: string, wall: string, s: number): Outcome {
  const held = document.floorPlan.openings.find((opening) => opening.id === id);
  if (!held) return document;
  const width = held.to - held.from;
  const from = Math.max(0, s - width / 2);
  return changeOpening(document, id, { wall, from, to: from + width });
}

export const removeOpening = (document: FloorPlanDocument, id: string): FloorPlanDocument =>
  withOpenings(
    document,
    document.floorPlan.openings.filter((opening) => opening.id !== id),
  );
