import { Ajv2020 } from 'ajv/dist/2020.js';
import { API_SCHEMAS } from '../../server/http/api-schemas';
import { fullPath } from '../../server/http/register';
import moveSchema from '../../schemas/move.schema.json';
import shotsSchema from '../../schemas/api/shots.schema.json';
import { base, EXAMPLE, makeMove, makeShot } from '../support/server/crew-work';
import { panorama } from '../support/server/pictures';
import { type Browser, signedIn, startTestApp, type TestApp } from '../support/server/test-app';

jest.setTimeout(30_000);

let app: TestApp;
let operator: Browser;
beforeAll(async () => {
  app = await startTestApp();
  operator = await signedIn(app, 'operator');
});
afterAll(() => app.close());

const ajv = new Ajv2020({ allErrors: true, schemas: API_SCHEMAS });

function expectMatches(body: unknown, file: string, definition: string) {
  const validate = ajv.getSchema(`${file}.schema.json#/$defs/${definition}`);
  const matches = validate?.(body);
  expect([definition, matches, validate?.errors]).toEqual([definition, true, null]);
}

it('describes every route that there is, and every reference in it leads somewhere', async () => {
  const { body } = await operator.get('/api/openapi.json').expect(200);
  expect(body.openapi).toMatch(/^3\.1\./);
  const described = Object.entries<object>(body.paths).flatMap(([path, methods]) =>
    Object.keys(methods).map(method => `${method} ${path}`),
  );
  const real = app.app.routes.map(route => `${route.method} ${fullPath(route).replace(/:(\w+)/g, '{$1}')}`);
  expect(described.sort()).toEqual(real.sort());
  const references = [...JSON.stringify(body).matchAll(/"\$ref":"([^"]+)"/g)].map(([, ref]) => ref ?? '');
  expect(references.length).toBeGreaterThan(30);
  for (const reference of references) {
    const [root, components, schemas, name = ''] = reference.split('/');
    expect([root, components, schemas, name in body.components.schemas]).toEqual([
      '#',
      'components',
      'schemas',
      true,
    ]);
  }
});

it('answers as its schemas say', async () => {
  const crew = base(app.crew);
  const { shootId, shotId } = await makeShot(operator, app.crew);
  const moveId = await makeMove(operator, app.crew, shotId);
  const plate = await operator
    .send('post', `${crew}/shots/${shotId}/plates`)
    .attach('picture', await panorama(512), 'p.jpg');
  expectMatches(plate.body, 'plates', 'Plate');
  const answers: [string, string, string][] = [
    ['/api/health', 'session', 'Health'],
    ['/api/session', 'session', 'Session'],
    [`${crew}/shoots`, 'shoots', 'ShootPage'],
    [`${crew}/shoots/${shootId}`, 'shoots', 'Shoot'],
    [`${crew}/shoots/${shootId}/shots`, 'shots', 'ShotPage'],
    [`${crew}/shots/${shotId}`, 'shots', 'Shot'],
    [`${crew}/shots/${shotId}/plates`, 'plates', 'PlateList'],
    [`${crew}/shots/${shotId}/moves`, 'moves', 'MoveList'],
    [`${crew}/moves/${moveId}`, 'moves', 'Move'],
  ];
  for (const [url, file, definition] of answers)
    expectMatches((await operator.get(url).expect(200)).body, file, definition);
  expectMatches((await operator.get(`${crew}/moves/${shotId}`).expect(404)).body, 'problem', 'Problem');
  expectMatches(
    (
      await operator
        .send('put', `${crew}/moves/${moveId}`)
        .set('If-Match', '"9"')
        .send({ document: EXAMPLE })
        .expect(412)
    ).body,
    'problem',
    'Problem',
  );
});

// The shot of the API is the shot of the document: ranges are written down in both, and must not drift apart.
it.each(['frames', 'speed', 'seamYaw', 'exposure', 'interval', 'level'] as const)(
  'gives a shot’s %s the range that the document gives it',
  name => {
    const range = (schema: object) =>
      Object.fromEntries(Object.entries(schema).filter(([word]) => /imum$|Items$|^type$/.test(word)));
    const documents: object = moveSchema.$defs.shot.properties[name];
    const ours = shotsSchema.$defs.ShotDraft.properties[name];
    const plain: object = 'anyOf' in ours ? (ours.anyOf[0] ?? {}) : ours;
    expect(range(plain)).toEqual(range(documents));
    expect(Object.keys(range(plain)).length).toBeGreaterThan(1);
  },
);
