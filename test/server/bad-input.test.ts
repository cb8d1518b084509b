import request from 'supertest';
import { base, EXAMPLE, makeMove, makeShot } from '../support/server/crew-work';
import { type Browser, signedIn, startTestApp, type TestApp } from '../support/server/test-app';

let app: TestApp;
let operator: Browser;
let crew: string;
let movesUrl: string;
let moveUrl: string;
let before: Record<string, number>;

beforeAll(async () => {
  app = await startTestApp();
  operator = await signedIn(app, 'operator');
  crew = base(app.crew);
  const { shotId } = await makeShot(operator, app.crew);
  movesUrl = `${crew}/shots/${shotId}/moves`;
  moveUrl = `${crew}/moves/${await makeMove(operator, app.crew, shotId)}`;
  before = await app.rowCounts();
});

afterEach(async () => {
  expect(await app.rowCounts()).toEqual(before);
  const { body } = await operator.get(moveUrl).expect(200);
  expect(body).toMatchObject({ revision: 1, document: EXAMPLE });
});
afterAll(() => app.close());

const save = () => operator.send('put', moveUrl).set('If-Match', '"1"');
const pointers = (body: { errors: { pointer: string }[] }) => body.errors.map(e => e.pointer);

describe('a document', () => {
  it('with frames out of order is refused at the frame', async () => {
    const [a, b, c] = EXAMPLE.keys;
    const document = { ...EXAMPLE, keys: [{ ...a, frame: 720 }, { ...b, frame: 700 }, c] };
    const { body, headers } = await save().send({ document }).expect(422);
    expect(headers['content-type']).toMatch(/^application\/problem\+json/);
    expect(body).toMatchObject({ type: '/problems/invalid-body', status: 422, instance: moveUrl });
    expect(body.errors).toEqual([
      { pointer: '/document/keys/1/frame', detail: expect.stringMatching(/720.*700/) },
    ]);
  });

  it('with NaN is no JSON: the answer says at which line and column', async () => {
    const text = JSON.stringify({ document: EXAMPLE }, null, 1).replace('"yaw": 180', '"yaw": NaN');
    const line = text.split('\n').findIndex(l => l.includes('NaN')) + 1;
    const column = (text.split('\n')[line - 1] ?? '').indexOf('NaN') + 1;
    const { body } = await save().type('json').send(text).expect(400);
    expect(body.type).toBe('/problems/malformed-json');
    expect(body.detail).toContain(`line ${line}, column ${column}`);
    expect(body.detail).toContain('"NaN"');
  });

  it('with null for a number is refused at the number', async () => {
    const text = JSON.stringify({ document: EXAMPLE }).replace('"yaw":180', '"yaw":null');
    expect(pointers((await save().type('json').send(text).expect(422)).body)).toEqual([
      '/document/keys/1/yaw',
    ]);
  });

  it('with an unknown member is refused at the member', async () => {
    const [a, b, c] = EXAMPLE.keys;
    const document = { ...EXAMPLE, speed: 3, keys: [a, { ...b, zoom: 2 }, c] };
    const { body } = await save().send({ document }).expect(422);
    expect(pointers(body).sort()).toEqual(['/document/keys/1/zoom', '/document/speed']);
  });

  it('with 2,001 keys is refused by their number', async () => {
    const key = { yaw: 0, pitch: 0, roll: 0, fov: 90, eye: 0 };
    const keys = Array.from({ length: 2001 }, (_, frame) => ({
      ...key,
      frame,
      ...(frame < 2000 ? { leg: { path: 'level', ease: 'linear' } } : {}),
    }));
    const document = { ...EXAMPLE, shot: { ...EXAMPLE.shot, frames: 5000, to: 4999 }, keys };
    const { body } = await save().send({ document }).expect(422);
    expect(body.errors).toContainEqual({
      pointer: '/document/keys',
      detail: expect.stringMatching(/2000.*2001/),
    });
  });

  it('as a new move is checked just so', async () => {
    const { body } = await operator
      .send('post', movesUrl)
      .send({ document: { ...EXAMPLE, keys: [] } })
      .expect(422);
    expect(pointers(body)).toEqual(['/document/keys']);
  });

  it('with a zero sign in its title cannot be stored, and the answer says so', async () => {
    const { body } = await save()
      .send({ document: { ...EXAMPLE, notes: 'a\u0000b' } })
      .expect(422);
    expect(body.type).toBe('/problems/unstorable-text');
  });

  it('with members of hostile names is refused, and nothing else changes', async () => {
    const text = JSON.stringify({ document: EXAMPLE }).replace(
      '"notes":""',
      '"__proto__":{"polluted":1},"constructor":1',
    );
    await save().type('json').send(text).expect(422);
    expect({}).not.toHaveProperty('polluted');
  });

  it.each([200, 100_000])(
    'with extensions %i levels deep is refused, as the database could not take it',
    async levels => {
      const deep = `{"other":${'['.repeat(levels)}${']'.repeat(levels)}}`;
      const text = JSON.stringify({ document: { ...EXAMPLE, extensions: 0 } }).replace(
        '"extensions":0',
        `"extensions":${deep}`,
      );
      expect(pointers((await save().type('json').send(text).expect(422)).body)).toEqual([
        '/document/extensions',
      ]);
    },
  );

  it('nested 100,000 deep is refused', async () => {
    const text = `{"document":${'['.repeat(100_000)}${']'.repeat(100_000)}}`;
    await save().type('json').send(text).expect(422);
  });
});

