import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import { type MoveDocument } from '#schemas/move';
import { saveMove } from '#shared/document/save-move';
import { serialiseMove, serialiseSavedMove } from '#shared/document/serialise';
import { CommandLine } from '../../support/cli';
import { changed, quayMove } from '../../support/documents';

// Exit codes, names and shapes: the format's description. Numbers: arithmetic.
const quay = path.resolve('test/fixtures/quay-one-turn.move.json');
let move: CommandLine;
let folder: string;

beforeAll(() => {
  move = new CommandLine('measure');
  folder = mkdtempSync(path.join(tmpdir(), 'cli-test-'));
});
afterAll(() => {
  move.remove();
  rmSync(folder, { recursive: true, force: true });
});

function file(name: string, text: string): string {
  const place = path.join(folder, name);
  writeFileSync(place, text);
  return place;
}

const MEASURES = [
  'panRateDegPerSec',
  'crossingTimeSec',
  'stepPx',
  'rollRateDegPerSec',
  'zoomRatePerSec',
  'accelerationDegPerSec2',
  'joltDegPerSec',
  'shutterAngleDeg',
  'sharpness',
  'horizonLeanDeg',
  'seamInView',
  'tripodInView',
  'loopGapDeg',
];

interface Printed {
  readonly worst: Record<
    string,
    { value: number | null; limit: number | null; breaks: boolean; why?: string }
  >;
  readonly perFrame: Record<string, (number | null)[]>;
  readonly notes: unknown[];
}

describe('measure', () => {
  const measured = (args: string[], input?: string): Printed =>
    JSON.parse(move.run(['measure', ...args], input).stdout) as Printed;

  it('prints every measure for every delivered frame, and the worst against its limit', () => {
    const { worst, perFrame } = measured([quay]);
    expect(Object.keys(worst)).toEqual(MEASURES);
    expect(Object.keys(perFrame)).toEqual(MEASURES);
    for (const name of MEASURES) expect(perFrame[name]).toHaveLength(241);
    // A turn in ten seconds at pitch 0 in its middle third would be 36 °/s; the exposure of 0.02 s is 172.8° / 6.
    expect(worst['panRateDegPerSec'].value).toBeCloseTo(36, 0);
    expect(worst['shutterAngleDeg'].value).toBeCloseTo(28.8, 5);
    expect(worst['crossingTimeSec']).toMatchObject({ limit: 7, breaks: true });
  });

  it('says why what is not known is null', () => {
    const { worst, perFrame } = measured([quay]);
    expect(worst['loopGapDeg']).toMatchObject({ value: null, why: expect.any(String) });
    expect(perFrame['loopGapDeg'].every(value => value === null)).toBe(true);
  });

  it('sums up on standard error, and ends with 0 though limits are broken', () => {
    const { status, stderr } = move.run(['measure', quay]);
    expect(status).toBe(0);
    expect(stderr).toContain('crossingTimeSec');
    expect(stderr.trim().split('\n').length).toBeLessThan(12);
  });

  it('takes limits of one’s own, and a deliverable', () => {
    const limits = file('limits.json', JSON.stringify({ crossingTimeSec: 3, joltDegPerSec: null }));
    const { worst } = measured([quay, '--limits', limits, '--deliverable', 'Wide']);
    expect(worst['crossingTimeSec']).toMatchObject({ limit: 3, breaks: false });
    expect(worst['joltDegPerSec']).toMatchObject({ limit: null, breaks: false });
    expect(worst['sharpness']).toMatchObject({ limit: 1 });
  });

  it.each([
    ['a limit of no measure', { panRate: 3 }, '"panRate" is no measure'],
    ['a limit in words', { sharpness: 'high' }, 'the limit of sharpness must be a number'],
    ['a list', [], 'the limits must be an object'],
  ])('%s is one line on standard error, and 2', (_what, limits, words) => {
    const { status, stdout, stderr } = move.run([
      'measure',
      quay,
      '--limits',
      file('l.json', JSON.stringify(limits)),
    ]);
    expect([status, stdout, stderr.trim().split('\n').length]).toEqual([2, '', 1]);
    expect(stderr.toLowerCase()).toContain(words.toLowerCase());
  });
});

