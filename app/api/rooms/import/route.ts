import { roomFileSchema } from '@/lib/room';
import { importedSchema } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { importRoom } from '@/lib/server/rooms/import-room';
import { route } from '@/lib/server/route';

const MOST_BYTES = 2_000_000;

export const POST = route({
  permission: 'rooms:write',
  body: roomFileSchema,
  limit: MOST_BYTES,
  answer: importedSchema,
  run: async ({ actor, body }) => ({
    value: await importRoom(await database(), actor, body),
    status: 201,
  }),
});
