import 'server-only';
import { and, eq } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { rooms, stopSets } from '@/db/schema';
import { AppError } from '@/lib/errors';
import type { Actor } from '../actor';

/** The stop set, if its room belongs to the actor's organisation. */
export async function ownStopSet(tx: Tx, actor: Actor, stopSetId: string) {
  const [found] = await tx
    .select({ set: stopSets })
    .from(stopSets)
    .innerJoin(rooms, eq(rooms.id, stopSets.roomId))
    .where(and(eq(stopSets.id, stopSetId), eq(rooms.organisationId, actor.organisationId)));
  if (!found) throw new AppError('not_found', 'There is no such stop set.');
  return found.set;
}

/** Anything past draft is what somebody looks at or has signed: it no longer changes. */
export function refuseUnlessDraft({ status }: { status: string }): void {
  if (status !== 'draft')
    throw new AppError(
      'conflict',
      `This stop set is ${status}, so it cannot be changed. Copy it to work on.`,
    );
}
