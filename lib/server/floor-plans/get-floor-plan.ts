import 'server-only';
import { eq } from 'drizzle-orm';
import type { z } from 'zod';
import type { Db } from '@/db/client';
import { floorPlans, users } from '@/db/schema';
import type { floorPlanResourceSchema } from '@/lib/room/api/resources';
import type { Actor } from '../actor';
import { ownRoom } from '../rooms/own-room';
import { listRevisions } from './list-revisions';

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
  const [newest] = await listRevisions(db, actor, roomId, 1);
  return {
    document: plan?.plan.document ?? null,
    version: plan?.plan.version ?? 0,
    updatedAt: (plan?.plan.updatedAt ?? room.createdAt).toISOString(),
    updatedBy: plan?.by ?? '',
    revision: newest ?? null,
  };
}
