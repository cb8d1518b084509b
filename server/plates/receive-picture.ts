import { type Request, type RequestHandler } from 'express';
import { mkdirSync } from 'node:fs';
import { readdir, rm, stat } from 'node:fs/promises';
import path from 'node:path';
import multer, { MulterError } from 'multer';
import { wrongContentType } from '../http/body-problem';
import { invalid, Problem } from '../http/problem';
import { type BroughtPicture } from './plates-service';
import { MOST_UPLOAD_MB, uploadProblem } from './upload-problem';

/** No upload takes so long: what is older was left by a process that died. */
const STALE_MS = 6 * 3600 * 1000;
const MOST_NAME_SIGNS = 200;

/** Reads multipart bodies into temporary files under names of our own. */
export class PictureReceiver {
  readonly #folder: string;

  constructor(storageDir: string) {
    this.#folder = path.join(storageDir, 'tmp');
    mkdirSync(this.#folder, { recursive: true });
  }

  /** Middleware: takes one file, `picture`, and one field, `frame`. */
  handlers(): RequestHandler[] {
    const upload = multer({
      storage: multer.diskStorage({ destination: this.#folder }),
      defParamCharset: 'utf8',
      limits: {
        fileSize: MOST_UPLOAD_MB * 1024 * 1024,
        files: 1,
        fields: 4,
        fieldSize: 100,
        fieldNameSize: 100,
        parts: 6,
      },
    });
    const read = upload.single('picture');
    return [
      requireMultipart,
      (req, res, next) => read(req, res, (error: unknown) => next(error && readingProblem(error))),
    ];
  }

  /**
   * What the middleware read; the file is gone when `use` has ended.
   *
   * @throws Problem 422 without a picture, or where the frame is no frame
   */
  async with<T>(req: Request, use: (picture: BroughtPicture) => Promise<T>): Promise<T> {
    try {
      return await use(brought(req));
    } finally {
      if (req.file) await rm(req.file.path, { force: true });
    }
  }

  /** Takes away what killed processes have left. */
  async sweep(nowMs: number): Promise<void> {
    for (const name of await readdir(this.#folder)) {
      const file = path.join(this.#folder, name);
      const { mtimeMs } = await stat(file).catch(() => ({ mtimeMs: nowMs }));
      if (nowMs - mtimeMs > STALE_MS) await rm(file, { recursive: true, force: true });
    }
  }
}

const requireMultipart: RequestHandler = (req, _res, next) => {
  if (!req.is('multipart/form-data'))
    throw wrongContentType('multipart/form-data with the file as "picture"');
  next();
};

/** The disk's own errors stay what they are; anything else is a body that is no multipart body. */
function readingProblem(error: unknown): unknown {
  if (error instanceof MulterError) return uploadProblem(error);
  if (typeof error === 'object' && error !== null && 'syscall' in error) return error;
  return new Problem(
    400,
    'malformed-upload',
    'The upload was cut short or is malformed',
    'The multipart body could not be read to its end. Nothing was stored; send it again.',
  );
}

function brought({ file, body }: Request): BroughtPicture {
  if (!file)
    throw invalid(
      [{ pointer: '/picture', detail: 'is missing: send the file as "picture"' }],
      'No picture came',
    );
  const fields: unknown = body;
  const given = typeof fields === 'object' && fields !== null && 'frame' in fields ? fields.frame : '0';
  if (typeof given !== 'string' || !/^\d{1,8}$/.test(given)) {
    throw invalid([
      { pointer: '/frame', detail: `must be a whole source frame, is ${JSON.stringify(given)}` },
    ]);
  }
  return { file: file.path, fileName: plainName(file.originalname), bytes: file.size, frame: Number(given) };
}

/** A name to show: no folders, nothing invisible. The file itself is never stored under it. */
export function plainName(name: string): string {
  const last = name.split(/[/\\]/).at(-1) ?? '';
  const shown = last.replace(/[\p{C}\p{Zl}\p{Zp}]/gu, '').trim();
  return [...shown].slice(0, MOST_NAME_SIGNS).join('') || 'picture';
}
