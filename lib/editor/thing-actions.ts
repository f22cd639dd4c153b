import type { FloorPlanDocument, PlanPoint } from '@/lib/room';
import type { PlanRef } from '@/lib/room/plan-ref';
import { placedTouchPoints } from '@/lib/room/touch-points';
import { edgeOf, wallRuns } from '@/lib/room/wall-geometry';
import { freeName } from './free-name';
import { addPiece, changePiece, movePiece, removePiece, turnPiece } from './furniture-actions';
import { placeInnerWall, removeInnerWall } from './inner-wall-actions';
import { addOpening, changeOpening, removeOpening, slideOpening } from './opening-actions';
import type { Outcome } from './outcome';
import { moveSide } from './outline-actions';
import { changeWatchPoint, moveTouchPoint, removeSpot, turnTouchPoint } from './spot-actions';

/** Edits that every kind of thing on a plan knows: by keyboard and from the list they all go through here. */

/** How a thing is called in lists and messages. */
export function nameOf({ floorPlan }: FloorPlanDocument, { kind, id }: PlanRef): string {
  switch (kind) {
    case 'outline-wall':
      return floorPlan.outlineWalls[edgeOf(id) ?? -1]?.name ?? 'wall';
    case 'inner-wall':
      return floorPlan.innerWalls.find((wall) => wall.id === id)?.name ?? 'inner wall';
    case 'opening': {
      const opening = floorPlan.openings.find((candidate) => candidate.id === id);
      const wall = wallRuns(floorPlan).find((run) => run.id === opening?.wall);
      return opening ? `${opening.kind} in the ${wall?.name ?? 'missing wall'}` : 'opening';
    }
    case 'furniture':
      return floorPlan.furniture.find((piece) => piece.id === id)?.name ?? 'furniture';
    case 'touch-point':
      return placedTouchPoints(floorPlan).find(({ point }) => point.id === id)?.point.name ?? 'touch point';
    case 'watch-point':
      return floorPlan.watchPoints.find((point) => point.id === id)?.name ?? 'watch point';
  }
}

/** Is there still such a thing? */
export function exists({ floorPlan }: FloorPlanDocument, { kind, id }: PlanRef): boolean {
  switch (kind) {
    case 'outline-wall':
      return (edgeOf(id) ?? Number.POSITIVE_INFINITY) < floorPlan.outline.length;
    case 'inner-wall':
      return floorPlan.innerWalls.some((wall) => wall.id === id);
    case 'opening':
      return floorPlan.openings.some((opening) => opening.id === id);
    case 'furniture':
      return floorPlan.furniture.some((piece) => piece.id === id);
    case 'touch-point':
      return placedTouchPoints(floorPlan).some(({ point }) => point.id === id);
    case 'watch-point':
      return floorPlan.watchPoints.some((point) => point.id === id);
  }
}

export function removeThing(document: FloorPlanDocument, { kind, id }: PlanRef): Outcome {
  switch (kind) {
    case 'outline-wall':
      return {
        refused: 'An outer wall cannot be deleted. Take out one of its corners, or draw the room anew.',
      };
    case 'inner-wall':
      return removeInnerWall(document, id);
    case 'opening':
      return removeOpening(document, id);
    case 'furniture':
      return removePiece(document, id);
    case 'touch-point':
    case 'watch-point':
      return removeSpot(document, id);
  }
}

/** Moves a thing by so many metres. An opening goes along its wall, an outer wall square to itself. */
export function nudgeThing(document: FloorPlanDocument, { kind, id }: PlanRef, [dx, dy]: PlanPoint): Outcome {
  const { floorPlan } = document;
  const moved = ([x, y]: PlanPoint): PlanPoint => [x + dx, y + dy];
  const run = (wall: string) => wallRuns(floorPlan).find((candidate) => candidate.id === wall);
  switch (kind) {
    case 'outline-wall': {
      const wall = run(id);
      return wall ? moveSide(document, edgeOf(id) ?? 0, dx * wall.across[0] + dy * wall.across[1]) : document;
    }
    case 'inner-wall': {
      const wall = floorPlan.innerWalls.find((candidate) => candidate.id === id);
      return wall ? placeInnerWall(document, id, { a: moved(wall.a), b: moved(wall.b) }) : document;
    }
    case 'opening': {
      const opening = floorPlan.openings.find((candidate) => candidate.id === id);
      const wall = opening && run(opening.wall);
      if (!wall) return document;
      const along = dx * wall.along[0] + dy * wall.along[1];
      return slideOpening(document, id, opening.wall, (opening.from + opening.to) / 2 + along);
    }
    case 'furniture': {
      const piece = floorPlan.furniture.find((candidate) => candidate.id === id);
      return piece ? movePiece(document, id, moved(piece.at)) : document;
    }
    case 'touch-point': {
      const spot = placedTouchPoints(document.floorPlan).find(({ point }) => point.id === id);
      return spot ? moveTouchPoint(document, id, moved(spot.at)) : document;
    }
    case 'watch-point': {
      const spot = floorPlan.watchPoints.find((candidate) => candidate.id === id);
      return spot ? changeWatchPoint(document, id, { at: moved(spot.at) }) : document;
    }
  }
}

