import { integer, primaryKey, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { roles } from '@/lib/access/roles';

export const organisations = sqliteTable('organisations', {
  id: text().primaryKey(),
  name: text().notNull(),
});

export const users = sqliteTable('users', {
  id: text().primaryKey(),
  /** Lower case. */
  email: text().notNull().unique(),
  name: text().notNull(),
  /** argon2id, with its salt and costs inside. */
  passwordHash: text('password_hash').notNull(),
});

export const memberships = sqliteTable(
  'memberships',
  {
    organisationId: text('organisation_id')
      .notNull()
      .references(() => organisations.id),
    userId: text('user_id')
      .notNull()
      .references(() => users.id),
    role: text({ enum: roles }).notNull(),
    /** Goes up when the role changes: sessions of an older version are over. */
    sessionVersion: integer('session_version').notNull().default(1),
  },
  (table) => [primaryKey({ columns: [table.organisationId, table.userId] })],
);
