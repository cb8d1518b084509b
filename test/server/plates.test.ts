import { readFileSync } from 'node:fs';
import { request as httpRequest } from 'node:http';
import { type AddressInfo } from 'node:net';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import sharp, { type Sharp } from 'sharp';
import { LocalStorage, objectsFolder } from '../../server/storage/local-storage';
import { type ObjectStorage } from '../../server/storage/object-storage';
import { base, makeShot } from '../support/server/crew-work';
import { panorama } from '../support/server/pictures';
import { type Browser, ORIGIN, signedIn, startTestApp, type TestApp } from '../support/server/test-app';

jest.setTimeout(120_000);

const fixture = (name: string) => path.resolve('test/fixtures/panos', name);

let app: TestApp;
let operator: Browser;
let crew: string;
let url: string;

beforeAll(async () => {
  app = await startTestApp();
  operator = await signedIn(app, 'operator');
  crew = base(app.crew);
});
afterAll(() => app.close());

beforeEach(async () => {
  url = `${crew}/shots/${(await makeShot(operator, app.crew)).shotId}/plates`;
});

const send = (picture: Buffer | string, name = 'p.jpg', frame?: string) => {
  const sent = operator.send('post', url);
  if (frame !== undefined) void sent.field('frame', frame);
  return sent.attach('picture', picture, name);
};

const bytesOf = async (address: string): Promise<Buffer> => {
  const { body } = await operator
    .get(address)
    .expect(200)
    .buffer(true)
    .parse((res, done) => {
      const parts: Buffer[] = [];
      res.on('data', (part: Buffer) => parts.push(part));
      res.on('end', () => done(null, Buffer.concat(parts)));
    });
  return body;
};

