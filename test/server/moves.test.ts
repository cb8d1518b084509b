import { parse } from 'csv-parse/sync';
import { base, EXAMPLE, makeMove, makeShot } from '../support/server/crew-work';
import { type Browser, signedIn, startTestApp, type TestApp } from '../support/server/test-app';

let app: TestApp;
let operator: Browser;
let crew: string;
let shotId: string;
let movesUrl: string;

beforeAll(async () => {
  app = await startTestApp();
  operator = await signedIn(app, 'operator');
  crew = base(app.crew);
  ({ shotId } = await makeShot(operator, app.crew));
  movesUrl = `${crew}/shots/${shotId}/moves`;
});
afterAll(() => app.close());

describe('a move', () => {
  it('comes back as the document that was sent', async () => {
    const extended = { ...EXAMPLE, extensions: { 'other.program': { kept: [1, 'two', null] } } };
    const made = await operator.send('post', movesUrl).send({ document: extended }).expect(201);
    const { body, headers } = await operator.get(`${crew}/moves/${made.body.id}`).expect(200);
    expect(body.document).toEqual(extended);
    expect(headers['etag']).toBe('"1"');
    expect(body).toMatchObject({
      shotId,
      crewId: app.crew.id,
      title: EXAMPLE.title,
      revision: 1,
      updatedBy: { name: 'quay operator' },
    });
  });

  it('begins with one key made from the shot where only a title is given', async () => {
    const { body } = await operator.send('post', movesUrl).send({ title: 'Fresh' }).expect(201);
    expect(body.document).toMatchObject({ title: 'Fresh', shot: { title: 'Quay', frames: 1441, to: 1440 } });
    expect(body.document.keys).toHaveLength(1);
  });

  it('is listed, last saved first, without its document', async () => {
    const { shotId: other } = await makeShot(operator, app.crew);
    const first = await makeMove(operator, app.crew, other);
    const second = await makeMove(operator, app.crew, other);
    const list = async () => (await operator.get(`${crew}/shots/${other}/moves`).expect(200)).body.items;
    expect((await list()).map((m: { id: string }) => m.id)).toEqual([second, first]);
    await operator
      .send('put', `${crew}/moves/${first}`)
      .set('If-Match', '"1"')
      .send({ document: EXAMPLE })
      .expect(200);
    const items = await list();
    expect(items.map((m: { id: string }) => m.id)).toEqual([first, second]);
    expect(items[0]).toEqual(expect.objectContaining({ keyCount: 3, revision: 2 }));
    expect(items[0]).not.toHaveProperty('document');
  });

  it('is gone after deleting, for reading and for saving', async () => {
    const id = await makeMove(operator, app.crew, shotId);
    await operator.send('delete', `${crew}/moves/${id}`).expect(204);
    await operator.get(`${crew}/moves/${id}`).expect(404);
    await operator
      .send('put', `${crew}/moves/${id}`)
      .set('If-Match', '"1"')
      .send({ document: EXAMPLE })
      .expect(404);
    await operator.send('delete', `${crew}/moves/${id}`).expect(404);
  });

  it('goes with its shoot, and a soft-deleted row stays in the database', async () => {
    const lead = await signedIn(app, 'lead');
    const made = await makeShot(operator, app.crew);
    const id = await makeMove(operator, app.crew, made.shotId);
    await lead.send('delete', `${crew}/shoots/${made.shootId}`).expect(204);
    await operator.get(`${crew}/moves/${id}`).expect(404);
    await operator.get(`${crew}/shots/${made.shotId}`).expect(404);
    await operator.send('post', `${crew}/shots/${made.shotId}/moves`).send({ document: EXAMPLE }).expect(404);
    const row = await app.app.db('moves').where({ id }).first();
    expect(row.deleted_at).toBeInstanceOf(Date);
    expect(row.document).toEqual(EXAMPLE);
  });
});

