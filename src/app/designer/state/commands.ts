import { type Key, type Leg, type MoveDocument } from '#schemas/move';
import { type EditorState, type Selection, type Transaction } from './editor-state';
import { partsOf, type Step } from './steps';

/**
 * A command says whether it would apply, and when given `dispatch` does it: buttons, keystrokes and menus share it.
 *
 * @returns whether it applies to the state
 */
export type Command = (state: EditorState, dispatch?: (transaction: Transaction) => void) => boolean;

/** The numbers of a key that say where it looks. */
export type Look = Pick<Key, 'yaw' | 'pitch' | 'roll' | 'fov' | 'eye'>;

/** How a fresh leg travels, where no neighbour says otherwise. */
const FRESH_LEG: Leg = { path: 'level', ease: 'fair' };

export function keyAt(move: MoveDocument, frame: number): Key | undefined {
  return move.keys.find(key => key.frame === frame);
}

/** Sets a key at a source frame: a new one, or the one that stands there given another look. */
export function setKey(frame: number, look: Look): Command {
  return (state, dispatch) => {
    const { move } = state;
    if (frame < 0 || frame >= move.shot.frames) return false;
    const present = keyAt(move, frame);
    const selection = keySelection(frame);
    if (present) {
      const after = { ...present, ...look };
      dispatch?.({ label: 'Change key', steps: [{ kind: 'changeKey', before: present, after }], selection });
    } else {
      dispatch?.({ label: 'Set key', steps: insertion(move, { frame, ...look }), selection });
    }
    return true;
  };
}

/**
 * A new key takes its leg from the leg that it divides, or, at either end, from the leg nearest to it; the key that was
 * last gets one, as from now on a leg leaves it.
 */
function insertion(move: MoveDocument, key: Key): Step[] {
  const { keys } = move;
  const before = keys.filter(each => each.frame < key.frame).at(-1);
  const isLast = before === keys.at(-1);
  const leg = before?.leg ?? keys.at(-2)?.leg ?? keys[0].leg ?? FRESH_LEG;
  if (!isLast || !before) return [{ kind: 'insertKey', key: { ...key, leg: leg } }];
  return [
    { kind: 'changeKey', before, after: { ...before, leg: leg } },
    { kind: 'insertKey', key },
  ];
}

/** Deletes the keys in hand; a move keeps at least one. */
export const removeSelectedKeys: Command = (state, dispatch) => {
  const { move, selection } = state;
  const doomed = move.keys.filter(key => selection.keys.includes(key.frame));
  if (doomed.length === 0 || doomed.length === move.keys.length) return false;
  const kept = move.keys.filter(key => !doomed.includes(key));
  const last = kept[kept.length - 1];
  const steps: Step[] = doomed.map(key => ({ kind: 'removeKey', key }));
  if (last.leg) steps.push({ kind: 'changeKey', before: last, after: withoutLeg(last) });
  dispatch?.({
    label: doomed.length === 1 ? 'Delete key' : `Delete ${doomed.length} keys`,
    steps,
    selection: { keys: [], leg: undefined },
  });
  return true;
};

function withoutLeg({ leg: _leg, ...key }: Key): Key {
  return key;
}

/**
 * Moves a key in time, between its neighbours: it never passes one, so that legs keep their order.
 *
 * @returns a command that does not apply where the key has no room
 */
export function retimeKey(fromFrame: number, toFrame: number): Command {
  return (state, dispatch) => {
    const { move } = state;
    const key = keyAt(move, fromFrame);
    if (!key) return false;
    const frame = roomFor(move, fromFrame, toFrame);
    if (frame === fromFrame) return false;
    dispatch?.({
      label: 'Move key in time',
      steps: [{ kind: 'changeKey', before: key, after: { ...key, frame } }],
      selection: keySelection(frame),
      mergeKey: `retime`,
    });
    return true;
  };
}

/** @returns the whole frame nearest to `wanted` at which the key at `frame` may stand */
export function roomFor(move: MoveDocument, frame: number, wanted: number): number {
  const i = move.keys.findIndex(key => key.frame === frame);
  const least = i > 0 ? move.keys[i - 1].frame + 1 : 0;
  const most = i < move.keys.length - 1 ? move.keys[i + 1].frame - 1 : move.shot.frames - 1;
  return Math.min(Math.max(Math.round(wanted), least), most);
}

/** Gives a key other numbers. @param mergeKey joins a run of small changes, such as nudges, into one */
export function changeKey(
  frame: number,
  change: Partial<Look & Pick<Key, 'rest'>>,
  label: string,
  mergeKey?: string,
): Command {
  return (state, dispatch) => {
    const before = keyAt(state.move, frame);
    if (!before) return false;
    const changed = Object.entries(change).some(([name, value]) => Reflect.get(before, name) !== value);
    if (!changed) return false;
    dispatch?.({
      label,
      steps: [{ kind: 'changeKey', before, after: { ...before, ...change } }],
      selection: keySelection(frame),
      ...(mergeKey === undefined ? {} : { mergeKey }),
    });
    return true;
  };
}

/** Changes how the camera travels on a leg, named by the frame of the key that it leaves. */
export function changeLeg(frame: number, change: Partial<Leg>, label: string): Command {
  return (state, dispatch) => {
    const before = keyAt(state.move, frame);
    if (!before?.leg) return false;
    const after = { ...before, leg: { ...before.leg, ...change } };
    if (JSON.stringify(after.leg) === JSON.stringify(before.leg)) return false;
    dispatch?.({ label, steps: [{ kind: 'changeKey', before, after }], selection: { keys: [], leg: frame } });
    return true;
  };
}

export function rename(title: string): Command {
  return (state, dispatch) => {
    if (title === state.move.title) return false;
    dispatch?.({
      label: 'Rename',
      steps: [{ kind: 'changeTitle', before: state.move.title, after: title }],
      mergeKey: 'rename',
    });
    return true;
  };
}

/** Takes title, notes, deliverables and keys of another document; the shot stays this shot's. */
export function openDocument(document: MoveDocument): Command {
  return (state, dispatch) => {
    dispatch?.({
      label: `Open ${document.title || 'document'}`,
      steps: [{ kind: 'replaceParts', before: partsOf(state.move), after: partsOf(document) }],
      selection: { keys: [], leg: undefined },
    });
    return true;
  };
}

export function keySelection(frame: number): Selection {
  return { keys: [frame], leg: undefined };
}
