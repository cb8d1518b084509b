import { type Server } from 'node:http';
import { type App, createApp } from './app';
import { readConfig } from './config';
import { codeOf, messageOf } from './error-parts';
import { openLog } from './http/request-log';

/** What a start script reads as "that port is taken". */
const PORT_TAKEN = 98;
/** How long requests that are under way may take to end. */
const PATIENCE_MS = 5000;
/** A large picture on a slow line. */
const LONGEST_REQUEST_MS = 15 * 60 * 1000;

try {
  start();
} catch (error) {
  fail(error);
}

function start(): void {
  const config = readConfig(process.env);
  const log = openLog(config.logLevel);
  const app = createApp(config, log);
  const server = app.express.listen(config.port, config.host, error => {
    if (error) return fail(error, config.port);
    const address = server.address();
    const port = typeof address === 'object' && address ? address.port : config.port;
    log.info({ port }, 'Listening');
    process.send?.({ ready: true, port });
  });
  server.requestTimeout = LONGEST_REQUEST_MS;

  let stopping = false;
  const stop = (reason: string) => {
    if (stopping) return;
    stopping = true;
    log.info({ reason }, 'Stopping');
    void close(server, app).then(() => process.exit(0), fail);
  };
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, stop);
  process.once('disconnect', () => stop('disconnect'));
}

/** Lets requests that are under way end, for a while, then closes everything. */
async function close(server: Server, app: App): Promise<void> {
  const closed = new Promise(resolve => server.close(resolve));
  const idle = setInterval(() => server.closeIdleConnections(), 100);
  const cut = setTimeout(() => server.closeAllConnections(), PATIENCE_MS);
  await closed;
  clearInterval(idle);
  clearTimeout(cut);
  await app.close();
}

function fail(error: unknown, port?: number): void {
  const taken = codeOf(error) === 'EADDRINUSE';
  console.error(taken ? `Port ${port} is taken by another program.` : messageOf(error));
  process.exit(taken ? PORT_TAKEN : 1);
}