describe('export', () => {
  const out = (name: string) => path.join(folder, name);
  const flat = () => file('flat.json', serialiseMove(eyesOf(0)));
  const eyesOf = (eye: number): MoveDocument =>
    changed(quayMove(), { '/keys/0/eye': eye, '/keys/1/eye': eye, '/keys/2/eye': eye }) as MoveDocument;

  it.each([
    ['gltf', ['camera.gltf']],
    ['otio', ['timeline.otio']],
    ['csv', ['frames-source.csv', 'frames.csv']],
    ['ffmpeg', ['move.cmd', 'render.sh']],
  ])('--to %s writes its files and prints their names', (to, names) => {
    const place = out(`to-${to}`);
    const { status, stdout } = move.run(['export', flat(), '--to', to, '--out', place]);
    expect(status).toBe(0);
    expect(stdout.trim().split('\n').sort()).toEqual(names.map(name => path.join(place, name)));
    expect(readdirSync(place).sort()).toEqual(names);
  });

  it('writes what bake prints', () => {
    move.run(['export', quay, '--to', 'csv', '--out', out('same')]);
    expect(readFileSync(path.join(out('same'), 'frames.csv'), 'utf8')).toBe(move.run(['bake', quay]).stdout);
  });

  it.each([
    ['an eye point that FFmpeg does not draw', ['--to', 'ffmpeg'], '(0.2)'],
    ['nothing that it knows', ['--to', 'film'], '--to is one of gltf, otio, ffmpeg, csv'],
    ['no wish at all', [], '--to is missing'],
    [
      'a deliverable that is not there',
      ['--to', 'csv', '--deliverable', 'Square'],
      'no deliverable "Square"',
    ],
    ['a folder that is a file', ['--to', 'csv', '--out', quay], 'cannot be written to'],
  ])('%s is refused in one line, and nothing is left', (_what, args, words) => {
    const place = out('refused');
    const { status, stdout, stderr } = move.run(['export', quay, '--out', place, ...args]);
    expect([status, stdout, stderr.trim().split('\n').length]).toEqual([2, '', 1]);
    expect(stderr).toContain(words);
    expect(readdirSync(folder)).not.toContain('refused');
  });
});

describe('apply', () => {
  const savedQuay = () => {
    const saved = saveMove(quayMove());
    if (!saved.ok) throw new Error('The described move cannot be saved.');
    return file('saved.json', serialiseSavedMove(saved.document));
  };
  const applied = (args: string[]): MoveDocument =>
    JSON.parse(move.run(['apply', savedQuay(), '--shot', quay, ...args]).stdout) as MoveDocument;

  it('puts a saved move on the shot of a document', () => {
    const { keys, shot } = applied(['--from', '100', '--to', '300', '--yaw', '-20']);
    expect(keys.map(({ frame, yaw }) => [frame, yaw])).toEqual([
      [100, -20],
      [200, 160],
      [300, 340],
    ]);
    expect(shot).toEqual(quayMove().shot);
  });

  it('mirrors, reverses and scales', () => {
    const { keys } = applied(['--from', '0', '--to', '100', '--mirror', '--reverse', '--scale', '0.5']);
    expect(keys.map(({ frame, yaw, pitch }) => [frame, yaw, pitch])).toEqual([
      [0, 0, 0],
      [50, 90, -4],
      [100, 180, 0],
    ]);
  });

  it('prints a document that check accepts', () => {
    const { stdout } = move.run([
      'apply',
      savedQuay(),
      '--shot',
      quay,
      '--from',
      '0',
      '--to',
      '90',
      '--fov',
      'shot',
    ]);
    expect(move.run(['check', '-'], stdout)).toMatchObject({ status: 0, stdout: 'ok\n' });
  });

  it.each([
    ['no first frame', ['--to', '9'], '--from is missing'],
    ['words for a frame', ['--from', 'soon', '--to', '9'], '--from is a number, not "soon"'],
    ['a range past the shot', ['--from', '0', '--to', '5000'], 'inside the shot'],
    ['too tight a range', ['--from', '0', '--to', '1'], 'the smallest range that works is 2 frames'],
    ['an unknown rule', ['--from', '0', '--to', '9', '--fov', 'mine'], '--fov is one of own, shot'],
    ['a flag with a value', ['--from', '0', '--to', '9', '--mirror=no'], '--mirror=no is not an option'],
  ])('%s is refused in one line', (_what, args, words) => {
    const { status, stdout, stderr } = move.run(['apply', savedQuay(), '--shot', quay, ...args]);
    expect([status, stdout, stderr.trim().split('\n').length]).toEqual([2, '', 1]);
    expect(stderr).toContain(words);
  });
});
