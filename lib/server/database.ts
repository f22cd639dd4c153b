import 'server-only';
import { type Database, openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { env } from './env';

// One a process: the framework may load this module more than once.
const shared = globalThis as { leesideDatabase?: Promise<Database> };

/** The process's database, opened and migrated on first use. */
export function database(): Promise<Database> {
  shared.leesideDatabase ??= (async () => {
    const opened = await openDatabase(env().DATABASE_URL);
    await migrateDatabase(opened);
    return opened;
  })();
  return shared.leesideDatabase;
}
