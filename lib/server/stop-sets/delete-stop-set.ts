import 'server-only';
import { eq } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { stopSets } from '@/db/schema';
import type { Actor } from '../actor';
import { audit } from '../audit';
import { staleSave } from '../stale';
import { ownStopSet, refuseUnlessDraft } from './own-stop-set';

/** Deletes a draft at version `expected`. */
export function deleteStopSet(
  { write }: Database,
  actor: Actor,
  stopSetId: string,
  expected: number,
): Promise<void> {
  return write(async (tx) => {
    const held = await ownStopSet(tx, actor, stopSetId);
    refuseUnlessDraft(held);
    if (held.version !== expected) throw await staleSave(tx, 'stop set', held);
    await tx.delete(stopSets).where(eq(stopSets.id, stopSetId));
    await audit(tx, actor, 'delete stop set', 'stop set', stopSetId, { name: held.document.name });
  });
}
