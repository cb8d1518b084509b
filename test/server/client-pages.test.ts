import { mkdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import request from 'supertest';
import { startTestApp, type TestApp } from '../support/server/test-app';

let app: TestApp;
beforeAll(async () => {
  app = await startTestApp();
  const folder = app.config.clientDir;
  await mkdir(folder, { recursive: true });
  await writeFile(
    path.join(folder, 'index.html'),
    '<app-root ngCspNonce="__CSP_NONCE__"></app-root><script nonce="__CSP_NONCE__"></script>',
  );
  await writeFile(path.join(folder, 'main-ABCDEF12.js'), 'export {};');
  await writeFile(path.join(folder, 'favicon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
  await writeFile(path.join(app.config.storageDir, 'secret.txt'), 'secret');
});
afterAll(() => app.close());

const get = (url: string) => request(app.server).get(url);

it.each(['/', '/index.html', '/shoots', '/crews/1/shots/2'])(
  '%s is the one page, with a fresh nonce in page and policy',
  async url => {
    const [first, second] = [await get(url).expect(200), await get(url).expect(200)];
    const nonces = [first, second].map(({ text }) => /ngCspNonce="([^"]+)"/.exec(text)?.[1] ?? '');
    expect(nonces[0]).not.toBe(nonces[1]);
    expect(nonces[0]).toMatch(/^[\w+/]{22}==$/);
    expect(first.text).not.toContain('__CSP_NONCE__');
    const policy = String(first.headers['content-security-policy']);
    expect(policy).toContain(`style-src 'self' 'nonce-${nonces[0]}'`);
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain("require-trusted-types-for 'script'");
    expect(policy).not.toContain("'unsafe-inline'");
    expect(policy).not.toContain("'unsafe-eval'");
    expect(first.headers).toMatchObject({
      'cache-control': 'no-store',
      'x-content-type-options': 'nosniff',
      'x-frame-options': 'SAMEORIGIN',
    });
  },
);

it('lets a browser keep hashed files for ever, and others only with asking', async () => {
  expect((await get('/main-ABCDEF12.js').expect(200)).headers['cache-control']).toBe(
    'public, max-age=31536000, immutable',
  );
  expect((await get('/favicon.svg').expect(200)).headers['cache-control']).toBe('no-cache');
});

it.each(['/main-00000000.js', '/shots/picture.png', '/.env', '/..%2fsecret.txt', '/%2e%2e/secret.txt'])(
  '%s is not found, and no page',
  async url => {
    const { text, headers } = await get(url).expect(404);
    expect(text).not.toContain('app-root');
    expect(text).not.toContain('secret');
    expect(headers['content-type']).not.toMatch(/html/);
  },
);

it('does not say what it is made of', async () => {
  expect((await get('/').expect(200)).headers).not.toHaveProperty('x-powered-by');
});
