import {
  newRevisionSchema,
  revisionListSchema,
  revisionSummarySchema,
  roomParams,
} from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { listRevisions } from '@/lib/server/floor-plans/list-revisions';
import { makeRevision } from '@/lib/server/floor-plans/make-revision';
import { route } from '@/lib/server/route';

export const GET = route({
  permission: 'rooms:read',
  params: roomParams,
  answer: revisionListSchema,
  run: async ({ actor, params }) => ({
    value: { revisions: await listRevisions((await database()).db, actor, params.roomId) },
  }),
});

export const POST = route({
  permission: 'floor-plans:write',
  params: roomParams,
  body: newRevisionSchema,
  answer: revisionSummarySchema,
  run: async ({ actor, params, body }) => ({
    value: await makeRevision(await database(), actor, params.roomId, body.note),
    status: 201,
  }),
});
