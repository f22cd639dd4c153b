import { revisionParams, revisionSchema } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { getRevision } from '@/lib/server/floor-plans/get-revision';
import { route } from '@/lib/server/route';

export const GET = route({
  permission: 'rooms:read',
  params: revisionParams,
  answer: revisionSchema,
  run: async ({ actor, params }) => ({
    value: await getRevision((await database()).db, actor, params.roomId, params.number),
  }),
});
