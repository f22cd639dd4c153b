import { emittersResourceSchema } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { listEmitters } from '@/lib/server/emitters/list-emitters';
import { route } from '@/lib/server/route';

export const GET = route({
  permission: 'emitters:read',
  answer: emittersResourceSchema,
  run: async ({ actor }) => ({ value: { emitters: await listEmitters((await database()).db, actor) } }),
});
