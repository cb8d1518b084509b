import { type Server } from 'node:http';
import { createApp } from './app';
import { readConfig } from './config';
import { codeOf } from './error-parts';
import { openLog } from './http/request-log';

/** What a start script reads as "that port is taken". */
const PORT_TAKEN = 98;
/** How long requests that are under way may take to end. */
const PATIENCE_MS = 5000;

const config = readConfig(process.env);
const log = openLog(config.logLevel);
const app = createApp(config, log);

const server = app.express.listen(config.port, config.host, error => {
  if (error) return fail(error);
  const address = server.address();
  const port = typeof address === 'object' && address ? address.port : config.port;
  log.info({ port }, 'Listening');
  process.send?.({ ready: true, port });
});
// Half a minute for headers, and no limit of our own for a large picture on a slow line.
server.requestTimeout = 15 * 60 * 1000;

for (const signal of ['SIGTERM', 'SIGINT'] as const) process.once(signal, () => void stop(server, signal));
process.once('disconnect', () => void stop(server, 'disconnect'));

let stopping = false;

async function stop(listening: Server, reason: string): Promise<void> {
  if (stopping) return;
  stopping = true;
  log.info({ reason }, 'Stopping');
  const closed = new Promise(resolve => listening.close(resolve));
  const idle = setInterval(() => listening.closeIdleConnections(), 100);
  const cut = setTimeout(() => listening.closeAllConnections(), PATIENCE_MS);
  await closed;
  clearInterval(idle);
  clearTimeout(cut);
  await app.close();
  process.exit(0);
}

function fail(error: Error): void {
  const taken = codeOf(error) === 'EADDRINUSE';
  console.error(taken ? `Port ${config.port} is taken by another program.` : error.message);
  process.exit(taken ? PORT_TAKEN : 1);
}
