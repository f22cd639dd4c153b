import { signedArea } from '@/lib/geometry/polygon';
import type { FloorPlanDocument, Opening, OutlineWall, PlanPoint } from '@/lib/room';
import { outlineFault } from '@/lib/room/check-outline';
import { edgeOf, outlineWallId } from '@/lib/room/wall-geometry';
import { fitOpening, keepOnWall } from './keep-openings';
import { type Outcome, tidyPoint } from './outcome';
import { sideNamesOf, withSideLength, withSideMoved } from './outline-corners';

/** Named edits of the outline. One that would leave no room is refused in words; openings stay on their walls. */

/** Masonry and stud walls alike are near this, common practice. */
const DEFAULT_THICKNESS = 0.12;
export const DEFAULT_CEILING = 2.6;

const span = (a: PlanPoint, b: PlanPoint) => Math.hypot(b[0] - a[0], b[1] - a[1]);
const sideLength = (outline: readonly PlanPoint[], edge: number) =>
  span(outline[edge], outline[(edge + 1) % outline.length]);

const refuse = (message: string): Outcome => ({ refused: `${message} The walls are as they were.` });

/** Puts moved corners in place, with the same number and order of sides. */
function withCorners(document: FloorPlanDocument, corners: readonly PlanPoint[]): Outcome {
  const { floorPlan } = document;
  const before = floorPlan.outline;
  const outline = corners.map(tidyPoint);
  const fault = outlineFault(outline, (edge) => floorPlan.outlineWalls[edge].name);
  if (fault) return refuse(fault.message);
  const moved = outline.map((corner, i) => span(corner, before[i]) > 0);
  const openings = floorPlan.openings.map((opening) => {
    const edge = edgeOf(opening.wall);
    if (edge === null || edge >= outline.length) return opening;
    return keepOnWall(opening, {
      before: sideLength(before, edge),
      after: sideLength(outline, edge),
      firstEndMoved: moved[edge],
      lastEndMoved: moved[(edge + 1) % outline.length],
    });
  });
  return { ...document, floorPlan: { ...floorPlan, outline, openings } };
}

/** A new outline from its corners. What stood in the room stays; doors and windows of the old outer walls go. */
export function drawOutline(
  document: FloorPlanDocument | null,
  corners: readonly PlanPoint[],
  ceiling = document?.ceiling ?? DEFAULT_CEILING,
): Outcome {
  const drawn = corners.map(tidyPoint);
  const outline = signedArea(drawn) < 0 ? drawn.reverse() : drawn;
  const fault = outlineFault(outline);
  if (fault) return { refused: `${fault.message} Nothing was drawn.` };
  const outlineWalls = sideNamesOf(outline).map((name) => ({ name, thickness: DEFAULT_THICKNESS }));
  const held = document?.floorPlan;
  return {
    ceiling,
    floorPlan: {
      outline,
      outlineWalls,
      innerWalls: held?.innerWalls ?? [],
      openings: held?.openings.filter(({ wall }) => edgeOf(wall) === null) ?? [],
      furniture: held?.furniture ?? [],
      touchPoints: held?.touchPoints ?? [],
      watchPoints: held?.watchPoints ?? [],
    },
  };
}

/** A rectangular room with its upper left corner at 0, 0. */
export const drawRectangle = (
  document: FloorPlanDocument | null,
  width: number,
  depth: number,
  ceiling?: number,
): Outcome =>
  drawOutline(
    document,
    [
      [0, 0],
      [width, 0],
      [width, depth],
      [0, depth],
    ],
    ceiling,
  );

export const moveCorner = (document: FloorPlanDocument, corner: number, to: PlanPoint): Outcome =>
  withCorners(
    document,
    document.floorPlan.outline.map((at, i) => (i === corner ? to : at)),
  );

/** Moves a side outward by `offset` metres, inward when negative. */
export const moveSide = (document: FloorPlanDocument, edge: number, offset: number): Outcome =>
  withCorners(document, withSideMoved(document.floorPlan.outline, edge, offset));

