import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';

import { parse } from 'csv-parse/sync';

import { CommandLine } from '../../support/cli';
import { fixture } from '../../support/fixtures';

// Exit codes, output and the described move's numbers: the format's description.
const quay = path.resolve('test/fixtures/quay-one-turn.move.json');
let move: CommandLine;
let folder: string;
let lines: (text: string) => string[];

beforeAll(() => {
  move = new CommandLine('check');
  folder = mkdtempSync(path.join(tmpdir(), 'cli-test-'));
  lines = text => text.split('\n').filter(line => line !== '');
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

const broken = () => fixture('quay-one-turn.move.json').toString('utf8').replace('1440, "yaw"', '700, "yaw"');

describe('check', () => {
  it('says ok and ends with 0 for a valid document, from a file or standard input', () => {
    const ok = { status: 0, stdout: 'ok\n', stderr: '' };
    expect(move.run(['check', quay])).toEqual(ok);
    expect(move.run(['check', '-'], fixture('quay-one-turn.move.json'))).toEqual(ok);
  });

  it('reads a document that begins with a byte order mark', () => {
    expect(
      move.run(['check', '-'], `\uFEFF${fixture('quay-one-turn.move.json').toString('utf8')}`).status,
    ).toBe(0);
  });

  it('prints each fault as pointer and words, and ends with 1', () => {
    const text = broken().replace('"roll": 0, "fov": 100', '"roll": 0, "fov": 300');
    expect(move.run(['check', file('broken.json', text)])).toEqual({
      status: 1,
      stdout:
        '/keys/0/fov: must be 10 to 193.0739 at eye point 0.2, is 300\n' +
        '/keys/2/frame: must be after frame 720, is 700\n',
      stderr: '',
    });
  });

  it('prints one line a fault whatever the document calls its members', () => {
    const text =
      '{"format":"fairlead.move","version":1,"title":"","shot":3,"deliverables":[],"keys":[],"a\\nb\\u001b[2J":1}';
    const { stdout } = move.run(['check', '-'], text);
    expect(lines(stdout)).toHaveLength(4);
    expect(stdout).toContain('/a\\nb\\u001b[2J: is not a member');
  });

  it.each([
    ['a file that is not there', ['check', '/nowhere/at-all.json'], '/nowhere/at-all.json cannot be read'],
    ['a folder', ['check', '.'], '. cannot be read'],
    ['text of several lines that is not JSON', ['check', '-'], 'standard input is not JSON'],
    ['no file', ['check'], 'Name one FILE'],
    ['two files', ['check', 'a', 'b'], 'Name one FILE'],
    ['an option that it does not take', ['check', quay, '--per', 'source'], '--per is not an option'],
    ['an unknown verb', ['polish', quay], 'VERB is one of check'],
    ['no verb', [], 'VERB is one of check'],
    ['a verb from the prototype', ['constructor', quay], 'VERB is one of check'],
  ])('%s is one line on standard error, and 2', (_what, args, words) => {
    const { status, stdout, stderr } = move.run(args, '{\n"format":\n!\n');
    expect([status, stdout, lines(stderr).length]).toEqual([2, '', 1]);
    expect(stderr).toContain(words);
  });

  it('takes JSON nested 100,000 deep without a stack trace', () => {
    const { status, stderr } = move.run(['check', '-'], '['.repeat(1e5) + ']'.repeat(1e5));
    expect([status, stderr]).toEqual([1, '']);
  });
});

describe('bake', () => {
  const rows = (text: string) => parse(text, { columns: true }) as unknown as Record<string, string>[];

  it('prints the delivered frames as CSV unless told otherwise', () => {
    const { status, stdout, stderr } = move.run(['bake', quay]);
    expect([status, stderr, rows(stdout).length]).toEqual([0, '', 241]);
  });

  it('prints yaw 60 at source frame 240 of the described move, and its keys exactly', () => {
    const table = rows(move.run(['bake', quay, '--per', 'source']).stdout);
    expect(table[240]['source_frame']).toBe('240');
    expect(Math.abs(Number(table[240]['yaw']) - 60)).toBeLessThan(1e-9);
    expect(
      [0, 720, 1440].map(frame => table[frame]).map(({ yaw, pitch, fov, eye }) => [yaw, pitch, fov, eye]),
    ).toEqual([
      ['0', '0', '100', '0.2'],
      ['180', '-8', '100', '0.2'],
      ['360', '0', '100', '0.2'],
    ]);
  });

  it('prints JSON of the same numbers', () => {
    const table = JSON.parse(move.run(['bake', quay, '--format=json']).stdout) as Record<string, unknown>[];
    expect(table).toHaveLength(241);
    expect(table[40]).toMatchObject({ frame: 40, source_frame: 240, timecode: '01:00:10:00' });
  });

  it('takes the deliverable that is named', () => {
    const fov = (name: string) =>
      Number(rows(move.run(['bake', quay, '--deliverable', name]).stdout)[0]['fov']);
    expect(fov('Wide')).toBe(100);
    expect(fov('Tall')).toBeLessThan(50);
  });

  it.each([
    ['a document with faults', ['bake', '-'], 'standard input is not a valid move document: /keys/2/frame'],
    [
      'a deliverable that is not there',
      ['bake', quay, '--deliverable', 'Square'],
      '"Square"; it has "Wide", "Tall"',
    ],
    ['a wrong choice', ['bake', quay, '--per', 'second'], '--per is one of delivered, source, not "second"'],
    ['an option without its value', ['bake', quay, '--format'], '--format wants a value'],
  ])('%s is one line on standard error, and 2', (_what, args, words) => {
    const { status, stdout, stderr } = move.run(args, broken());
    expect([status, stdout, lines(stderr).length]).toEqual([2, '', 1]);
    expect(stderr).toContain(words);
  });

  it('ends quietly when its reader has seen enough', async () => {
    const child = spawn(process.execPath, [
      move.program,
      'bake',
      quay,
      '--per',
      'source',
      '--format',
      'json',
    ]);
    const said: string[] = [];
    child.stderr.on('data', (words: Buffer) => said.push(words.toString()));
    child.stdout.once('data', () => child.stdout.destroy());
    const [code] = (await once(child, 'close')) as [number | null];
    expect([code, said.join('')]).toEqual([0, '']);
  });

  it('writes everything through a pipe that is read slowly', async () => {
    const child = spawn(process.execPath, [
      move.program,
      'bake',
      quay,
      '--per',
      'source',
      '--format',
      'json',
    ]);
    await new Promise(resolve => setTimeout(resolve, 300));
    const pieces: Buffer[] = [];
    for await (const piece of child.stdout) pieces.push(piece as Buffer);
    expect(JSON.parse(Buffer.concat(pieces).toString('utf8'))).toHaveLength(1441);
  });
});
