import type { Role } from './roles';

/** What can be done, and who may: the one table that the server enforces and the interface shows. */
export const permissions = {
  'rooms:read': {
    roles: ['owner', 'planner', 'reviewer', 'crew'],
    does: 'See sites, rooms, floor plans and stop sets',
  },
  'sites:write': { roles: ['owner'], does: 'Add sites' },
  'rooms:write': {
    roles: ['owner', 'planner'],
    does: 'Add, rename and archive rooms; import them, with the sites and emitters that a file brings',
  },
  'floor-plans:write': { roles: ['owner', 'planner'], does: 'Draw floor plans and save revisions' },
  'stop-sets:write': { roles: ['owner', 'planner'], does: 'Place stops and edit draft stop sets' },
  'emitters:read': { roles: ['owner', 'planner', 'reviewer', 'crew'], does: 'See the emitters' },
} as const satisfies Record<string, { roles: readonly Role[]; does: string }>;

export type Permission = keyof typeof permissions;

export const can = (role: Role, permission: Permission): boolean =>
  (permissions[permission].roles as readonly Role[]).includes(role);

export const permissionsOf = (role: Role): Permission[] =>
  (Object.keys(permissions) as Permission[]).filter((permission) => can(role, permission));
