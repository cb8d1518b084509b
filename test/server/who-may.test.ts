import { type Role } from '#schemas/api/session';
import { CrewScope } from '../../server/crews/crew-scope';
import { uuidV7 } from '../../server/db/uuid-v7';
import { fullPath } from '../../server/http/register';
import { type Route } from '../../server/http/route';
import { WHO_MAY } from '../../server/http/who-may';
import { insertPlate, type PlateFacts } from '../../server/plates/plates-db';
import { base, EXAMPLE, makeMove, makeShot } from '../support/server/crew-work';
import { panorama } from '../support/server/pictures';
import { Browser, signedIn, startTestApp, type TestApp } from '../support/server/test-app';
import { ROLES } from '../support/server/test-crew';

jest.setTimeout(120_000);

/**
 * PRODUCT, "The people", for what exists so far, spelled out by hand: an operator may create and edit shoots, shots,
 * plates, moves; a lead all that and delete; an editor see all of the crew's work; a reviewer see what was sent to them,
 * and nothing can be sent yet.
 */
const PRODUCT: Readonly<Record<string, string>> = {
  'get /api/health': 'anybody',
  'get /api/openapi.json': 'anybody',
  'get /api/session': 'anybody',
  'post /api/session': 'anybody',
  'delete /api/session': 'signed-in',
  'get /api/crews/:crewId/shoots': 'lead operator editor',
  'post /api/crews/:crewId/shoots': 'lead operator',
  'get /api/crews/:crewId/shoots/:shootId': 'lead operator editor',
  'patch /api/crews/:crewId/shoots/:shootId': 'lead operator',
  'delete /api/crews/:crewId/shoots/:shootId': 'lead',
  'get /api/crews/:crewId/shoots/:shootId/shots': 'lead operator editor',
  'post /api/crews/:crewId/shoots/:shootId/shots': 'lead operator',
  'get /api/crews/:crewId/shots/:shotId': 'lead operator editor',
  'patch /api/crews/:crewId/shots/:shotId': 'lead operator',
  'delete /api/crews/:crewId/shots/:shotId': 'lead',
  'get /api/crews/:crewId/shots/:shotId/plates': 'lead operator editor',
  'post /api/crews/:crewId/shots/:shotId/plates': 'lead operator',
  'delete /api/crews/:crewId/plates/:plateId': 'lead operator',
  'get /api/crews/:crewId/plates/:plateId/versions/:name': 'lead operator editor',
  'get /api/crews/:crewId/shots/:shotId/moves': 'lead operator editor',
  'post /api/crews/:crewId/shots/:shotId/moves': 'lead operator',
  'get /api/crews/:crewId/moves/:moveId': 'lead operator editor',
  'put /api/crews/:crewId/moves/:moveId': 'lead operator',
  'delete /api/crews/:crewId/moves/:moveId': 'lead operator',
  'get /api/crews/:crewId/moves/:moveId/move.json': 'lead operator editor',
  'get /api/crews/:crewId/moves/:moveId/frames.csv': 'lead operator editor',
  'get /api/crews/:crewId/moves/:moveId/frames-source.csv': 'lead operator editor',
};

interface Work {
  readonly shootId: string;
  readonly shotId: string;
  readonly plateId: string;
  readonly moveId: string;
}

let app: TestApp;
let picture: Buffer;
let versions: PlateFacts['versions'];
const browsers = new Map<Role, Browser>();
const strangers = new Map<Role, Browser>();

const browserOf = (role: Role, of = browsers): Browser => {
  const browser = of.get(role);
  if (!browser) throw new Error(`nobody is signed in as ${role}`);
  return browser;
};

beforeAll(async () => {
  app = await startTestApp();
  picture = await panorama(512);
  for (const role of ROLES) {
    browsers.set(role, await signedIn(app, role));
    strangers.set(role, await signedIn(app, role, app.otherCrew));
  }
  versions = await sendPicture();
});
afterAll(() => app.close());

/** Fresh work of the crew, so that a request that may delete has something to delete. */
async function makeWork(): Promise<Work> {
  const operator = browserOf('operator');
  const { shootId, shotId } = await makeShot(operator, app.crew);
  const plateId = uuidV7();
  const facts = { width: 512, height: 256, bytes: 1, fileName: 'p.jpg', projection: 'assumed' as const };
  await insertPlate(operatorScope(), { ...facts, id: plateId, shotId, frame: 0, versions });
  return { shootId, shotId, plateId, moveId: await makeMove(operator, app.crew, shotId) };
}

/** The database as the crew's operator: a plate's rows are written without decoding a picture for every question. */
function operatorScope(): CrewScope {
  const { id: crewId, userIds } = app.crew;
  return new CrewScope(app.app.db, {
    crewId,
    userId: userIds.operator,
    userName: 'operator',
    role: 'operator',
  });
}