describe('a picture', () => {
  it('becomes four versions, none larger than it is, all of its proportions', async () => {
    const { body } = await send(fixture('hill-2048x1024.jpg'), 'hill.jpg', '24').expect(201);
    expect(body).toMatchObject({
      frame: 24,
      fileName: 'hill.jpg',
      width: 2048,
      height: 1024,
      projection: 'assumed',
    });
    expect(body.bytes).toBe(readFileSync(fixture('hill-2048x1024.jpg')).length);
    const sizes = body.versions.map((v: { name: string; width: number; height: number }) => [
      v.name,
      v.width,
      v.height,
    ]);
    expect(sizes).toEqual([
      ['display', 2048, 1024],
      ['4096', 2048, 1024],
      ['2048', 2048, 1024],
      ['thumb', 512, 256],
    ]);
    for (const version of body.versions) {
      const { width, height, format, space, hasAlpha } = await sharp(await bytesOf(version.url)).metadata();
      expect({ width, height }).toEqual({ width: version.width, height: version.height });
      expect({ format, space, hasAlpha }).toEqual({
        format: version.name === 'thumb' ? 'webp' : 'jpeg',
        space: 'srgb',
        hasAlpha: false,
      });
    }
  });

  it('keeps its look: a small version differs from the picture shrunk elsewhere by little', async () => {
    const { body } = await send(fixture('hill-2048x1024.jpg')).expect(201);
    const raw = (picture: Buffer | string) =>
      sharp(picture).resize(64, 32, { kernel: 'cubic' }).removeAlpha().raw().toBuffer();
    const wanted = await raw(fixture('hill-2048x1024.jpg'));
    const got = await raw(await bytesOf(body.versions[3].url));
    const mean = wanted.reduce((sum, value, i) => sum + Math.abs(value - (got[i] ?? 0)), 0) / wanted.length;
    // 2 levels of 255: lossy coding and another kernel; no source, our own bound.
    expect(mean).toBeLessThan(2);
  });

  it('that says it is a whole equirectangular panorama (GPano) is taken at its word', async () => {
    expect((await send(fixture('hill-2048x1024-gpano.jpg')).expect(201)).body.projection).toBe('stated');
  });

  it.each(['png', 'webp', 'tiff'] as const)('may be %s, whatever its name says', async format => {
    const picture = await sharp(await panorama(1024))
      .toFormat(format)
      .toBuffer();
    expect((await send(picture, 'picture.jpg').expect(201)).body).toMatchObject({ width: 1024, height: 512 });
  });

  it.each([
    ['grey', (s: Sharp) => s.greyscale().jpeg()],
    ['with 16 bits a channel', (s: Sharp) => s.toColourspace('rgb16').png()],
    ['half transparent', (s: Sharp) => s.ensureAlpha(0.5).png()],
    ['of four printing inks', (s: Sharp) => s.toColourspace('cmyk').jpeg()],
    ['of a palette', (s: Sharp) => s.png({ palette: true, colours: 4 })],
    ['progressive', (s: Sharp) => s.jpeg({ progressive: true })],
  ])('that is %s becomes plain 8-bit sRGB', async (_kind, encode) => {
    const { body } = await send(await encode(sharp(await panorama(640))).toBuffer()).expect(201);
    for (const version of body.versions) {
      const { space, channels, depth, hasAlpha } = await sharp(await bytesOf(version.url)).metadata();
      expect({ space, channels, depth, hasAlpha }).toEqual({
        space: 'srgb',
        channels: 3,
        depth: 'uchar',
        hasAlpha: false,
      });
    }
  });

  it('is turned upright by its orientation mark before it is measured', async () => {
    // EXIF orientation 6: the stored rows are columns of the picture (Exif 2.32, 4.6.4, tag 274).
    const lying = await sharp(await panorama(1024))
      .rotate(-90)
      .withMetadata({ orientation: 6 })
      .jpeg()
      .toBuffer();
    expect((await send(lying).expect(201)).body).toMatchObject({ width: 1024, height: 512 });
  });

  it('may miss the shape by two pixels, as stitchers round', async () => {
    await send(await panorama(1022, 510)).expect(201);
    expect((await send(await panorama(1023, 510)).expect(422)).body.type).toBe('/problems/not-2-to-1');
  });

  it('sent twice is two plates that share their files', async () => {
    const picture = await panorama(640);
    await send(picture).expect(201);
    const files = await app.storedFiles();
    await send(picture, 'again.jpg', '10').expect(201);
    expect(await app.storedFiles()).toEqual(files);
    const { body } = await operator.get(url);
    expect(body.items.map((p: { frame: number }) => p.frame)).toEqual([0, 10]);
  });

  it('keeps its wrap: left and right edge differ no more than neighbouring columns inside', async () => {
    // A full turn of a sine: column 0 follows column W − 1 as smoothly as any other.
    const width = 4608;
    const data = Buffer.alloc(width * (width / 2) * 3);
    for (let x = 0; x < width; x++) {
      const level = Math.round(128 + 100 * Math.sin((2 * Math.PI * (x + 0.5) * 40) / width));
      for (let y = 0; y < width / 2; y++) data.fill(level, (y * width + x) * 3, (y * width + x) * 3 + 3);
    }
    const picture = await sharp(data, { raw: { width, height: width / 2, channels: 3 } })
      .png({ compressionLevel: 1 })
      .toBuffer();
    const { body } = await send(picture).expect(201);
    const small = await sharp(await bytesOf(body.versions[2].url))
      .greyscale()
      .raw()
      .toBuffer({ resolveWithObject: true });
    const row = small.data.subarray(0, small.info.width);
    const steps = [...row].map((value, x) => Math.abs(value - (row[(x + 1) % row.length] ?? 0)));
    expect(steps.at(-1)).toBeLessThanOrEqual(Math.max(...steps.slice(0, -1)) + 1);
  });

  it('is sent only to the crew, to be kept by the browser alone', async () => {
    const { body } = await send(await panorama(512)).expect(201);
    const address: string = body.versions[3].url;
    const { headers } = await operator.get(address).expect(200);
    expect(headers).toMatchObject({
      'content-type': 'image/webp',
      'cache-control': 'private, max-age=31536000, immutable',
      'x-content-type-options': 'nosniff',
    });
    await operator.get(address).set('If-None-Match', String(headers['etag'])).expect(304);
    await operator.get(address.replace('thumb', 'original')).expect(404);
    await operator.send('delete', `${crew}/plates/${body.id}`).expect(204);
    await operator.get(address).expect(404);
  });

  it('becomes the cover of its shot and its shoot', async () => {
    const { body } = await send(await panorama(512)).expect(201);
    const { body: shot } = await operator.get(`${crew}/shots/${body.shotId}`);
    const { body: shoot } = await operator.get(`${crew}/shoots/${shot.shootId}`);
    const cover = { plateId: body.id, thumbUrl: body.versions[3].url, url2048: body.versions[2].url };
    expect(shot).toMatchObject({ plateCount: 1, cover });
    expect(shoot).toMatchObject({ shotCount: 1, cover });
  });

  it('keeps its shot at least as long as where it stands', async () => {
    const { body } = await send(await panorama(512), 'p.jpg', '100').expect(201);
    const shorten = (frames: number) =>
      operator.send('patch', `${crew}/shots/${body.shotId}`).set('If-Match', '"1"').send({ frames });
    expect((await shorten(100).expect(422)).body.errors).toEqual([
      { pointer: '/frames', detail: expect.stringContaining('100') },
    ]);
    await shorten(101).expect(200);
  });

  it.each([
    ['../../etc/passwd.jpg', 'passwd.jpg'],
    ['C:\\pictures\\quay.jpg', 'quay.jpg'],
    ['Kai bei Nacht äöü 海.jpg', 'Kai bei Nacht äöü 海.jpg'],
    [`${'x'.repeat(300)}.jpg`, 'x'.repeat(200)],
  ])('named %s is shown as %s', async (name, shown) => {
    expect((await send(await panorama(512), name).expect(201)).body.fileName).toBe(shown);
  });
});

