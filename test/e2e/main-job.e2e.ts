import { readFile } from 'node:fs/promises';

import { type Locator, type Page } from '@playwright/test';
import { parse } from 'csv-parse/sync';

import { checkMove } from '../../shared/document/validate';
import { expect, makeShot, numberField, openShot, signIn, test, typeNumber } from './support/person';

/** A real panorama; its source is in test/fixtures/README.md. */
const PHOTOGRAPH = 'test/fixtures/panos/hill-2048x1024.jpg';

async function drag(page: Page, from: Locator, byX: number, byY: number): Promise<void> {
  const box = await from.boundingBox();
  if (!box) throw new Error('Nothing to drag');
  const [x, y] = [box.x + box.width / 2, box.y + box.height / 2];
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x + byX / 2, y + byY / 2, { steps: 4 });
  await page.mouse.move(x + byX, y + byY, { steps: 4 });
  await page.mouse.up();
}

async function downloaded(page: Page, button: string): Promise<string> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: button }).click(),
  ]);
  return readFile(await download.path(), 'utf8');
}

function framedView(page: Page): Locator {
  return page.getByRole('img', { name: /^Framed view/ });
}

function playhead(page: Page): Locator {
  return page.getByTestId('playhead');
}

/** Keys three, plays, saves and takes the documents out: the main job from an open shot on. */
async function doTheMainJob(page: Page): Promise<void> {
  await page.getByRole('button', { name: 'New move' }).click();
  await expect(framedView(page)).toBeVisible();
  await expect(page.getByTestId('save-state')).toHaveText('saved');

  // The first key is there; look elsewhere at the end, and set a key with the pose in hand.
  await page.getByRole('button', { name: 'To the end' }).click();
  await drag(page, framedView(page), -120, 0);
  await expect(page.getByText('pose in hand')).toBeVisible();
  await page.keyboard.press('n');
  await expect(page.getByText('pose in hand')).toBeHidden();
  const turned = await numberField(page, 'Yaw');
  // Dragging the picture to the left brings in what was on the right.
  expect(turned).toBeGreaterThan(5);
  await typeNumber(page, 'Yaw', 90);
  await expect(page.getByLabel('Yaw', { exact: true })).toHaveValue('90');

  // A third key between them: typed, then dragged on the chart, undone and redone.
  await page.getByRole('button', { name: 'To the start' }).click();
  for (let i = 0; i < 12; i++) await page.keyboard.press('Shift+ArrowRight');
  await page.keyboard.press('n');
  await expect(page.getByRole('heading', { name: /^Key 2/ })).toBeVisible();
  await typeNumber(page, 'Pitch', -8);
  const pitch = page.getByLabel('Pitch', { exact: true });
  const handle = page.getByRole('button', { name: /^Key 2 at frame/ });
  await drag(page, handle, 0, -40);
  await expect(pitch).not.toHaveValue('-8');
  const lifted = await numberField(page, 'Pitch');
  expect(lifted).toBeGreaterThan(-8);
  await page.keyboard.press('Control+z');
  await expect(pitch).toHaveValue('-8');
  await page.keyboard.press('Control+Shift+z');
  await expect(pitch).toHaveValue(String(lifted));
  await page.keyboard.press('Control+z');
  await expect(pitch).toHaveValue('-8');

  // Nonsense in a field is told, and the old number stays.
  await typeNumber(page, 'Roll', 'sideways');
  await expect(page.getByText('“sideways” is no number; 0 was kept.')).toBeVisible();
  await expect(page.getByLabel('Roll', { exact: true })).toHaveValue('0');

  // Played: the playhead runs by itself, and stops when told.
  await page.getByRole('button', { name: 'To the start' }).click();
  const before = await playhead(page).innerText();
  await page.keyboard.press('Space');
  await expect(page.getByRole('button', { name: 'Stop' })).toBeVisible();
  await expect(playhead(page)).not.toHaveText(before);
  await page.waitForTimeout(400);
  await page.getByRole('button', { name: 'Stop' }).click();
  const stopped = await playhead(page).innerText();
  await page.waitForTimeout(200);
  expect(await playhead(page).innerText()).toBe(stopped);

  // Saved, and still there after loading the page again.
  await page.getByLabel('Title of the move').fill('Keyed by hand');
  await page.getByLabel('Title of the move').press('Enter');
  await expect(page.getByTestId('save-state')).toHaveText('unsaved changes');
  await page.keyboard.press('Control+s');
  await expect(page.getByTestId('save-state')).toHaveText('saved');
  await page.reload();
  await expect(page.getByLabel('Title of the move')).toHaveValue('Keyed by hand');
  await expect(page.getByRole('button', { name: /^Key 3 at frame/ })).toBeVisible();

  // Handed on: the document is valid and says what was keyed; the table has a row a delivered frame.
  const checked = checkMove(JSON.parse(await downloaded(page, 'Download move.json')));
  if (!checked.ok) throw new Error(JSON.stringify(checked.faults));
  const { keys, shot } = checked.document;
  expect(keys.map(key => key.yaw).at(-1)).toBe(90);
  expect(keys.map(key => key.pitch)).toEqual([0, -8, 0]);
  const rows: Record<string, string>[] = parse(await downloaded(page, 'Download frames.csv'), {
    columns: true,
  });
  const delivered = Math.floor(((shot.to ?? shot.frames - 1) - (shot.from ?? 0)) / shot.speed + 1e-9) + 1;
  expect(rows).toHaveLength(delivered);
  expect(Number(rows.at(-1)?.['yaw'])).toBeCloseTo(90, 9);
}