/** What a plate's rows say of the files of a picture that was really sent. */
async function sendPicture(): Promise<PlateFacts['versions']> {
  const operator = browserOf('operator');
  const { shotId } = await makeShot(operator, app.crew);
  await operator
    .send('post', `${base(app.crew)}/shots/${shotId}/plates`)
    .attach('picture', picture, 'p.jpg')
    .expect(201);
  return app.app
    .db('plate_versions')
    .select('name', 'width', 'height', 'bytes', { mediaType: 'media_type', objectKey: 'object_key' });
}

const nameOf = (route: Route) => `${route.method} ${fullPath(route)}`;

const crewRoutes = () => app.app.routes.filter(route => route.kind === 'crew');

function ask(browser: Browser, route: Route, crewId: string, work: Work) {
  const url = fullPath(route).replace(
    /:(\w+)/g,
    (_, name: string) => ({ ...work, crewId, name: 'thumb' })[name] ?? '',
  );
  if (route.method === 'get') return browser.get(url);
  const asked = browser.send(route.method, url).set('If-Match', '"1"');
  const bodies: Record<string, object> = {
    ShootDraft: { title: 'x' },
    ShootChanges: { title: 'y' },
    ShotDraft: { title: 'x', rate: { num: 25, den: 1 }, frames: 10, source: { width: 512, height: 256 } },
    ShotChanges: { title: 'y' },
    MoveDraft: { document: EXAMPLE },
    MoveSave: { document: EXAMPLE },
  };
  if (route.body === 'upload') return asked.attach('picture', picture, 'p.jpg');
  return route.body ? asked.send(bodies[route.body]) : asked;
}

it('declares exactly the routes and the roles of the product’s design', () => {
  const declared = Object.fromEntries(
    app.app.routes.map(route => [nameOf(route), [WHO_MAY[route.action]].flat().join(' ')]),
  );
  expect(declared).toEqual(PRODUCT);
});

it.each(ROLES)('lets the %s do what the design says and nothing else', async role => {
  for (const route of crewRoutes()) {
    const work = await makeWork();
    const { status, body } = await ask(browserOf(role), route, app.crew.id, work);
    const may = PRODUCT[nameOf(route)]?.split(' ').includes(role);
    expect([nameOf(route), status]).toEqual([nameOf(route), may ? route.answer[0] : 403]);
    if (!may) expect(body.type).toBe('/problems/not-allowed');
  }
});

it.each(ROLES)('hides everything from the %s of another crew', async role => {
  const work = await makeWork();
  for (const route of crewRoutes()) {
    const { status } = await ask(browserOf(role, strangers), route, app.crew.id, work);
    expect([nameOf(route), status]).toEqual([nameOf(route), 404]);
  }
});

it('does not reach another crew’s rows by way of one’s own crew', async () => {
  const work = await makeWork();
  const stranger = browserOf('lead', strangers);
  for (const route of crewRoutes().filter(r => /:(?!crewId)\w+Id/.test(r.path))) {
    const { status } = await ask(stranger, route, app.otherCrew.id, work);
    expect([nameOf(route), status]).toEqual([nameOf(route), 404]);
  }
});

it('asks whoever is not signed in to sign in, for everything but what anybody may', async () => {
  const work = await makeWork();
  const visitor = await new Browser(app.server).open();
  for (const route of app.app.routes.filter(r => PRODUCT[nameOf(r)] !== 'anybody')) {
    const { status } = await ask(visitor, route, app.crew.id, work);
    expect([nameOf(route), status]).toEqual([nameOf(route), 401]);
  }
});

it('wants the page’s token for everything that changes something', async () => {
  const work = await makeWork();
  const tokenless = await signedIn(app, 'lead');
  tokenless.token = '';
  for (const route of app.app.routes.filter(r => r.method !== 'get')) {
    const { status } = await ask(tokenless, route, app.crew.id, work);
    expect([nameOf(route), status]).toEqual([nameOf(route), 403]);
  }
});

it('is the database’s rule too: a row cannot refer to another crew’s row', async () => {
  const { shotId } = await makeWork();
  const stray = app.app.db('moves').insert({
    id: '01900000-0000-7000-8000-000000000001',
    crew_id: app.otherCrew.id,
    shot_id: shotId,
    title: EXAMPLE.title,
    key_count: 3,
    document: JSON.stringify(EXAMPLE),
    updated_by: app.otherCrew.userIds.lead,
  });
  await expect(stray).rejects.toMatchObject({ code: '23503', constraint: 'moves_shot_fkey' });
});
