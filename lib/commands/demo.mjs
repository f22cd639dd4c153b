// `npm run demo`: from a fresh checkout to the demo organisation in a browser.
import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { installPackages, root, run, start, tool } from './steps.mjs';

const port = process.env.PORT ?? '3000';
const address = `http://localhost:${port}`;
const dataFolder = path.join(root, 'data');

installPackages();

mkdirSync(dataFolder, { recursive: true });
// Made once and kept, so that a restart neither signs everybody out nor changes the password.
const kept = (name, bytes) => {
  const file = path.join(dataFolder, name);
  if (!existsSync(file)) writeFileSync(file, randomBytes(bytes).toString('base64url'), { mode: 0o600 });
  return readFileSync(file, 'utf8').trim();
};

const env = {
  NODE_ENV: 'production',
  DATABASE_URL: process.env.DATABASE_URL ?? `file:${path.join(dataFolder, 'leeside.db')}`,
  NEXTAUTH_SECRET: kept('demo-secret', 32),
  DEMO_PASSWORD: process.env.DEMO_PASSWORD ?? kept('demo-password', 9),
  NEXTAUTH_URL: address,
  PORT: port,
};

run('Building', tool('next'), ['build'], { env });
run('Database and demo organisation', tool('tsx'), ['lib/commands/seed.ts'], { env });

const server = start(tool('next'), ['start', '-p', port], env);
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal));
server.on('exit', (code) => process.exit(code ?? 0));

const healthy = async () => {
  try {
    return (await fetch(`http://127.0.0.1:${port}/api/health`)).ok;
  } catch {
    return false;
  }
};
const deadline = Date.now() + 60_000;
while (!(await healthy())) {
  if (Date.now() > deadline) {
    console.error(
      `The server did not answer on port ${port} within a minute. Is the port taken? Set PORT to another.`,
    );
    server.kill();
    process.exit(1);
  }
  await new Promise((resolve) => setTimeout(resolve, 300));
}
run(`Leeside is ready: ${address}`, tool('tsx'), ['lib/commands/seed.ts', '--list-sign-ins'], { env });