export const setSideLength = (document: FloorPlanDocument, edge: number, length: number): Outcome =>
  withCorners(document, withSideLength(document.floorPlan.outline, edge, length));

const renumber = (openings: readonly Opening[], place: (edge: number, opening: Opening) => Opening) =>
  openings.map((opening) => {
    const edge = edgeOf(opening.wall);
    return edge === null ? opening : place(edge, opening);
  });

/** Splits a side in two at `s` metres from its first corner; both keep its name until given their own. */
export function addCorner(document: FloorPlanDocument, edge: number, s: number): Outcome {
  const { floorPlan } = document;
  const { outline, outlineWalls } = floorPlan;
  const length = sideLength(outline, edge);
  if (s < 0.05 || s > length - 0.05) return refuse('A new corner must stand 5 cm or more from the next.');
  const wall = outlineWallId(edge);
  if (floorPlan.openings.some((o) => o.wall === wall && o.from < s && o.to > s))
    return refuse('A corner cannot stand in a door or a window.');
  const [a, b] = [outline[edge], outline[(edge + 1) % outline.length]];
  const at = tidyPoint([a[0] + ((b[0] - a[0]) * s) / length, a[1] + ((b[1] - a[1]) * s) / length]);
  const second: OutlineWall = {
    ...outlineWalls[edge],
    name: `${outlineWalls[edge].name} 2`.slice(0, 80),
  };
  return {
    ...document,
    floorPlan: {
      ...floorPlan,
      outline: outline.toSpliced(edge + 1, 0, at),
      outlineWalls: outlineWalls.toSpliced(edge + 1, 0, second),
      openings: renumber(floorPlan.openings, (on, opening) => {
        if (on > edge) return { ...opening, wall: outlineWallId(on + 1) };
        if (on < edge || opening.from < s) return opening;
        const shifted = {
          ...opening,
          wall: outlineWallId(edge + 1),
          from: opening.from - s,
          to: opening.to - s,
        };
        return fitOpening(shifted, length - s);
      }),
    },
  };
}

/** Takes a corner out: its two sides become one, which keeps the first one's name. */
export function removeCorner(document: FloorPlanDocument, corner: number): Outcome {
  const { floorPlan } = document;
  const { outline, outlineWalls } = floorPlan;
  const n = outline.length;
  if (n <= 3) return refuse('A room needs at least 3 corners.');
  const first = (corner + n - 1) % n;
  const [before, after] = [outline[first], outline[(corner + 1) % n]];
  const rest = outline.toSpliced(corner, 1);
  const fault = outlineFault(rest);
  if (fault) return refuse(fault.message);
  const length = span(before, after);
  const joint = sideLength(outline, first);
  // The corner's own side goes; the sides after it in the list move up by one, the joined one may too.
  const moveUp = (edge: number) => outlineWallId(edge > corner ? edge - 1 : edge);
  return {
    ...document,
    floorPlan: {
      ...floorPlan,
      outline: rest,
      outlineWalls: outlineWalls.toSpliced(corner, 1),
      openings: renumber(floorPlan.openings, (on, opening) => {
        if (on === first) return fitOpening({ ...opening, wall: moveUp(first) }, length);
        if (on !== corner) return { ...opening, wall: moveUp(on) };
        const joined = {
          ...opening,
          wall: moveUp(first),
          from: opening.from + joint,
          to: opening.to + joint,
        };
        return fitOpening(joined, length);
      }),
    },
  };
}

export const changeSide = (
  document: FloorPlanDocument,
  edge: number,
  change: Partial<OutlineWall>,
): FloorPlanDocument => ({
  ...document,
  floorPlan: {
    ...document.floorPlan,
    outlineWalls: document.floorPlan.outlineWalls.map((wall, i) =>
      i === edge ? { ...wall, ...change } : wall,
    ),
  },
});

export const setCeiling = (document: FloorPlanDocument, ceiling: number): FloorPlanDocument => ({
  ...document,
  ceiling,
});
