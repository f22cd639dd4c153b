// `npm run seed`: migrates the database and puts the demo organisation into it. `--list-sign-ins` only prints who may sign in.
import { openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { marrowby } from '@/db/seed/demo';
import { seedOrganisation } from '@/db/seed/seed-organisation';

const password = process.env.DEMO_PASSWORD;
if (!password || password.length < 8) {
  console.error('Set DEMO_PASSWORD (8 characters or more): the demo people sign in with it.');
  process.exit(1);
}

if (process.argv.includes('--list-sign-ins')) {
  console.log(`Sign in as any of these with the password ${password}\n`);
  for (const { email, role, name } of marrowby.people)
    console.log(`  ${email.padEnd(32)}${role.padEnd(10)}${name}`);
  console.log('\nCtrl+C stops the server; the data stays under data/.');
} else {
  const database = await openDatabase(process.env.DATABASE_URL ?? 'file:data/leeside.db');
  await migrateDatabase(database);
  await seedOrganisation(database, marrowby, password);
  database.close();
  console.log(`${marrowby.name} is in place.`);
}
