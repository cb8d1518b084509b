import { newMove } from '#shared/document/new-move';
import { checkMove } from '#shared/document/validate';
import { fullMove, quayMove } from '../../support/documents';

it.each([
  ['the whole of it', quayMove().shot, 0],
  ['a part of it', fullMove().shot, 10],
])(
  'a new move of a shot that delivers %s is valid and stands at its first delivered frame',
  (_w, shot, first) => {
    const move = newMove(shot, 'New');
    expect(checkMove(move).ok).toBe(true);
    expect(move.keys.map(key => key.frame)).toEqual([first]);
    expect(move.shot).toBe(shot);
  },
);
