import fc from 'fast-check';

import { type Key, type MoveDocument } from '#schemas/move';
import { checkMove } from '#shared/document/validate';
import {
  changeKey,
  changeLeg,
  type Command,
  openDocument,
  removeSelectedKeys,
  rename,
  retimeKey,
  setKey,
} from '../../../src/app/designer/state/commands';
import {
  type EditorState,
  openState,
  redo,
  select,
  transact,
  undo,
} from '../../../src/app/designer/state/editor-state';
import { applyStep, invert } from '../../../src/app/designer/state/steps';
import { joined, key, moveWith } from '../../support/moves';

// What must hold for any editing, whatever the numbers (STYLE: editor state).

const FRAMES = 1000;

const anyKey: fc.Arbitrary<Key> = fc
  .record({
    frame: fc.integer({ min: 0, max: FRAMES - 1 }),
    yaw: fc.double({ min: -720, max: 720, noNaN: true }),
    pitch: fc.double({ min: -90, max: 90, noNaN: true }),
    roll: fc.double({ min: -180, max: 180, noNaN: true }),
    fov: fc.double({ min: 10, max: 170, noNaN: true }),
    eye: fc.double({ min: 0, max: 1, noNaN: true }),
  })
  .map(({ frame, ...look }) => key(frame, look));

const anyMove: fc.Arbitrary<MoveDocument> = fc
  .uniqueArray(anyKey, { selector: each => each.frame, minLength: 1, maxLength: 8 })
  .map(keys =>
    joined(
      keys.sort((a, b) => a.frame - b.frame),
      { path: 'level', ease: 'fair' },
    ),
  )
  .map(keys => {
    const move = moveWith(keys);
    return { ...move, shot: { ...move.shot, frames: FRAMES } };
  });

const anyFrame = fc.integer({ min: 0, max: FRAMES - 1 });

/** A command aimed at one of the move's keys, or at any frame. */
const anyCommand = (move: MoveDocument): fc.Arbitrary<Command> => {
  const frame = fc.oneof(fc.constantFrom(...move.keys.map(each => each.frame)), anyFrame);
  return fc.oneof(
    fc
      .record({ frame, look: anyKey })
      .map(({ frame, look: { frame: _frame, ...look } }) => setKey(frame, look)),
    fc.tuple(frame, anyFrame).map(([from, to]) => retimeKey(from, to)),
    fc.tuple(frame, fc.boolean()).map(([at, rest]) => changeKey(at, { rest }, 'Rest')),
    frame.map(at => changeLeg(at, { path: 'arc', ease: { bezier: [0.2, 0, 0.4, 1] } }, 'Own curve')),
    fc.string({ maxLength: 20 }).map(rename),
    anyMove.map(openDocument),
    fc.constant(removeSelectedKeys),
  );
};

const anyEdit = anyMove.chain(move =>
  fc.record({ move: fc.constant(move), commands: fc.array(anyCommand(move), { maxLength: 12 }) }),
);

function done(state: EditorState, command: Command): EditorState {
  let after = state;
  command(state, transaction => (after = transact(state, transaction, 0)));
  return after;
}

function selecting(move: MoveDocument): EditorState {
  return select(openState(move), { keys: [move.keys[0].frame], leg: undefined });
}

it('leaves a document that checkMove accepts after every command', () => {
  fc.assert(
    fc.property(anyEdit, ({ move, commands }) => {
      expect(checkMove(commands.reduce(done, selecting(move)).move)).toMatchObject({ ok: true });
    }),
  );
});

it('undoes every step by its inverse, and redoes it', () => {
  fc.assert(
    fc.property(anyEdit, ({ move, commands }) => {
      let state = selecting(move);
      for (const command of commands) {
        const before = state.move;
        command(state, transaction => {
          const after = transaction.steps.reduce(applyStep, before);
          const back = [...transaction.steps].reverse().map(invert).reduce(applyStep, after);
          expect(back).toEqual(before);
        });
        state = done(state, command);
      }
      const undone = state.past.reduce(undo, state);
      expect(undone.move).toEqual(move);
      expect(state.past.reduce(redo, undone).move).toEqual(state.move);
    }),
  );
});

it('answers the same whether it would apply as whether it did', () => {
  fc.assert(
    fc.property(anyEdit, ({ move, commands }) => {
      const state = selecting(move);
      for (const command of commands) {
        let dispatched = false;
        expect(command(state, () => (dispatched = true))).toBe(dispatched);
        expect(command(state)).toBe(dispatched);
      }
    }),
  );
});

it('joins nudges that follow each other within half a second, and no others', () => {
  const state = openState(moveWith([key(0)]));
  const nudge = (yaw: number): Command => changeKey(0, { yaw }, 'Nudge yaw', 'yaw 0');
  const at = (from: EditorState, yaw: number, ms: number): EditorState => {
    let after = from;
    nudge(yaw)(from, transaction => (after = transact(from, transaction, ms)));
    return after;
  };
  const joinedOnce = at(at(state, 1, 1000), 2, 1500);
  expect(joinedOnce.past).toHaveLength(1);
  expect(at(joinedOnce, 3, 2001).past).toHaveLength(2);
});

it('never lets a key pass another in time', () => {
  const move = moveWith(joined([key(0), key(10), key(20)], { path: 'level', ease: 'fair' }));
  const after = done(openState(move), retimeKey(10, 99));
  expect(after.move.keys.map(each => each.frame)).toEqual([0, 19, 20]);
});

it('keeps the last key of a move', () => {
  expect(removeSelectedKeys(selecting(moveWith([key(5)])))).toBe(false);
});
