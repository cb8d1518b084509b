import { type Readable } from 'node:stream';

/** Where pictures are kept: a local folder now, a bucket on more machines. Keys are ours, never a person's words. */
export interface ObjectStorage {
  /**
   * Takes a whole file into place, at once or not at all.
   *
   * @param file a temporary file in the storage folder; it may be gone afterwards
   * @returns false where the key was there already (keys carry their content's hash, so it is the same)
   */
  put(key: string, file: string): Promise<boolean>;
  /** @returns undefined where there is none */
  get(key: string): Promise<{ readonly bytes: number; readonly stream: Readable } | undefined>;
  /** What is not there is deleted already. */
  delete(key: string): Promise<void>;
}
