// `npm run migrate`: brings the database to the newest schema. The server does the same when it starts.
import { openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';

const database = await openDatabase(process.env.DATABASE_URL ?? 'file:data/leeside.db');
await migrateDatabase(database);
database.close();
console.log('The database is up to date.');
