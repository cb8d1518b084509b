import { type Page } from '@playwright/test';
import sharp from 'sharp';

import { RAD_PER_DEG } from '../../shared/conventions';
import { type Picture } from '../../shared/render/picture';
import { referenceFrame } from '../../shared/render/reference';
import { quatFromYawPitchRoll } from '../../shared/rotation/yaw-pitch-roll';
import { expect, makeShot, signIn, test, typeNumber } from './support/person';

/**
 * Poses at which the picture is magnified, so that no smaller level of the plate takes part: yaw, pitch, roll, field of
 * view, eye point. Seam, zenith and nadir are among them.
 */
const POSES = [
  [0, 0, 0, 60, 0],
  [180, 5, 0, 50, 0],
  [-77, 20, 15, 40, 0.5],
  [33, 88, 0, 50, 0],
  [120, -86, -30, 45, 1],
  [540, 10, 8, 30, 0.2],
] as const;

/**
 * What counts as the same picture, in 8-bit tones. The software graphics of the tests count a texture's width in 65536
 * steps, 1/32 of one of our 2048 columns: at a hard edge that alone is several tones, so a few samples may differ by more.
 */
const BY_GRAPHICS = { close: 3, shareBeyond: 0.005, largest: 12, mean: 0.6 };

/** The processor blends in whole steps of 1/255 of a tone: rounding alone. */
const BY_PROCESSOR = { close: 1, shareBeyond: 0, largest: 1, mean: 0.5 };

const WAYS = [
  ['Drawn by the graphics card', BY_GRAPHICS],
  ['Drawn by the processor', BY_PROCESSOR],
] as const;

/** The plate's bytes as this browser decodes them: JPEG decoders differ by a tone or two, and that is not in question. */
async function decodedByTheBrowser(page: Page, url: string): Promise<Picture> {
  const { width, height, png } = await page.evaluate(async address => {
    const blob = await (await fetch(address)).blob();
    const bitmap = await createImageBitmap(blob, { colorSpaceConversion: 'none' });
    const canvas = new OffscreenCanvas(bitmap.width, bitmap.height);
    canvas.getContext('2d')?.drawImage(bitmap, 0, 0);
    const bytes = new Uint8Array(await (await canvas.convertToBlob({ type: 'image/png' })).arrayBuffer());
    let text = '';
    for (let i = 0; i < bytes.length; i += 4096) text += String.fromCharCode(...bytes.subarray(i, i + 4096));
    return { width: bitmap.width, height: bitmap.height, png: btoa(text) };
  }, url);
  const rgba = await sharp(Buffer.from(png, 'base64')).ensureAlpha().raw().toBuffer();
  return { width, height, rgba: new Uint8Array(rgba) };
}

// The second opinion: a plain double-precision renderer (shared/render/reference.ts), itself held against FFmpeg's v360
// and three.js (test/shared/render).
test('the framed view shows what a plain double-precision renderer shows', async ({ page }) => {
  await signIn(page, 'operator');
  await makeShot(page, 'Pixel for pixel', 'Hill', 'test/fixtures/panos/hill-2048x1024.jpg');
  const [served] = await Promise.all([
    page.waitForResponse(response => response.url().includes('/versions/2048')),
    page.getByRole('button', { name: 'New move' }).click(),
  ]);
  const source = await decodedByTheBrowser(page, served.url());
  await expect(page.getByLabel('Yaw', { exact: true })).toBeVisible();
  await page.getByRole('button', { name: 'Frame', exact: true }).click();
  // The sharpest picture arrives after the first one, without a sign that a person would need.
  await page.waitForTimeout(2500);
  for (const [way, allowed] of WAYS) {
    await page.getByRole('button', { name: 'Overlays' }).click();
    await page.getByRole('menuitemradio', { name: way }).click();
    await page.keyboard.press('Escape');
    for (const pose of POSES) await compare(page, source, pose, way, allowed);
  }
});

async function compare(
  page: Page,
  source: Picture,
  pose: (typeof POSES)[number],
  way: string,
  allowed: typeof BY_GRAPHICS,
): Promise<void> {
  const [yaw, pitch, roll, fov, eye] = pose;
  const fields = { Yaw: yaw, Pitch: pitch, Roll: roll, 'Eye point': eye, 'Field of view': fov };
  for (const [label, value] of Object.entries(fields)) await typeNumber(page, label, value);
  await page.waitForTimeout(700);
  const shot = await sharp(await page.getByRole('img', { name: /^Framed view/ }).screenshot())
    .ensureAlpha()
    .raw()
    .toBuffer({ resolveWithObject: true });
  const orientation = new Float64Array(4);
  quatFromYawPitchRoll(orientation, yaw * RAD_PER_DEG, pitch * RAD_PER_DEG, roll * RAD_PER_DEG);
  const { width, height } = shot.info;
  const truth = referenceFrame(source, { width, height, orientation, fovRad: fov * RAD_PER_DEG, eye });
  let largest = 0;
  let beyond = 0;
  let sum = 0;
  for (let i = 0; i < width * height; i++) {
    for (let k = 0; k < 3; k++) {
      const difference = Math.abs(shot.data[4 * i + k] - truth[4 * i + k]);
      largest = Math.max(largest, difference);
      if (difference > allowed.close) beyond++;
      sum += difference;
    }
  }
  const what = `${way} at ${pose.join(', ')}`;
  expect(largest, what).toBeLessThanOrEqual(allowed.largest);
  expect(beyond / (3 * width * height), what).toBeLessThanOrEqual(allowed.shareBeyond);
  expect(sum / (3 * width * height), what).toBeLessThan(allowed.mean);
}
