import request from 'supertest';
import { Browser, ORIGIN, signedIn, startTestApp, type TestApp } from '../support/server/test-app';
import { PASSWORD } from '../support/server/test-crew';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
});
afterAll(() => app.close());

const email = () => app.crew.emailOf('operator');

describe('signing in', () => {
  it('answers a visitor with nobody and a token', async () => {
    const answer = await request(app.server).get('/api/session').expect(200);
    expect(answer.body).toEqual({ user: null, memberships: [] });
    expect(String(answer.headers['set-cookie'])).toMatch(/^XSRF-TOKEN=[^;]+; Path=\/; SameSite=Lax$/);
  });

  it('answers with the person and their crews', async () => {
    const browser = await new Browser(app.server).open();
    const answer = await browser
      .send('post', '/api/session')
      .send({ email: email().toUpperCase(), password: PASSWORD })
      .expect(200);
    expect(answer.body).toEqual({
      user: { id: app.crew.userIds.operator, name: 'quay operator', email: email() },
      memberships: [{ crewId: app.crew.id, crewName: 'quay', role: 'operator' }],
    });
    expect((await browser.get('/api/session')).body).toEqual(answer.body);
  });

  it('tells nobody whether the name or the password was wrong', async () => {
    const browser = await new Browser(app.server).open();
    const tries = [
      { email: email(), password: 'wrong' },
      { email: 'nobody@nowhere.example', password: 'wrong' },
    ];
    const answers = [];
    for (const body of tries) answers.push(await browser.send('post', '/api/session').send(body).expect(401));
    expect(answers[0]?.body).toEqual(answers[1]?.body);
    expect(answers[0]?.body.type).toBe('/problems/wrong-sign-in');
  });

  it('gives a new session id, and the old one is worth nothing', async () => {
    const browser = await signedIn(app, 'operator');
    const sid = async () =>
      (
        await app.app
          .db('sessions')
          .select('sid')
          .whereRaw("sess->'passport'->'user'->>'id' = ?", [app.crew.userIds.operator])
      ).map(r => r.sid as string);
    const before = await sid();
    const answer = await browser
      .send('post', '/api/session')
      .send({ email: email(), password: PASSWORD })
      .expect(200);
    expect(String(answer.headers['set-cookie'])).toMatch(
      /^sid=[^;]+; Path=\/; Expires=[^;]+; HttpOnly; SameSite=Lax$/,
    );
    const after = await sid();
    expect(after).toHaveLength(before.length);
    expect(after.filter(id => before.includes(id))).toHaveLength(before.length - 1);
  });

  it('ends a session at sign-out, whatever cookie is still sent', async () => {
    const browser = await new Browser(app.server).open();
    const answer = await browser.send('post', '/api/session').send({ email: email(), password: PASSWORD });
    const [cookie] = String(answer.headers['set-cookie']).split(';');
    await browser.send('delete', '/api/session').expect(204);
    const late = await request(app.server)
      .get(`/api/crews/${app.crew.id}/shoots`)
      .set('Cookie', cookie ?? '')
      .expect(401);
    expect(late.body.type).toBe('/problems/not-signed-in');
  });

  it('ends every session of a person whose epoch has moved', async () => {
    const browser = await signedIn(app, 'editor');
    await app.app.db('users').where({ id: app.crew.userIds.editor }).increment('session_epoch', 1);
    await browser.get(`/api/crews/${app.crew.id}/shoots`).expect(401);
  });

  it('does not know an expired session', async () => {
    const browser = await signedIn(app, 'lead');
    await browser.get(`/api/crews/${app.crew.id}/shoots`).expect(200);
    await app.app.db('sessions').update({ expire: new Date(0) });
    await browser.get(`/api/crews/${app.crew.id}/shoots`).expect(401);
    expect((await browser.get('/api/session')).body.user).toBeNull();
  });

  it('stores a password as Argon2id with the cost that OWASP gives (19 MiB, 2 passes, 1 lane)', async () => {
    const row = await app.app.db('users').where({ id: app.crew.userIds.lead }).first('password_hash');
    expect(row.password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });
});

describe('changing things', () => {
  const body = () => ({ email: email(), password: PASSWORD });

  it('needs the token of the page', async () => {
    const browser = await new Browser(app.server).open();
    const without = await browser.agent.post('/api/session').set('Origin', ORIGIN).send(body()).expect(403);
    expect(without.body.type).toBe('/problems/xsrf');
    await browser.agent
      .post('/api/session')
      .set('Origin', ORIGIN)
      .set('X-XSRF-TOKEN', 'made.up')
      .set('Cookie', 'XSRF-TOKEN=made.up')
      .send(body())
      .expect(403);
  });

  it.each([
    ['another origin', { Origin: 'http://elsewhere.test' }],
    ['no origin at all', {}],
    ['another site, by the browser’s word', { Origin: ORIGIN, 'Sec-Fetch-Site': 'cross-site' }],
    ['another port of the same host', { Origin: ORIGIN, 'Sec-Fetch-Site': 'same-site' }],
  ])('is refused from %s', async (_from, headers) => {
    const browser = await new Browser(app.server).open();
    const answer = await browser.agent
      .post('/api/session')
      .set(headers)
      .set('X-XSRF-TOKEN', browser.token)
      .send(body())
      .expect(403);
    expect(answer.body.type).toBe('/problems/other-site');
  });

  it('works where the browser says that the page is ours', async () => {
    const browser = await new Browser(app.server).open();
    await browser.agent
      .post('/api/session')
      .set('Sec-Fetch-Site', 'same-origin')
      .set('X-XSRF-TOKEN', browser.token)
      .send(body())
      .expect(200);
  });
});

describe('trying passwords', () => {
  it('stops after the allowed tries, for this account from this address, even when all come at once', async () => {
    const strict = await startTestApp({ signIns: { ofAccountAndAddress: 5, ofAddress: 100 } });
    try {
      const browser = await new Browser(strict.server).open();
      const attempt = (address: string, password: string) =>
        browser.send('post', '/api/session').send({ email: address, password });
      const target = strict.crew.emailOf('lead');
      const statuses = (await Promise.all(Array.from({ length: 12 }, () => attempt(target, 'wrong')))).map(
        a => a.status,
      );
      expect(statuses.filter(s => s === 401)).toHaveLength(5);
      expect(statuses.filter(s => s === 429)).toHaveLength(7);
      const refused = await attempt(target, PASSWORD).expect(429);
      expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
      await attempt(strict.crew.emailOf('operator'), PASSWORD).expect(200);
    } finally {
      await strict.close();
    }
  });

  it('forgets wrong tries after a right one', async () => {
    const strict = await startTestApp({ signIns: { ofAccountAndAddress: 3, ofAddress: 100 } });
    try {
      const browser = await new Browser(strict.server).open();
      const address = strict.crew.emailOf('lead');
      for (const password of ['wrong', 'wrong', PASSWORD, 'wrong', 'wrong', PASSWORD]) {
        await browser
          .send('post', '/api/session')
          .send({ email: address, password })
          .expect(password === PASSWORD ? 200 : 401);
      }
    } finally {
      await strict.close();
    }
  });
});
