import 'server-only';
import type { Db } from '@/db/client';
import { AppError } from '@/lib/errors';
import type { RoomFile } from '@/lib/room/schema/room-file';
import type { Actor } from '../actor';
import { listEmitters } from '../emitters/list-emitters';
import { getFloorPlan } from '../floor-plans/get-floor-plan';
import { listStopSets } from '../stop-sets/read-stop-sets';
import { getRoom } from './list-rooms';

/** The room with its stop sets as one open room file; only the emitters that the sets use go along. */
export async function exportRoom(db: Db, actor: Actor, roomId: string): Promise<RoomFile> {
  const room = await getRoom(db, actor, roomId);
  const { document } = await getFloorPlan(db, actor, roomId);
  if (!document) throw new AppError('invalid', 'Draw the room first: there is nothing to export yet.');
  const sets = (await listStopSets(db, actor, roomId)).map(({ stopSet }) => stopSet);
  const used = new Set(
    sets.flatMap((set) => [set.emitter, ...[...set.stops, ...set.passes].map((item) => item.emitter)]),
  );
  const emitters = Object.entries(await listEmitters(db, actor)).filter(([key]) => used.has(key));
  return {
    format: 'leeside-room',
    version: 1,
    room: {
      name: room.name,
      site: room.site.name,
      ...(room.area ? { area: room.area } : {}),
      ceiling: document.ceiling,
    },
    floorPlan: document.floorPlan,
    emitters: Object.fromEntries(emitters),
    stopSets: sets,
  };
}
