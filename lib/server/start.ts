import 'server-only';
import { database } from './database';

/**
 * Opens and migrates the database before the first request. In production a server that cannot do that ends
 * here: the framework would keep it up and answer every request with a fault.
 */
export async function start(): Promise<void> {
  try {
    await database();
  } catch (error) {
    if (process.env.NODE_ENV !== 'production') throw error;
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  }
}
