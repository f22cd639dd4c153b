import { roomChangeSchema, roomParams, roomSummarySchema } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { changeRoom } from '@/lib/server/rooms/change-room';
import { getRoom } from '@/lib/server/rooms/list-rooms';
import { route } from '@/lib/server/route';

export const GET = route({
  permission: 'rooms:read',
  params: roomParams,
  answer: roomSummarySchema,
  run: async ({ actor, params }) => ({ value: await getRoom((await database()).db, actor, params.roomId) }),
});

export const PATCH = route({
  permission: 'rooms:write',
  params: roomParams,
  body: roomChangeSchema,
  answer: roomSummarySchema,
  run: async ({ actor, params, body }) => ({
    value: await changeRoom(await database(), actor, params.roomId, body),
  }),
});
