import path from 'node:path';
import sharp from 'sharp';
import { DEMO_PASSWORD } from '../../seeds/demo-crew';
import { seedDemo } from '../../seeds/demo';
import { type DemoPictures } from '../../seeds/demo-plates';
import { PictureReader } from '../../server/plates/picture-reader';
import { LocalStorage, objectsFolder } from '../../server/storage/local-storage';
import { checkMove } from '#shared/document/validate';
import { Browser, startTestApp, type TestApp } from '../support/server/test-app';

// Decoding two large pictures beside other work takes its time.
jest.setTimeout(120_000);

let app: TestApp;
let pictures: DemoPictures;
const painted: string[] = [];
const lines: string[] = [];

beforeAll(async () => {
  app = await startTestApp();
  await app.app.db('crews').delete();
  await app.app.db('users').delete();
  pictures = {
    // A plain picture of the painting's size: the painter has its own test.
    paint: ({ width, variant, onProgress }) => {
      painted.push(variant);
      onProgress(0.5);
      const background = variant === 'blue-hour' ? '#246' : '#012';
      return sharp({ create: { width, height: width / 2, channels: 3, background } })
        .jpeg()
        .toBuffer();
    },
    reader: new PictureReader(app.config.pictureWorker),
    storage: new LocalStorage(objectsFolder(app.config.storageDir)),
    temporaryFolder: path.join(app.config.storageDir, 'tmp'),
  };
});
afterAll(() => app.close());

const browse = (email: string) => new Browser(app.server).signIn(email, DEMO_PASSWORD);

it('leaves nothing in the database when it is stopped half-way, and the next run does it whole', async () => {
  const stopped = { ...pictures, paint: () => Promise.reject(new Error('stopped')) };
  await expect(seedDemo(app.app.db, stopped, () => undefined)).rejects.toThrow('stopped');
  expect(await app.app.db('users').select()).toEqual([]);
  expect(await seedDemo(app.app.db, pictures, line => lines.push(line))).toBe(true);
  expect(painted).toEqual(['blue-hour', 'deep-night']);
});

it('is done once: a second run changes nothing', async () => {
  const before = await app.rowCounts();
  expect(await seedDemo(app.app.db, pictures, () => undefined)).toBe(false);
  expect(await app.rowCounts()).toEqual(before);
});

// The counts of the product's brief: two shoots, five shots, eight moves, four people.
it('has two shoots, five shots and eight moves', async () => {
  const counts = await app.rowCounts();
  expect(counts).toMatchObject({ shoots: 2, shots: 5, moves: 8 });
  expect(await app.app.db('memberships').pluck('role')).toEqual(
    expect.arrayContaining(['lead', 'operator', 'editor', 'reviewer']),
  );
});

it('keeps each painting once, whatever number of shots shows it, and no temporary file', async () => {
  const files = await app.storedFiles();
  // Two paintings in four versions each.
  expect(files).toHaveLength(8);
  expect(files.every(file => file.startsWith('objects/pictures/'))).toBe(true);
});

it('gives the operator documents that hold together, with every way to travel', async () => {
  const browser = await browse('tomas@lantern-quay.example');
  const session = await browser.get('/api/session');
  const crew = `/api/crews/${session.body.memberships[0].crewId}`;
  const { body: shoots } = await browser.get(`${crew}/shoots`);
  const eases = new Set<string>();
  const paths = new Set<string>();
  for (const shoot of shoots.items) {
    const { body: shots } = await browser.get(`${crew}/shoots/${shoot.id}/shots`);
    for (const shot of shots.items) {
      expect(shot.cover).not.toBeNull();
      const { body: moves } = await browser.get(`${crew}/shots/${shot.id}/moves`);
      for (const { id } of moves.items) {
        const { body: move } = await browser.get(`${crew}/moves/${id}`);
        const checked = checkMove(move.document);
        expect(checked).toMatchObject({ ok: true });
        if (!checked.ok) continue;
        for (const { leg } of checked.document.keys) {
          if (!leg) continue;
          paths.add(leg.path);
          eases.add(typeof leg.ease === 'string' ? leg.ease : 'bezier');
        }
      }
    }
  }
  expect([...paths].sort()).toEqual(['arc', 'level']);
  // FORMATS: every ease that a leg may have.
  const every = ['bezier', 'ease', 'ease-in', 'ease-in-out', 'ease-out', 'fair', 'hold', 'linear'];
  expect([...eases].sort()).toEqual(every);
});

it.each(['ines', 'maren', 'oskar'])('lets %s sign in', async name => {
  const browser = await browse(`${name}@lantern-quay.example`);
  expect((await browser.get('/api/session')).body.memberships).toHaveLength(1);
});
