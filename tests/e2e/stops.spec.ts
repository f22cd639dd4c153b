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

// The browser reports a save that was refused for being stale as an error of its own.
test.use({ expectedError: /412/ });

test.describe('stops and dose', () => {
  test.beforeEach(async ({ page }) => {
    await signIn(page, 'planner');
  });

  test('a moved stop, a longer dwell and undo change the figures and come back', async ({ page }) => {
    await openStops(page, 'treatment-room');
    const before = await targetMet(page);
    const lampOn = await figure(page, 'lamp-on');

    await page.getByRole('button', { name: 'Stop 1', exact: true }).click();
    await page.getByLabel('Dwell').fill('20:00');
    await page.getByLabel('Dwell').press('Enter');
    await doseSettled(page);
    expect(await targetMet(page)).toBeGreaterThan(before);
    expect(await figure(page, 'lamp-on')).not.toBe(lampOn);
    await saved(page);

    await page.getByRole('button', { name: 'Undo' }).click();
    await doseSettled(page);
    expect(await targetMet(page)).toBe(before);
    expect(await figure(page, 'lamp-on')).toBe(lampOn);

    await page.keyboard.press('Escape');
    await dragSheet(page, [1.0, 2.75], [1.8, 2.4]);
    await doseSettled(page);
    await expect(page.getByLabel('x (m)')).toHaveValue('1.8');
    await expect(page.getByLabel('y (m)')).toHaveValue('2.4');
    // One drag is one step back.
    await page.getByRole('button', { name: 'Undo' }).click();
    await expect(page.getByLabel('x (m)')).toHaveValue('1');
    await saved(page);
  });

  test('everything about a stop can be done by keyboard alone', async ({ page }) => {
    await openStops(page, 'treatment-room');
    await page.getByRole('button', { name: 'Stop 2', exact: true }).focus();
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: 'Stop 2', exact: true }).focus();
    for (let i = 0; i < 3; i++) await page.keyboard.press('ArrowRight');
    await page.keyboard.press('Shift+ArrowDown');
    await page.keyboard.press(']');
    await expect(page.getByLabel('x (m)')).toHaveValue('1.6');
    await expect(page.getByLabel('y (m)')).toHaveValue('0.71');
    await expect(page.getByLabel('Heading')).toHaveValue('45');
    await page.keyboard.press('Control+z');
    await page.keyboard.press('Control+z');
    await page.keyboard.press('Control+z');
    await expect(page.getByLabel('x (m)')).toHaveValue('1.45');
    await page.keyboard.press('?');
    await expect(page.getByRole('dialog', { name: 'Keys' })).toBeVisible();
    await page.keyboard.press('Escape');
    await saved(page);
  });

  test('choosing a gap shows it, and the read-out names the stops that light a spot', async ({ page }) => {
    await openStops(page, 'two-bed-bay');
    const gap = ledger(page).getByRole('button', { name: 'G1', exact: true });
    await gap.click();
    await expect(gap).toHaveAttribute('aria-pressed', 'true');
    await clickSheet(page, [4.25, 2.6]);
    await expect(page.getByTestId('read-out')).toContainText('mJ/cm²');
    await expect(page.getByTestId('read-out')).toContainText('stop 2');
  });

  test('the surface changes what is shown, down to the floor and up to the tops', async ({ page }) => {
    await openStops(page, 'side-room');
    const plane = await targetMet(page);
    await page.getByRole('button', { name: 'Floor', exact: true }).click();
    await expect(ledger(page)).toContainText('of the floor');
    await doseSettled(page);
    expect(await targetMet(page)).not.toBe(plane);
    await page.getByRole('button', { name: 'Tops', exact: true }).click();
    await expect(ledger(page)).toContainText('of tops and floor');
    await doseSettled(page);
  });

  test('a dwell that cannot be read is marked and changes nothing', async ({ page }) => {
    await openStops(page, 'treatment-room');
    const lampOn = await figure(page, 'lamp-on');
    await page.getByRole('button', { name: 'Stop 1', exact: true }).click();
    await page.getByLabel('Dwell').fill('soon');
    await page.getByLabel('Dwell').press('Enter');
    await expect(page.getByText('Write minutes and seconds, such as 7:30')).toBeVisible();
    expect(await figure(page, 'lamp-on')).toBe(lampOn);
  });

  test('stops are reordered, named, copied and deleted', async ({ page }) => {
    await openStops(page, 'side-room');
    await page.getByRole('button', { name: 'Copy this stop set' }).click();
    await expect(page.getByLabel('Stop set', { exact: true })).toContainText('Three stops (copy)');
    await doseSettled(page);
    await page.getByRole('button', { name: 'Stop 3 earlier' }).click();
    await expect(ledger(page).getByRole('button', { name: /^Stop \d$/ })).toHaveText(['1', '3', '2']);
    await page.getByRole('button', { name: 'Stop 3', exact: true }).click();
    await page.getByLabel('Name', { exact: true }).fill('En-suite');
    await page.getByLabel('Name', { exact: true }).press('Enter');
    await page.getByRole('button', { name: 'Delete stop En-suite' }).click();
    await expect(ledger(page).getByRole('button', { name: /^Stop \d$/ })).toHaveText(['1', '2']);
    await saved(page);
    await page.reload();
    await doseSettled(page);
    await page.getByLabel('Stop set', { exact: true }).selectOption({ label: 'Three stops (copy) · draft' });
    await expect(ledger(page).getByRole('button', { name: /^Stop \d$/ })).toHaveText(['1', '2']);
  });
});

test('two planners on one stop set: the second save is told, and nothing is lost', async ({
  page,
  browser,
}) => {
  await signIn(page, 'planner');
  await page.goto('/rooms/studio/stops');
  await page.getByRole('button', { name: 'Start a stop set' }).click();
  await clickSheet(page, [4, 5]);
  await saved(page);

  const other = await browser.newContext();
  const theirs = await other.newPage();
  await signIn(theirs, 'planner', 'priya.lorne@example.test');
  await openStops(theirs, 'studio');
  await clickSheet(theirs, [2, 2]);
  await theirs.keyboard.press('s');
  await clickSheet(theirs, [2, 7]);
  await saved(theirs);

  await page.keyboard.press('s');
  await clickSheet(page, [9, 6]);
  const notice = page.getByRole('alert').filter({ hasText: 'Someone else saved first' });
  await expect(notice).toContainText('Priya Lorne');
  await notice.getByRole('button', { name: 'Keep mine as a copy' }).click();
  await expect(page.getByLabel('Stop set', { exact: true })).toContainText('(copy)');
  await saved(page);

  // Both are there: hers under the old name, mine as the copy.
  await page.reload();
  await doseSettled(page);
  await expect(ledger(page).getByRole('button', { name: /^Stop \d$/ })).toHaveCount(2);
  await page.getByLabel('Stop set', { exact: true }).selectOption({ index: 1 });
  await expect(ledger(page).getByRole('button', { name: /^Stop \d$/ })).toHaveCount(2);
  await other.close();
});
