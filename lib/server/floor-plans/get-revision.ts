import 'server-only';
import { and, eq } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { revisions, users } from '@/db/schema';
import { AppError } from '@/lib/errors';
import type { Actor } from '../actor';
import { ownRoom } from '../rooms/own-room';

/** One frozen copy, drawing and all. */
export async function getRevision(db: Db, actor: Actor, roomId: string, number: number) {
  await ownRoom(db, actor, roomId);
  const [row] = await db
    .select({ revision: revisions, by: users.name })
    .from(revisions)
    .innerJoin(users, eq(users.id, revisions.createdBy))
    .where(and(eq(revisions.roomId, roomId), eq(revisions.number, number)));
  if (!row) throw new AppError('not_found', 'There is no such revision.');
  const { note, planVersion, createdAt, document } = row.revision;
  return { number, note, planVersion, createdAt: createdAt.toISOString(), createdBy: row.by, document };
}
