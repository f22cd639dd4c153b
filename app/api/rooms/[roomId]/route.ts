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
  run: async ({ actor, params, body }) => {
    const open = await database();
    await changeRoom(open, actor, params.roomId, body);
    return { value: await getRoom(open.db, actor, params.roomId) };
  },
});
