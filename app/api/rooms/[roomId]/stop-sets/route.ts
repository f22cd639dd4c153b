import { stopSetSchema } from '@/lib/room';
import { roomParams, savedSchema, stopSetListSchema } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { route } from '@/lib/server/route';
import { createStopSet } from '@/lib/server/stop-sets/create-stop-set';
import { listStopSets } from '@/lib/server/stop-sets/read-stop-sets';

export const GET = route({
  permission: 'rooms:read',
  params: roomParams,
  answer: stopSetListSchema,
  run: async ({ actor, params }) => ({
    value: { stopSets: await listStopSets((await database()).db, actor, params.roomId) },
  }),
});

export const POST = route({
  permission: 'stop-sets:write',
  params: roomParams,
  body: stopSetSchema,
  answer: savedSchema,
  run: async ({ actor, params, body }) => {
    const { version, added } = await createStopSet(await database(), actor, params.roomId, body);
    return { value: { version }, version, status: added ? 201 : 200 };
  },
});