describe('refused, with nothing stored', () => {
  let rows: Record<string, number>;
  let files: string[];
  beforeEach(async () => {
    rows = await app.rowCounts();
    files = await app.storedFiles();
  });
  afterEach(async () => {
    expect(await app.rowCounts()).toEqual(rows);
    expect(await app.storedFiles()).toEqual(files);
    await operator.get('/api/health').expect(200);
  });

  const refused = async (picture: Buffer, status: number, type: string, says: RegExp) => {
    const { body } = await send(picture).expect(status);
    expect(body).toMatchObject({ type: `/problems/${type}`, detail: expect.stringMatching(says) });
    expect(body.errors).toEqual([{ pointer: '/picture', detail: expect.any(String) }]);
  };

  it('no picture at all, but text', () =>
    refused(Buffer.from('not a picture '.repeat(100)), 415, 'not-a-picture', /JPEG, PNG, WebP or TIFF/));

  it('an empty file', () => refused(Buffer.alloc(0), 415, 'not-a-picture', /JPEG/));

  it('SVG and GIF, which the decoder would know', async () => {
    const svg =
      '<svg xmlns="http://www.w3.org/2000/svg" width="1024" height="512"><rect width="9" height="9"/></svg>';
    await refused(Buffer.from(svg), 415, 'not-a-picture', /JPEG/);
    await refused(
      await sharp(await panorama(512))
        .gif()
        .toBuffer(),
      415,
      'not-a-picture',
      /JPEG/,
    );
  });

  it.each([0.02, 0.5, 0.98])('a JPEG cut off at %f of its length', async share => {
    const whole = readFileSync(fixture('hill-2048x1024.jpg'));
    const { status, body } = await send(whole.subarray(0, Math.floor(whole.length * share)));
    expect([415, 422]).toContain(status);
    expect(['/problems/broken-picture', '/problems/not-a-picture']).toContain(body.type);
  });

  it('a PNG cut off half-way', async () => {
    const whole = await sharp(await panorama(1024))
      .png()
      .toBuffer();
    await refused(
      whole.subarray(0, Math.floor(whole.length / 2)),
      422,
      'broken-picture',
      /cut short or damaged/,
    );
  });

  it('one that is not 2:1, with the size found and the size wanted', async () =>
    refused(await panorama(1024, 768), 422, 'not-2-to-1', /1024 × 768.*1024 × 512/));

  it('one of 30,000 × 15,000 pixels, without decoding it', async () => {
    const bomb = await sharp({
      create: { width: 30_000, height: 15_000, channels: 3, background: '#000' },
      limitInputPixels: false,
    })
      .png({ compressionLevel: 9, palette: false })
      .toBuffer();
    await refused(bomb, 422, 'picture-size', /30000 × 15000.*12000 × 6000/);
  });

  it('one whose header lies about its size', async () => {
    const png = await sharp(await panorama(1024))
      .png()
      .toBuffer();
    // IHDR's width and height (PNG, 11.2.2) say 8192 × 4096; its checksum is made to agree.
    png.writeUInt32BE(8192, 16);
    png.writeUInt32BE(4096, 20);
    png.writeUInt32BE(crc32(png.subarray(12, 29)), 29);
    await refused(png, 422, 'broken-picture', /cut short or damaged/);
  });

  it('one that is too small to look at', async () =>
    refused(await panorama(256), 422, 'picture-size', /256 × 128.*512 × 256/));

  it('an animation', async () => {
    const frames = await sharp(await panorama(512))
      .extend({ bottom: 256 })
      .raw()
      .toBuffer({ resolveWithObject: true });
    const animation = await sharp(frames.data, {
      raw: { width: 512, height: 512, channels: 3, pageHeight: 256 },
    })
      .webp({ loop: 0 })
      .toBuffer();
    await refused(animation, 422, 'moving-picture', /2 pictures/);
  });

  it('a part of a panorama (GPano crop)', async () => {
    const xmp = Buffer.from(readFileSync(fixture('hill-2048x1024-gpano.jpg')));
    const at = xmp.indexOf('FullPanoWidthPixels');
    const digits = xmp.indexOf('2048', at);
    xmp.write('4096', digits, 'latin1');
    await refused(xmp, 422, 'partial-panorama', /part of a panorama/);
  });

  it('a file over 80 MB', async () => {
    const { body } = await send(Buffer.alloc(81 * 1024 * 1024)).expect(413);
    expect(body).toMatchObject({
      type: '/problems/picture-too-large',
      detail: expect.stringContaining('80 MB'),
    });
  });

  it('a file in another field, or two files', async () => {
    const picture = await panorama(512);
    const other = await operator.send('post', url).attach('image', picture, 'p.jpg').expect(422);
    expect(other.body).toMatchObject({
      type: '/problems/invalid-upload',
      detail: expect.stringContaining('"image"'),
    });
    await operator
      .send('post', url)
      .attach('picture', picture, 'a.jpg')
      .attach('picture', picture, 'b.jpg')
      .expect(422);
  });

  it('a form without a picture', async () => {
    const { body } = await operator.send('post', url).field('frame', '3').expect(422);
    expect(body.errors).toEqual([{ pointer: '/picture', detail: expect.stringContaining('missing') }]);
  });

  it.each(['-1', '1.5', 'first', '1441'])('the frame %s', async frame => {
    const { body } = await send(await panorama(512), 'p.jpg', frame).expect(422);
    expect(body.errors[0].pointer).toBe('/frame');
  });

  it('another type of body', async () => {
    await operator.send('post', url).send({ picture: 'x' }).expect(415);
    await operator
      .send('post', url)
      .set('Content-Type', 'multipart/form-data; boundary=x')
      .send('not a form')
      .expect(400);
  });

  it('an upload whose sender goes away', async () => {
    const { port } = app.server.address() as AddressInfo;
    const sid: string[] = [
      operator.agent.jar.getCookies({ domain: '127.0.0.1', path: '/', secure: false, script: false }),
    ]
      .flat()
      .map(c => `${c.name}=${c.value}`);
    const upload = httpRequest({
      port,
      method: 'POST',
      path: url,
      headers: {
        Cookie: sid.join('; '),
        Origin: ORIGIN,
        'X-XSRF-TOKEN': operator.token,
        'Content-Type': 'multipart/form-data; boundary=x',
        'Content-Length': 9_000_000,
      },
    });
    upload.on('error', () => undefined);
    upload.write('--x\r\nContent-Disposition: form-data; name="picture"; filename="p.jpg"\r\n\r\n');
    upload.write(Buffer.alloc(3_000_000));
    for (let i = 0; i < 100 && (await app.storedFiles()).length === files.length; i++) await sleep(20);
    expect((await app.storedFiles()).length).toBe(files.length + 1);
    upload.destroy();
    for (let i = 0; i < 100 && (await app.storedFiles()).length > files.length; i++) await sleep(20);
  });
});