test('an operator keys a move on the sample plate, plays it, saves it and takes its document', async ({
  page,
}) => {
  await signIn(page, 'operator');
  await openShot(page, 'harbour by night', 'Quay at blue hour');
  await doTheMainJob(page);
});

test('an operator does the same on a photograph of their own', async ({ page }) => {
  await signIn(page, 'operator');
  await makeShot(page, 'A walk uphill', 'From the top', PHOTOGRAPH);
  await doTheMainJob(page);
});

test('a picture that is not 2:1 is refused with its size, and nothing is kept', async ({ page }) => {
  await signIn(page, 'operator');
  await openShot(page, 'harbour by night', 'Last ferry in');
  const plates = await page.locator('.plates li').count();
  const square = Buffer.from(
    'iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==',
    'base64',
  );
  await page
    .getByLabel('Panorama to upload as a plate')
    .setInputFiles({ name: 'dot.png', mimeType: 'image/png', buffer: square });
  await expect(page.getByRole('alert')).toContainText('1 × 1');
  await page.reload();
  await expect(page.locator('.plates li')).toHaveCount(plates);
});

test('a bad document is listed fault by fault and replaces nothing; a good one is one step that can be undone', async ({
  page,
}) => {
  await signIn(page, 'operator');
  await openShot(page, 'harbour by night', 'Quay at blue hour');
  await page.getByRole('link', { name: 'Quay, one turn with a dip', exact: true }).click();
  const title = page.getByLabel('Title of the move');
  await expect(title).toHaveValue('Quay, one turn with a dip');
  const example = JSON.parse(await readFile('test/fixtures/quay-one-turn.move.json', 'utf8'));
  const open = (document: unknown) =>
    page.getByLabel('Move document to open').setInputFiles({
      name: 'other.move.json',
      mimeType: 'application/json',
      buffer: Buffer.from(JSON.stringify(document)),
    });
  await open({ ...example, keys: [example.keys[1], example.keys[0], { ...example.keys[2], fov: 400 }] });
  await expect(page.getByRole('alert')).toContainText('/keys/1/frame must be after frame 720');
  await expect(page.getByRole('alert')).toContainText('/keys/2/fov');
  await expect(page.getByTestId('save-state')).toHaveText('saved');
  await open({ ...example, title: 'Another', keys: example.keys.slice(2) });
  await expect(title).toHaveValue('Another');
  await expect(page.getByRole('button', { name: /^Key \d+ at frame/ })).toHaveCount(1);
  await page.getByRole('button', { name: 'Undo' }).click();
  await expect(title).toHaveValue('Quay, one turn with a dip');
  await expect(page.getByTestId('save-state')).toHaveText('saved');
});

test('an editor sees and downloads, and is offered no change', async ({ page }) => {
  await signIn(page, 'editor');
  await openShot(page, 'harbour by night', 'Quay at blue hour');
  await expect(page.getByRole('button', { name: 'New move' })).toHaveCount(0);
  await page.getByRole('link', { name: 'Quay, one turn with a dip', exact: true }).click();
  await expect(page.getByTestId('save-state')).toHaveText('look only');
  await expect(page.getByRole('button', { name: 'Set key' })).toHaveCount(0);
});

test('a reviewer is told that nothing has been sent yet', async ({ page }) => {
  await signIn(page, 'reviewer');
  await expect(page.getByRole('heading', { name: 'Nothing has been sent to you yet' })).toBeVisible();
});

test('a wrong password and an unknown name are answered alike', async ({ page }) => {
  await page.goto('/');
  const answers: string[] = [];
  for (const email of ['tomas@lantern-quay.example', 'nobody@lantern-quay.example']) {
    await page.getByLabel('E-mail').fill(email);
    await page.getByLabel('Password').fill('not the password');
    await page.getByRole('button', { name: 'Sign in' }).click();
    await expect(page.getByRole('alert')).toBeVisible();
    answers.push(await page.getByRole('alert').innerText());
    await page.reload();
  }
  expect(answers[0]).toBe(answers[1]);
});
