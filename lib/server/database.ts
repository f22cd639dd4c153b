import 'server-only';
import { type Database, openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { env } from './env';

// One a process: the framework may load this module more than once.
const shared = globalThis as { leesideDatabase?: Promise<Database> };

async function open(): Promise<Database> {
  const opened = await openDatabase(env().DATABASE_URL);
  await migrateDatabase(opened);
  return opened;
}

/** The process's database, opened and migrated on first use; a failure is not kept, so that the next call tries again. */
export function database(): Promise<Database> {
  shared.leesideDatabase ??= open().catch((error) => {
    shared.leesideDatabase = undefined;
    throw error;
  });
  return shared.leesideDatabase;
}
