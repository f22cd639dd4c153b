import 'server-only';
import { and, eq, inArray } from 'drizzle-orm';
import type { Database, Tx } from '@/db/client';
import { emitters, floorPlans, rooms, sites, stopSets } from '@/db/schema';
import { fileReferenceFaults } from '@/lib/room/check-references';
import type { Emitters } from '@/lib/room/schema/emitter';
import type { RoomFile } from '@/lib/room/schema/room-file';
import type { StopSet } from '@/lib/room/schema/stop-set';
import type { Actor } from '../actor';
import { audit } from '../audit';
import { listEmitters } from '../emitters/list-emitters';
import { newId } from '../new-id';
import { refuseFaults } from '../refuse-faults';
import { sameJson } from '../same-json';

async function siteCalled(tx: Tx, actor: Actor, name: string): Promise<string> {
  const [found] = await tx
    .select()
    .from(sites)
    .where(and(eq(sites.organisationId, actor.organisationId), eq(sites.name, name)));
  if (found) return found.id;
  const id = newId();
  await tx.insert(sites).values({ id, organisationId: actor.organisationId, name });
  await audit(tx, actor, 'add site', 'site', id, { name });
  return id;
}

/** `name`, or `name (2)` and so on when the site has a room of that name. */
async function freeRoomName(tx: Tx, siteId: string, name: string): Promise<string> {
  const taken = new Set(
    (await tx.select({ name: rooms.name }).from(rooms).where(eq(rooms.siteId, siteId))).map(
      (room) => room.name,
    ),
  );
  for (let number = 1; ; number++) {
    const suffix = number === 1 ? '' : ` (${number})`;
    // Cut between characters, not through one.
    const candidate = `${name
      .slice(0, 80 - suffix.length)
      .replace(/\p{Cs}$/u, '')
      .trimEnd()}${suffix}`;
    if (!taken.has(candidate)) return candidate;
  }
}

/**
 * What each emitter key of the file is called here: the organisation's own when it has the same emitter,
 * else the file's emitter is added under a free key.
 */
async function bringEmitters(tx: Tx, actor: Actor, wanted: Emitters): Promise<Map<string, string>> {
  const held = await listEmitters(tx, actor);
  const names = new Map<string, string>();
  for (const [key, emitter] of Object.entries(wanted)) {
    const same = sameJson(held[key], emitter)
      ? key
      : Object.keys(held).find((other) => sameJson(held[other], emitter));
    if (same !== undefined) {
      names.set(key, same);
      continue;
    }
    let free = key;
    for (let number = 2; Object.hasOwn(held, free); number++) free = `${key.slice(0, 35)}-${number}`;
    held[free] = emitter;
    names.set(key, free);
    await tx
      .insert(emitters)
      .values({ id: newId(), organisationId: actor.organisationId, key: free, document: emitter });
    await audit(tx, actor, 'add emitter', 'emitter', free, { name: emitter.name });
  }
  return names;
}

function renamed(set: StopSet, names: ReadonlyMap<string, string>): StopSet {
  const here = (key: string) => names.get(key) ?? key;
  const own = <T extends { emitter: string | null }>(item: T): T => ({
    ...item,
    emitter: item.emitter === null ? null : here(item.emitter),
  });
  return { ...set, emitter: here(set.emitter), stops: set.stops.map(own), passes: set.passes.map(own) };
}

/** Makes a room of an open room file, whole or not at all. Stop sets come in as drafts. */
export async function importRoom(
  { write }: Database,
  actor: Actor,
  file: RoomFile,
): Promise<{ roomId: string; name: string }> {
  refuseFaults(fileReferenceFaults(file), 'room file');
  return write(async (tx) => {
    const siteId = await siteCalled(tx, actor, file.room.site);
    const name = await freeRoomName(tx, siteId, file.room.name);
    const names = await bringEmitters(tx, actor, file.emitters);
    const roomId = newId();
    const now = new Date();
    await tx.insert(rooms).values({
      id: roomId,
      organisationId: actor.organisationId,
      siteId,
      name,
      area: file.room.area ?? null,
      createdAt: now,
    });
    await tx.insert(floorPlans).values({
      roomId,
      document: { ceiling: file.room.ceiling, floorPlan: file.floorPlan },
      version: 1,
      updatedBy: actor.userId,
      updatedAt: now,
    });
    const ids = file.stopSets.map((set) => set.id);
    const taken = new Set(
      (await tx.select({ id: stopSets.id }).from(stopSets).where(inArray(stopSets.id, ids))).map(
        ({ id }) => id,
      ),
    );
    for (const [position, set] of file.stopSets.entries()) {
      const id = taken.has(set.id) ? newId() : set.id;
      await tx.insert(stopSets).values({
        id,
        roomId,
        document: { ...renamed(set, names), id },
        version: 1,
        position,
        updatedBy: actor.userId,
        updatedAt: now,
      });
    }
    await audit(tx, actor, 'import room', 'room', roomId, { name });
    return { roomId, name };
  });
}