it('is no longer taken from a person who has sent too many, and others go on', async () => {
  const strict = await startTestApp({ uploads: 1 });
  try {
    const picture = await panorama(512);
    const [first, second] = [await signedIn(strict, 'operator'), await signedIn(strict, 'lead')];
    const { shotId } = await makeShot(first, strict.crew);
    const sendBy = (browser: Browser) =>
      browser.send('post', `${base(strict.crew)}/shots/${shotId}/plates`).attach('picture', picture, 'p.jpg');
    await sendBy(first).expect(201);
    const { body, headers } = await sendBy(first).expect(429);
    expect(body.type).toBe('/problems/too-many-tries');
    expect(Number(headers['retry-after'])).toBeGreaterThan(0);
    await sendBy(second).expect(201);
  } finally {
    await strict.close();
  }
});

describe('a full disk', () => {
  /** Storage that has room for two files. */
  class AlmostFull implements ObjectStorage {
    private left = 2;
    constructor(private readonly inner: ObjectStorage) {}
    async put(key: string, file: string) {
      if (this.left-- === 0) throw Object.assign(new Error('no space left on device'), { code: 'ENOSPC' });
      return this.inner.put(key, file);
    }
    get(key: string) {
      return this.inner.get(key);
    }
    delete(key: string) {
      return this.inner.delete(key);
    }
  }

  it('is told as 507, and what was written is taken away again', async () => {
    const folder = objectsFolder(app.config.storageDir);
    const full = await startTestApp({ storage: new AlmostFull(new LocalStorage(folder)) });
    try {
      const before = await app.storedFiles();
      const browser = await signedIn(full, 'operator');
      const { shotId } = await makeShot(browser, full.crew);
      const picture = await panorama(768);
      const { body } = await browser
        .send('post', `${base(full.crew)}/shots/${shotId}/plates`)
        .attach('picture', picture, 'p.jpg')
        .expect(507);
      expect(body).toMatchObject({
        type: '/problems/disk-full',
        detail: expect.stringContaining('Everything stored before is kept'),
      });
      expect(await app.storedFiles()).toEqual(before);
      expect(await full.storedFiles()).toEqual([]);
      expect(await full.rowCounts()).toMatchObject({ plates: 0, plate_versions: 0 });
    } finally {
      await full.close();
    }
  });
});

/** CRC-32 of ISO 3309, as PNG's annex D gives it. */
function crc32(bytes: Buffer): number {
  let crc = 0xffffffff;
  for (const byte of bytes) {
    crc ^= byte;
    for (let bit = 0; bit < 8; bit++) crc = (crc >>> 1) ^ (crc & 1 ? 0xedb88320 : 0);
  }
  return (crc ^ 0xffffffff) >>> 0;
}
