import type { Page } from '@playwright/test';
import {
  clickSheet,
  doseSettled,
  dragSheet,
  expect,
  ledger,
  onSheet,
  saved,
  signIn,
  signOut,
  test,
} from './desk';

const newRoom = async (page: Page, name: string): Promise<void> => {
  await page.goto('/sites');
  await page.getByRole('button', { name: 'New room' }).click();
  await page.getByLabel('Room', { exact: true }).fill(name);
  await page.getByRole('button', { name: 'Add and draw it' }).click();
  await expect(page.getByRole('heading', { name: 'Draw the room' })).toBeVisible();
  await expect(page.locator('[data-sheet] canvas').first()).toBeVisible();
};

const listed = (page: Page, name: string | RegExp) => ledger(page).getByRole('button', { name });

/** Puts a piece of the shelf where the sheet is clicked. */
const furnish = async (page: Page, piece: string, at: readonly [number, number]): Promise<void> => {
  await page.getByRole('button', { name: piece, exact: true }).click();
  await clickSheet(page, at);
};

test.beforeEach(async ({ page }) => {
  await signIn(page, 'planner');
});

test('from no room to a dose map without the gap, saved, found again and handed over', async ({ page }) => {
  await newRoom(page, 'Side room 3.05');
  await page.getByLabel('Width').fill('5');
  await page.getByLabel('Depth').fill('4');
  await page.getByRole('button', { name: 'Draw a rectangle' }).click();
  await expect(page.locator('[data-figure="floor-area"]')).toHaveText('20.0m²');
  await page.keyboard.press('d');
  await clickSheet(page, [2.5, 4]);
  await expect(listed(page, /^Door, bottom wall/)).toBeVisible();
  await furnish(page, 'Bed', [0.6, 1]);
  await furnish(page, 'Cupboard', [3, 1.6]);
  await expect(page.getByLabel('Turn')).toHaveValue('0');
  await expect(listed(page, /^Bed \d/)).toBeVisible();
  await saved(page);

  await page.getByRole('link', { name: 'Stops & dose' }).click();
  await page.getByRole('button', { name: 'Start a stop set' }).click();
  await clickSheet(page, [1.2, 2.9]);
  await page.keyboard.press('s');
  await clickSheet(page, [3.6, 2.9]);
  await doseSettled(page);
  const gaps = ledger(page).getByRole('region', { name: 'Shadow gaps' });
  await expect(gaps.getByRole('row').nth(1)).toContainText('G1');
  await page.keyboard.press('s');
  await clickSheet(page, [3, 0.7]);
  for (const stop of ['1', '2', '3']) {
    await page.getByRole('button', { name: `Stop ${stop}`, exact: true }).click();
    await page.getByLabel('Dwell').fill('30:00');
    await page.getByLabel('Dwell').press('Enter');
    await page.getByRole('button', { name: `Stop ${stop}`, exact: true }).click();
  }
  await doseSettled(page);
  await expect(ledger(page)).toContainText('None: every spot of this surface meets the target');
  await saved(page);
  const figures = await page.locator('[data-figure]').allTextContents();

  await signOut(page);
  await signIn(page, 'planner');
  await page.getByRole('link', { name: 'Side room 3.05', exact: true }).click();
  await doseSettled(page);
  expect(await page.locator('[data-figure]').allTextContents()).toEqual(figures);

  const download = page.waitForEvent('download');
  await page.getByRole('button', { name: 'Stop sequence (CSV)' }).click();
  const file = await (await download).createReadStream();
  let csv = '';
  for await (const chunk of file) csv += chunk;
  const rows = csv.trim().split(/\r?\n/);
  expect(rows[0]).toBe(
    'order,name,kind,from_wall_1,distance_1_m,from_wall_2,distance_2_m,heading_deg,dwell_s,speed_m_s,emitter',
  );
  expect(rows.slice(1).map((row) => row.split(',').slice(0, 3).join(','))).toEqual([
    '1,1,stop',
    '2,2,stop',
    '3,3,stop',
  ]);
  expect(rows[1]).toMatch(/left wall,1\.20,.*bottom wall,1\.10|bottom wall,1\.10,.*left wall,1\.20/);
  expect(rows.slice(1).every((row) => row.split(',')[8] === '1800')).toBe(true);
});

test('a room is drawn corner by corner, and a crossing outline is refused in words', async ({ page }) => {
  await newRoom(page, 'Drawn by corners');
  for (const at of [
    [0, 0],
    [6, 0],
    [6, 3],
    [4, 3],
    [4, 5],
    [0, 5],
  ] as const)
    await clickSheet(page, at);
  await page.keyboard.press('Enter');
  await expect(page.locator('[data-figure="floor-area"]')).toHaveText('26.0m²');
  await listed(page, /^right wall 1/).click();
  await page.getByLabel('Length').fill('3.5');
  await page.getByLabel('Length').press('Enter');
  await expect(page.locator('[data-figure="floor-area"]')).toHaveText('27.0m²');
  // Its last corner pulled across the far wall would make the sides cross.
  await dragSheet(page, [4, 3.5], [-1, 3.5]);
  await expect(page.getByRole('alert').filter({ hasText: 'cross' })).toContainText('as they were');
  await page.keyboard.press('Escape');
  await saved(page);
});