/** Turns what can be turned by so many degrees; a door swings open or shut instead. */
export function turnThing(document: FloorPlanDocument, { kind, id }: PlanRef, by: number): Outcome {
  if (kind === 'furniture') {
    const piece = document.floorPlan.furniture.find((candidate) => candidate.id === id);
    return piece ? turnPiece(document, id, piece.turn + by) : document;
  }
  if (kind === 'touch-point') {
    const spot = placedTouchPoints(document.floorPlan).find(({ point }) => point.id === id);
    return spot ? turnTouchPoint(document, id, spot.facing + by) : document;
  }
  if (kind === 'opening') {
    const opening = document.floorPlan.openings.find((candidate) => candidate.id === id);
    return opening ? changeOpening(document, id, { open: !opening.open }) : document;
  }
  return document;
}

/** How far a copy stands from what it was made from, metres. */
const COPY_OFFSET = 0.3;

/** A copy beside the thing; `newId` names it and, for furniture, each of its touch points. Outer walls have none. */
export function duplicateThing(
  document: FloorPlanDocument,
  ref: PlanRef,
  newId: () => string,
): { outcome: Outcome; copy: PlanRef | null } {
  const { floorPlan } = document;
  const id = newId();
  const copy: PlanRef = { kind: ref.kind, id };
  const beside = ([x, y]: PlanPoint): PlanPoint => [x + COPY_OFFSET, y + COPY_OFFSET];
  switch (ref.kind) {
    case 'furniture': {
      const piece = floorPlan.furniture.find((candidate) => candidate.id === ref.id);
      if (!piece) break;
      const name = freeName(
        piece.name.replace(/ \d+$/, ''),
        floorPlan.furniture.map((one) => one.name),
      );
      const touchPoints = piece.touchPoints.map((point) => ({ ...point, id: newId() }));
      return { outcome: addPiece(document, { ...piece, id, name, at: beside(piece.at), touchPoints }), copy };
    }
    case 'inner-wall': {
      const wall = floorPlan.innerWalls.find((candidate) => candidate.id === ref.id);
      if (!wall) break;
      const name = freeName(
        wall.name,
        floorPlan.innerWalls.map((one) => one.name),
      );
      const innerWalls = [
        ...floorPlan.innerWalls,
        { ...wall, id, name, a: beside(wall.a), b: beside(wall.b) },
      ];
      return { outcome: { ...document, floorPlan: { ...floorPlan, innerWalls } }, copy };
    }
    case 'opening': {
      const opening = floorPlan.openings.find((candidate) => candidate.id === ref.id);
      if (!opening) break;
      const added = addOpening(
        document,
        id,
        opening.kind,
        opening.wall,
        opening.to + (opening.to - opening.from),
      );
      if ('refused' in added) return { outcome: added, copy: null };
      const { sill, head, open, transmittance } = opening;
      return { outcome: changeOpening(added, id, { sill, head, open, transmittance }), copy };
    }
    case 'touch-point': {
      const point = floorPlan.touchPoints.find((candidate) => candidate.id === ref.id);
      const piece = floorPlan.furniture.find(({ touchPoints }) => touchPoints.some((p) => p.id === ref.id));
      if (piece)
        return {
          outcome: changePiece(document, piece.id, (held) => ({
            ...held,
            touchPoints: held.touchPoints.flatMap((one) =>
              one.id === ref.id ? [one, { ...one, id, at: [one.at[0] + 0.1, one.at[1]] }] : [one],
            ),
          })),
          copy,
        };
      if (!point) break;
      const touchPoints = [...floorPlan.touchPoints, { ...point, id, at: beside(point.at) }];
      return { outcome: { ...document, floorPlan: { ...floorPlan, touchPoints } }, copy };
    }
    case 'watch-point': {
      const point = floorPlan.watchPoints.find((candidate) => candidate.id === ref.id);
      if (!point) break;
      const watchPoints = [...floorPlan.watchPoints, { ...point, id, at: beside(point.at) }];
      return { outcome: { ...document, floorPlan: { ...floorPlan, watchPoints } }, copy };
    }
  }
  return { outcome: { refused: 'This cannot be duplicated.' }, copy: null };
}
