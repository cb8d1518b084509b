import { type RequestHandler, type Response } from 'express';
import { pipeline } from 'node:stream/promises';
import { notFound } from '../http/problem';
import { crewRoute, type CrewRoute, pathValue } from '../http/route';
import { type ObjectStorage } from '../storage/object-storage';
import { findVersion } from './plates-db';
import { addPlate, deletePlate, type PictureTools, seePlates } from './plates-service';
import { type PictureReceiver } from './receive-picture';

const OF_SHOT = '/shots/:shotId/plates';

/** @param limit middleware that stops whoever sends too much */
export function plateRoutes(
  tools: PictureTools,
  receiver: PictureReceiver,
  limit: RequestHandler,
): CrewRoute[] {
  return [
    crewRoute(
      {
        method: 'get',
        path: OF_SHOT,
        action: 'plates.see',
        summary: 'A shot’s plates, by frame',
        answer: [200, 'PlateList'],
      },
      async ({ scope, req }) => ({
        status: 200,
        body: { items: await seePlates(scope, pathValue(req, 'shotId')) },
      }),
    ),
    crewRoute(
      {
        ...{ method: 'post', path: OF_SHOT, action: 'plates.create', summary: 'Add a plate' },
        ...{ body: 'upload', answer: [201, 'Plate'], before: [limit, ...receiver.handlers()] },
      },
      ({ scope, req, res }) =>
        receiver.with(req, async picture => {
          const plate = await addPlate(scope, tools, pathValue(req, 'shotId'), picture, signalOf(res));
          return { status: 201, body: plate };
        }),
    ),
    crewRoute(
      {
        method: 'delete',
        path: '/plates/:plateId',
        action: 'plates.delete',
        summary: 'Delete a plate; it is kept for 30 days',
        answer: [204],
      },
      async ({ scope, req }) => {
        await deletePlate(scope, pathValue(req, 'plateId'));
        return { status: 204 };
      },
    ),
    crewRoute(
      {
        ...{ method: 'get', path: '/plates/:plateId/versions/:name', action: 'plates.see' },
        ...{ summary: 'A plate’s picture at one size', answer: [200, 'image/jpeg'] },
      },
      async ({ scope, req, res }) => {
        const version = await findVersion(scope, pathValue(req, 'plateId'), pathValue(req, 'name'));
        if (!version) throw notFound('picture');
        await sendPicture(res, tools.storage, version);
        return undefined;
      },
    ),
  ];
}

/** Fires where the asker goes away before the answer. */
function signalOf(res: Response): AbortSignal {
  const gone = new AbortController();
  if (res.destroyed) gone.abort();
  res.once('close', () => {
    if (!res.writableFinished) gone.abort();
  });
  return gone.signal;
}

/** The address carries the content's hash, so the browser, and it alone, may keep the picture for ever. */
async function sendPicture(
  res: Response,
  storage: ObjectStorage,
  { objectKey, mediaType }: { readonly objectKey: string; readonly mediaType: string },
): Promise<void> {
  res.type(mediaType).set({
    'Cache-Control': 'private, max-age=31536000, immutable',
    ETag: `"${objectKey.replace(/^.*\/|\..*$/g, '')}"`,
  });
  if (res.req.fresh) {
    res.status(304).end();
    return;
  }
  const object = await storage.get(objectKey);
  if (!object) throw new Error(`The picture ${objectKey} is missing from storage`);
  res.set('Content-Length', String(object.bytes));
  await pipeline(object.stream, res).catch((error: unknown) => {
    if (!res.destroyed) throw error;
  });
}
