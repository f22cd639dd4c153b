import { z } from 'zod';
import { stopSetSchema } from '@/lib/room';
import { savedSchema, stopSetParams, stopSetResourceSchema } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { route } from '@/lib/server/route';
import { deleteStopSet } from '@/lib/server/stop-sets/delete-stop-set';
import { getStopSet } from '@/lib/server/stop-sets/read-stop-sets';
import { saveStopSet } from '@/lib/server/stop-sets/save-stop-set';

export const GET = route({
  permission: 'rooms:read',
  params: stopSetParams,
  answer: stopSetResourceSchema,
  run: async ({ actor, params }) => {
    const value = await getStopSet((await database()).db, actor, params.stopSetId);
    return { value, version: value.version };
  },
});

export const PUT = route({
  permission: 'stop-sets:write',
  params: stopSetParams,
  body: stopSetSchema,
  answer: savedSchema,
  run: async ({ actor, params, body, expected }) => {
    const version = await saveStopSet(await database(), actor, params.stopSetId, body, expected());
    return { value: { version }, version };
  },
});

export const DELETE = route({
  permission: 'stop-sets:write',
  params: stopSetParams,
  answer: z.undefined(),
  run: async ({ actor, params, expected }) => {
    await deleteStopSet(await database(), actor, params.stopSetId, expected());
    return { value: undefined, status: 204 };
  },
});
