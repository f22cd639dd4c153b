import 'server-only';
import { and, asc, eq } from 'drizzle-orm';
import type { z } from 'zod';
import type { Db } from '@/db/client';
import { rooms, stopSets, users } from '@/db/schema';
import { AppError } from '@/lib/errors';
import type { stopSetResourceSchema } from '@/lib/room/api/resources';
import type { Actor } from '../actor';
import { ownRoom } from '../rooms/own-room';

type Resource = z.input<typeof stopSetResourceSchema>;

async function select(db: Db, where: ReturnType<typeof and>): Promise<Resource[]> {
  const rows = await db
    .select({ set: stopSets, by: users.name })
    .from(stopSets)
    .innerJoin(rooms, eq(rooms.id, stopSets.roomId))
    .innerJoin(users, eq(users.id, stopSets.updatedBy))
    .where(where)
    .orderBy(asc(stopSets.position));
  return rows.map(({ set, by }) => ({
    stopSet: set.document,
    roomId: set.roomId,
    status: set.status,
    version: set.version,
    updatedAt: set.updatedAt.toISOString(),
    updatedBy: by,
  }));
}

/** A room's stop sets in their order. */
export async function listStopSets(db: Db, actor: Actor, roomId: string): Promise<Resource[]> {
  await ownRoom(db, actor, roomId);
  return select(db, and(eq(stopSets.roomId, roomId)));
}

export async function getStopSet(db: Db, actor: Actor, stopSetId: string): Promise<Resource> {
  const [found] = await select(
    db,
    and(eq(stopSets.id, stopSetId), eq(rooms.organisationId, actor.organisationId)),
  );
  if (!found) throw new AppError('not_found', 'There is no such stop set.');
  return found;
}
