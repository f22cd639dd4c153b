import { index, integer, primaryKey, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core';
import type { FloorPlanDocument } from '@/lib/room/schema/floor-plan';
import { organisations, users } from './people';

/** Instants are milliseconds since 1970, UTC. */
export const instant = (name: string) => integer(name, { mode: 'timestamp_ms' });

export const sites = sqliteTable(
  'sites',
  {
    id: text().primaryKey(),
    organisationId: text('organisation_id')
      .notNull()
      .references(() => organisations.id),
    name: text().notNull(),
  },
  (table) => [unique().on(table.organisationId, table.name)],
);

export const rooms = sqliteTable(
  'rooms',
  {
    id: text().primaryKey(),
    organisationId: text('organisation_id')
      .notNull()
      .references(() => organisations.id),
    siteId: text('site_id')
      .notNull()
      .references(() => sites.id),
    name: text().notNull(),
    /** A part of the site, such as a ward. */
    area: text(),
    createdAt: instant('created_at_ms').notNull(),
    archivedAt: instant('archived_at_ms'),
  },
  (table) => [index('rooms_by_organisation').on(table.organisationId)],
);

/** The working plan of a room; autosave writes it. */
export const floorPlans = sqliteTable('floor_plans', {
  roomId: text('room_id')
    .primaryKey()
    .references(() => rooms.id),
  document: text({ mode: 'json' }).$type<FloorPlanDocument>().notNull(),
  /** Goes up by one with every save: the ETag. */
  version: integer().notNull(),
  updatedBy: text('updated_by')
    .notNull()
    .references(() => users.id),
  updatedAt: instant('updated_at_ms').notNull(),
});

/** Frozen copies of the floor plan. */
export const revisions = sqliteTable(
  'revisions',
  {
    roomId: text('room_id')
      .notNull()
      .references(() => rooms.id),
    number: integer().notNull(),
    document: text({ mode: 'json' }).$type<FloorPlanDocument>().notNull(),
    /** Version of the working plan that was copied. */
    planVersion: integer('plan_version').notNull(),
    note: text().notNull(),
    createdBy: text('created_by')
      .notNull()
      .references(() => users.id),
    createdAt: instant('created_at_ms').notNull(),
  },
  (table) => [primaryKey({ columns: [table.roomId, table.number] })],
);
