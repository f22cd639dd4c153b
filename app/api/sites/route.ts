import { newSiteSchema, siteListSchema, siteSchema } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { route } from '@/lib/server/route';
import { createSite } from '@/lib/server/sites/create-site';
import { listSites } from '@/lib/server/sites/list-sites';

export const GET = route({
  permission: 'rooms:read',
  answer: siteListSchema,
  run: async ({ actor }) => ({ value: { sites: await listSites((await database()).db, actor) } }),
});

export const POST = route({
  permission: 'sites:write',
  body: newSiteSchema,
  answer: siteSchema,
  run: async ({ actor, body }) => ({
    value: await createSite(await database(), actor, body.name),
    status: 201,
  }),
});
