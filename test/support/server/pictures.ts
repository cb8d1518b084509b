import sharp from 'sharp';

/** A panorama of plain stripes: any width, half as high. */
export function panorama(width: number, height = width / 2): Promise<Buffer> {
  return striped(width, height).jpeg().toBuffer();
}

export function striped(width: number, height: number) {
  const tile = { create: { width: 64, height: 64, channels: 3 as const, background: '#123' } };
  const stripe = { create: { width: 64, height: 8, channels: 3 as const, background: '#fc6' } };
  const background = sharp({
    create: { width, height, channels: 3, background: '#234' },
    limitInputPixels: false,
  });
  return background.composite([
    { input: { ...stripe }, top: Math.floor(height / 2), left: 0 },
    { input: { ...tile }, top: 0, left: 0 },
  ]);
}
