import { execFile } from 'node:child_process';
import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { promisify } from 'node:util';
import { is } from 'drizzle-orm';
import { getTableConfig, integer, SQLiteTable, sqliteTable } from 'drizzle-orm/sqlite-core';
import { expect, onTestFinished, test } from 'vitest';
import { type Database, openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { passwordMatches } from '@/db/password';
import * as schema from '@/db/schema';
import { marrowby } from '@/db/seed/demo';
import { seedOrganisation } from '@/db/seed/seed-organisation';
import { freshDatabaseUrl } from '../../support/database';

async function opened(url: string): Promise<Database> {
  const database = await openDatabase(url);
  onTestFinished(() => database.close());
  return database;
}

const tables = Object.values(schema).filter((it) => is(it, SQLiteTable));

/** Every row of every table, for comparing before and after. */
const everything = async ({ db }: Database) =>
  Object.fromEntries(
    await Promise.all(
      tables.map(async (table) => [getTableConfig(table).name, await db.select().from(table)]),
    ),
  );

/** How many migrations the database says it has had. */
const applied = ({ db }: Database): Promise<number> =>
  db.$count(sqliteTable('__drizzle_migrations', { id: integer() }));

test('an empty file is brought to the newest schema from the first migration on, and once there it stays', async () => {
  const database = await opened(freshDatabaseUrl());
  await migrateDatabase(database);
  const steps = readdirSync('drizzle').filter((file) => file.endsWith('.sql')).length;
  expect(await applied(database)).toBe(steps);
  for (const table of tables) {
    const { name, columns } = getTableConfig(table);
    const { rows } = await database.db.run(`select name from pragma_table_info('${name}')`);
    expect(rows.map((row) => row.name).sort()).toEqual(columns.map((column) => column.name).sort());
  }
  await seedOrganisation(database, marrowby, 'a password for this test');
  const before = await everything(database);
  await migrateDatabase(database);
  expect(await applied(database)).toBe(steps);
  expect(await everything(database)).toEqual(before);
});

test('every migration that is listed is there, and every one that is there is listed', () => {
  const { entries } = JSON.parse(readFileSync('drizzle/meta/_journal.json', 'utf8')) as {
    entries: { tag: string }[];
  };
  const files = readdirSync('drizzle').filter((file) => file.endsWith('.sql'));
  expect(files.sort()).toEqual(entries.map(({ tag }) => `${tag}.sql`));
});

test('seeding twice is seeding once', async () => {
  const database = await opened(freshDatabaseUrl());
  await migrateDatabase(database);
  await seedOrganisation(database, marrowby, 'a password for this test');
  const before = await everything(database);
  expect(before.users).toHaveLength(marrowby.people.length);
  expect(before.rooms).toHaveLength(Object.keys(marrowby.rooms).length);
  await seedOrganisation(database, marrowby, 'a password for this test');
  expect(await everything(database)).toEqual(before);
});

test('seeding again keeps what people have changed and gives everybody the new password', async () => {
  const database = await opened(freshDatabaseUrl());
  await migrateDatabase(database);
  await seedOrganisation(database, marrowby, 'the first password');
  await database.db.update(schema.rooms).set({ name: 'Renamed' });
  await database.db.delete(schema.stopSets);
  await database.db.update(schema.memberships).set({ role: 'crew', sessionVersion: 2 });
  const { users: _, ...before } = await everything(database);
  await seedOrganisation(database, marrowby, 'the second password');
  const { users, ...after } = await everything(database);
  expect(after).toEqual(before);
  for (const { passwordHash } of users as { passwordHash: string }[]) {
    expect(await passwordMatches(passwordHash, 'the first password')).toBe(false);
    expect(await passwordMatches(passwordHash, 'the second password')).toBe(true);
  }
});

const run = promisify(execFile);
const command = (name: string, env: Record<string, string>) =>
  run(path.join('node_modules', '.bin', 'tsx'), [`lib/commands/${name}.ts`], {
    env: { PATH: process.env.PATH, ...env } as unknown as NodeJS.ProcessEnv,
    timeout: 20_000,
  }).then(
    ({ stdout }) => ({ code: 0, said: stdout }),
    (error: { code: number; stderr: string }) => ({ code: error.code, said: error.stderr }),
  );

test('the commands migrate and seed a file that is not there yet, and say so', async () => {
  const DATABASE_URL = freshDatabaseUrl();
  expect(await command('migrate', { DATABASE_URL })).toEqual({
    code: 0,
    said: 'The database is up to date.\n',
  });
  expect(await command('seed', { DATABASE_URL, DEMO_PASSWORD: 'long enough' })).toEqual({
    code: 0,
    said: 'Marrowby Care Group is in place.\n',
  });
  const database = await opened(DATABASE_URL);
  expect(await database.db.$count(schema.rooms)).toBe(Object.keys(marrowby.rooms).length);
});

test.each([
  ['migrate', { DATABASE_URL: 'postgres://db.example.test' }, /DATABASE_URL/],
  ['seed', { DATABASE_URL: 'nonsense', DEMO_PASSWORD: 'long enough' }, /"nonsense" \(DATABASE_URL\)/],
  ['seed', {}, /Set DEMO_PASSWORD/],
  ['seed', { DEMO_PASSWORD: 'short' }, /8 characters or more/],
])('%s with %o fails and says what is wrong', async (name, env, words) => {
  const { code, said } = await command(name, env as Record<string, string>);
  expect(code).not.toBe(0);
  expect(said).toMatch(words);
});
