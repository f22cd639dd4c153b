import { index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { organisations, users } from './people';
import { instant } from './rooms';

/** Who did what to which thing when. Written in the same transaction as the deed; never changed. */
export const auditEntries = sqliteTable(
  'audit_entries',
  {
    id: integer().primaryKey({ autoIncrement: true }),
    organisationId: text('organisation_id')
      .notNull()
      .references(() => organisations.id),
    userId: text('user_id')
      .notNull()
      .references(() => users.id),
    at: instant('at_ms').notNull(),
    /** Such as `save floor plan`. */
    action: text().notNull(),
    /** Kind and id of the thing, such as `room` and its id. */
    thing: text().notNull(),
    thingId: text('thing_id').notNull(),
    details: text({ mode: 'json' }).$type<Record<string, unknown>>(),
  },
  (table) => [index('audit_by_organisation').on(table.organisationId, table.at)],
);
