import { randomUUID } from 'node:crypto';
import { type RequestHandler } from 'express';
import { pino, type Logger } from 'pino';
import { pinoHttp } from 'pino-http';

const SECRET_HEADERS = [
  'req.headers.cookie',
  'req.headers["x-xsrf-token"]',
  'req.headers.authorization',
  'res.headers["set-cookie"]',
];

export function openLog(level: string): Logger {
  return pino({ level, redact: { paths: SECRET_HEADERS, censor: '[redacted]' } });
}

/** Logs each request with an id, which the answer carries as X-Request-Id. */
export function requestLog(logger: Logger): RequestHandler {
  return pinoHttp({
    logger,
    genReqId: (req, res) => {
      const given = req.headers['x-request-id'];
      const id = typeof given === 'string' && /^[\w-]{8,64}$/.test(given) ? given : randomUUID();
      res.setHeader('X-Request-Id', id);
      return id;
    },
    customLogLevel: (_req, res, error) => {
      if (error || res.statusCode >= 500) return 'error';
      return res.statusCode >= 400 ? 'info' : 'debug';
    },
  });
}
