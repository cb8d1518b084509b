import { createHash } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import path from 'node:path';
import sharp, { type Metadata, type OutputInfo, type Sharp } from 'sharp';
import { type PlateVersionName } from '#schemas/api/plates';
import { messageOf } from '../error-parts';
import { panoramaClaim, type PanoramaClaim } from './panorama-claim';
import {
  type MadeVersion,
  type PictureMade,
  type PictureRefused,
  type PictureReport,
  type PictureTask,
} from './picture-report';

const MOST_WIDTH = 12_000;
const MOST_HEIGHT = 6000;
const LEAST_WIDTH = 512;
const LEAST_HEIGHT = 256;
/** A stitcher may round one side; more is another shape. */
const SHAPE_TOLERANCE_PX = 2;
const TIMEOUT_SEC = 60;

const FORMATS: readonly string[] = ['jpeg', 'png', 'webp', 'tiff'];

/** Each at most this wide, never larger than the picture; each made from the one before it. */
const WIDTHS: readonly (readonly [PlateVersionName, number])[] = [
  ['display', 8192],
  ['4096', 4096],
  ['2048', 2048],
  ['thumb', 512],
];

/** Lets libvips open the four formats and nothing else, whatever a file pretends to be. */
export function allowOnlyOurFormats(): void {
  sharp.block({ operation: ['VipsForeignLoad'] });
  sharp.unblock({
    operation: ['VipsForeignLoadJpeg', 'VipsForeignLoadPng', 'VipsForeignLoadWebp', 'VipsForeignLoadTiff'],
  });
  sharp.concurrency(1);
  sharp.cache(false);
}

/** Looks at a picture and makes its versions. Never rejects. */
export async function makeVersions({ file, folder }: PictureTask): Promise<PictureReport> {
  const header = await readHeader(file);
  if (!header)
    return {
      refused: {
        kind: 'not-a-picture',
        detail: 'Its content is not JPEG, PNG, WebP or TIFF, whatever its name says',
      },
    };
  const claim = panoramaClaim(header.xmp);
  const refused = refusal(header, claim);
  if (refused) return { refused };
  try {
    const { width, height } = header.autoOrient;
    return { made: await makeAll(file, folder, { size: { width, height }, claim }) };
  } catch (error) {
    return reportOf(error);
  }
}

async function readHeader(file: string): Promise<Metadata | undefined> {
  try {
    // Reading a header decodes nothing, so its size may be told even where it is far too large.
    const header = await sharp(file, { limitInputPixels: false }).metadata();
    return FORMATS.includes(header.format) ? header : undefined;
  } catch {
    return undefined;
  }
}

/** @returns why a picture is refused by what its header says */
function refusal(header: Metadata, claim: PanoramaClaim | undefined): PictureRefused | undefined {
  const { width, height } = header.autoOrient;
  const size = `${width} × ${height} pixels`;
  if ((header.pages ?? 1) > 1)
    return { kind: 'moving-picture', detail: `It holds ${header.pages} pictures; a plate is one` };
  if (width > MOST_WIDTH || height > MOST_HEIGHT + 1) {
    return {
      kind: 'picture-size',
      detail: `It has ${size}; at most ${MOST_WIDTH} × ${MOST_HEIGHT} are taken. Save it smaller`,
    };
  }
  if (claim && (claim.projection.toLowerCase() !== 'equirectangular' || !claim.whole)) {
    return {
      kind: 'partial-panorama',
      detail: `It says that it is ${claim.whole ? `a ${claim.projection.slice(0, 40)} picture` : 'a part of a panorama'}; a whole equirectangular one is wanted`,
    };
  }
  if (Math.abs(width - 2 * height) > SHAPE_TOLERANCE_PX) {
    return {
      kind: 'not-2-to-1',
      detail: `It has ${size}; a whole equirectangular panorama is twice as wide as high, such as ${width} × ${Math.round(width / 2)}`,
    };
  }
  if (width < LEAST_WIDTH || height < LEAST_HEIGHT) {
    return {
      kind: 'picture-size',
      detail: `It has ${size}; at least ${LEAST_WIDTH} × ${LEAST_HEIGHT} are wanted`,
    };
  }
  return undefined;
}

