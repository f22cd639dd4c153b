import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { createClient } from '@libsql/client';
import { drizzle, type LibSQLDatabase } from 'drizzle-orm/libsql';
import * as schema from './schema';

export type Db = LibSQLDatabase<typeof schema>;
/** What a use case reads and writes with inside a write. */
export type Tx = Parameters<Parameters<Db['transaction']>[0]>[0];

export interface Database {
  readonly db: Db;
  /**
   * Runs one write as an immediate transaction, after the writes before it. Await only `tx` inside: the
   * queue waits, and a nested write would wait for itself.
   */
  readonly write: <T>(work: (tx: Tx) => Promise<T>) => Promise<T>;
  readonly close: () => void;
}

const LOCK_WAIT_MS = 5000;
const BUSY_TRIES = 8;

const isBusy = (error: unknown): boolean => {
  for (let cause = error; cause instanceof Error; cause = cause.cause) {
    if (/SQLITE_BUSY|database is locked/.test(cause.message)) return true;
  }
  return false;
};

/** An address as it may be shown: without a password or token in it. */
const shown = (url: string): string => url.replace(/\/\/[^/@]*@/, '//').replace(/[?#].*$/s, '');

/** The words at the bottom of a chain of causes: what it really was. */
function reasonOf(error: unknown): string {
  let deepest = error;
  while (deepest instanceof Error && deepest.cause instanceof Error) deepest = deepest.cause;
  return deepest instanceof Error ? deepest.message : String(deepest);
}

/** Opens the file or finds the server; says in one line which one it was when that fails. */
async function connect(url: string) {
  try {
    const isFile = url.startsWith('file:');
    if (isFile) mkdirSync(path.dirname(path.resolve(url.slice('file:'.length))), { recursive: true });
    const client = createClient({ url, authToken: process.env.DATABASE_AUTH_TOKEN, timeout: LOCK_WAIT_MS });
    await client.execute(isFile ? 'PRAGMA journal_mode = WAL' : 'select 1');
    return client;
  } catch (error) {
    throw new Error(`The database at "${shown(url)}" (DATABASE_URL) cannot be opened: ${reasonOf(error)}`, {
      cause: error,
    });
  }
}

const pause = (ms: number) => new Promise((resolve) => setTimeout(resolve, ms));

/**
 * Opens the database at `url` (`file:…` or a remote libSQL server). libSQL cannot hold two interactive
 * transactions in one process, so writes queue here; another process on the same file is waited for and,
 * when the wait runs out, tried again.
 */
export async function openDatabase(url: string): Promise<Database> {
  const client = await connect(url);
  const db = drizzle(client, { schema });

  let last: Promise<unknown> = Promise.resolve();
  const attempt = async <T>(work: (tx: Tx) => Promise<T>): Promise<T> => {
    for (let tries = 1; ; tries++) {
      try {
        return await db.transaction(work);
      } catch (error) {
        if (tries === BUSY_TRIES || !isBusy(error)) throw error;
        await pause(20 * 2 ** tries * (0.5 + Math.random()));
      }
    }
  };
  const write = <T>(work: (tx: Tx) => Promise<T>): Promise<T> => {
    const result = last.then(() => attempt(work));
    last = result.catch(() => {});
    return result;
  };
  return { db, write, close: () => client.close() };
}
