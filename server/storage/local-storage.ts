import { access, mkdir, open, rename, rm } from 'node:fs/promises';
import path from 'node:path';
import { codeOf } from '../error-parts';
import { type ObjectStorage } from './object-storage';

/** Lowercase words with slashes between; nothing that climbs out of the folder. */
const KEY = /^[a-z0-9]+(?:[/-][a-z0-9]+)*\.[a-z0-9]+$/;

/** @returns where a process' storage folder keeps its objects */
export const objectsFolder = (storageDir: string) => path.join(storageDir, 'objects');

/** Objects as files below one folder. */
export class LocalStorage implements ObjectStorage {
  constructor(private readonly folder: string) {}

  async put(key: string, file: string): Promise<boolean> {
    const place = this.pathOf(key);
    if (await isThere(place)) return false;
    await mkdir(path.dirname(place), { recursive: true });
    await settle(file);
    await rename(file, place);
    return true;
  }

  async get(key: string) {
    try {
      const file = await open(this.pathOf(key));
      const { size } = await file.stat();
      return { bytes: size, stream: file.createReadStream() };
    } catch (error) {
      if (codeOf(error) === 'ENOENT') return undefined;
      throw error;
    }
  }

  async delete(key: string): Promise<void> {
    await rm(this.pathOf(key), { force: true });
  }

  private pathOf(key: string): string {
    if (!KEY.test(key)) throw new Error(`Not a storage key: ${key}`);
    return path.join(this.folder, key);
  }
}

async function isThere(place: string): Promise<boolean> {
  return access(place).then(
    () => true,
    () => false,
  );
}

/** Waits until the file is on the disk itself: the rows that will refer to it survive a power cut, so must it. */
async function settle(file: string): Promise<void> {
  const handle = await open(file, 'r+');
  try {
    await handle.sync();
  } finally {
    await handle.close();
  }
}
