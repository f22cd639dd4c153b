import 'server-only';
import type { Tx } from '@/db/client';
import { auditEntries } from '@/db/schema';
import type { Actor } from './actor';

/** Notes a deed in the transaction that does it. */
export async function audit(
  tx: Tx,
  actor: Actor,
  action: string,
  thing: string,
  thingId: string,
  details?: Record<string, unknown>,
): Promise<void> {
  await tx.insert(auditEntries).values({
    organisationId: actor.organisationId,
    userId: actor.userId,
    at: new Date(),
    action,
    thing,
    thingId,
    details,
  });
}
