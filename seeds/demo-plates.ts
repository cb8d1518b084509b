import { randomUUID } from 'node:crypto';
import { mkdir, rm, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { objectKey } from '../server/plates/keep-pictures';
import { type PictureReader } from '../server/plates/picture-reader';
import { type PictureMade } from '../server/plates/picture-report';
import { type PlateFacts } from '../server/plates/plates-db';
import { type ObjectStorage } from '../server/storage/object-storage';
import { DEMO_PLATE_WIDTH, type DemoVariant } from './demo-shots';

/** Paints a panorama and returns it as JPEG, half as high as wide. */
export type Painter = (wanted: {
  readonly width: number;
  readonly variant: DemoVariant;
  readonly onProgress: (done: number) => void;
}) => Promise<Buffer>;

export interface DemoPictures {
  readonly paint: Painter;
  readonly reader: PictureReader;
  readonly storage: ObjectStorage;
  /** For files that are gone afterwards. */
  readonly temporaryFolder: string;
}

/** What a plate's row needs, beside its place on a shot. */
export type DemoPlate = Omit<PlateFacts, 'id' | 'shotId' | 'frame'>;

/**
 * Paints one variant and keeps its versions. Keys are by content: painting again after a killed start keeps nothing
 * twice, and every shot that shows it shares the files.
 */
export async function makeDemoPlate(
  { paint, reader, storage, temporaryFolder }: DemoPictures,
  variant: DemoVariant,
  onProgress: (done: number) => void,
): Promise<DemoPlate> {
  const folder = path.join(temporaryFolder, `demo-${randomUUID()}`);
  await mkdir(folder, { recursive: true });
  try {
    const picture = await paint({ width: DEMO_PLATE_WIDTH, variant, onProgress });
    const file = path.join(folder, 'painting');
    await writeFile(file, picture);
    const report = await reader.read({ file, folder }, new AbortController().signal);
    if (!('made' in report)) throw new Error(`The painting was not taken: ${JSON.stringify(report)}`);
    return await kept(storage, report.made, variant, picture.length);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

async function kept(
  storage: ObjectStorage,
  made: PictureMade,
  variant: DemoVariant,
  bytes: number,
): Promise<DemoPlate> {
  for (const version of made.versions) await storage.put(objectKey(version), version.file);
  const versions = made.versions.map(version => ({ ...version, objectKey: objectKey(version) }));
  return { ...made, versions, fileName: `vesper-haven-${variant}.jpg`, bytes };
}
