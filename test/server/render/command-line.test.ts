import { buildSync } from 'esbuild';
import { execFileSync, spawn, spawnSync } from 'node:child_process';
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import sharp from 'sharp';

// Inside node_modules, where the bundle finds its packages.
const program = path.resolve(`node_modules/.cache/fairlead-test/move-${process.pid}.mjs`);
const move = path.resolve('test/fixtures/quay-one-turn.move.json');
const panorama = path.resolve('test/fixtures/panos/courtyard-1024x512.jpg');
let folder: string;

beforeAll(() => {
  buildSync({
    entryPoints: ['server/cli/main.ts'],
    outfile: program,
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    packages: 'external',
    logLevel: 'error',
  });
});
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'render-test-'));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));
afterAll(() => rmSync(program, { force: true }));

const out = (name: string): string => path.join(folder, name);
const run = (...args: string[]) => spawnSync(process.execPath, [program, ...args], { encoding: 'utf8' });

describe('frame', () => {
  // The expected height is the deliverable's aspect, 16:9 for Wide and 9:16 for Tall, worked out by hand.
  it.each([
    ['Wide', 320, 180],
    ['Tall', 180, 320],
  ])('writes one picture in the shape of %s', async (name, width, height) => {
    const args = ['--source', panorama, '--at', '240', '--width', String(width), '--deliverable', name];
    expect(run('frame', move, ...args, '--out', out('a.png')).stderr).toBe('');
    const { width: w, height: h } = await sharp(out('a.png')).metadata();
    expect([w, h]).toEqual([width, height]);
  });

  it.each([
    [['--at', '1441'], '0 to 1440'],
    [['--at', '3', '--width', '7'], '16 to 16384'],
    [['--at', '3', '--source', '/nowhere.jpg'], '/nowhere.jpg cannot be read'],
  ])('refuses %j in one line and leaves nothing behind', (args, said) => {
    const { status, stderr } = run('frame', move, '--source', panorama, ...args, '--out', out('a.png'));
    expect([status, stderr.trim().split('\n').length]).toEqual([2, 1]);
    expect(stderr).toContain(said);
    expect(readdirSync(folder)).toEqual([]);
  });
});

describe('render', () => {
  const args = ['render', move, '--source', panorama, '--width', '64'];

  // 1441 source frames at six times the speed: 241 delivered ones (floor(1440 / 6) + 1), at 24 a second.
  it('writes a film of every delivered frame, at the rate and in even sides', () => {
    const { status } = run(...args, '--out', out('a.mp4'));
    expect(status).toBe(0);
    const said = execFileSync(
      'ffprobe',
      [
        ...['-v', 'error', '-count_frames', '-of', 'csv=p=0'],
        ...['-show_entries', 'stream=width,height,r_frame_rate,nb_read_frames', out('a.mp4')],
      ],
      { encoding: 'utf8' },
    );
    expect(said.trim()).toBe('64,36,24/1,241');
  });

  it('leaves nothing half-written when it is interrupted', async () => {
    const child = spawn(process.execPath, [program, ...args, '--width', '1920', '--out', out('a.mp4')]);
    const said: string[] = [];
    await new Promise<void>(resolve => {
      child.stderr.on('data', (words: Buffer) => {
        said.push(words.toString());
        if (said.length === 1) child.kill('SIGINT');
      });
      child.once('close', () => resolve());
    });
    expect(said.join('')).toContain('was not written: it was stopped');
    expect(child.exitCode).toBe(2);
    expect(readdirSync(folder)).toEqual([]);
  }, 60_000);

  it('says that FFmpeg is missing where it is', () => {
    const { status, stderr } = spawnSync(process.execPath, [program, ...args, '--out', out('a.mp4')], {
      encoding: 'utf8',
      env: { ...process.env, PATH: folder },
    });
    expect(status).toBe(2);
    expect(stderr).toContain('FFmpeg is not installed');
    expect(readdirSync(folder)).toEqual([]);
  });
});
