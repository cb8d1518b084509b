import { mkdtemp, readdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { text } from 'node:stream/consumers';
import { LocalStorage } from '../../server/storage/local-storage';

let folder: string;
let storage: LocalStorage;
beforeEach(async () => {
  folder = await mkdtemp(path.join(tmpdir(), 'fairlead-storage-'));
  storage = new LocalStorage(path.join(folder, 'objects'));
});
afterEach(() => rm(folder, { recursive: true, force: true }));

async function fileOf(content: string): Promise<string> {
  const file = path.join(folder, `brought-${content.length}`);
  await writeFile(file, content);
  return file;
}

it('gives back what was put, whole, and says whether it was there before', async () => {
  expect(await storage.put('pictures/ab/abc.jpg', await fileOf('first'))).toBe(true);
  expect(await storage.put('pictures/ab/abc.jpg', await fileOf('another'))).toBe(false);
  const object = await storage.get('pictures/ab/abc.jpg');
  expect(object?.bytes).toBe(5);
  expect(object && (await text(object.stream))).toBe('first');
});

it('knows nothing of what was deleted or never put; deleting twice is fine', async () => {
  await storage.put('a/b.webp', await fileOf('x'));
  await storage.delete('a/b.webp');
  await storage.delete('a/b.webp');
  expect(await storage.get('a/b.webp')).toBeUndefined();
  expect(await readdir(path.join(folder, 'objects/a'))).toEqual([]);
});

it('leaves nothing in place when a file cannot be taken', async () => {
  await expect(storage.put('a/b.jpg', path.join(folder, 'missing'))).rejects.toMatchObject({
    code: 'ENOENT',
  });
  expect(await storage.get('a/b.jpg')).toBeUndefined();
});

it.each([
  '../secret.txt',
  '/etc/passwd',
  'a/../../b.jpg',
  'a//b.jpg',
  'A.jpg',
  'a',
  '',
  'a\u0000.jpg',
  'a/.hidden.jpg',
])('takes no key like %j', async key => {
  const file = await fileOf('x');
  await expect(storage.put(key, file)).rejects.toThrow('Not a storage key');
  await expect(storage.get(key)).rejects.toThrow('Not a storage key');
  await expect(storage.delete(key)).rejects.toThrow('Not a storage key');
});
