import { index, integer, sqliteTable, text, unique } from 'drizzle-orm/sqlite-core';
import type { Emitter } from '@/lib/room/schema/emitter';
import { type StopSet, stopSetStatuses } from '@/lib/room/schema/stop-set';
import { organisations, users } from './people';
import { instant, rooms } from './rooms';

export const emitters = sqliteTable(
  'emitters',
  {
    id: text().primaryKey(),
    organisationId: text('organisation_id')
      .notNull()
      .references(() => organisations.id),
    /** What stop sets call it by. */
    key: text().notNull(),
    document: text({ mode: 'json' }).$type<Emitter>().notNull(),
  },
  (table) => [unique().on(table.organisationId, table.key)],
);

export const stopSets = sqliteTable(
  'stop_sets',
  {
    id: text().primaryKey(),
    roomId: text('room_id')
      .notNull()
      .references(() => rooms.id),
    document: text({ mode: 'json' }).$type<StopSet>().notNull(),
    status: text({ enum: stopSetStatuses }).notNull().default('draft'),
    /** Goes up by one with every save: the ETag. */
    version: integer().notNull(),
    position: integer().notNull(),
    updatedBy: text('updated_by')
      .notNull()
      .references(() => users.id),
    updatedAt: instant('updated_at_ms').notNull(),
  },
  (table) => [index('stop_sets_by_room').on(table.roomId)],
);
