import { readFileSync } from 'node:fs';
import { evaluateStopSet } from '@/lib/commands/evaluate-stop-set';
import type { RoomFile } from '@/lib/room';
import {
  clickSheet,
  doseSettled,
  dragSheet,
  expect,
  figure,
  ledger,
  openStops,
  saved,
  signIn,
  targetMet,
  test,
} from './desk';

test.beforeEach(async ({ page }) => {
  await signIn(page, 'planner');
});

test('the browser and the command line agree on the target met', async ({ page }) => {
  // Rooms that no other test leaves changed.
  for (const room of ['two-bed-bay', 'weights-floor']) {
    const file: RoomFile = JSON.parse(readFileSync(`db/seed/rooms/${room}.json`, 'utf8'));
    const { targetMet: share } = evaluateStopSet(file, { plane: 0.75, grid: 0.05 });
    await openStops(page, room);
    expect(await targetMet(page)).toBeCloseTo(Math.floor(share * 1000) / 10, 6);
  }
});

test('upright faces are a surface of their own: a gap is named by its face and unrolls it', async ({
  page,
}) => {
  await openStops(page, 'side-room');
  const plane = await targetMet(page);
  await page.getByRole('button', { name: 'Sides', exact: true }).click();
  await expect(ledger(page)).toContainText('of all upright faces');
  await doseSettled(page);
  expect(await targetMet(page)).not.toBe(plane);
  await ledger(page).getByRole('button', { name: 'G1', exact: true }).click();
  const unrolled = ledger(page).getByRole('region', { name: /unrolled$/ });
  await expect(unrolled).toContainText(/\d\.\d\d m long/);
  await expect(unrolled).toContainText('% met');
  await unrolled.getByRole('button', { name: 'Roll it up' }).click();
  await expect(unrolled).toHaveCount(0);
});

test('touch points say whether they are met, and more dwell meets more of them', async ({ page }) => {
  await openStops(page, 'two-bed-bay');
  const met = async () =>
    Number.parseInt((await page.locator('[data-figure="touch-points"]').textContent()) ?? '', 10);
  const before = await met();
  await expect(ledger(page).getByText('hand-clean').first()).toBeVisible();
  await page.getByRole('button', { name: 'Stop 1', exact: true }).click();
  await page.getByLabel('Dwell').fill('120:00');
  await page.getByLabel('Dwell').press('Enter');
  await doseSettled(page);
  expect(await met()).toBeGreaterThan(before);
  await page.getByRole('button', { name: 'Undo' }).click();
  await doseSettled(page);
  expect(await met()).toBe(before);
  await saved(page);
});

test('a pass is drawn, counts in time and dose, is slowed, bent and deleted', async ({ page }) => {
  await page.goto('/rooms/treatment-room/stops');
  await page.getByRole('button', { name: 'New stop set' }).click();
  await expect(page.getByLabel('Stop set', { exact: true })).toContainText('Stop set');
  await page.keyboard.press('p');
  await clickSheet(page, [1, 2.4]);
  await clickSheet(page, [2, 2.4]);
  await page.keyboard.press('Enter');
  await doseSettled(page);
  const pass = ledger(page).getByRole('region', { name: 'Pass P1' });
  await expect(pass).toBeVisible();
  // 1 m at 0.05 m/s and a minute of warm-up.
  expect(await figure(page, 'lamp-on')).toBe('1:20');
  const fast = await targetMet(page);
  await pass.getByLabel('Speed').fill('0.005');
  await pass.getByLabel('Speed').press('Enter');
  await doseSettled(page);
  expect(await figure(page, 'lamp-on')).toBe('4:20');
  expect(await targetMet(page)).toBeGreaterThan(fast);

  await pass.getByRole('button', { name: 'Push speeds' }).click();
  const speeds = page.getByRole('dialog', { name: /^Push speeds/ });
  await expect(speeds.getByRole('row')).toHaveCount(8);
  await page.keyboard.press('Escape');

  await dragSheet(page, [2, 2.4], [2, 3]);
  await doseSettled(page);
  await expect(ledger(page).getByRole('row').filter({ hasText: 'P1' })).toContainText('1.17 m');
  await saved(page);
  const download = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Stop sequence (CSV)' }).click();
  let csv = '';
  for await (const chunk of await (await download).createReadStream()) csv += chunk;
  expect(csv.split(/\r?\n/)[1]).toMatch(/^1,P1,pass,.*,,0\.005,/);

  await page.getByRole('button', { name: 'Delete pass P1' }).click();
  await expect(pass).toHaveCount(0);
  await saved(page);
});
