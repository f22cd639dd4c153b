import 'server-only';
import { and, eq } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { rooms, sites } from '@/db/schema';
import { AppError } from '@/lib/errors';
import type { Actor } from '../actor';
import { audit } from '../audit';
import { newId } from '../new-id';
import { getRoom, type RoomSummary } from './list-rooms';

/** A room with nothing drawn in it yet. */
export function createRoom(
  { write }: Database,
  actor: Actor,
  { siteId, name, area }: { siteId: string; name: string; area?: string },
): Promise<RoomSummary> {
  return write(async (tx) => {
    const [site] = await tx
      .select()
      .from(sites)
      .where(and(eq(sites.id, siteId), eq(sites.organisationId, actor.organisationId)));
    if (!site) throw new AppError('not_found', 'There is no such site.');
    const id = newId();
    await tx.insert(rooms).values({
      id,
      organisationId: actor.organisationId,
      siteId,
      name,
      area: area ?? null,
      createdAt: new Date(),
    });
    await audit(tx, actor, 'add room', 'room', id, { name });
    return getRoom(tx, actor, id);
  });
}
