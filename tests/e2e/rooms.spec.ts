import { expect, openStops, signIn, signOut, test } from './desk';

test.use({ expectedError: /40[01]|413|422/ });

test('a wrong password is refused in words, and signing out ends the session', async ({ page }) => {
  await page.goto('/sites');
  await expect(page).toHaveURL(/sign-in/);
  await page.getByLabel('E-mail').fill('tomas.quill@example.test');
  await page.getByLabel('Password').fill('not the password');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('alert').filter({ hasText: 'not right' })).toBeVisible();
  await signIn(page, 'planner');
  await signOut(page);
  await page.goto('/rooms/two-bed-bay/stops');
  await expect(page).toHaveURL(/sign-in/);
});

test('rooms are found by words and by site, and sorted', async ({ page }) => {
  await signIn(page, 'planner');
  const names = page.getByRole('row').getByRole('link', { name: /.+/ });
  await page.getByLabel('Search').fill('ward 3 room');
  await expect(names.filter({ hasText: 'Side room 3.02' })).toBeVisible();
  await expect(names.filter({ hasText: 'Weights floor' })).toHaveCount(0);
  await page.getByLabel('Search').fill('no such room');
  await page.getByRole('button', { name: 'Show all rooms' }).click();
  await page.getByLabel('Site', { exact: true }).selectOption('Tollgate Gym');
  await expect(names.filter({ hasText: 'Weights floor' })).toBeVisible();
  await expect(names.filter({ hasText: 'Side room 3.02' })).toHaveCount(0);
  await page.getByRole('button', { name: 'Room', exact: true }).click();
  await expect(names.first()).toHaveText('Studio');
  await page.getByRole('button', { name: 'Room', exact: true }).click();
  await expect(names.first()).toHaveText('Weights floor');
});

test('a room file goes out and comes in again to the same figures', async ({ page }) => {
  await signIn(page, 'planner');
  await openStops(page, 'treatment-room');
  const figures = await page.locator('[data-figure]').allTextContents();
  await page.goto('/sites');
  const download = page.waitForEvent('download');
  await page.getByRole('link', { name: 'Export Treatment room as a room file' }).click();
  const path = await (await download).path();

  await page.getByRole('button', { name: 'Import a room file' }).click();
  await page.getByLabel('Room file', { exact: true }).setInputFiles(path);
  await expect(page).toHaveURL(/\/stops$/);
  await expect(page.getByRole('complementary', { name: 'Ledger' })).toHaveAttribute('data-dose', 'settled');
  await expect(page.getByText('Treatment room (2)').first()).toBeVisible();
  expect(await page.locator('[data-figure]').allTextContents()).toEqual(figures);
});

test('a broken file is refused with the place that is wrong', async ({ page }) => {
  await signIn(page, 'planner');
  await page.getByRole('button', { name: 'Import a room file' }).click();
  const give = (text: string) =>
    page
      .getByLabel('Room file', { exact: true })
      .setInputFiles({ name: 'room.json', mimeType: 'application/json', buffer: Buffer.from(text) });
  const alert = page.getByRole('dialog').getByRole('alert');
  await give('{\n  "format": "leeside-room",\n  "version": 1,,\n}');
  await expect(alert).toContainText('line 3, column 16');
  await give('{"format":"leeside-room","version":1,"room":{"name":"A","site":"B","ceiling":"high"}}');
  await expect(alert).toContainText('room.ceiling');
  await give('x'.repeat(2_100_000));
  await expect(alert).toContainText('at most 2 MB');
});

test('who may only look sees no tool that changes anything', async ({ page }) => {
  await signIn(page, 'crew');
  await expect(page.getByRole('button', { name: 'New room' })).toHaveCount(0);
  await openStops(page, 'two-bed-bay');
  await expect(page.getByText('Read only')).toBeVisible();
  await expect(page.getByRole('button', { name: 'Stop', exact: true })).toHaveCount(0);
  await page.getByRole('button', { name: 'Stop 1', exact: true }).click();
  await expect(page.getByLabel('Dwell')).toBeDisabled();
});

test('the theme stays as it was chosen', async ({ page }) => {
  await signIn(page, 'reviewer');
  await page.getByRole('button', { name: /^Account/ }).click();
  await page.getByRole('menuitemradio', { name: 'Night shift' }).click();
  await page.keyboard.press('Escape');
  await page.reload();
  await expect(page.locator('html')).toHaveAttribute('data-theme', 'dark');
});
