import { mkdtemp, readdir, rm } from 'node:fs/promises';
import { createServer, type Server } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import request from 'supertest';
import { type Role } from '#schemas/api/session';
import { type App, createApp, type Parts } from '../../../server/app';
import { type Config } from '../../../server/config';
import { openLog } from '../../../server/http/request-log';
import { bundledWorker } from './bundled-worker';
import { makeCrew, PASSWORD, type TestCrew } from './test-crew';
import { makeDatabase } from './test-database';

export const ORIGIN = 'http://fairlead.test';

/** The whole application over a database and a storage folder of its own, with two crews. */
export interface TestApp {
  readonly app: App;
  readonly server: Server;
  readonly config: Config;
  readonly crew: TestCrew;
  readonly otherCrew: TestCrew;
  /** Files in the storage folder, temporary ones included, relative to it. */
  storedFiles(): Promise<string[]>;
  /** Rows of each table that a crew's work goes to. */
  rowCounts(): Promise<Record<string, number>>;
  close(): Promise<void>;
}

/**
 * @param parts what stands in for the usual
 * @param settings what differs from the tests' usual settings
 * @param route given the database's address, the one that the application shall use
 */
export async function startTestApp(
  parts: Parts = {},
  settings: Partial<Config> = {},
  route: (databaseUrl: string) => Promise<string> = url => Promise.resolve(url),
): Promise<TestApp> {
  const database = await makeDatabase();
  const storageDir = await mkdtemp(path.join(tmpdir(), 'fairlead-test-'));
  const config: Config = {
    databaseUrl: await route(database.url),
    host: '127.0.0.1',
    port: 0,
    sessionSecret: 'a secret of the tests alone',
    storageDir,
    clientDir: path.join(storageDir, 'client'),
    publicOrigin: ORIGIN,
    logLevel: 'silent',
    pictureWorker: bundledWorker(),
    ...settings,
  };
  const app = createApp(config, openLog('silent'), {
    signIns: { ofAccountAndAddress: 50, ofAddress: 500 },
    ...parts,
  });
  const crew = await makeCrew(app.db, 'quay');
  const otherCrew = await makeCrew(app.db, 'lighthouse');
  const server = createServer(app.express);
  await new Promise<void>(resolve => server.listen(0, '127.0.0.1', resolve));
  return {
    ...{ app, server, config, crew, otherCrew },
    storedFiles: async () => {
      const entries = await readdir(storageDir, { recursive: true, withFileTypes: true });
      return entries
        .filter(e => e.isFile())
        .map(e => path.relative(storageDir, path.join(e.parentPath, e.name)));
    },
    rowCounts: async () => {
      const counts: Record<string, number> = {};
      for (const table of ['shoots', 'shots', 'plates', 'plate_versions', 'moves']) {
        const rows: unknown[] = await app.db(table).select(app.db.raw('1'));
        counts[table] = rows.length;
      }
      return counts;
    },
    close: async () => {
      server.closeAllConnections();
      await new Promise(resolve => server.close(resolve));
      await app.close();
      await database.drop();
      await rm(storageDir, { recursive: true, force: true });
    },
  };
}

/** A browser of ours: keeps cookies, sends the token and where it comes from, as the client does. */
export class Browser {
  readonly agent: ReturnType<typeof request.agent>;
  token = '';

  constructor(server: Server) {
    this.agent = request.agent(server);
  }

  /** Opens the page: the token's cookie comes. */
  async open(): Promise<this> {
    const answer = await this.agent.get('/api/session').expect(200);
    const cookies: string[] = [answer.headers['set-cookie'] ?? []].flat();
    this.token =
      cookies.map(c => /^XSRF-TOKEN=([^;]+)/.exec(c)?.[1]).find(t => t !== undefined) ?? this.token;
    return this;
  }

  async signIn(email: string, password = PASSWORD): Promise<this> {
    await this.open();
    await this.send('post', '/api/session').send({ email, password }).expect(200);
    return this;
  }

  get(url: string) {
    return this.agent.get(url);
  }

  /** A changing request with what the page sends. */
  send(method: 'post' | 'put' | 'patch' | 'delete', url: string) {
    return this.agent[method](url).set('Origin', ORIGIN).set('X-XSRF-TOKEN', this.token);
  }
}

export function signedIn(app: TestApp, role: Role, crew: TestCrew = app.crew): Promise<Browser> {
  return new Browser(app.server).signIn(crew.emailOf(role));
}
