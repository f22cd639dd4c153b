import type { FloorPlanDocument, PlanPoint } from '@/lib/room';
import type { PlanRef } from '@/lib/room/plan-ref';
import { placedTouchPoints } from '@/lib/room/touch-points';
import { edgeOf, wallRuns } from '@/lib/room/wall-geometry';
import { movePiece } from '../furniture-actions';
import { wallAt } from '../hit-test';
import { placeInnerWall } from '../inner-wall-actions';
import { slideOpening } from '../opening-actions';
import { moveSide } from '../outline-actions';
import { nearestFace, onGrid, snapPiece, snapPoint } from '../snapping';
import { changeWatchPoint, moveTouchPoint } from '../spot-actions';
import type { Gesture, Pull, Pulled } from './gesture';

/** Takes hold of a thing at `grip` and moves it; `null` for what is not there. */
export function moveThing(document: FloorPlanDocument, ref: PlanRef, grip: PlanPoint): Gesture | null {
  const pull = pullOf(document, ref, grip);
  return pull && { mark: `move ${ref.kind} ${ref.id}`, pull };
}

function pullOf(
  document: FloorPlanDocument,
  { kind, id }: PlanRef,
  grip: PlanPoint,
): ((pull: Pull) => Pulled) | null {
  const { floorPlan } = document;
  const runs = wallRuns(floorPlan);
  const from = (start: PlanPoint, { at }: Pull): PlanPoint => [
    start[0] + at[0] - grip[0],
    start[1] + at[1] - grip[1],
  ];
  switch (kind) {
    case 'furniture': {
      const piece = floorPlan.furniture.find((candidate) => candidate.id === id);
      if (!piece) return null;
      return (pull) => {
        const { at, guides } = snapPiece(piece, from(piece.at, pull), runs, pull);
        return { outcome: movePiece(document, id, at), guides };
      };
    }
    case 'outline-wall': {
      const run = runs.find((candidate) => candidate.id === id);
      const edge = edgeOf(id);
      if (!run || edge === null) return null;
      return (pull) => {
        const [dx, dy] = from([0, 0], pull);
        const offset = dx * run.across[0] + dy * run.across[1];
        return { outcome: moveSide(document, edge, pull.free ? offset : onGrid(offset)), guides: [] };
      };
    }
    case 'inner-wall': {
      const wall = floorPlan.innerWalls.find((candidate) => candidate.id === id);
      if (!wall) return null;
      return (pull) => {
        const [x, y] = from(wall.a, pull);
        const a: PlanPoint = pull.free ? [x, y] : [onGrid(x), onGrid(y)];
        const b: PlanPoint = [wall.b[0] + a[0] - wall.a[0], wall.b[1] + a[1] - wall.a[1]];
        return { outcome: placeInnerWall(document, id, { a, b }), guides: [] };
      };
    }
    case 'opening': {
      const opening = floorPlan.openings.find((candidate) => candidate.id === id);
      const own = runs.find((candidate) => candidate.id === opening?.wall);
      if (!opening || !own) return null;
      // The middle of the opening follows the hand, on whichever wall the hand is at.
      const middle = (opening.from + opening.to) / 2;
      const lead = (grip[0] - own.a[0]) * own.along[0] + (grip[1] - own.a[1]) * own.along[1] - middle;
      return ({ at, reach, free }) => {
        const run = wallAt(runs, at, reach) ?? own;
        const s = (at[0] - run.a[0]) * run.along[0] + (at[1] - run.a[1]) * run.along[1] - lead;
        const half = (opening.to - opening.from) / 2;
        return {
          outcome: slideOpening(document, id, run.id, free ? s : onGrid(s - half) + half),
          guides: [],
        };
      };
    }
    case 'touch-point': {
      const spot = placedTouchPoints(document.floorPlan).find(({ point }) => point.id === id);
      if (!spot) return null;
      return (pull) => {
        const at = from(spot.at, pull);
        const face = pull.free ? null : nearestFace(at, runs, pull.reach);
        const snapped = face ? snapPoint(at, [], [face.run], pull) : { at, guides: [] };
        return { outcome: moveTouchPoint(document, id, snapped.at), guides: snapped.guides };
      };
    }
    case 'watch-point': {
      const spot = floorPlan.watchPoints.find((candidate) => candidate.id === id);
      if (!spot) return null;
      return (pull) => {
        const { at } = snapPoint(from(spot.at, pull), [], [], pull);
        return { outcome: changeWatchPoint(document, id, { at }), guides: [] };
      };
    }
  }
}
