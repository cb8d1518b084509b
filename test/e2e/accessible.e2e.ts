import AxeBuilder from '@axe-core/playwright';
import { type Page } from '@playwright/test';

import { expect, openShot, signIn, test } from './support/person';

// The rules of axe-core: WCAG 2.2 A and AA, and its best practices.
async function faults(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations.flatMap(({ id, nodes }) => nodes.map(node => `${id}: ${node.target.join(' ')}`));
}

test.describe.configure({ mode: 'parallel' });

for (const colorScheme of ['light', 'dark'] as const) {
  test.describe(`in the ${colorScheme} scheme`, () => {
    test.use({ colorScheme });

    test('every page can be used by everybody, as far as axe can tell', async ({ page }) => {
      await page.goto('/sign-in');
      await expect(page.getByRole('heading', { name: 'Sign in' })).toBeVisible();
      expect(await faults(page)).toEqual([]);
      await signIn(page, 'lead');
      await expect(page.getByRole('link', { name: 'harbour by night' })).toBeVisible();
      expect(await faults(page)).toEqual([]);
      await page.getByRole('button', { name: 'New shoot' }).click();
      await expect(page.getByLabel('Title')).toBeVisible();
      expect(await faults(page)).toEqual([]);
      await page.getByRole('button', { name: 'Cancel' }).click();
      await openShot(page, 'harbour by night', 'Quay at blue hour');
      expect(await faults(page)).toEqual([]);
      await page.getByRole('link', { name: 'Quay, one turn with a dip', exact: true }).click();
      await expect(page.getByRole('button', { name: /^Key 3 at frame/ })).toBeVisible();
      expect(await faults(page)).toEqual([]);
      await page.getByRole('button', { name: /^Leg from frame 0/ }).click();
      expect(await faults(page)).toEqual([]);
    });
  });
}
