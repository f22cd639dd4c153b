import type { FloorPlanDocument, PlanPoint } from '@/lib/room';
import { pieceSize } from '@/lib/room/piece-size';
import { againstWall, outlineWallId, wallRuns } from '@/lib/room/wall-geometry';
import { toDegrees } from '@/lib/units';
import { changePiece, LEAST_PIECE, resizePiece, turnPiece } from '../furniture-actions';
import type { Handle } from '../hit-test';
import { placeInnerWall } from '../inner-wall-actions';
import { LEAST_OPENING } from '../keep-openings';
import { changeOpening } from '../opening-actions';
import { moveCorner } from '../outline-actions';
import { onGrid, snapPoint, straighten } from '../snapping';
import { turnTouchPoint } from '../spot-actions';
import type { Gesture, Pull, Pulled } from './gesture';

/** Degrees that turning by hand goes in; with Shift every degree. */
const TURN_STEP = 15;

/** Takes hold of a handle of a chosen thing. */
export function pullHandle(document: FloorPlanDocument, handle: Handle): Gesture {
  return { mark: markOf(handle), pull: pullOf(document, handle) };
}

const markOf = (handle: Handle): string => {
  switch (handle.kind) {
    case 'corner':
      return `corner ${handle.corner}`;
    case 'turn':
      return `turn ${handle.ref.id}`;
    default:
      return `${handle.kind} ${handle.id}`;
  }
};

function pullOf(document: FloorPlanDocument, handle: Handle): (pull: Pull) => Pulled {
  const { floorPlan } = document;
  const runs = wallRuns(floorPlan);
  const still = (): Pulled => ({ outcome: document, guides: [] });
  switch (handle.kind) {
    case 'corner': {
      const n = floorPlan.outline.length;
      const own = [outlineWallId(handle.corner), outlineWallId((handle.corner + n - 1) % n)];
      const others = floorPlan.outline.filter((_, i) => i !== handle.corner);
      const walls = runs.filter((run) => !own.includes(run.id));
      return (pull) => {
        const { at, guides } = snapPoint(pull.at, others, walls, pull);
        return { outcome: moveCorner(document, handle.corner, at), guides };
      };
    }
    case 'wall-end': {
      const wall = floorPlan.innerWalls.find(({ id }) => id === handle.id);
      if (!wall) return still;
      const other = wall[handle.end === 'a' ? 'b' : 'a'];
      const walls = runs.filter(({ id }) => id !== handle.id);
      return (pull) => {
        const aim = pull.shift ? straighten(other, pull.at) : pull.at;
        const { at, guides } = snapPoint(aim, [other, ...floorPlan.outline], walls, pull);
        return { outcome: placeInnerWall(document, handle.id, { [handle.end]: at }), guides };
      };
    }
    case 'opening-end': {
      const opening = floorPlan.openings.find(({ id }) => id === handle.id);
      const run = runs.find(({ id }) => id === opening?.wall);
      if (!opening || !run) return still;
      return ({ at, free }) => {
        const { s } = againstWall(run, at);
        const step = free ? s : onGrid(s);
        const end =
          handle.end === 'from'
            ? Math.max(0, Math.min(step, opening.to - LEAST_OPENING))
            : Math.min(run.length, Math.max(step, opening.from + LEAST_OPENING));
        return { outcome: changeOpening(document, handle.id, { [handle.end]: end }), guides: [] };
      };
    }
    case 'piece-side':
      return pullSide(document, handle);
    case 'turn':
      return ({ at, shift }) => {
        const step = shift ? 1 : TURN_STEP;
        const free = toDegrees(Math.atan2(at[1] - handle.about[1], at[0] - handle.about[0]));
        // A piece's handle stands at its back (−y); a touch point's where it faces.
        const turn = Math.round((handle.ref.kind === 'furniture' ? free + 90 : free) / step) * step;
        return {
          outcome:
            handle.ref.kind === 'furniture'
              ? turnPiece(document, handle.ref.id, turn)
              : turnTouchPoint(document, handle.ref.id, turn),
          guides: [],
        };
      };
  }
}

/** Stretches a piece from one side or corner; the opposite one stays where it is. */
function pullSide(
  document: FloorPlanDocument,
  { id, side: [u, v] }: Extract<Handle, { kind: 'piece-side' }>,
): (pull: Pull) => Pulled {
  const piece = document.floorPlan.furniture.find((candidate) => candidate.id === id);
  if (!piece) return () => ({ outcome: document, guides: [] });
  const size = pieceSize(piece);
  const anchor: PlanPoint = [
    u > 0 ? size.minX : u < 0 ? size.maxX : 0,
    v > 0 ? size.minY : v < 0 ? size.maxY : 0,
  ];
  const angle = (piece.turn * Math.PI) / 180;
  return ({ at, free, shift }) => {
    const [dx, dy] = [at[0] - piece.at[0], at[1] - piece.at[1]];
    const own: PlanPoint = [
      dx * Math.cos(angle) + dy * Math.sin(angle),
      dy * Math.cos(angle) - dx * Math.sin(angle),
    ];
    const step = (value: number) => Math.max(LEAST_PIECE, free ? value : onGrid(value) || LEAST_PIECE);
    let width = u === 0 ? size.width : step(u * (own[0] - anchor[0]));
    let depth = v === 0 ? size.depth : step(v * (own[1] - anchor[1]));
    if (shift && u !== 0 && v !== 0) {
      const factor = Math.max(width / size.width, depth / size.depth);
      [width, depth] = [size.width * factor, size.depth * factor];
    }
    return {
      outcome: changePiece(document, id, (held) => resizePiece(held, width, depth, anchor)),
      guides: [],
    };
  };
}
