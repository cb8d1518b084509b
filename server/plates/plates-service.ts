import { mkdir, rm } from 'node:fs/promises';
import { type Plate } from '#schemas/api/plates';
import { type CrewScope } from '../crews/crew-scope';
import { uuidV7 } from '../db/uuid-v7';
import { invalid, notFound, Problem } from '../http/problem';
import { holdShot } from '../shots/shots-db';
import { seeShot } from '../shots/shots-service';
import { type ObjectStorage } from '../storage/object-storage';
import { keepPictures } from './keep-pictures';
import { type PictureReader } from './picture-reader';
import { type PictureMade, type PictureReport } from './picture-report';
import { findPlate, insertPlate, listPlates } from './plates-db';

/** A picture that a person brought, as it stands in a temporary file. */
export interface BroughtPicture {
  readonly file: string;
  readonly fileName: string;
  readonly bytes: number;
  /** The source frame at which it stands. */
  readonly frame: number;
}

export interface PictureTools {
  readonly reader: PictureReader;
  readonly storage: ObjectStorage;
}

/** @throws Problem 404 for the shot */
export async function seePlates(scope: CrewScope, shotId: string): Promise<Plate[]> {
  await seeShot(scope, shotId);
  return listPlates(scope, shotId);
}

/** @throws Problem 404 */
export async function seePlate(scope: CrewScope, id: string): Promise<Plate> {
  const plate = await findPlate(scope, id);
  if (!plate) throw notFound('plate');
  return plate;
}

/**
 * Checks a picture, makes its versions and keeps them. Either all of it is stored or nothing.
 *
 * @param signal ends the work where the sender has gone
 * @throws Problem 404 for the shot; 415 or 422 for the picture
 */
export async function addPlate(
  scope: CrewScope,
  { reader, storage }: PictureTools,
  shotId: string,
  picture: BroughtPicture,
  signal: AbortSignal,
): Promise<Plate> {
  requireFrameInside((await seeShot(scope, shotId)).frames, picture.frame);
  const folder = `${picture.file}.versions`;
  await mkdir(folder);
  try {
    const made = accepted(await reader.read({ file: picture.file, folder }, signal));
    return await keep(scope, storage, shotId, picture, made);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

function keep(
  scope: CrewScope,
  storage: ObjectStorage,
  shotId: string,
  picture: BroughtPicture,
  made: PictureMade,
): Promise<Plate> {
  return scope.transaction(async trx => {
    for (const sha256 of made.versions.map(v => v.sha256).sort()) await trx.lock(sha256);
    const shot = await holdShot(trx, shotId);
    if (!shot) throw notFound('shot');
    requireFrameInside(shot.frames, picture.frame);
    const { fileName, bytes, frame } = picture;
    const id = uuidV7();
    return keepPictures(storage, made.versions, async versions => {
      await insertPlate(trx, { ...made, id, shotId, frame, fileName, bytes, versions });
      await trx.record('plate.created', id, { shotId, fileName });
      return seePlate(trx, id);
    });
  });
}

/** Its files stay with it for 30 days. @throws Problem 404 */
export async function deletePlate(scope: CrewScope, id: string): Promise<void> {
  await scope.transaction(async trx => {
    if ((await trx.softDelete('plates', 'id', [id])).length === 0) throw notFound('plate');
    await trx.record('plate.deleted', id);
  });
}

function requireFrameInside(frames: number, frame: number): void {
  if (frame < frames) return;
  throw invalid([{ pointer: '/frame', detail: `must be inside the shot, 0 to ${frames - 1}, is ${frame}` }]);
}

const TITLES = {
  'not-a-picture': 'Not a picture that can be taken',
  'broken-picture': 'The picture is damaged',
  'picture-size': 'The picture has another size',
  'not-2-to-1': 'The picture is not 2:1',
  'partial-panorama': 'Not a whole equirectangular panorama',
  'moving-picture': 'More than one picture',
};

function accepted(report: PictureReport): PictureMade {
  if ('made' in report) return report.made;
  if ('failed' in report) throw Object.assign(new Error(report.failed), { code: report.code });
  const { kind, detail } = report.refused;
  throw new Problem(
    kind === 'not-a-picture' ? 415 : 422,
    kind,
    TITLES[kind],
    `${detail}. Nothing was stored.`,
    {
      errors: [{ pointer: '/picture', detail }],
    },
  );
}
