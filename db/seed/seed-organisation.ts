import { eq } from 'drizzle-orm';
import { z } from 'zod';
import { emitterKey, emitterSchema } from '@/lib/room/schema/emitter';
import type { RoomFile } from '@/lib/room/schema/room-file';
import type { Database, Tx } from '../client';
import { hashPassword, passwordMatches } from '../password';
import {
  emitters,
  floorPlans,
  memberships,
  organisations,
  revisions,
  rooms,
  sites,
  stopSets,
  users,
} from '../schema';
import genericEmitters from './emitters.json' with { type: 'json' };
import type { DemoPerson } from './people';

export interface Organisation {
  readonly id: string;
  readonly name: string;
  readonly people: readonly DemoPerson[];
  readonly sites: readonly string[];
  readonly rooms: Readonly<Record<string, RoomFile>>;
}

const slug = (name: string) => name.toLowerCase().replaceAll(/[^a-z0-9]+/g, '-');

/**
 * Puts an organisation with its people, emitters, sites and rooms into the database. Idempotent: what is
 * there already stays as people have changed it, except that everyone gets `password` again.
 */
export async function seedOrganisation(
  { db, write }: Database,
  organisation: Organisation,
  password: string,
) {
  const hashes = new Map<string, string>();
  for (const { id } of organisation.people) {
    const [held] = await db.select().from(users).where(eq(users.id, id));
    const keeps = held && (await passwordMatches(held.passwordHash, password));
    hashes.set(id, keeps ? held.passwordHash : await hashPassword(password));
  }
  await write(async (tx) => {
    await tx
      .insert(organisations)
      .values({ id: organisation.id, name: organisation.name })
      .onConflictDoNothing();
    for (const person of organisation.people)
      await seedPerson(tx, organisation.id, person, hashes.get(person.id) ?? '');
    const kinds = z.record(emitterKey, emitterSchema).parse(genericEmitters);
    for (const [key, document] of Object.entries(kinds)) {
      await tx
        .insert(emitters)
        .values({ id: `${organisation.id}-${key}`, organisationId: organisation.id, key, document })
        .onConflictDoNothing();
    }
    for (const name of organisation.sites) {
      await tx
        .insert(sites)
        .values({ id: `${organisation.id}-${slug(name)}`, organisationId: organisation.id, name })
        .onConflictDoNothing();
    }
    const planner = organisation.people.find((person) => person.role === 'planner') ?? organisation.people[0];
    for (const [id, file] of Object.entries(organisation.rooms))
      await seedRoom(tx, organisation.id, planner.id, id, file);
  });
}

async function seedPerson(tx: Tx, organisationId: string, person: DemoPerson, passwordHash: string) {
  const { role, ...user } = person;
  await tx
    .insert(users)
    .values({ ...user, passwordHash })
    .onConflictDoUpdate({ target: users.id, set: { passwordHash } });
  await tx.insert(memberships).values({ organisationId, userId: person.id, role }).onConflictDoNothing();
}

async function seedRoom(tx: Tx, organisationId: string, plannerId: string, roomId: string, file: RoomFile) {
  const [held] = await tx.select({ id: rooms.id }).from(rooms).where(eq(rooms.id, roomId));
  if (held) return;
  const now = new Date();
  const by = { updatedBy: plannerId, updatedAt: now };
  const document = { ceiling: file.room.ceiling, floorPlan: file.floorPlan };
  await tx.insert(rooms).values({
    id: roomId,
    organisationId,
    siteId: `${organisationId}-${slug(file.room.site)}`,
    name: file.room.name,
    area: file.room.area ?? null,
    createdAt: now,
  });
  await tx.insert(floorPlans).values({ roomId, document, version: 1, ...by });
  await tx.insert(revisions).values({
    roomId,
    number: 1,
    document,
    planVersion: 1,
    note: 'As measured',
    createdBy: plannerId,
    createdAt: now,
  });
  for (const [position, set] of file.stopSets.entries()) {
    await tx.insert(stopSets).values({ id: set.id, roomId, document: set, version: 1, position, ...by });
  }
}
