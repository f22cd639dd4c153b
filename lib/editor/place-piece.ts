import type { FloorPlanDocument, Furniture, PlanPoint } from '@/lib/room';
import type { ShelfPiece } from '@/lib/room/furniture-shelf/shelf-piece';
import { takeFromShelf } from '@/lib/room/furniture-shelf/take-from-shelf';
import { wallRuns } from '@/lib/room/wall-geometry';
import { normaliseDegrees, toDegrees } from '@/lib/units';
import { freeName } from './free-name';
import { tidy } from './outcome';
import { nearestFace, type Snapped, type SnapReach, snapPiece } from './snapping';

/** A wall nearer than this turns a piece from the shelf to it, metres. */
const WALL_TURN = 0.9;

/** A shelf piece where the hand holds it: its back to a near wall, flush with it. Beds stand with their head there. */
export function placedFromShelf(
  { floorPlan }: FloorPlanDocument,
  shelf: ShelfPiece,
  at: PlanPoint,
  turn: number | null,
  snap: SnapReach,
  newId: () => string,
): { piece: Furniture } & Snapped {
  const runs = wallRuns(floorPlan);
  const face = nearestFace(at, runs, WALL_TURN);
  // Out of the wall, into the room: where the piece's front looks.
  const front = face
    ? toDegrees(Math.atan2(face.run.across[1] * face.facing, face.run.across[0] * face.facing))
    : 90;
  const own = shelf.kind === 'bed' ? front : front - 90;
  const name = freeName(
    shelf.label,
    floorPlan.furniture.map((piece) => piece.name),
  );
  const loose = takeFromShelf(shelf, name, at, turn ?? tidy(normaliseDegrees(own)), newId);
  const snapped = snapPiece(loose, at, runs, { ...snap, reach: Math.max(snap.reach, 0.25) });
  return { piece: { ...loose, at: snapped.at }, ...snapped };
}
