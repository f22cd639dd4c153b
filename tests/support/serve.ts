// The production build on a database of its own, with the demo organisation and a stranger to it.
import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { mkdtempSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { openDatabase } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { marrowby } from '@/db/seed/demo';
import { seedOrganisation } from '@/db/seed/seed-organisation';
import { TEST_PASSWORD } from './people';

const port = process.env.E2E_PORT ?? '3217';
const url = `file:${path.join(mkdtempSync(path.join(os.tmpdir(), 'leeside-e2e-')), 'e2e.db')}`;

const database = await openDatabase(url);
await migrateDatabase(database);
await seedOrganisation(database, marrowby, TEST_PASSWORD);
database.close();

const server = spawn('node_modules/.bin/next', ['start', '-H', '127.0.0.1', '-p', port], {
  stdio: 'inherit',
  env: {
    ...process.env,
    NODE_ENV: 'production',
    NEXT_TELEMETRY_DISABLED: '1',
    DATABASE_URL: url,
    NEXTAUTH_SECRET: randomBytes(32).toString('base64url'),
    NEXTAUTH_URL: `http://127.0.0.1:${port}`,
  },
});
for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => server.kill(signal));
server.on('exit', (code) => process.exit(code ?? 0));
