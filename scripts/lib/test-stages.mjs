import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';

import { buildClient, buildServer } from './build.mjs';
import { ensureProgram } from './debian.mjs';
import { prepareDatabase, serverEnvironment, startServer, stopServer } from './fairlead.mjs';
import { Cluster, freePort } from './postgres.mjs';
import { dataFolder, inProject } from './project.mjs';
import { run } from './run.mjs';
import { say, step } from './say.mjs';

const bin = (name, file) => inProject('node_modules', name, file);
const TSC = bin('typescript', 'bin/tsc');

/** What the stages share and must close: the throw-away cluster, the server under test. */
const open = { cluster: undefined, server: undefined };

/** In the order they run: what is quick and tells most comes first. Each adds its counts to the tally. */
export const stages = {
  format: tally =>
    check(tally, 'formatting', bin('prettier', 'bin/prettier.cjs'), ['--check', '--log-level', 'warn', '.']),
  schemas: tally => check(tally, 'generated types are fresh', inProject('scripts/generate.mjs'), ['--check']),
  types: async tally => {
    for (const project of ['shared', 'app', 'node', 'spec']) {
      await check(tally, `types of ${project}`, TSC, ['-p', `tsconfig.${project}.json`, '--noEmit']);
    }
  },
  lint: tally => check(tally, 'lint', bin('eslint', 'bin/eslint.js'), ['.', '--max-warnings', '0']),
  shared: (tally, options) => jest(tally, 'shared', options),
  server: (tally, options) => jest(tally, 'server', options, { TEST_DATABASE_URL: true }),
  client: (tally, options) => jest(tally, 'client', options),
  e2e: browserTests,
};

export async function closeStages() {
  const { server, cluster } = open;
  open.server = open.cluster = undefined;
  if (server) await stopServer(server);
  cluster?.stop();
}

async function check(tally, what, program, args) {
  const { code, output } = await run(process.execPath, [program, ...args]);
  tally.add(code === 0 ? { passed: 1 } : { failed: 1 });
  say(code === 0 ? `   ok: ${what}` : `   FAILED: ${what}\n${output.trim()}`);
}

async function jest(tally, project, { match }, needs = {}) {
  // FFmpeg is the outside reference for exported scripts; the tests of those run it.
  if (project !== 'client') await program('ffmpeg', 'ffmpeg', ['ffmpeg']);
  const env = {
    ...process.env,
    NODE_OPTIONS: '',
    ...(needs.TEST_DATABASE_URL ? { TEST_DATABASE_URL: await database() } : {}),
  };
  const report = path.join(resultsFolder(), `${project}.json`);
  const args = [
    '--selectProjects',
    project,
    '--json',
    `--outputFile=${report}`,
    '--maxWorkers=2',
    ...(match ? [match] : []),
  ];
  rmSync(report, { force: true });
  const { code, output } = await run(process.execPath, [bin('jest', 'bin/jest.js'), ...args], { env });
  if (!existsSync(report)) throw new Error(`Jest (${project}) ended without a report:\n${output}`);
  const { numPassedTests, numFailedTests, numPendingTests, numRuntimeErrorTestSuites } = JSON.parse(
    readFileSync(report, 'utf8'),
  );
  const failed = numFailedTests + numRuntimeErrorTestSuites;
  tally.add({ passed: numPassedTests, failed: failed || (code === 0 ? 0 : 1), skipped: numPendingTests });
  say(`   ${numPassedTests} passed, ${failed} failed, ${numPendingTests} skipped`);
  if (code !== 0) say(output.replace(/^\{"num.*$/m, '').trim());
}

async function browserTests(tally, { match }) {
  const chromium = await program('chromium', 'Chromium', ['chromium']);
  await buildServer();
  await buildClient();
  const port = await freePort();
  const storage = path.join(dataFolder(), 'test-storage');
  rmSync(storage, { recursive: true, force: true });
  const env = serverEnvironment({
    databaseUrl: await freshDatabase('e2e'),
    storage,
    port,
    logLevel: 'error',
  });
  await step('Seeding the demo', () => prepareDatabase(env));
  open.server = await startServer(env);
  const report = path.join(resultsFolder(), 'e2e.json');
  rmSync(report, { force: true });
  const { code, output } = await run(
    process.execPath,
    [bin('@playwright/test', 'cli.js'), 'test', ...(match ? [match] : [])],
    {
      env: {
        ...process.env,
        E2E_BASE_URL: env.PUBLIC_ORIGIN,
        E2E_CHROMIUM: chromium,
        PLAYWRIGHT_JSON_OUTPUT_FILE: report,
      },
    },
  );
  if (!existsSync(report)) throw new Error(`Playwright ended without a report:\n${output}`);
  const { expected, unexpected, skipped, flaky } = JSON.parse(readFileSync(report, 'utf8')).stats;
  tally.add({ passed: expected, failed: unexpected + flaky || (code === 0 ? 0 : 1), skipped });
  say(`   ${expected} passed, ${unexpected + flaky} failed, ${skipped} skipped`);
  if (code !== 0) say(output.trim());
}

/** The throw-away cluster's address; made at the first call. */
async function database() {
  open.cluster ??= await Cluster.open('pg-test', { throwAway: true });
  return open.cluster.start();
}

async function freshDatabase(name) {
  const admin = await database();
  const { default: pg } = await import('pg');
  const client = new pg.Client({ connectionString: admin });
  await client.connect();
  await client.query(`drop database if exists ${name} with (force)`);
  await client.query(`create database ${name}`);
  await client.end();
  return admin.replace(/\/fairlead$/, `/${name}`);
}

/** @returns the path of a program, installed from Debian's packages where missing */
function program(name, what, packages) {
  const find = () =>
    (process.env.PATH ?? '')
      .split(':')
      .map(folder => path.join(folder, name))
      .find(existsSync);
  return ensureProgram({ find, packages, what });
}

function resultsFolder() {
  const folder = inProject('test-results');
  mkdirSync(folder, { recursive: true });
  return folder;
}
