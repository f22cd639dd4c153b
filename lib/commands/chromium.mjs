// Finds the system's Chromium for the browser tests, and installs it through the system's package manager where it can.
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { run } from './steps.mjs';

const places = [
  process.env.CHROMIUM_PATH,
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
];

const find = () => places.find((place) => place && existsSync(place));
const has = (program) => spawnSync('which', [program], { stdio: 'ignore' }).status === 0;

/** Path of a Chromium; ends the command with words when none is to be had. */
export function ensureChromium() {
  const found = find();
  if (found) return found;
  if (has('apt-get')) {
    const asRoot = process.getuid?.() === 0 ? [] : ['sudo', '-n'];
    const apt = (...args) => {
      const [command, ...rest] = [...asRoot, 'apt-get', ...args];
      return run(`Installing Chromium: apt-get ${args[0]}`, command, rest, {
        mayFail: true,
        env: { DEBIAN_FRONTEND: 'noninteractive' },
      });
    };
    apt('update', '-qq');
    apt('install', '-y', '-qq', '--no-install-recommends', 'chromium');
  }
  const installed = find();
  if (installed) return installed;
  console.error(
    '\nNo Chromium found, and it could not be installed. The browser tests need one:\n' +
      'install the package "chromium" of your system, or set CHROMIUM_PATH to the program.',
  );
  return process.exit(1);
}
