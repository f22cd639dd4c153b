import { newRoomSchema, roomListSchema, roomSummarySchema } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { createRoom } from '@/lib/server/rooms/create-room';
import { listRooms } from '@/lib/server/rooms/list-rooms';
import { route } from '@/lib/server/route';

export const GET = route({
  permission: 'rooms:read',
  answer: roomListSchema,
  run: async ({ actor }) => ({ value: { rooms: await listRooms((await database()).db, actor) } }),
});

export const POST = route({
  permission: 'rooms:write',
  body: newRoomSchema,
  answer: roomSummarySchema,
  run: async ({ actor, body }) => ({ value: await createRoom(await database(), actor, body), status: 201 }),
});
