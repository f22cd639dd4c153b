import 'server-only';
import { eq } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { stopSets } from '@/db/schema';
import { AppError } from '@/lib/errors';
import { setReferenceFaults } from '@/lib/room/check-references';
import type { StopSet } from '@/lib/room/schema/stop-set';
import type { Actor } from '../actor';
import { audit } from '../audit';
import { listEmitters } from '../emitters/list-emitters';
import { refuseFaults } from '../refuse-faults';
import { isRepeated, staleSave } from '../stale';
import { ownStopSet, refuseUnlessDraft } from './own-stop-set';

/** Saves a draft over version `expected`; answers the new version, or who was first. */
export function saveStopSet(
  { write }: Database,
  actor: Actor,
  stopSetId: string,
  set: StopSet,
  expected: number,
): Promise<number> {
  return write(async (tx) => {
    const held = await ownStopSet(tx, actor, stopSetId);
    if (set.id !== stopSetId)
      throw new AppError('invalid', 'The id in the body is not the id in the address. Nothing was changed.', [
        { path: 'id', message: `Must be ${stopSetId}` },
      ]);
    refuseUnlessDraft(held);
    if (isRepeated(held, actor, set, expected)) return held.version;
    if (held.version !== expected) throw await staleSave(tx, 'stop set', held);
    refuseFaults(setReferenceFaults(set, await listEmitters(tx, actor)), 'stop set');
    const version = expected + 1;
    await tx
      .update(stopSets)
      .set({ document: set, version, updatedBy: actor.userId, updatedAt: new Date() })
      .where(eq(stopSets.id, stopSetId));
    await audit(tx, actor, 'save stop set', 'stop set', stopSetId, { version });
    return version;
  });
}
