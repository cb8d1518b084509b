// `npm start`: from a fresh clone, or any later day, to a running Fairlead. Node's built-ins only: packages come first.
import { buildClient, buildServer } from './lib/build.mjs';
import {
  claimCopy,
  ensureDiskSpace,
  PortTaken,
  prepareDatabase,
  serverEnvironment,
  startServer,
  stopServer,
} from './lib/fairlead.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { Cluster } from './lib/postgres.mjs';
import { dataFolder, Explained } from './lib/project.mjs';
import { fail, say, step } from './lib/say.mjs';

/** Where Fairlead is served unless PORT says otherwise; when taken, the next ones are tried. */
const USUAL_PORT = 8360;
const PORTS_TRIED = 20;

const DEMO = [
  ['lead', 'ines@lantern-quay.example'],
  ['operator', 'tomas@lantern-quay.example'],
  ['editor', 'maren@lantern-quay.example'],
  ['reviewer', 'oskar@lantern-quay.example'],
];

const began = performance.now();
let cluster;
let server;
let stopping = false;

async function start() {
  claimCopy();
  await ensureDiskSpace();
  await ensurePackages();
  await buildServer();
  cluster = await step('Finding PostgreSQL', () => Cluster.open('pg'));
  const databaseUrl = await step('Starting the database', () => cluster.start());
  const settings = { databaseUrl, storage: dataFolder('storage') };
  await step('Preparing the database', () =>
    prepareDatabase(serverEnvironment({ ...settings, port: USUAL_PORT })),
  );
  await buildClient();
  const { child, port } = await listen(settings);
  server = child;
  server.once('exit', code => {
    if (!stopping)
      void stop(`The server ended (exit code ${code}). Your work is kept; run npm start again.`, 1);
  });
  welcome(port);
}

async function listen(settings) {
  const chosen = Number(process.env.PORT);
  if (chosen) return { child: await serveOn(settings, chosen), port: chosen };
  for (let port = USUAL_PORT; port < USUAL_PORT + PORTS_TRIED; port++) {
    try {
      return { child: await startServer(serverEnvironment({ ...settings, port })), port };
    } catch (error) {
      if (!(error instanceof PortTaken)) throw error;
      say(`  Port ${port} is taken by another program; trying the next.`);
    }
  }
  throw new Explained(
    `Ports ${USUAL_PORT} to ${USUAL_PORT + PORTS_TRIED - 1} are all taken. Choose one: PORT=9000 npm start`,
  );
}

async function serveOn(settings, port) {
  try {
    return await startServer(serverEnvironment({ ...settings, port }));
  } catch (error) {
    if (!(error instanceof PortTaken)) throw error;
    throw new Explained(`Port ${port} is taken by another program. Choose another: PORT=9000 npm start`);
  }
}

function welcome(port) {
  const accounts = DEMO.map(([role, email]) => `    ${role.padEnd(9)} ${email}`).join('\n');
  console.log(`
  Fairlead is at  http://127.0.0.1:${port}   (ready after ${((performance.now() - began) / 1000).toFixed(1)} s)

  Demo accounts of the crew Lantern Quay, all with the password  lantern-quay
${accounts}

  Ctrl-C stops the server and its database; what you made is kept in .data/
`);
}

async function stop(reason, code) {
  if (stopping) return;
  stopping = true;
  say(reason);
  if (server) await stopServer(server);
  cluster?.stop();
  process.exit(code);
}

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void stop('\nStopping.', 0));

try {
  await start();
} catch (error) {
  if (!stopping) {
    fail(error);
    await stop('', 1);
  }
}
