// Adds to a number in the database, one read and one write at a time: two that ran at once would lose one.
// As a program of its own (`tsx count-up.ts <address> <times>`) it is another process on the same file.
import { eq } from 'drizzle-orm';
import { type Database, openDatabase } from '@/db/client';
import { organisations } from '@/db/schema';

export const TALLY = 'tally';

export const countUp = ({ write }: Database): Promise<void> =>
  write(async (tx) => {
    const tally = eq(organisations.id, TALLY);
    const [row] = await tx.select().from(organisations).where(tally);
    await tx
      .update(organisations)
      .set({ name: String(Number(row.name) + 1) })
      .where(tally);
  });

if (process.argv[1]?.endsWith('count-up.ts')) {
  const [url, times] = process.argv.slice(2);
  const database = await openDatabase(url);
  for (let i = 0; i < Number(times); i++) await countUp(database);
  database.close();
}
