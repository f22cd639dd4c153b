import type { Role } from '@/lib/access/roles';

export interface DemoPerson {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

/** Invented people of the invented Marrowby Care Group: one for each role, and a second planner. */
export const demoPeople: readonly DemoPerson[] = [
  { id: 'maud', name: 'Maud Ellery', email: 'maud.ellery@example.test', role: 'owner' },
  { id: 'tomas', name: 'Tomas Quill', email: 'tomas.quill@example.test', role: 'planner' },
  { id: 'priya', name: 'Priya Lorne', email: 'priya.lorne@example.test', role: 'planner' },
  { id: 'ifeoma', name: 'Ifeoma Strand', email: 'ifeoma.strand@example.test', role: 'reviewer' },
  { id: 'benno', name: 'Benno Hale', email: 'benno.hale@example.test', role: 'crew' },
];
