import { z } from 'zod';
import { type Permission, permissions } from './permissions';
import { roles } from './roles';

/** Who is signed in, and what they may do: enough for an interface to show what can be done and no more. */
export const meSchema = z.object({
  id: z.string(),
  name: z.string(),
  email: z.string(),
  role: z.enum(roles),
  organisation: z.string(),
  may: z.array(z.enum(Object.keys(permissions) as Permission[])),
});