describe('a body', () => {
  it('of 50 MB is refused with the limit, and the server goes on', async () => {
    const text = `{"document":"${'x'.repeat(50_000_000)}"}`;
    const { body } = await save().type('json').send(text).expect(413);
    expect(body).toMatchObject({ type: '/problems/body-too-large', detail: expect.stringContaining('2 MB') });
    await request(app.server).get('/api/health').expect(200, { ok: true });
  });

  it('of 50 MB packed into a few is refused as well', async () => {
    const { gzipSync } = await import('node:zlib');
    const packed = gzipSync(`{"document":"${'x'.repeat(50_000_000)}"}`);
    const { body } = await save()
      .type('json')
      .set('Content-Encoding', 'gzip')
      .serialize((b: unknown) => b as string)
      .send(packed)
      .expect(413);
    expect(body.type).toBe('/problems/body-too-large');
  });

  it('that stops half-way is refused with its place', async () => {
    const { body } = await save().type('json').send('{"document": {"format": "fair').expect(400);
    expect(body).toMatchObject({
      type: '/problems/malformed-json',
      detail: expect.stringContaining('column 25'),
    });
  });

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'application/xml'])(
    'of type %s is refused',
    async type => {
      const { body } = await save().set('Content-Type', type).send('document=1').expect(415);
      expect(body).toMatchObject({
        type: '/problems/wrong-content-type',
        detail: expect.stringContaining('application/json'),
      });
    },
  );

  it.each(['[]', '"text"', '7', 'null'])('that is %s is refused', async text => {
    const { status } = await save().type('json').send(text);
    expect([400, 422]).toContain(status);
  });
});

describe('a shoot or a shot', () => {
  const post = (url: string, body: object) => operator.send('post', `${crew}${url}`).send(body);

  it.each([
    [{}, ['/title']],
    [{ title: '' }, ['/title']],
    [{ title: '   ' }, ['/title']],
    [{ title: 'x'.repeat(201) }, ['/title']],
    [{ title: 'x', crewId: 'y' }, ['/crewId']],
    [{ title: 'x', startsOn: '2026-02-30' }, ['/startsOn']],
    [{ title: 'x', startsOn: 'soon' }, ['/startsOn']],
  ])('%j as a shoot is refused at %j', async (body, at) => {
    expect(pointers((await post('/shoots', body).expect(422)).body)).toEqual(at);
  });

  it.each([
    [{ frames: 0 }, '/frames'],
    [{ frames: 1.5 }, '/frames'],
    [{ rate: { num: 24, den: 0 } }, '/rate/den'],
    [{ rate: { num: 1001, den: 1 } }, '/rate'],
    [{ dropFrame: true, start: '00:00:00;00' }, '/dropFrame'],
    [{ start: 'noon' }, '/start'],
    [{ from: 20, to: 10 }, '/to'],
    [{ to: 1441 }, '/to'],
    [{ level: [0, 0, 0, 2] }, '/level/3'],
    [{ level: [0, 0, 0, 0.5] }, '/level'],
    [{ source: { width: 8, height: 4 } }, '/source/width'],
    [{ exposure: 0 }, '/exposure'],
  ])('%j as a shot’s facts are refused at %s', async (facts, at) => {
    const { body: shoots } = await operator.get(`${crew}/shoots`);
    const shot = {
      title: 'Quay',
      rate: { num: 24, den: 1 },
      frames: 1441,
      source: { width: 6144, height: 3072 },
    };
    const { body } = await post(`/shoots/${shoots.items[0].id}/shots`, { ...shot, ...facts }).expect(422);
    expect(pointers(body)).toContain(at);
  });
});

describe('an address', () => {
  it.each(['/api/nowhere', '/api/crews/not-a-uuid/shoots', '/api/crews'])(
    '%s answers 404 as a problem',
    async url => {
      const { body, headers } = await operator.get(url).expect(404);
      expect(headers['content-type']).toMatch(/^application\/problem\+json/);
      expect(body.type).toBe('/problems/not-found');
    },
  );

  it.each(['/api/crews/%E0%A4%A/shoots', '/%E0%A4%A'])(
    '%s, whose percent signs mean nothing, answers 400',
    async url => {
      const { body } = await operator.get(url).expect(400);
      expect(body.type).toBe('/problems/unreadable-request');
    },
  );

  it.each(['limit=0', 'limit=201', 'limit=x', 'limit=1&limit=2', 'after=x'])(
    'with the query %s is refused by its name',
    async query => {
      const { body } = await operator.get(`${crew}/shoots?${query}`).expect(400);
      expect(body).toMatchObject({
        type: '/problems/invalid-query',
        detail: expect.stringContaining(query.split('=')[0] ?? ''),
      });
    },
  );
});
