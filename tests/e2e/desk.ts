import { test as base, expect, type Locator, type Page } from '@playwright/test';
import type { Role } from '@/lib/access/roles';
import { emailOf, TEST_PASSWORD } from '../support/people';

/** A page that fails its test when the browser reports an error nobody expected. */
export const test = base.extend<{ expectedError: RegExp | null }>({
  expectedError: [null, { option: true }],
  page: async ({ page, expectedError }, use) => {
    const errors: string[] = [];
    page.on('pageerror', (error) => errors.push(error.message));
    page.on('console', (message) => {
      if (message.type() === 'error') errors.push(message.text());
    });
    await use(page);
    expect(errors.filter((error) => !expectedError?.test(error))).toEqual([]);
  },
});

export { expect };

export async function signIn(page: Page, role: Role, email = emailOf(role)): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(TEST_PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'Sites and rooms' })).toBeVisible();
}

export async function signOut(page: Page): Promise<void> {
  await page.getByRole('button', { name: /^Account/ }).click();
  await page.getByRole('menuitem', { name: 'Sign out' }).click();
  await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
}

/** The page of a room's stops, once its dose map is there and nothing is still to come. */
export async function openStops(page: Page, roomId: string): Promise<void> {
  await page.goto(`/rooms/${roomId}/stops`);
  await doseSettled(page);
}

/** Waits until the map and its gaps belong to what is on the sheet now. */
export const doseSettled = (page: Page): Promise<void> =>
  expect(page.getByRole('complementary', { name: 'Ledger' })).toHaveAttribute('data-dose', 'settled');

export const saved = (page: Page): Promise<void> =>
  expect(page.locator('[data-save-state]')).toHaveAttribute('data-save-state', 'saved');

export const ledger = (page: Page): Locator => page.getByRole('complementary', { name: 'Ledger' });

export const figure = async (page: Page, name: 'target-met' | 'lamp-on'): Promise<string> =>
  (await page.locator(`[data-figure="${name}"]`).textContent()) ?? '';

export const targetMet = async (page: Page): Promise<number> =>
  Number.parseFloat(await figure(page, 'target-met'));

/** Where a plan position is on the page now, read from the rulers' view that the sheet publishes. */
export async function onSheet(
  page: Page,
  [x, y]: readonly [number, number],
): Promise<{ x: number; y: number }> {
  const sheet = page.locator('[data-sheet]');
  const box = await sheet.boundingBox();
  const [scale, left, top] = ((await sheet.getAttribute('data-sheet')) ?? '').split(' ').map(Number);
  if (!box) throw new Error('The sheet is not on the page');
  return { x: box.x + x * scale + left, y: box.y + y * scale + top };
}

export async function clickSheet(page: Page, at: readonly [number, number]): Promise<void> {
  const { x, y } = await onSheet(page, at);
  await page.mouse.click(x, y);
}

/** Drags from one plan position to another in `steps` moves. */
export async function dragSheet(
  page: Page,
  from: readonly [number, number],
  to: readonly [number, number],
  steps = 12,
): Promise<void> {
  const start = await onSheet(page, from);
  const end = await onSheet(page, to);
  await page.mouse.move(start.x, start.y);
  await page.mouse.down();
  await page.mouse.move(end.x, end.y, { steps });
  await page.mouse.up();
}
