import 'server-only';
import { desc, eq } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { revisions, users } from '@/db/schema';
import type { Actor } from '../actor';
import { ownRoom } from '../rooms/own-room';

/** Frozen copies of a room's floor plan, newest first, without their drawings. */
export async function listRevisions(db: Db, actor: Actor, roomId: string, most = 500) {
  await ownRoom(db, actor, roomId);
  const rows = await db
    .select({
      number: revisions.number,
      note: revisions.note,
      planVersion: revisions.planVersion,
      createdAt: revisions.createdAt,
      createdBy: users.name,
    })
    .from(revisions)
    .innerJoin(users, eq(users.id, revisions.createdBy))
    .where(eq(revisions.roomId, roomId))
    .orderBy(desc(revisions.number))
    .limit(most);
  return rows.map((row) => ({ ...row, createdAt: row.createdAt.toISOString() }));
}
