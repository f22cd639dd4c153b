import AxeBuilder from '@axe-core/playwright';
import { doseSettled, expect, signIn, test } from './desk';

const pages = [
  ['sites and rooms', '/sites'],
  ['the floor plan', '/rooms/two-bed-bay/floor-plan'],
  ['stops and dose', '/rooms/two-bed-bay/stops'],
] as const;

const sizes = [
  ['a desk', { width: 1440, height: 900 }],
  ['a phone', { width: 390, height: 844 }],
] as const;

for (const [device, viewport] of sizes)
  for (const colorScheme of ['light', 'dark'] as const)
    test.describe(`on ${device}, ${colorScheme}`, () => {
      test.use({ viewport, colorScheme });

      test('every page fits its width and passes the accessibility rules', async ({ page }) => {
        await page.goto('/sign-in');
        const check = async (name: string) => {
          const { violations } = await new AxeBuilder({ page }).analyze();
          expect(
            violations.map(({ id, nodes }) => `${id}: ${nodes[0].target}`),
            name,
          ).toEqual([]);
          const overflow = await page.evaluate(
            () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
          );
          expect(overflow, `${name} scrolls sideways`).toBeLessThanOrEqual(0);
        };
        await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
        await check('sign-in');
        await signIn(page, 'planner');
        for (const [name, address] of pages) {
          await page.goto(address);
          if (address === '/sites')
            await expect(page.getByRole('link', { name: 'Studio', exact: true })).toBeVisible();
          else await expect(page.locator('[data-sheet] canvas').first()).toBeVisible();
          if (address.endsWith('stops')) await doseSettled(page);
          await check(name);
        }
      });
    });

test.describe('when the server cannot be reached', () => {
  test.use({ expectedError: /Failed to load resource|ERR_/ });

  test('a page says so in words, and comes back when it can', async ({ page }) => {
    await signIn(page, 'planner');
    await page.route('**/api/rooms/**', (route) => route.abort());
    await page.goto('/rooms/two-bed-bay/stops');
    const alert = page.getByRole('alert').filter({ hasText: 'could not be loaded' });
    await expect(alert).toContainText('Nothing that was saved is lost', { timeout: 20_000 });
    await page.unroute('**/api/rooms/**');
    await alert.getByRole('button', { name: 'Try again' }).click();
    await doseSettled(page);
  });

  test('what is drawn without a network is kept and saved when it is back', async ({ page, context }) => {
    await signIn(page, 'planner');
    await page.goto('/rooms/studio/floor-plan');
    await expect(page.locator('[data-sheet] canvas').first()).toBeVisible();
    await context.setOffline(true);
    await page.getByLabel('Ceiling').fill('3.05');
    await page.getByLabel('Ceiling').press('Enter');
    await expect(page.getByText('No network')).toBeVisible();
    await context.setOffline(false);
    await expect(page.locator('[data-save-state]')).toHaveAttribute('data-save-state', 'saved', {
      timeout: 20_000,
    });
    await page.reload();
    await expect(page.getByLabel('Ceiling')).toHaveValue('3.05');
  });
});

test.describe('a missing room', () => {
  test.use({ expectedError: /404/ });

  test('is said to be not there', async ({ page }) => {
    await signIn(page, 'planner');
    await page.goto('/rooms/no-such-room/stops');
    await expect(page.getByRole('alert').filter({ hasText: 'could not be loaded' })).toBeVisible();
  });
});
