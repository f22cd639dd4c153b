import 'server-only';
import { asc, eq } from 'drizzle-orm';
import type { Db, Tx } from '@/db/client';
import { emitters } from '@/db/schema';
import type { Emitters } from '@/lib/room/schema/emitter';
import type { Actor } from '../actor';

/** The organisation's emitters by key. */
export async function listEmitters(db: Db | Tx, actor: Actor): Promise<Emitters> {
  const rows = await db
    .select({ key: emitters.key, document: emitters.document })
    .from(emitters)
    .where(eq(emitters.organisationId, actor.organisationId))
    .orderBy(asc(emitters.key));
  return Object.fromEntries(rows.map(({ key, document }) => [key, document]));
}
