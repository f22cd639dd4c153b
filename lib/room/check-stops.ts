import { distanceToSegment, sideOf } from '@/lib/geometry/polygon';
import type { Emitters } from './schema/emitter';
import type { FloorPlan } from './schema/floor-plan';
import type { StopSet } from './schema/stop-set';
import { wallFaces } from './tape';
import { emitterOf } from './times';
import { footprintInPlan, slabOf } from './to-scene';

export interface StopProblem {
  readonly stopId: string;
  /** `wrong`: it cannot be set out. `tight`: it can, with less free floor than the emitter wants. */
  readonly kind: 'wrong' | 'tight';
  readonly message: string;
}

/** Parts whose underside is above this do not stand in an emitter's way. */
const HEADROOM = 2;

/** What keeps a stop from being set out as drawn; the first thing found for each stop. */
export function stopProblems(set: StopSet, plan: FloorPlan, emitters: Emitters): StopProblem[] {
  const faces = wallFaces(plan);
  return set.stops.flatMap((stop): StopProblem[] => {
    const [x, y] = stop.at;
    const say = (kind: StopProblem['kind'], message: string) => [{ stopId: stop.id, kind, message }];
    if (sideOf(x, y, plan.outline) !== 'inside') return say('wrong', `Stop ${stop.name} is outside the room`);
    const inside = plan.innerWalls.find((wall) => {
      const slab = slabOf(wall);
      return slab !== null && sideOf(x, y, slab) !== 'outside';
    });
    if (inside) return say('wrong', `Stop ${stop.name} stands in the ${inside.name}`);
    const clearance = emitterOf(set, stop, emitters)?.clearance ?? 0;
    let tight: StopProblem[] = [];
    for (const piece of plan.furniture) {
      for (const part of piece.parts) {
        if (part.base >= HEADROOM) continue;
        const footprint = footprintInPlan(piece, part);
        if (sideOf(x, y, footprint) !== 'outside')
          return say('wrong', `Stop ${stop.name} stands on the ${piece.name}`);
        const near = Math.min(
          ...footprint.map((corner, i) =>
            distanceToSegment(x, y, corner, footprint[(i + 1) % footprint.length]),
          ),
        );
        if (near < clearance)
          tight = say(
            'tight',
            `Stop ${stop.name} is ${near.toFixed(2)} m from the ${piece.name}; the emitter wants ${clearance} m`,
          );
      }
    }
    const wall = faces.find((face) => distanceToSegment(x, y, face.a, face.b) < clearance);
    return tight.length > 0 || !wall
      ? tight
      : say(
          'tight',
          `Stop ${stop.name} is closer to the ${wall.wall} than the ${clearance} m its emitter wants`,
        );
  });
}
