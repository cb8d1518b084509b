import { base, SHOT } from '../support/server/crew-work';
import { type Browser, signedIn, startTestApp, type TestApp } from '../support/server/test-app';

let app: TestApp;
let operator: Browser;
let lead: Browser;
let shootsUrl: string;

beforeAll(async () => {
  app = await startTestApp();
  operator = await signedIn(app, 'operator');
  lead = await signedIn(app, 'lead');
  shootsUrl = `${base(app.crew)}/shoots`;
});
afterAll(() => app.close());

const makeShoot = async (body: object) =>
  (await operator.send('post', shootsUrl).send(body).expect(201)).body;

it('gives shoots newest first, a page at a time, each once', async () => {
  const made: string[] = [];
  for (let i = 0; i < 7; i++) made.push((await makeShoot({ title: `Shoot ${i}` })).title);
  const seen: string[] = [];
  let next: string | null = null;
  let pages = 0;
  do {
    const after: string = next === null ? '' : `&after=${next}`;
    const { body } = await operator.get(`${shootsUrl}?limit=3${after}`).expect(200);
    seen.push(...body.items.map((s: { title: string }) => s.title));
    next = body.next;
    pages++;
  } while (next !== null);
  expect(seen).toEqual(made.reverse());
  expect(pages).toBe(3);
});

it('fills in what a draft leaves out, and keeps a day as that day', async () => {
  expect(await makeShoot({ title: 'Bare' })).toMatchObject({
    place: '',
    notes: '',
    startsOn: null,
    shotCount: 0,
    cover: null,
    revision: 1,
  });
  expect((await makeShoot({ title: 'Dated', startsOn: '2026-03-29' })).startsOn).toBe('2026-03-29');
});

it('changes only what is named, at the revision that was seen', async () => {
  const shoot = await makeShoot({ title: 'Before', place: 'Mole', startsOn: '2026-10-09' });
  const url = `${shootsUrl}/${shoot.id}`;
  const patch = (revision: string) => operator.send('patch', url).set('If-Match', revision);
  const { body, headers } = await patch('"1"').send({ title: 'After', startsOn: null }).expect(200);
  expect(body).toMatchObject({ title: 'After', place: 'Mole', startsOn: null, revision: 2 });
  expect(headers['etag']).toBe('"2"');
  const late = await patch('"1"').send({ title: 'Late' }).expect(412);
  expect(late.body.current).toEqual(body);
  await operator.send('patch', url).send({ title: 'x' }).expect(428);
  await patch('"2"').send({}).expect(422);
});

it('is gone with all its shots after a lead deletes it, and lists no longer show it', async () => {
  const shoot = await makeShoot({ title: 'Doomed' });
  const shot = await operator.send('post', `${shootsUrl}/${shoot.id}/shots`).send(SHOT).expect(201);
  await lead.send('delete', `${shootsUrl}/${shoot.id}`).expect(204);
  await operator.get(`${shootsUrl}/${shoot.id}`).expect(404);
  await operator.get(`${base(app.crew)}/shots/${shot.body.id}`).expect(404);
  await operator.send('post', `${shootsUrl}/${shoot.id}/shots`).send(SHOT).expect(404);
  const { body } = await operator.get(`${shootsUrl}?limit=200`);
  expect(body.items.map((s: { title: string }) => s.title)).not.toContain('Doomed');
});

it('fills in a shot: all of it, at its own speed, levelled', async () => {
  const shoot = await makeShoot({ title: 'Shots' });
  const { body } = await operator.send('post', `${shootsUrl}/${shoot.id}/shots`).send(SHOT).expect(201);
  expect(body).toMatchObject({
    ...{
      shootId: shoot.id,
      speed: 1,
      from: 0,
      to: 1440,
      start: '00:00:00:00',
      dropFrame: false,
      level: [0, 0, 0, 1],
    },
    ...{
      seamYaw: null,
      loops: false,
      exposure: null,
      interval: null,
      notes: '',
      plateCount: 0,
      moveCount: 0,
    },
  });
});

it('keeps a shot delivered whole when its length changes, and checks the whole after a change', async () => {
  const shoot = await makeShoot({ title: 'Lengths' });
  const { body: shot } = await operator.send('post', `${shootsUrl}/${shoot.id}/shots`).send(SHOT).expect(201);
  const url = `${base(app.crew)}/shots/${shot.id}`;
  const patch = (revision: number, body: object) =>
    operator.send('patch', url).set('If-Match', `"${revision}"`).send(body);
  expect((await patch(1, { frames: 100 }).expect(200)).body).toMatchObject({ frames: 100, to: 99 });
  const refused = await patch(2, { frames: 50, to: 99 }).expect(422);
  expect(refused.body.errors).toEqual([{ pointer: '/to', detail: expect.any(String) }]);
  expect((await operator.get(url)).body.revision).toBe(2);
  const numbers = { exposure: 0.1, interval: 0.0416666667, seamYaw: -90.125, level: [0.6, 0, 0, 0.8] };
  expect((await patch(2, numbers).expect(200)).body).toMatchObject(numbers);
  expect((await patch(3, { exposure: null }).expect(200)).body.exposure).toBeNull();
});

it('notes who did what, for the crew’s lead to look up', async () => {
  const shoot = await makeShoot({ title: 'Noted' });
  await lead.send('delete', `${shootsUrl}/${shoot.id}`).expect(204);
  const events = await app.app
    .db('audit_events')
    .where({ subject_id: shoot.id })
    .orderBy('id')
    .select('crew_id', 'user_id', 'action');
  expect(events).toEqual([
    { crew_id: app.crew.id, user_id: app.crew.userIds.operator, action: 'shoot.created' },
    { crew_id: app.crew.id, user_id: app.crew.userIds.lead, action: 'shoot.deleted' },
  ]);
  expect(await app.app.db('audit_events').where({ action: 'session.begun' }).pluck('user_id')).toContain(
    app.crew.userIds.lead,
  );
});
