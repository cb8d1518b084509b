import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { statfs } from 'node:fs/promises';
import path from 'node:path';

import { dataFolder, DATA, Explained, inProject, ROOT } from './project.mjs';
import { mustRun } from './run.mjs';

/** The server's exit code when its port is taken (server/main.ts). */
const PORT_TAKEN = 98;

/** What the database, the painted plates and a build need to begin with, generously. */
const LEAST_FREE_BYTES = 600e6;

export async function ensureDiskSpace() {
  const { bavail, bsize } = await statfs(ROOT);
  const free = bavail * bsize;
  if (free < LEAST_FREE_BYTES) {
    throw new Explained(
      `The disk has ${Math.round(free / 1e6)} MB left; Fairlead wants ${LEAST_FREE_BYTES / 1e6} MB to start safely. Nothing was changed. Free some space and start again.`,
    );
  }
}

/** The environment of the server's programs, for one database and one folder of pictures. */
export function serverEnvironment({ databaseUrl, storage, port, logLevel = 'warn' }) {
  return {
    ...process.env,
    APP_ROOT: ROOT,
    NODE_ENV: 'production',
    DATABASE_URL: databaseUrl,
    STORAGE_DIR: storage,
    SESSION_SECRET: secret('session'),
    CLIENT_DIR: inProject('dist/client'),
    HOST: '127.0.0.1',
    PORT: String(port),
    PUBLIC_ORIGIN: `http://127.0.0.1:${port}`,
    LOG_LEVEL: process.env.LOG_LEVEL ?? logLevel,
  };
}

/** Migrates, and seeds the demo where there is no crew yet. */
export async function prepareDatabase(env) {
  await mustRun('Preparing the database', process.execPath, ['dist/server/prepare.mjs', '--demo'], {
    env,
    show: true,
  });
}

/**
 * Starts the server and waits until it listens. It ends by itself when this process does (its ipc channel closes),
 * however that ends.
 *
 * @returns the child process
 * @throws PortTaken where another program has the port
 */
export function startServer(env) {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--enable-source-maps', 'dist/server/main.mjs'], {
      cwd: ROOT,
      env,
      stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    });
    child.once('message', () => resolve(child));
    child.once('exit', code => {
      reject(
        code === PORT_TAKEN
          ? new PortTaken(env.PORT)
          : new Explained(`The server ended at once (exit code ${code}).`),
      );
    });
  });
}

export class PortTaken extends Error {
  constructor(port) {
    super(`Port ${port} is taken`);
  }
}

/** Stops a server started by {@link startServer} and waits for its end. */
export async function stopServer(child) {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const ended = new Promise(resolve => child.once('exit', resolve));
  child.kill('SIGTERM');
  await ended;
}

/** A random value made once and kept beside the data. */
function secret(name) {
  const file = path.join(dataFolder(), `${name}.secret`);
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('hex'), { mode: 0o600 });
  return readFileSync(file, 'utf8');
}

/**
 * Keeps two starts of one copy apart: they would share a database cluster, and the first to stop would stop both.
 *
 * @throws Explained where another start of this copy is alive
 */
export function claimCopy() {
  const file = path.join(DATA, 'start.pid');
  dataFolder();
  const other = existsSync(file) ? Number(readFileSync(file, 'utf8')) : 0;
  if (other && other !== process.pid && isStartScript(other)) {
    throw new Explained(
      `Fairlead already runs from this folder (process ${other}). Use that one, or stop it with Ctrl-C first.`,
    );
  }
  writeFileSync(file, String(process.pid));
}

/** A process number alone may have been given to another program since: its command line tells. */
function isStartScript(pid) {
  try {
    process.kill(pid, 0);
  } catch {
    return false;
  }
  const commandLine = `/proc/${pid}/cmdline`;
  return !existsSync(commandLine) || readFileSync(commandLine, 'utf8').includes('start.mjs');
}
