import { type Page } from '@playwright/test';
import sharp from 'sharp';

import { expect, makeShot, signIn, test, typeNumber } from './support/person';

/** Rows of the framed picture, as shares of its height, in which most pixels have the level line's colour. */
async function levelRows(page: Page): Promise<number[]> {
  const view = page.getByRole('img', { name: /^Framed view/ });
  const { data, info } = await sharp(await view.screenshot())
    .removeAlpha()
    .raw()
    .toBuffer({ resolveWithObject: true });
  const isLine = (at: number) => data[at] > 120 && data[at] < 190 && data[at + 1] > 200 && data[at + 2] > 225;
  const rows = [];
  for (let row = 0; row < info.height; row++) {
    let count = 0;
    for (let column = 0; column < info.width; column++) if (isLine(3 * (row * info.width + column))) count++;
    if (count > info.width * 0.6) rows.push((row + 0.5) / info.height);
  }
  return rows;
}

// Truth: arithmetic: looking up by θ, the horizon lies tan θ / (tan(fov/2) · h/w) of half the height below the middle.
test('the level line lies on the horizon, and what is shown is remembered', async ({ page }) => {
  await signIn(page, 'operator');
  await makeShot(page, 'Lines over the picture', 'Hill', 'test/fixtures/panos/hill-2048x1024.jpg');
  await page.getByRole('button', { name: 'New move' }).click();
  await expect(page.getByLabel('Yaw', { exact: true })).toBeVisible();
  await typeNumber(page, 'Eye point', 0);
  await typeNumber(page, 'Field of view', 90);
  expect(await levelRows(page)).toEqual([]);

  await page.getByRole('button', { name: 'Overlays' }).click();
  const choice = page.getByRole('menuitemcheckbox', { name: 'Level line' });
  await choice.click();
  await expect(choice).toHaveAttribute('aria-checked', 'true');
  await page.keyboard.press('Escape');
  const middle = await levelRows(page);
  expect(middle.length).toBeGreaterThan(0);
  expect(Math.abs(middle[0] - 0.5)).toBeLessThan(0.01);

  await typeNumber(page, 'Pitch', 10);
  await page.waitForTimeout(300);
  const [looking] = await levelRows(page);
  expect(looking - 0.5).toBeCloseTo((0.5 * Math.tan(Math.PI / 18) * 16) / 9, 1);

  await page.getByRole('button', { name: 'Save', exact: true }).click();
  await page.reload();
  await expect(page.getByLabel('Yaw', { exact: true })).toBeVisible();
  await page.waitForTimeout(1500);
  expect((await levelRows(page)).length).toBeGreaterThan(0);
  await page.getByRole('button', { name: 'Overlays' }).click();
  await expect(choice).toHaveAttribute('aria-checked', 'true');
  for (const name of [
    'Thirds',
    'Centre',
    'Safe action area',
    'Safe title area',
    'Seam',
    'Other deliverables',
    'Surround, masked',
  ])
    await expect(page.getByRole('menuitemcheckbox', { name })).toHaveAttribute('aria-checked', 'false');
});
