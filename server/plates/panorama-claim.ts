import { XMLParser } from 'fast-xml-parser';

/** What a file's XMP says of its projection, in Google's GPano words. */
export interface PanoramaClaim {
  /** Such as `equirectangular`. */
  readonly projection: string;
  /** Whether the picture is the whole sphere, by the numbers that it states. */
  readonly whole: boolean;
}

const parser = new XMLParser({
  ignoreAttributes: false,
  attributeNamePrefix: '',
  removeNSPrefix: false,
  processEntities: false,
  parseTagValue: false,
  parseAttributeValue: false,
});

/** XMP that is larger says nothing that is wanted here. */
const MOST_XMP_BYTES = 256 * 1024;

/**
 * Reads the GPano members of an XMP packet, written as attributes or as elements.
 *
 * @returns undefined where it says nothing of a projection, or cannot be read
 * @see https://developers.google.com/streetview/spherical-metadata
 */
export function panoramaClaim(xmp: Buffer | undefined): PanoramaClaim | undefined {
  if (!xmp || xmp.length > MOST_XMP_BYTES) return undefined;
  const members = new Map<string, string>();
  try {
    collect(parser.parse(xmp.toString('utf8')), members);
  } catch {
    // Broken metadata is no reason to refuse a sound picture: its shape decides then.
    return undefined;
  }
  const projection = members.get('ProjectionType');
  if (projection === undefined) return undefined;
  const number = (name: string, otherwise: number) => Number(members.get(name) ?? otherwise);
  const width = number('FullPanoWidthPixels', 0);
  const height = number('FullPanoHeightPixels', 0);
  const whole =
    number('CroppedAreaImageWidthPixels', width) === width &&
    number('CroppedAreaImageHeightPixels', height) === height &&
    number('CroppedAreaLeftPixels', 0) === 0 &&
    number('CroppedAreaTopPixels', 0) === 0;
  return { projection, whole };
}

function collect(node: unknown, into: Map<string, string>): void {
  if (typeof node !== 'object' || node === null) return;
  for (const [name, value] of Object.entries(node)) {
    if (name.startsWith('GPano:') && typeof value === 'string')
      into.set(name.slice('GPano:'.length), value.trim());
    else collect(value, into);
  }
}
