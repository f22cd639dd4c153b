import 'server-only';
import { asc, eq } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { sites } from '@/db/schema';
import type { Actor } from '../actor';

export const listSites = (db: Db, actor: Actor) =>
  db
    .select({ id: sites.id, name: sites.name })
    .from(sites)
    .where(eq(sites.organisationId, actor.organisationId))
    .orderBy(asc(sites.name));
