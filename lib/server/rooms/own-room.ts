import 'server-only';
import { and, eq } from 'drizzle-orm';
import type { Db, Tx } from '@/db/client';
import { rooms } from '@/db/schema';
import { AppError } from '@/lib/errors';
import type { Actor } from '../actor';

/** The room, if it belongs to the actor's organisation: another's room does not exist for them. */
export async function ownRoom(db: Db | Tx, actor: Actor, roomId: string) {
  const [room] = await db
    .select()
    .from(rooms)
    .where(and(eq(rooms.id, roomId), eq(rooms.organisationId, actor.organisationId)));
  if (!room) throw new AppError('not_found', 'There is no such room.');
  return room;
}
