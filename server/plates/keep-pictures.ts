import { type PlateFacts } from './plates-db';
import { type MadeVersion } from './picture-report';
import { type ObjectStorage } from '../storage/object-storage';

/** @returns where a picture is kept: by its content, so that the same picture is kept once */
export function objectKey({ sha256, mediaType }: Pick<MadeVersion, 'sha256' | 'mediaType'>): string {
  return `pictures/${sha256.slice(0, 2)}/${sha256}.${mediaType === 'image/webp' ? 'webp' : 'jpg'}`;
}

/**
 * Puts the versions of a picture into storage, then does what refers to them. Where either fails, what was put in now is
 * taken out again. The caller holds a lock, so that nobody else begins to rely on these files meanwhile.
 *
 * @param refer writes the rows that refer to the files
 */
export async function keepPictures<T>(
  storage: ObjectStorage,
  versions: readonly MadeVersion[],
  refer: (kept: PlateFacts['versions']) => Promise<T>,
): Promise<T> {
  const added: string[] = [];
  try {
    for (const version of versions) {
      const key = objectKey(version);
      if (await storage.put(key, version.file)) added.push(key);
    }
    return await refer(versions.map(version => ({ ...version, objectKey: objectKey(version) })));
  } catch (error) {
    for (const key of added) await storage.delete(key);
    throw error;
  }
}