test('furniture stops at walls, is pulled, turned, sized, copied and deleted, and undone in whole steps', async ({
  page,
}) => {
  await newRoom(page, 'Furnished');
  await dragSheet(page, [0, 0], [6, 4]);
  await furnish(page, 'Locker', [3, 2]);
  await dragSheet(page, [3, 2], [5.95, 2]);
  // 0.45 m wide and flush with the wall at 6 m.
  await expect(page.getByLabel('x (m)')).toHaveValue('5.78');
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(page.getByLabel('x (m)')).toHaveValue('3');
  await page.getByRole('button', { name: 'Redo' }).click();
  await expect(page.getByLabel('x (m)')).toHaveValue('5.78');
  await page.getByLabel('x (m)').fill('2');
  await page.getByLabel('x (m)').press('Enter');
  await page.getByLabel('Width').fill('0.6');
  await page.getByLabel('Width').press('Enter');
  await page.getByLabel('Turn').fill('30');
  await page.getByLabel('Turn').press('Enter');
  await expect(listed(page, /^Locker 0\.60 × 0\.45/)).toBeVisible();
  await page.getByRole('button', { name: 'Duplicate' }).click();
  await expect(listed(page, /^Locker 2 /)).toBeVisible();
  await page.getByRole('button', { name: 'Delete' }).click();
  await expect(listed(page, /^Locker 2 /)).toHaveCount(0);
  // Typed out of the room: kept, marked and said where.
  await listed(page, /^Locker /).click();
  await page.getByLabel('x (m)').fill('5.9');
  await page.getByLabel('x (m)').press('Enter');
  await expect(page.getByText(/Locker reaches \d\.\d\d m out of the room/)).toBeVisible();
  await page.getByLabel('x (m)').fill('far');
  await page.getByLabel('x (m)').press('Enter');
  await expect(page.getByText('Write a number')).toBeVisible();
  await saved(page);
});

test('everything on the plan can be worked by keyboard', async ({ page }) => {
  await newRoom(page, 'By keyboard');
  await page.getByLabel('Width').fill('4');
  await page.getByLabel('Depth').fill('3');
  await page.keyboard.press('Enter');
  await page.getByRole('button', { name: 'Chair', exact: true }).focus();
  await page.keyboard.press('Enter');
  await expect(page.getByLabel('x (m)')).toHaveValue('2');
  const chair = listed(page, /^Chair /);
  await chair.focus();
  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('ArrowRight');
  await page.keyboard.press('Shift+ArrowUp');
  await page.keyboard.press(']');
  await expect(page.getByLabel('x (m)')).toHaveValue('2.1');
  await expect(page.getByLabel('y (m)')).toHaveValue('1.49');
  await expect(page.getByLabel('Turn')).toHaveValue('15');
  await page.keyboard.press('Control+z');
  await page.keyboard.press('Control+z');
  await expect(page.getByLabel('x (m)')).toHaveValue('2');
  await page.keyboard.press('Delete');
  await expect(chair).toHaveCount(0);
  await page.keyboard.press('?');
  await expect(page.getByRole('dialog', { name: 'Keys' })).toBeVisible();
});

test('a revision freezes the plan under a number', async ({ page }) => {
  await newRoom(page, 'Frozen');
  await dragSheet(page, [0, 0], [4, 3]);
  await page.getByLabel('What has changed').fill('As measured');
  await page.getByRole('button', { name: 'Save revision' }).click();
  await expect(page.getByText('Rev 1', { exact: true })).toBeVisible();
  await expect(page.getByText('As measured')).toBeVisible();
});

test('the wheel zooms where the pointer is, and the space bar moves the sheet', async ({ page }) => {
  await page.goto('/rooms/two-bed-bay/floor-plan');
  const scale = async () =>
    Number(((await page.locator('[data-sheet]').getAttribute('data-sheet')) ?? '').split(' ')[0]);
  await expect.poll(scale).toBeGreaterThan(20);
  const before = await scale();
  const at = await onSheet(page, [3, 2]);
  await page.mouse.move(at.x, at.y);
  await page.mouse.wheel(0, -400);
  await expect.poll(scale).toBeGreaterThan(before * 1.2);
  const after = await onSheet(page, [3, 2]);
  expect(Math.hypot(after.x - at.x, after.y - at.y)).toBeLessThan(4);
  await page.keyboard.down('Space');
  await page.mouse.down();
  await page.mouse.move(at.x + 80, at.y + 40, { steps: 4 });
  await page.mouse.up();
  await page.keyboard.up('Space');
  const moved = await onSheet(page, [3, 2]);
  expect(Math.round(moved.x - after.x)).toBe(80);
  await page.getByRole('button', { name: 'Show the whole room' }).click();
  await expect.poll(scale).toBeCloseTo(before, 3);
});
