// Shared by the commands that must run before anything is installed: Node's own modules only.
import { spawn, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/** Path of a tool that `npm ci` put into the project. */
export const tool = (name) => path.join(root, 'node_modules', '.bin', name);

/** Runs a step with its output shown; ends the whole command when it fails, unless told to carry on. */
export function run(title, command, args, { env = {}, mayFail = false } = {}) {
  console.log(`\n▸ ${title}`);
  const { status, error } = spawnSync(command, args, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1', ...env },
  });
  if (error) console.error(`${title}: ${error.message}`);
  const code = status ?? 1;
  if (code !== 0 && !mayFail) {
    console.error(`\n${title} failed.`);
    process.exit(code);
  }
  return code;
}

/** Installs the packages when there are none or the lock file has changed since. */
export function installPackages() {
  const lock = createHash('sha256')
    .update(readFileSync(path.join(root, 'package-lock.json')))
    .digest('hex');
  const stamp = path.join(root, 'node_modules', '.lock-installed');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lock) return;
  run('Installing packages', 'npm', ['ci', '--include=dev', '--no-audit', '--no-fund']);
  writeFileSync(stamp, lock);
}

/** Starts a program that stays, its output shown. */
export const start = (command, args, env) =>
  spawn(command, args, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1', ...env },
  });
