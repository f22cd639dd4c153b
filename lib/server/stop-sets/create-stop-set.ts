import 'server-only';
import { count, eq, max } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { stopSets } from '@/db/schema';
import { AppError } from '@/lib/errors';
import { setReferenceFaults } from '@/lib/room/check-references';
import { MOST_STOP_SETS } from '@/lib/room/schema/room-file';
import type { StopSet } from '@/lib/room/schema/stop-set';
import type { Actor } from '../actor';
import { audit } from '../audit';
import { listEmitters } from '../emitters/list-emitters';
import { refuseFaults } from '../refuse-faults';
import { ownRoom } from '../rooms/own-room';
import { sameJson } from '../same-json';

/** Adds a draft. The browser makes the id, so a repeated request adds nothing twice. */
export function createStopSet(
  { write }: Database,
  actor: Actor,
  roomId: string,
  set: StopSet,
): Promise<{ version: number; added: boolean }> {
  return write(async (tx) => {
    await ownRoom(tx, actor, roomId);
    const [held] = await tx.select().from(stopSets).where(eq(stopSets.id, set.id));
    if (held?.roomId === roomId && sameJson(held.document, set))
      return { version: held.version, added: false };
    if (held)
      throw new AppError('conflict', 'This id is taken. Nothing was changed.', [
        { path: 'id', message: 'Make another id' },
      ]);
    refuseFaults(setReferenceFaults(set, await listEmitters(tx, actor)), 'stop set');
    const [last] = await tx
      .select({ position: max(stopSets.position), held: count() })
      .from(stopSets)
      .where(eq(stopSets.roomId, roomId));
    if (last.held >= MOST_STOP_SETS)
      throw new AppError(
        'conflict',
        `A room holds ${MOST_STOP_SETS} stop sets at most. Delete a draft first; nothing was changed.`,
      );
    await tx.insert(stopSets).values({
      id: set.id,
      roomId,
      document: set,
      version: 1,
      position: (last.position ?? 0) + 1,
      updatedBy: actor.userId,
      updatedAt: new Date(),
    });
    await audit(tx, actor, 'add stop set', 'stop set', set.id, { name: set.name });
    return { version: 1, added: true };
  });
}
