import { meSchema } from '@/lib/access/me';
import { permissionsOf } from '@/lib/access/permissions';
import { route } from '@/lib/server/route';

export const GET = route({
  permission: null,
  answer: meSchema,
  run: async ({ actor: { userId: id, name, email, role, organisation } }) => ({
    value: { id, name, email, role, organisation, may: permissionsOf(role) },
  }),
});
