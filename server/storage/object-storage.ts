import { type Readable } from 'node:stream';

/** Where pictures are kept: a local folder now, a bucket on more machines. Keys are ours, never a person's words. */
export interface ObjectStorage {
  /**
   * Puts a whole file into place, at once or not at all.
   *
   * @param file path of a local file, which stays
   * @returns false where the key was there already (keys carry their content's hash, so it is the same)
   */
  put(key: string, file: string): Promise<boolean>;
  /** @returns undefined where there is none */
  get(key: string): Promise<{ readonly bytes: number; readonly stream: Readable } | undefined>;
  /** What is not there is deleted already. */
  delete(key: string): Promise<void>;
}
