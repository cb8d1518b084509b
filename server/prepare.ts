import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { type Knex } from 'knex';
import { seedDemo } from '../seeds/demo';
import { type DemoPictures } from '../seeds/demo-plates';
import { paintVesperHaven } from '../seeds/vesper-haven/paint';
import { type Config, readConfig } from './config';
import { connect } from './db/connect';
import { databaseFailure } from './db/failures';
import { migrate } from './db/migrations';
import { PictureReader } from './plates/picture-reader';
import { LocalStorage, objectsFolder } from './storage/local-storage';

/** A cluster that has just been started may take a while to recover. */
const PATIENCE_MS = 60_000;
const BETWEEN_TRIES_MS = 500;

const say = (words: string) => console.log(`  ${words}`);

try {
  await prepare();
} catch (error) {
  console.error(
    `The database could not be prepared: ${error instanceof Error ? error.message : String(error)}`,
  );
  process.exit(1);
}

async function prepare(): Promise<void> {
  const config = readConfig(process.env);
  const db = connect(config.databaseUrl, 2);
  try {
    await waitFor(db);
    const names = await migrate(db);
    if (names.length > 0) say(`Migrated: ${names.join(', ')}`);
    if (process.argv.includes('--demo')) await seedDemo(db, demoPictures(config), say);
  } finally {
    await db.destroy();
  }
}

function demoPictures({ pictureWorker, storageDir }: Config): DemoPictures {
  return {
    paint: paintVesperHaven,
    reader: new PictureReader(pictureWorker),
    storage: new LocalStorage(objectsFolder(storageDir)),
    temporaryFolder: path.join(storageDir, 'tmp'),
  };
}

async function waitFor(db: Knex): Promise<void> {
  const until = Date.now() + PATIENCE_MS;
  for (;;) {
    try {
      await db.raw('select 1');
      return;
    } catch (error) {
      if (databaseFailure(error) !== 'away' || Date.now() > until) throw error;
      await sleep(BETWEEN_TRIES_MS);
    }
  }
}
