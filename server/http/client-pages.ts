import express, { type Express, type RequestHandler } from 'express';
import { randomBytes } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import path from 'node:path';
import helmet from 'helmet';
import { Problem } from './problem';

const NONCE_MARK = /__CSP_NONCE__/g;
const HASHED = /[-.][A-Z0-9]{8}\.\w+$/;

/** Headers of everything; pages get their nonce by `contentSecurity`. */
export function securityHeaders(publicOrigin: string): RequestHandler {
  return helmet({
    contentSecurityPolicy: false,
    strictTransportSecurity: publicOrigin.startsWith('https:') ? { maxAge: 15_552_000 } : false,
    crossOriginResourcePolicy: { policy: 'same-origin' },
    referrerPolicy: { policy: 'same-origin' },
  });
}

/** Nothing but our own files; `wasm-unsafe-eval` lets a WebAssembly renderer start, and no script. */
function contentSecurity(nonce: string): RequestHandler {
  return helmet.contentSecurityPolicy({
    useDefaults: false,
    directives: {
      'default-src': ["'none'"],
      'base-uri': ["'self'"],
      'script-src': ["'self'", "'wasm-unsafe-eval'"],
      'style-src': ["'self'", `'nonce-${nonce}'`],
      'img-src': ["'self'", 'blob:', 'data:'],
      'font-src': ["'self'"],
      'connect-src': ["'self'"],
      'media-src': ["'self'", 'blob:'],
      'worker-src': ["'self'"],
      'manifest-src': ["'self'"],
      'form-action': ["'self'"],
      'frame-ancestors': ["'none'"],
      'object-src': ["'none'"],
      'require-trusted-types-for': ["'script'"],
      // `default` is the client's own (src/app/own-scripts.ts): it lets workers of this origin start, and nothing else.
      'trusted-types': ['angular', 'angular#components', 'angular#unsafe-bypass', 'default'],
    },
  });
}

/** For answers of the API: data, never a page, whoever opens them. */
export const dataOnly: RequestHandler = (_req, res, next) => {
  res.set('Content-Security-Policy', "default-src 'none'; frame-ancestors 'none'; sandbox");
  next();
};

/** The client's files, and its one page for every address that names no file. */
export function serveClient(app: Express, clientDir: string): void {
  const page = indexPage(path.join(clientDir, 'index.html'));
  app.get(['/', '/index.html'], page);
  app.use(
    express.static(clientDir, {
      index: false,
      redirect: false,
      setHeaders: (res, file) => {
        res.set('Cache-Control', HASHED.test(file) ? 'public, max-age=31536000, immutable' : 'no-cache');
      },
    }),
  );
  app.get('/{*path}', (req, res, next) => {
    // A missing script must not become a page: the browser would try to run it.
    if (!/\.[^/]*$/.test(req.path)) page(req, res, next);
    else res.status(404).type('text/plain').set('Cache-Control', 'no-store').send('Not found\n');
  });
}

function indexPage(file: string): RequestHandler {
  return async (req, res, next) => {
    const nonce = randomBytes(16).toString('base64');
    const html = await readFile(file, 'utf8').catch(() => undefined);
    if (html === undefined) {
      throw new Problem(
        503,
        'client-missing',
        'The pages are not built',
        'Run npm run build, then load this page again.',
        {},
        { 'Retry-After': '10' },
      );
    }
    contentSecurity(nonce)(req, res, error => {
      if (error) next(error);
      else res.type('html').set('Cache-Control', 'no-store').send(html.replace(NONCE_MARK, nonce));
    });
  };
}
