/**
 * npm run bench:browser, after `npm run build`: the demo's gym (20 × 14 m, 44 parts, 8 stops, 5 cm grid) in Chromium. Prints
 * how long the full map takes, and how the map follows a dragged stop. Asserts nothing.
 */
import { spawn } from 'node:child_process';
import { chromium } from '@playwright/test';
import { emailOf, TEST_PASSWORD } from '../support/people';

const port = '3218';
const address = `http://127.0.0.1:${port}`;
const server = spawn('node_modules/.bin/tsx', ['tests/support/serve.ts'], {
  stdio: 'ignore',
  env: { ...process.env, E2E_PORT: port },
});

const healthy = () =>
  fetch(`${address}/api/health`).then(
    ({ ok }) => ok,
    () => false,
  );

try {
  for (let tries = 0; !(await healthy()); tries++) {
    if (tries > 100) throw new Error('The server did not answer. Is there a build? npm run build makes one.');
    await new Promise((resolve) => setTimeout(resolve, 300));
  }
  const browser = await chromium.launch({
    executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-gpu'],
  });
  const page = await browser.newPage({ viewport: { width: 1440, height: 900 } });
  await page.goto(`${address}/sign-in`);
  await page.getByLabel('E-mail').fill(emailOf('planner'));
  await page.getByLabel('Password').fill(TEST_PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL('**/sites');

  // Functions sent to the page carry the compiler's naming helper, which is not there.
  await page.addInitScript('globalThis.__name = (named) => named;');
  // From the first sight of the sheet to the figure of the full map.
  await page.addInitScript(() => {
    const seen = { sheet: 0, map: 0 };
    Object.assign(window, { seen });
    const look = () => {
      if (!seen.sheet && document.querySelector('[data-sheet] canvas')) seen.sheet = performance.now();
      const figure = document.querySelector('[data-figure="target-met"]')?.textContent ?? '';
      if (!seen.map && figure.includes('%')) seen.map = performance.now();
      if (!seen.map) requestAnimationFrame(look);
    };
    requestAnimationFrame(look);
  });
  const maps: number[] = [];
  for (let visit = 0; visit < 5; visit++) {
    await page.goto(`${address}/rooms/weights-floor/stops`);
    await page.locator('[data-dose="settled"]').waitFor();
    const seen = await page.evaluate(
      () => (window as unknown as { seen: { sheet: number; map: number } }).seen,
    );
    maps.push(seen.map - seen.sheet);
  }

  const sheet = page.locator('[data-sheet]');
  const box = await sheet.boundingBox();
  const [scale, left, top] = ((await sheet.getAttribute('data-sheet')) ?? '').split(' ').map(Number);
  if (!box) throw new Error('The sheet is not on the page.');
  const at = (x: number, y: number) => [box.x + x * scale + left, box.y + y * scale + top] as const;
  await page.evaluate(() => {
    const drag = { frames: [] as number[], repaints: 0, running: true };
    Object.assign(window, { drag });
    let last = performance.now();
    const tick = (now: number) => {
      drag.frames.push(now - last);
      last = now;
      if (drag.running) requestAnimationFrame(tick);
    };
    requestAnimationFrame(tick);
    // Every map that is drawn is put into a canvas of its own.
    const put = CanvasRenderingContext2D.prototype.putImageData;
    CanvasRenderingContext2D.prototype.putImageData = function counted(...args: unknown[]) {
      drag.repaints++;
      return Reflect.apply(put, this, args);
    };
  });
  await page.mouse.move(...at(14, 7.5));
  await page.mouse.down();
  const started = Date.now();
  for (let step = 0; Date.now() - started < 4000; step++) {
    const angle = step / 12;
    await page.mouse.move(...at(13.5 + Math.cos(angle) * 1.5, 7.2 + Math.sin(angle) * 1.2));
  }
  const seconds = (Date.now() - started) / 1000;
  await page.mouse.up();
  const drag = await page.evaluate(() => {
    const { drag } = window as unknown as { drag: { frames: number[]; repaints: number; running: boolean } };
    drag.running = false;
    return { frames: drag.frames, repaints: drag.repaints };
  });
  const sorted = [...drag.frames].sort((a, b) => a - b);
  console.log(
    `full map of the gym: ${maps.map((ms) => `${Math.round(ms)} ms`).join(', ')} after the sheet is there`,
  );
  console.log(
    `dragging a stop: ${(drag.frames.length / seconds).toFixed(0)} frames a second, half of them within ` +
      `${sorted[Math.floor(sorted.length / 2)].toFixed(0)} ms, 95 % within ${sorted[Math.floor(sorted.length * 0.95)].toFixed(0)} ms; ` +
      `${(drag.repaints / seconds).toFixed(0)} maps drawn a second`,
  );
  await browser.close();
} finally {
  server.kill();
}