async function makeAll(
  file: string,
  folder: string,
  { size, claim }: { readonly size: Size; readonly claim: PanoramaClaim | undefined },
): Promise<PictureMade> {
  const versions: MadeVersion[] = [];
  let pixels: Pixels | undefined;
  for (const [name, most] of WIDTHS) {
    const wanted = sizeWithin(size, most);
    pixels = pixels ? await shrunk(pixels, wanted) : await decode(file, wanted);
    versions.push(await write(pixels, name, folder));
  }
  return { ...size, projection: claim ? 'stated' : 'assumed', versions };
}

interface Size {
  readonly width: number;
  readonly height: number;
}

/** Decoded pixels: 8-bit sRGB, no alpha, upright. */
interface Pixels {
  readonly data: Buffer;
  readonly info: OutputInfo;
}

function sizeWithin({ width, height }: Size, mostWidth: number): Size {
  if (width <= mostWidth) return { width, height };
  return { width: mostWidth, height: Math.round((height * mostWidth) / width) };
}

/**
 * Decodes all of it, so that a file that is cut short is found before anything is kept. Shrinking in the same pass keeps
 * a picture of 12,000 pixels from standing in memory whole.
 */
async function decode(file: string, { width, height }: Size): Promise<Pixels> {
  const limitInputPixels = (MOST_WIDTH + SHAPE_TOLERANCE_PX) * (MOST_HEIGHT + SHAPE_TOLERANCE_PX);
  return sharp(file, { failOn: 'error', limitInputPixels, sequentialRead: true })
    .timeout({ seconds: TIMEOUT_SEC })
    .autoOrient()
    .flatten({ background: '#000' })
    .resize(width, height, { fit: 'fill', kernel: 'lanczos3', fastShrinkOnLoad: false })
    .toColourspace('srgb')
    .raw({ depth: 'uchar' })
    .toBuffer({ resolveWithObject: true });
}

const opened = ({ data, info: { width, height, channels } }: Pixels): Sharp =>
  sharp(data, { raw: { width, height, channels }, limitInputPixels: false }).timeout({
    seconds: TIMEOUT_SEC,
  });

async function shrunk(pixels: Pixels, { width, height }: Size): Promise<Pixels> {
  if (width === pixels.info.width) return pixels;
  const small = opened(pixels).resize(width, height, { fit: 'fill', kernel: 'lanczos3' });
  return small.raw().toBuffer({ resolveWithObject: true });
}

async function write(pixels: Pixels, name: PlateVersionName, folder: string): Promise<MadeVersion> {
  const small = name === 'thumb';
  const file = path.join(folder, name);
  const picture = opened(pixels);
  // Full colour resolution: point lights at night are one pixel wide.
  const encoded = small
    ? picture.webp({ quality: 82 })
    : picture.jpeg({ quality: 88, chromaSubsampling: '4:4:4' });
  const { width, height, size } = await encoded.toFile(file);
  const sha256 = createHash('sha256')
    .update(await readFile(file))
    .digest('hex');
  return { name, file, width, height, bytes: size, mediaType: small ? 'image/webp' : 'image/jpeg', sha256 };
}

/** A picture that does not decode is the picture's fault; a disk without room is not. */
function reportOf(error: unknown): PictureReport {
  const words = messageOf(error);
  if (/no space left|ENOSPC/i.test(words)) return { failed: words, code: 'ENOSPC' };
  if (/timeout/i.test(words))
    return {
      refused: { kind: 'broken-picture', detail: `It could not be decoded within ${TIMEOUT_SEC} seconds` },
    };
  if (/unable to (open|write) for write|ENOENT|EACCES/i.test(words)) return { failed: words };
  return {
    refused: {
      kind: 'broken-picture',
      detail: 'It cannot be decoded to its end: it was cut short or damaged',
    },
  };
}
