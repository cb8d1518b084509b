import { parse } from 'csv-parse/sync';
import { Euler, MathUtils, Quaternion } from 'three';

import { type MoveDocument } from '#schemas/move';
import { UnknownDeliverable } from '#shared/document/deliverable-named';
import { framesCsv } from '#shared/export/csv';
import { framesJson } from '#shared/export/frames-json';
import { FRAME_COLUMNS, frameRows, type Per } from '#shared/export/frames-table';
import { fullMove, quayMove } from '../../support/documents';
import { joined, key, moveWith } from '../../support/moves';

const bake = (move: MoveDocument, per: Per, deliverable?: string) => [...frameRows(move, per, deliverable)];

describe('the described move, one turn with a dip', () => {
  const rows = bake(quayMove(), 'source');

  it('turns at a constant 0.25° a source frame: yaw 60 at source frame 240', () => {
    expect(rows[240].source_frame).toBe(240);
    expect(Math.abs(rows[240].yaw - 60)).toBeLessThan(1e-9);
    for (const row of rows) expect(Math.abs(row.yaw - row.source_frame / 4)).toBeLessThan(1e-9);
  });

  it('meets the keys exactly', () => {
    for (const { frame, yaw, pitch, roll, fov, eye } of quayMove().keys)
      expect(rows[frame]).toMatchObject({ yaw, pitch, roll, fov, eye });
  });

  // 1440 / 6 + 1 delivered frames at 24 a second from one hour on: arithmetic.
  it('has a row a delivered frame, each six source frames on', () => {
    const delivered = bake(quayMove(), 'delivered');
    expect(delivered).toHaveLength(241);
    expect(delivered[240]).toMatchObject({
      frame: 240,
      source_frame: 1440,
      timecode: '01:01:00:00',
      seconds: 10,
    });
    expect(delivered[1]).toMatchObject({ frame: 1, source_frame: 6, timecode: '01:00:00:06' });
    expect(delivered[1].seconds).toBeCloseTo(1 / 24, 15);
    expect(delivered[40]).toEqual({ ...rows[240], frame: 40 });
  });

  it('gives another deliverable its own field of view by the side that it matches', () => {
    // Eye point 0 keeps to the tangent: matched by height, tan(fov/2) shrinks by the aspects' ratio, (9/16)².
    const keys = [key(0, { fov: 100 })];
    const [row] = bake({ ...quayMove(), keys }, 'source', 'Tall');
    const half = Math.atan(Math.tan(MathUtils.degToRad(50)) * (9 / 16) ** 2);
    expect(row.fov).toBeCloseTo(MathUtils.radToDeg(2 * half), 10);
    // Its height covers what the first's height did: 2·atan(tan 50° · 9/16).
    const vertical = 2 * Math.atan(Math.tan(MathUtils.degToRad(50)) * (9 / 16));
    expect(row.vfov).toBeCloseTo(MathUtils.radToDeg(vertical), 10);
  });

  it('has no deliverable of a name that it does not name', () => {
    expect(() => bake(quayMove(), 'source', 'Square')).toThrow(UnknownDeliverable);
    expect(() => bake(quayMove(), 'source', 'Square')).toThrow('it has "Wide", "Tall"');
  });
});

it('covers the delivered range alone, both ends included', () => {
  const rows = bake(fullMove(), 'source');
  expect([rows[0].source_frame, rows.at(-1)?.source_frame]).toEqual([10, 5390]);
  const delivered = bake(fullMove(), 'delivered');
  expect(delivered.slice(0, 3).map(row => row.source_frame)).toEqual([10, 12.5, 15]);
  expect(delivered).toHaveLength(2153); // floor(5380 / 2.5) + 1
  // 00:59:00;02 is the first label of its minute at 29.97 drop-frame (SMPTE ST 12-1); ten frames on.
  expect(delivered[0].timecode).toBe('00:59:00;12');
});

/** Truth: three.js' quaternion of the same three rotations, Ry(−yaw) · Rx(pitch) · Rz(−roll). */
it('the quaternion of each row is that of its yaw, pitch and roll, up to sign', () => {
  const wrong: number[] = [];
  for (const row of [...bake(quayMove(), 'source'), ...bake(fullMove(), 'delivered')]) {
    const [x, y, z] = [row.pitch, -row.yaw, -row.roll].map(MathUtils.degToRad);
    const truth = new Quaternion().setFromEuler(new Euler(x, y, z, 'YXZ'));
    const [qx, qy, qz, qw] = truth.toArray();
    const off = (sign: number) =>
      Math.hypot(row.qx - sign * qx, row.qy - sign * qy, row.qz - sign * qz, row.qw - sign * qw);
    // Near a pole yaw and roll are known to about 1e-10 rad only.
    if (!(Math.min(off(1), off(-1)) < 2e-10)) wrong.push(row.frame);
  }
  expect(wrong).toEqual([]);
});

/** Whether a field is a value's text: to the column's decimals, plain, without trailing zeros. */
function says(text: string, value: string | number, column: string): boolean {
  if (typeof value === 'string') return text === value;
  const digits = column === 'source_frame' ? 9 : column.startsWith('q') ? 15 : 12;
  const slack = 0.5 * 10 ** -digits + Math.abs(value) * Number.EPSILON;
  return /^(?!-0$)-?(0|[1-9]\d*)(\.\d*[1-9])?$/.test(text) && Math.abs(Number(text) - value) <= slack;
}

describe('as CSV, read by csv-parse', () => {
  const read = (text: string) =>
    parse(text, { columns: true, record_delimiter: '\r\n' }) as unknown as Record<string, string>[];

  it.each<[string, MoveDocument, Per]>([
    ['quay per source frame', quayMove(), 'source'],
    ['quay per delivered frame', quayMove(), 'delivered'],
    ['every member per delivered frame', fullMove(), 'delivered'],
  ])('%s says what the table says, to its decimals', (_what, move, per) => {
    const rows = bake(move, per);
    const records = read([...framesCsv(rows)].join(''));
    expect(records).toHaveLength(rows.length);
    expect(Object.keys(records[0])).toEqual([...FRAME_COLUMNS]);
    const wrong = records.flatMap((record, i) =>
      FRAME_COLUMNS.filter(column => !says(record[column], rows[i][column], column)),
    );
    expect(wrong).toEqual([]);
  });

  it('ends every line with CRLF, the last too, and quotes nothing (RFC 4180)', () => {
    const lines = [...framesCsv(bake(quayMove(), 'delivered'))].join('').split('\r\n');
    expect(lines).toHaveLength(243);
    expect(lines.at(-1)).toBe('');
    expect(lines.join('')).not.toMatch(/["\r\n]/);
    expect(lines[0]).toBe('frame,source_frame,timecode,seconds,yaw,pitch,roll,fov,vfov,eye,qx,qy,qz,qw');
  });

  it('writes neither −0 nor an exponent', () => {
    const keys = joined([key(0, { yaw: -0, pitch: -1e-9 }), key(100, { roll: -1e-13 })], {
      path: 'level',
      ease: 'linear',
    });
    const text = [...framesCsv(bake(moveWith(keys), 'source'))].slice(1).join('');
    expect(text).not.toMatch(/e|(^|,)-0(,|\r)/i);
  });
});

it('as JSON, is a list of the same rows without −0', () => {
  const rows = bake(moveWith([key(0, { yaw: -0 })]), 'source');
  const text = [...framesJson(rows)].join('');
  expect(text).not.toContain('-0,');
  expect(JSON.parse(text)).toEqual(rows.map(row => ({ ...row, yaw: 0, qx: 0, qy: 0, qz: 0 })));
});
