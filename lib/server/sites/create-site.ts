import 'server-only';
import { and, eq } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { sites } from '@/db/schema';
import { AppError } from '@/lib/errors';
import type { Actor } from '../actor';
import { audit } from '../audit';
import { newId } from '../new-id';

/** Adds a site; two of one organisation cannot share a name. */
export function createSite({ write }: Database, actor: Actor, name: string) {
  return write(async (tx) => {
    const [taken] = await tx
      .select()
      .from(sites)
      .where(and(eq(sites.organisationId, actor.organisationId), eq(sites.name, name)));
    if (taken)
      throw new AppError('conflict', `There is a site called ${name} already.`, [
        { path: 'name', message: 'Already taken' },
      ]);
    const site = { id: newId(), name };
    await tx.insert(sites).values({ ...site, organisationId: actor.organisationId });
    await audit(tx, actor, 'add site', 'site', site.id, { name });
    return site;
  });
}
