import 'server-only';
import { eq } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { floorPlans } from '@/db/schema';
import { planReferenceFaults } from '@/lib/room/check-references';
import type { FloorPlanDocument } from '@/lib/room/schema/floor-plan';
import type { Actor } from '../actor';
import { audit } from '../audit';
import { refuseFaults } from '../refuse-faults';
import { ownRoom } from '../rooms/own-room';
import { isRepeated, staleSave } from '../stale';

/** Saves the working plan over version `expected`; answers the new version, or who was first. */
export function saveFloorPlan(
  { write }: Database,
  actor: Actor,
  roomId: string,
  document: FloorPlanDocument,
  expected: number,
): Promise<number> {
  return write(async (tx) => {
    await ownRoom(tx, actor, roomId);
    refuseFaults(planReferenceFaults(document.floorPlan, 'floorPlan.'), 'floor plan');
    const [held] = await tx.select().from(floorPlans).where(eq(floorPlans.roomId, roomId));
    if (isRepeated(held, actor, document, expected)) return expected + 1;
    if ((held?.version ?? 0) !== expected) throw await staleSave(tx, 'floor plan', held);
    const version = expected + 1;
    const row = { document, version, updatedBy: actor.userId, updatedAt: new Date() };
    await tx
      .insert(floorPlans)
      .values({ roomId, ...row })
      .onConflictDoUpdate({ target: floorPlans.roomId, set: row });
    await audit(tx, actor, 'save floor plan', 'room', roomId, { version });
    return version;
  });
}
