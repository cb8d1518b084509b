import path from 'node:path';
import { z } from 'zod';

const ROOT = process.env['APP_ROOT'] ?? process.cwd();

const environment = z.object({
  DATABASE_URL: z.string().regex(/^postgres(ql)?:\/\//, 'must be a postgres:// address'),
  HOST: z.string().min(1).default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65535).default(8360),
  SESSION_SECRET: z.string().min(16, 'must be at least 16 signs'),
  STORAGE_DIR: z.string().min(1).default(path.join(ROOT, '.data/storage')),
  CLIENT_DIR: z.string().min(1).default(path.join(ROOT, 'dist/client')),
  PUBLIC_ORIGIN: z.url().optional(),
  NODE_ENV: z.enum(['production', 'development', 'test']).default('development'),
  LOG_LEVEL: z.enum(['trace', 'debug', 'info', 'warn', 'error', 'fatal', 'silent']).default('info'),
});

export interface Config {
  readonly databaseUrl: string;
  readonly host: string;
  readonly port: number;
  readonly sessionSecret: string;
  readonly storageDir: string;
  readonly clientDir: string;
  /** Where browsers find the server, such as `https://fairlead.example`; no path. */
  readonly publicOrigin: string;
  readonly logLevel: string;
  readonly pictureWorker: WorkerProgram;
}

/** A program of ours that runs in a process of its own. */
export interface WorkerProgram {
  readonly file: string;
  /** What Node needs to run it. */
  readonly execArgv: readonly string[];
}

/**
 * Reads the environment, once.
 *
 * @throws Error that lists every setting at fault, one a line
 */
export function readConfig(env: NodeJS.ProcessEnv): Config {
  const read = environment.safeParse(env);
  if (!read.success) {
    const faults = read.error.issues.map(issue => `${issue.path.join('.')}: ${issue.message}`);
    throw new Error(`The environment is not usable:\n${faults.join('\n')}`);
  }
  const settings = read.data;
  return {
    databaseUrl: settings.DATABASE_URL,
    host: settings.HOST,
    port: settings.PORT,
    sessionSecret: settings.SESSION_SECRET,
    storageDir: path.resolve(ROOT, settings.STORAGE_DIR),
    clientDir: path.resolve(ROOT, settings.CLIENT_DIR),
    publicOrigin: new URL(settings.PUBLIC_ORIGIN ?? `http://${settings.HOST}:${settings.PORT}`).origin,
    logLevel: settings.LOG_LEVEL,
    pictureWorker: workerProgram('plates/picture-worker'),
  };
}

/**
 * Finds a worker beside the running program: bundled programs start bundled workers (`dist/server`), all else (tsx,
 * Jest) the TypeScript source.
 */
export function workerProgram(name: string): WorkerProgram {
  const running = process.argv[1] ?? '';
  return running.endsWith('.mjs')
    ? { file: path.join(path.dirname(running), `${name}.mjs`), execArgv: [] }
    : { file: path.join(ROOT, 'server', `${name}.ts`), execArgv: ['--import', 'tsx'] };
}
