import { fork, type ChildProcess } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { bundled } from '../support/server/bundled-worker';
import { makeDatabase, type TestDatabase } from '../support/server/test-database';

jest.setTimeout(60_000);

let database: TestDatabase;
let storage: string;
let program: string;

beforeAll(async () => {
  database = await makeDatabase();
  storage = await mkdtemp(path.join(tmpdir(), 'fairlead-main-'));
  program = bundled('main');
});
afterAll(async () => {
  await database.drop();
  await rm(storage, { recursive: true, force: true });
});

function start(settings: Record<string, string> = {}): ChildProcess {
  const env = {
    ...process.env,
    ...{ DATABASE_URL: database.url, SESSION_SECRET: 'a secret of the tests alone', STORAGE_DIR: storage },
    ...{ HOST: '127.0.0.1', PORT: '0', LOG_LEVEL: 'info', NODE_ENV: 'production', ...settings },
  };
  return fork(program, { env, stdio: ['ignore', 'pipe', 'pipe', 'ipc'] });
}

async function ready(server: ChildProcess): Promise<number> {
  const [message] = await once(server, 'message');
  expect(message).toEqual({ ready: true, port: expect.any(Number) });
  return message.port;
}

async function textOf(stream: ChildProcess['stdout']): Promise<string> {
  let text = '';
  for await (const part of stream ?? []) text += String(part);
  return text;
}

it.each([
  ['a termination signal', (server: ChildProcess) => server.kill('SIGTERM')],
  ['Ctrl-C', (server: ChildProcess) => server.kill('SIGINT')],
  ['the end of whoever started it', (server: ChildProcess) => server.disconnect()],
])('serves until %s, then ends cleanly, having printed nothing but log lines', async (_what, end) => {
  const server = start();
  const printed = textOf(server.stdout);
  const port = await ready(server);
  expect(await (await fetch(`http://127.0.0.1:${port}/api/health`)).json()).toEqual({ ok: true });
  const exited = once(server, 'exit');
  end(server);
  expect((await exited)[0]).toBe(0);
  for (const line of (await printed).trim().split('\n'))
    expect(JSON.parse(line)).toMatchObject({ level: expect.any(Number) });
});

it('ends with code 98 and one line where its port is taken', async () => {
  const first = start();
  const port = await ready(first);
  const second = start({ PORT: String(port) });
  const said = textOf(second.stderr);
  expect((await once(second, 'exit'))[0]).toBe(98);
  expect(await said).toBe(`Port ${port} is taken by another program.\n`);
  const exited = once(first, 'exit');
  first.disconnect();
  await exited;
});

it('names every setting that is not usable', async () => {
  const server = start({ DATABASE_URL: 'mysql://x', PORT: '70000', SESSION_SECRET: 'short' });
  const said = textOf(server.stderr);
  expect((await once(server, 'exit'))[0]).toBe(1);
  for (const name of ['DATABASE_URL', 'PORT', 'SESSION_SECRET']) expect(await said).toContain(`${name}: `);
});
