import { roomFileSchema } from '@/lib/room';
import { roomParams } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { fileName } from '@/lib/server/file-name';
import { exportRoom } from '@/lib/server/rooms/export-room';
import { route } from '@/lib/server/route';

export const GET = route({
  permission: 'rooms:read',
  params: roomParams,
  answer: roomFileSchema,
  run: async ({ actor, params }) => {
    const value = await exportRoom((await database()).db, actor, params.roomId);
    return { value, download: fileName(value.room.name, 'leeside.json') };
  },
});
