import { type Response } from 'express';
import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { serialiseMove } from '#shared/document/serialise';
import { framesCsv } from '#shared/export/csv';
import { frameRows, type Per } from '#shared/export/frames-table';
import { revisionOf } from '../http/if-match';
import { crewRoute, crewRouteWithBody, type CrewRoute, pathValue, revised } from '../http/route';
import { safeFileName } from './file-name';
import { createMove, deleteMove, saveMove, seeMove, seeMoves } from './moves-service';

const OF_SHOT = '/shots/:shotId/moves';
const ONE = '/moves/:moveId';

export function moveRoutes(): CrewRoute[] {
  return [
    crewRoute(
      {
        method: 'get',
        path: OF_SHOT,
        action: 'moves.see',
        summary: 'A shot’s moves, last saved first',
        answer: [200, 'MoveList'],
      },
      async ({ scope, req }) => ({
        status: 200,
        body: { items: await seeMoves(scope, pathValue(req, 'shotId')) },
      }),
    ),
    crewRouteWithBody(
      {
        method: 'post',
        path: OF_SHOT,
        action: 'moves.create',
        summary: 'Make a move',
        body: 'MoveDraft',
        answer: [201, 'Move'],
      },
      async ({ scope, req }, draft) => revised(201, await createMove(scope, pathValue(req, 'shotId'), draft)),
    ),
    crewRoute(
      {
        method: 'get',
        path: ONE,
        action: 'moves.see',
        summary: 'A move and its document',
        answer: [200, 'Move'],
      },
      async ({ scope, req }) => revised(200, await seeMove(scope, pathValue(req, 'moveId'))),
    ),
    crewRouteWithBody(
      {
        method: 'put',
        path: ONE,
        action: 'moves.edit',
        summary: 'Save a move’s document; needs If-Match',
        body: 'MoveSave',
        answer: [200, 'Move'],
      },
      async ({ scope, req }, { document }) =>
        revised(200, await saveMove(scope, pathValue(req, 'moveId'), revisionOf(req), document)),
    ),
    crewRoute(
      {
        method: 'delete',
        path: ONE,
        action: 'moves.delete',
        summary: 'Delete a move; it is kept for 30 days',
        answer: [204],
      },
      async ({ scope, req }) => {
        await deleteMove(scope, pathValue(req, 'moveId'));
        return { status: 204 };
      },
    ),
    crewRoute(
      {
        method: 'get',
        path: `${ONE}/move.json`,
        action: 'moves.see',
        summary: 'The move document as a file',
        answer: [200, 'application/json'],
      },
      async ({ scope, req, res }) => {
        const { document } = await seeMove(scope, pathValue(req, 'moveId'));
        await send(res, `${safeFileName(document.title)}.move.json`, 'application/json', [
          serialiseMove(document),
        ]);
        return undefined;
      },
    ),
    framesRoute('frames.csv', 'delivered', 'A row for each delivered frame'),
    framesRoute('frames-source.csv', 'source', 'A row for each source frame'),
  ];
}

function framesRoute(file: string, per: Per, summary: string): CrewRoute {
  return crewRoute(
    { method: 'get', path: `${ONE}/${file}`, action: 'moves.see', summary, answer: [200, 'text/csv'] },
    async ({ scope, req, res }) => {
      const { document } = await seeMove(scope, pathValue(req, 'moveId'));
      await send(
        res,
        `${safeFileName(document.title)}.${file}`,
        'text/csv; charset=utf-8',
        framesCsv(frameRows(document, per)),
      );
      return undefined;
    },
  );
}

/** Lines are gathered into pieces of about this size: a write for every line would be most of the work. */
const PIECE_SIGNS = 64 * 1024;

/** Streams a download; a reader who leaves ends it. */
async function send(res: Response, name: string, type: string, lines: Iterable<string>): Promise<void> {
  res.status(200).attachment(name).type(type).set('Cache-Control', 'no-store');
  await pipeline(Readable.from(pieces(lines)), res).catch((error: unknown) => {
    if (!res.destroyed) throw error;
  });
}

function* pieces(lines: Iterable<string>): Generator<string> {
  let piece = '';
  for (const line of lines) {
    piece += line;
    if (piece.length < PIECE_SIGNS) continue;
    yield piece;
    piece = '';
  }
  if (piece) yield piece;
}
