import 'server-only';
import type { Db } from '@/db/client';
import { AppError } from '@/lib/errors';
import { stopSequenceCsv } from '@/lib/room/stop-csv';
import type { Actor } from '../actor';
import { listEmitters } from '../emitters/list-emitters';
import { getFloorPlan } from '../floor-plans/get-floor-plan';
import { getRoom } from '../rooms/list-rooms';
import { getStopSet } from './read-stop-sets';

/** The crew's CSV of one stop set, and what to call it. */
export async function exportStopSequence(
  db: Db,
  actor: Actor,
  stopSetId: string,
): Promise<{ name: string; csv: string }> {
  const { stopSet, roomId } = await getStopSet(db, actor, stopSetId);
  const { document } = await getFloorPlan(db, actor, roomId);
  if (!document) throw new AppError('invalid', 'Draw the room first: stops are measured from its walls.');
  const room = await getRoom(db, actor, roomId);
  return {
    name: `${room.name} ${stopSet.name}`,
    csv: stopSequenceCsv(stopSet, document.floorPlan, await listEmitters(db, actor)),
  };
}
