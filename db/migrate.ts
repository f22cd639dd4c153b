import path from 'node:path';
import { migrate } from 'drizzle-orm/libsql/migrator';
import type { Database } from './client';

/** Brings a database to the newest schema; does nothing when it is there already. */
export async function migrateDatabase({ db }: Pick<Database, 'db'>): Promise<void> {
  await migrate(db, { migrationsFolder: path.join(process.cwd(), 'drizzle') });
}
