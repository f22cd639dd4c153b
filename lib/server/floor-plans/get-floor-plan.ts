import 'server-only';
import { desc, eq } from 'drizzle-orm';
import type { z } from 'zod';
import type { Db } from '@/db/client';
import { floorPlans, revisions, users } from '@/db/schema';
import type { floorPlanResourceSchema } from '@/lib/room/api/resources';
import type { Actor } from '../actor';
import { ownRoom } from '../rooms/own-room';

/** The working plan with its version (0 while nothing is drawn) and the newest revision. */
export async function getFloorPlan(
  db: Db,
  actor: Actor,
  roomId: string,
): Promise<z.input<typeof floorPlanResourceSchema>> {
  const room = await ownRoom(db, actor, roomId);
  const [plan] = await db
    .select({ plan: floorPlans, by: users.name })
    .from(floorPlans)
    .innerJoin(users, eq(users.id, floorPlans.updatedBy))
    .where(eq(floorPlans.roomId, roomId));
  const [newest] = await listRevisions(db, roomId, 1);
  return {
    document: plan?.plan.document ?? null,
    version: plan?.plan.version ?? 0,
    updatedAt: (plan?.plan.updatedAt ?? room.createdAt).toISOString(),
    updatedBy: plan?.by ?? '',
    revision: newest ?? null,
  };
}

/** Frozen copies, newest first, without their drawings. The caller has checked whose room it is. */
export async function listRevisions(db: Db, roomId: string, most = 500) {
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
