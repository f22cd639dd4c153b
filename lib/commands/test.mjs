// `npm test`: everything a change must pass, from a checkout with nothing installed.
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { ensureChromium } from './chromium.mjs';
import { installPackages, run, tool } from './steps.mjs';

installPackages();
const chromium = ensureChromium();

run('Lint', tool('biome'), ['check', '--error-on-warnings', '.']);
run('Route types', tool('next'), ['typegen']);
run('Types', tool('tsc'), ['--noEmit']);
run('Import directions', tool('depcruise'), [
  '--config',
  '.dependency-cruiser.cjs',
  ...['app', 'components', 'workers', 'lib', 'db', 'tests', 'instrumentation.ts'],
]);

const reports = mkdtempSync(path.join(os.tmpdir(), 'leeside-test-'));
const read = (file) => {
  try {
    return JSON.parse(readFileSync(path.join(reports, file), 'utf8'));
  } catch {
    return null;
  }
};

const unitCode = run(
  'Unit, reference, component and API tests',
  tool('vitest'),
  ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${path.join(reports, 'vitest.json')}`],
  { mayFail: true },
);
const unit = read('vitest.json');

run('Production build', tool('next'), ['build']);
const browserCode = run('Browser tests', tool('playwright'), ['test'], {
  mayFail: true,
  env: { CHROMIUM_PATH: chromium, PLAYWRIGHT_JSON_OUTPUT_NAME: path.join(reports, 'playwright.json') },
});
const browser = read('playwright.json')?.stats;
rmSync(reports, { recursive: true, force: true });

const passed = (unit?.numPassedTests ?? 0) + (browser?.expected ?? 0);
const failed = (unit?.numFailedTests ?? 0) + (browser?.unexpected ?? 0) + (browser?.flaky ?? 0);
const ranNothing = !unit?.numPassedTests || !browser?.expected;
if (ranNothing) console.error('\nA runner finished without running a test: see its output above.');
// A runner can fail without a failing test (an unhandled error, a server that does not start): never hide that.
const broken = ranNothing || unitCode !== 0 || browserCode !== 0;
console.log(`\n${passed} passed, ${broken ? Math.max(failed, 1) : failed} failed`);
process.exit(broken || failed > 0 ? 1 : 0);