describe('saving', () => {
  it('asks for the revision that was changed', async () => {
    const id = await makeMove(operator, app.crew, shotId);
    const save = () => operator.send('put', `${crew}/moves/${id}`);
    expect((await save().send({ document: EXAMPLE }).expect(428)).body.type).toBe(
      '/problems/revision-missing',
    );
    expect(
      (await save().set('If-Match', 'yesterday').send({ document: EXAMPLE }).expect(400)).body.type,
    ).toBe('/problems/revision-unreadable');
  });

  it('by two at once: one is stored, the other is told what is stored now', async () => {
    const id = await makeMove(operator, app.crew, shotId);
    const lead = await signedIn(app, 'lead');
    const titled = (title: string) => ({ document: { ...EXAMPLE, title } });
    const answers = await Promise.all([
      operator.send('put', `${crew}/moves/${id}`).set('If-Match', '"1"').send(titled('by the operator')),
      lead.send('put', `${crew}/moves/${id}`).set('If-Match', '"1"').send(titled('by the lead')),
    ]);
    expect(answers.map(a => a.status).sort()).toEqual([200, 412]);
    const stored = answers.find(a => a.status === 200)?.body;
    const refused = answers.find(a => a.status === 412)?.body;
    expect(refused.type).toBe('/problems/revision-conflict');
    expect(refused.current).toEqual(stored);
    expect((await operator.get(`${crew}/moves/${id}`)).body).toEqual(stored);
  });

  it('takes the largest document that the format allows: 2,000 keys with every digit and extensions', async () => {
    const id = await makeMove(operator, app.crew, shotId);
    const wordy = {
      'other.program': {
        at: 0.123456789012345,
        angles: [123.4567890123456, -12.34567890123456],
        note: 'x'.repeat(100),
      },
    };
    const keys = Array.from({ length: 2000 }, (_, i) => ({
      ...{
        frame: i * 5000,
        yaw: 12345.678901234 + i,
        pitch: -45.678901234567,
        roll: 1234.567890123456,
        fov: 99.99999999999999,
      },
      ...{ eye: 0.1234567890123456, rest: false, extensions: wordy },
      ...(i < 1999
        ? {
            leg: {
              path: 'level',
              ease: {
                bezier: [0.123456789012345, -9.12345678901234, 0.876543210987654, 9.87654321098765],
              },
              extensions: wordy,
            },
          }
        : {}),
    }));
    const shot = { ...EXAMPLE.shot, frames: 10_000_000, to: 9_999_999, start: '00:00:00:00' };
    const document = { ...EXAMPLE, notes: '海'.repeat(20_000), shot, keys };
    const { body } = await operator
      .send('put', `${crew}/moves/${id}`)
      .set('If-Match', '"1"')
      .send({ document })
      .expect(200);
    expect(body.document.keys).toHaveLength(2000);
    expect(body.document).toEqual(document);
  });
});

describe('downloads', () => {
  let id: string;
  beforeAll(async () => {
    const document = { ...EXAMPLE, title: '../Kai: "Ölhafen" / ein\r\nBlick' };
    id = (await operator.send('post', movesUrl).send({ document }).expect(201)).body.id;
  });

  it('give the document under a file name that every system takes', async () => {
    const editor = await signedIn(app, 'editor');
    const { headers, text } = await editor.get(`${crew}/moves/${id}/move.json`).expect(200);
    // RFC 6266: an ASCII name, and the real one in filename*.
    expect(headers['content-disposition']).toBe(
      `attachment; filename="Kai-?lhafen-ein-Blick.move.json"; filename*=UTF-8''Kai-%C3%96lhafen-ein-Blick.move.json`,
    );
    expect(JSON.parse(text)).toMatchObject({ format: 'fairlead.move', keys: EXAMPLE.keys });
  });

  // FORMATS: the example turns at a constant 0.25° a source frame, so yaw is 60° at source frame 240; 24 fps and speed 6
  // give (1440 − 0)/6 + 1 = 241 delivered frames.
  it('give the frames as CSV that an independent reader reads', async () => {
    const { text, headers } = await operator.get(`${crew}/moves/${id}/frames-source.csv`).expect(200);
    expect(headers['content-type']).toBe('text/csv; charset=utf-8');
    const rows: Record<string, string>[] = parse(text, { columns: true });
    expect(rows).toHaveLength(1441);
    expect(Number(rows[240]?.['yaw'])).toBeCloseTo(60, 9);
    const delivered: unknown[] = parse((await operator.get(`${crew}/moves/${id}/frames.csv`)).text, {
      columns: true,
    });
    expect(delivered).toHaveLength(241);
  });
});
