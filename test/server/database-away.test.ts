import { createServer, connect, type AddressInfo, type Server, type Socket } from 'node:net';
import { setTimeout as sleep } from 'node:timers/promises';
import request from 'supertest';
import { base, EXAMPLE, makeMove, makeShot } from '../support/server/crew-work';
import { signedIn, startTestApp, type TestApp } from '../support/server/test-app';

jest.setTimeout(60_000);

/** Stands between the application and the database, and can be cut. */
class Line {
  readonly #sockets = new Set<Socket>();
  #server: Server | undefined;
  #port = 0;

  async open(target: URL): Promise<string> {
    this.#server = createServer(near => {
      const far = connect(Number(target.port), target.hostname);
      for (const [one, other] of [
        [near, far],
        [far, near],
      ] as const) {
        this.#sockets.add(one);
        one.on('error', () => other.destroy());
        one.on('close', () => other.destroy());
        one.pipe(other);
      }
    });
    const server = this.#server;
    await new Promise<void>(resolve => server.listen(this.#port, '127.0.0.1', resolve));
    this.#port = (server.address() as AddressInfo).port;
    return Object.assign(new URL(target), { port: String(this.#port) }).href;
  }

  cut(): Promise<void> {
    for (const socket of this.#sockets) socket.destroy();
    this.#sockets.clear();
    return new Promise(resolve => this.#server?.close(() => resolve()));
  }
}

const line = new Line();
let target: URL;
let app: TestApp;

beforeAll(async () => {
  app = await startTestApp({}, {}, url => {
    target = new URL(url);
    return line.open(target);
  });
});
afterAll(async () => {
  await app.close();
  await line.cut();
});

it('answers 503 with Retry-After while the database is away, and heals by itself with nothing lost', async () => {
  const operator = await signedIn(app, 'operator');
  const { shotId } = await makeShot(operator, app.crew);
  const url = `${base(app.crew)}/moves/${await makeMove(operator, app.crew, shotId)}`;
  const save = (revision: number) =>
    operator.send('put', url).set('If-Match', `"${revision}"`).send({ document: EXAMPLE });
  await save(1).expect(200);

  await line.cut();
  for (const asked of [
    () => request(app.server).get('/api/health'),
    () => operator.get(url),
    () => save(2),
  ]) {
    const { body, headers } = await asked().expect(503);
    expect(headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(Number(headers['retry-after'])).toBeGreaterThan(0);
    expect(body.type).toBe('/problems/database-away');
  }
  const visitor = request(app.server);
  await visitor.get('/api/openapi.json').expect(200);

  await line.open(target);
  await sleep(100);
  await request(app.server).get('/api/health').expect(200, { ok: true });
  expect((await operator.get(url).expect(200)).body.revision).toBe(2);
  await save(2).expect(200);
});
