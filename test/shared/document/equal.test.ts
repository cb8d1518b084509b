import fc from 'fast-check';

import { type MoveDocument } from '#schemas/move';
import { equalMoves } from '#shared/document/equal';
import { serialiseMove } from '#shared/document/serialise';
import { changed, fullMove, quayMove } from '../../support/documents';
import { moveWith } from '../../support/moves';
import { EXTREME, validKeys } from '../../support/valid-keys';

const quayWith = (changes: Record<string, unknown>) => changed(quayMove(), changes) as MoveDocument;

/** The defaults that the format's description names. */
it('what is left out is equal to its default', () => {
  const bare = moveWith([{ frame: 0, yaw: 0, pitch: 0, roll: 0, fov: 90, eye: 0 }]);
  const told = changed(bare, {
    '/notes': '',
    '/extensions': {},
    '/shot/from': 0,
    '/shot/to': 0,
    '/shot/start': '00:00:00:00',
    '/shot/dropFrame': false,
    '/shot/level': [0, 0, 0, 1],
    '/shot/loops': false,
    '/shot/interval': 1 / 24,
    '/keys/0/rest': false,
  }) as MoveDocument;
  expect(equalMoves(bare, told)).toBe(true);
  expect(equalMoves(told, bare)).toBe(true);
});

it('the order of members and the sign of zero do not count', () => {
  const { keys, shot, ...rest } = quayMove();
  const turned: MoveDocument = {
    keys,
    ...rest,
    shot: Object.fromEntries(Object.entries(shot).reverse()) as typeof shot,
  };
  expect(equalMoves(quayMove(), turned)).toBe(true);
  expect(equalMoves(quayMove(), quayWith({ '/keys/0/yaw': -0 }))).toBe(true);
});

it.each<[string, Record<string, unknown>]>([
  ['a title', { '/title': 'Another' }],
  ['a note', { '/notes': 'By hand' }],
  ['a key’s number', { '/keys/1/pitch': -8.000000000001 }],
  ['a rest', { '/keys/1/rest': true }],
  ['a leg’s ease', { '/keys/0/leg/ease': 'linear' }],
  ['a deliverable', { '/deliverables/1/match': 'width' }],
  ['the seam', { '/shot/seamYaw': undefined }],
  ['a level', { '/shot/level': [0, 0, 1, 0] }],
  ['another program’s member', { '/extensions': { a: { b: 1 } } }],
  ['a key’s extension', { '/keys/2/extensions': { a: null } }],
])('%s makes the difference', (_what, changes) => {
  expect(equalMoves(quayMove(), quayWith(changes))).toBe(false);
  expect(equalMoves(quayWith(changes), quayWith(changes))).toBe(true);
});

it('a document is equal to what is read back from its text, and to no other', () => {
  expect(equalMoves(fullMove(), JSON.parse(serialiseMove(fullMove())) as MoveDocument)).toBe(true);
  fc.assert(
    fc.property(validKeys(EXTREME), keys => {
      const move = moveWith(keys);
      expect(equalMoves(move, JSON.parse(serialiseMove(move)) as MoveDocument)).toBe(true);
      const other = changed(move, { [`/keys/${keys.length - 1}/yaw`]: keys[keys.length - 1].yaw + 1 });
      expect(equalMoves(move, other as MoveDocument)).toBe(false);
    }),
    { numRuns: 200 },
  );
});
