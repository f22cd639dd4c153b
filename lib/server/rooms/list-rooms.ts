import 'server-only';
import { and, asc, eq, max } from 'drizzle-orm';
import type { z } from 'zod';
import type { Db, Tx } from '@/db/client';
import { floorPlans, revisions, rooms, sites, stopSets, users } from '@/db/schema';
import { AppError } from '@/lib/errors';
import type { roomSummarySchema } from '@/lib/room/api/resources';
import type { Actor } from '../actor';

export type RoomSummary = z.input<typeof roomSummarySchema>;

/** The organisation's rooms (or the one asked for), with what is needed to see their state at a glance. */
export async function listRooms(db: Db | Tx, actor: Actor, roomId?: string): Promise<RoomSummary[]> {
  const mine = and(
    eq(rooms.organisationId, actor.organisationId),
    roomId === undefined ? undefined : eq(rooms.id, roomId),
  );
  const found = await db
    .select({ room: rooms, site: sites, planAt: floorPlans.updatedAt, planBy: users.name })
    .from(rooms)
    .innerJoin(sites, eq(sites.id, rooms.siteId))
    .leftJoin(floorPlans, eq(floorPlans.roomId, rooms.id))
    .leftJoin(users, eq(users.id, floorPlans.updatedBy))
    .where(mine)
    .orderBy(asc(sites.name), asc(rooms.name));
  const newest = await db
    .select({ roomId: revisions.roomId, number: max(revisions.number) })
    .from(revisions)
    .innerJoin(rooms, eq(rooms.id, revisions.roomId))
    .where(mine)
    .groupBy(revisions.roomId);
  const sets = await db
    .select({
      roomId: stopSets.roomId,
      id: stopSets.id,
      document: stopSets.document,
      status: stopSets.status,
      at: stopSets.updatedAt,
      by: users.name,
    })
    .from(stopSets)
    .innerJoin(rooms, eq(rooms.id, stopSets.roomId))
    .innerJoin(users, eq(users.id, stopSets.updatedBy))
    .where(mine)
    .orderBy(asc(stopSets.position));
  return found.map(({ room, site, planAt, planBy }) => {
    const own = sets.filter((set) => set.roomId === room.id);
    const changes = [
      { at: room.createdAt, by: '' },
      ...(planAt ? [{ at: planAt, by: planBy ?? '' }] : []),
      ...own,
    ];
    const last = changes.reduce((latest, change) => (change.at > latest.at ? change : latest));
    return {
      id: room.id,
      name: room.name,
      area: room.area,
      site: { id: site.id, name: site.name },
      archived: room.archivedAt !== null,
      drawn: planAt !== null,
      revision: newest.find((revision) => revision.roomId === room.id)?.number ?? null,
      stopSets: own.map(({ id, document, status }) => ({ id, name: document.name, status })),
      updatedAt: last.at.toISOString(),
      updatedBy: last.by,
    };
  });
}

/** One room's summary. */
export async function getRoom(db: Db | Tx, actor: Actor, roomId: string): Promise<RoomSummary> {
  const [room] = await listRooms(db, actor, roomId);
  if (!room) throw new AppError('not_found', 'There is no such room.');
  return room;
}
