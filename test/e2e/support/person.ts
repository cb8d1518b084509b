import path from 'node:path';

import { expect, type Page, test as base } from '@playwright/test';

/** Accounts of the demo crew (seeds/demo-crew.ts). */
export const DEMO = {
  lead: 'ines@lantern-quay.example',
  operator: 'tomas@lantern-quay.example',
  editor: 'maren@lantern-quay.example',
  reviewer: 'oskar@lantern-quay.example',
} as const;

/**
 * A test with a watched page: an error on the console, an uncaught exception or a breach of the content security policy
 * fails it.
 */
export const test = base.extend<{ page: Page }>({
  page: async ({ page }, use) => {
    const faults: string[] = [];
    page.on('pageerror', error => faults.push(error.message));
    page.on('console', message => {
      // A refused request is the test's own business; what it shows is asserted there.
      if (message.type() === 'error' && !message.text().startsWith('Failed to load resource'))
        faults.push(message.text());
    });
    await use(page);
    expect(faults).toEqual([]);
  },
});

export { expect };

/** Signs in by the form, as a person does, and waits for the shoots. */
export async function signIn(page: Page, role: keyof typeof DEMO): Promise<void> {
  await page.goto('/');
  await page.getByLabel('E-mail').fill(DEMO[role]);
  await page.getByLabel('Password').fill('lantern-quay');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('button', { name: /^Account of/ })).toBeVisible();
}

/** Goes from the shoots to a shot by its titles. */
export async function openShot(page: Page, shoot: string, shot: string): Promise<void> {
  await page.getByRole('link', { name: shoot }).click();
  await page.getByRole('link', { name: shot }).click();
  await expect(page.getByRole('heading', { level: 1, name: shot })).toBeVisible();
}

/** Makes a shoot with one shot and uploads a picture as its plate, as a person does; ends on the shot's page. */
export async function makeShot(page: Page, shoot: string, shot: string, picture: string): Promise<void> {
  await page.getByRole('button', { name: 'New shoot' }).click();
  await page.getByLabel('Title').fill(shoot);
  await page.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByRole('heading', { level: 1, name: shoot })).toBeVisible();
  await page.getByRole('button', { name: 'New shot' }).click();
  await page.getByLabel('Title').fill(shot);
  await page.getByRole('button', { name: 'Save' }).click();
  await expect(page.getByRole('heading', { level: 1, name: shot })).toBeVisible();
  await page.getByLabel('Panorama to upload as a plate').setInputFiles(picture);
  await expect(page.getByRole('img', { name: path.basename(picture) })).toBeVisible();
}

/** The numbers of the key in hand, as the fields show them. */
export async function numberField(page: Page, label: string): Promise<number> {
  return Number(await page.getByLabel(label, { exact: true }).inputValue());
}

/** Types a number into a field and leaves it, as a person does. */
export async function typeNumber(page: Page, label: string, value: number | string): Promise<void> {
  const field = page.getByLabel(label, { exact: true });
  await field.click();
  await field.fill(String(value));
  await field.press('Enter');
  await field.blur();
}
