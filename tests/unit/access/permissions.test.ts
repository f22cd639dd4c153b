import { expect, test } from 'vitest';
import { meSchema } from '@/lib/access/me';
import { can, type Permission, permissions, permissionsOf } from '@/lib/access/permissions';
import { type Role, roles } from '@/lib/access/roles';

/** Who may: owner, planner, reviewer, crew. Written out, so that a change of the table is a change here. */
const table: Readonly<Record<Permission, readonly [boolean, boolean, boolean, boolean]>> = {
  'rooms:read': [true, true, true, true],
  'sites:write': [true, false, false, false],
  'rooms:write': [true, true, false, false],
  'floor-plans:write': [true, true, false, false],
  'stop-sets:write': [true, true, false, false],
  'emitters:read': [true, true, true, true],
};

const cells = Object.entries(table).flatMap(([permission, may]) =>
  roles.map((role, i): [Role, Permission, boolean] => [role, permission as Permission, may[i]]),
);

test.each(cells)('%s, %s: %s', (role, permission, may) => {
  expect(can(role, permission)).toBe(may);
  expect(permissionsOf(role).includes(permission)).toBe(may);
});

test('every permission has its row here and says in words what it lets one do', () => {
  expect(Object.keys(table).sort()).toEqual(Object.keys(permissions).sort());
  for (const { does } of Object.values(permissions)) expect(does).toMatch(/^[A-Z].{5,}/);
});

test('the owner may do everything', () => {
  expect(permissionsOf('owner')).toEqual(Object.keys(permissions));
});

test('what a page is told of who is signed in names only roles and permissions there are', () => {
  const me = {
    id: 'a',
    name: 'A',
    email: 'a@example.test',
    role: 'crew',
    organisation: 'O',
    may: ['rooms:read'],
  };
  expect(meSchema.parse(me)).toEqual(me);
  expect(meSchema.safeParse({ ...me, role: 'admin' }).success).toBe(false);
  expect(meSchema.safeParse({ ...me, may: ['everything'] }).success).toBe(false);
});
