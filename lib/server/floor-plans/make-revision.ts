import 'server-only';
import { eq, max } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { floorPlans, revisions } from '@/db/schema';
import { AppError } from '@/lib/errors';
import type { Actor } from '../actor';
import { audit } from '../audit';
import { ownRoom } from '../rooms/own-room';

/** Freezes the working plan as the next revision. */
export function makeRevision({ write }: Database, actor: Actor, roomId: string, note: string) {
  return write(async (tx) => {
    await ownRoom(tx, actor, roomId);
    const [plan] = await tx.select().from(floorPlans).where(eq(floorPlans.roomId, roomId));
    if (!plan) throw new AppError('invalid', 'Draw the room first: there is nothing to freeze yet.');
    const [newest] = await tx
      .select({ number: max(revisions.number) })
      .from(revisions)
      .where(eq(revisions.roomId, roomId));
    const number = (newest?.number ?? 0) + 1;
    const createdAt = new Date();
    await tx.insert(revisions).values({
      roomId,
      number,
      document: plan.document,
      planVersion: plan.version,
      note,
      createdBy: actor.userId,
      createdAt,
    });
    await audit(tx, actor, 'save revision', 'room', roomId, { number });
    return {
      number,
      note,
      planVersion: plan.version,
      createdAt: createdAt.toISOString(),
      createdBy: actor.name,
    };
  });
}
