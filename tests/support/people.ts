import { demoPeople } from '@/db/seed/people';
import type { Role } from '@/lib/access/roles';

/** For databases that live as long as a test run. */
export const TEST_PASSWORD = 'only-for-this-test-run';

export const emailOf = (role: Role): string => {
  const person = demoPeople.find((it) => it.role === role);
  if (!person) throw new Error(`No demo person is ${role}`);
  return person.email;
};
