import type { Fault } from '@/lib/errors';
import type { Emitters } from './schema/emitter';
import type { FloorPlan } from './schema/floor-plan';
import type { PlanPoint } from './schema/primitives';
import type { RoomFile } from './schema/room-file';
import type { StopSet } from './schema/stop-set';

/** Walls end where they end, give or take what a tape cannot tell. */
const SLACK = 1e-6;

function duplicates(ids: readonly { id: string; path: string }[]): Fault[] {
  const seen = new Set<string>();
  return ids.flatMap(({ id, path }) => {
    if (seen.has(id)) return [{ path, message: `The id "${id}" is used twice` }];
    seen.add(id);
    return [];
  });
}

const span = (a: PlanPoint, b: PlanPoint): number => Math.hypot(b[0] - a[0], b[1] - a[1]);

/** What a schema cannot see in a floor plan: openings on walls that are there and long enough, ids used once. */
export function planReferenceFaults(plan: FloorPlan, path = ''): Fault[] {
  const lengths = new Map<string, number>([
    ...plan.outline.map((a, i): [string, number] => [
      `outline:${i}`,
      span(a, plan.outline[(i + 1) % plan.outline.length]),
    ]),
    ...plan.innerWalls.map((wall): [string, number] => [wall.id, span(wall.a, wall.b)]),
  ]);
  const openings = plan.openings.flatMap((opening, i): Fault[] => {
    const length = lengths.get(opening.wall);
    if (length === undefined)
      return [{ path: `${path}openings[${i}].wall`, message: `There is no wall "${opening.wall}"` }];
    return opening.to > length + SLACK
      ? [{ path: `${path}openings[${i}].to`, message: `The wall ends at ${length.toFixed(3)} m` }]
      : [];
  });
  const listed = <T extends { id: string }>(items: readonly T[], name: string) =>
    items.map(({ id }, i) => ({ id, path: `${path}${name}[${i}].id` }));
  return [
    ...openings,
    ...duplicates([
      ...listed(plan.innerWalls, 'innerWalls'),
      ...listed(plan.openings, 'openings'),
      ...listed(plan.furniture, 'furniture'),
      ...listed(plan.touchPoints, 'touchPoints'),
      ...listed(plan.watchPoints, 'watchPoints'),
      ...plan.furniture.flatMap((piece, i) => listed(piece.touchPoints, `furniture[${i}].touchPoints`)),
    ]),
  ];
}

/** Stops and passes of one set must be told apart, and every emitter they name must be there. */
export function setReferenceFaults(set: StopSet, emitters: Emitters, path = ''): Fault[] {
  const items = [
    ...set.stops.map((stop, i) => ({ ...stop, path: `${path}stops[${i}]` })),
    ...set.passes.map((pass, i) => ({ ...pass, path: `${path}passes[${i}]` })),
  ];
  const named = [
    { path: `${path}emitter`, key: set.emitter },
    ...items.map((item) => ({ path: `${item.path}.emitter`, key: item.emitter })),
  ];
  return [
    ...duplicates(items.map(({ id, path: where }) => ({ id, path: `${where}.id` }))),
    ...named
      .filter(({ key }) => key !== null && !Object.hasOwn(emitters, key))
      .map(({ path: where, key }) => ({ path: where, message: `There is no emitter "${key}"` })),
  ];
}

/** The same for a whole room file. */
export function fileReferenceFaults(file: RoomFile): Fault[] {
  const sets = file.stopSets.flatMap((set, i) => setReferenceFaults(set, file.emitters, `stopSets[${i}].`));
  return [
    ...planReferenceFaults(file.floorPlan, 'floorPlan.'),
    ...sets,
    ...duplicates(file.stopSets.map(({ id }, i) => ({ id, path: `stopSets[${i}].id` }))),
  ];
}
