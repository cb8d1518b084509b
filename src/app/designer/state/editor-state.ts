import { type MoveDocument } from '#schemas/move';
import { applyStep, invert, type Step } from './steps';

/** What a person has in hand: keys by their frames, or one leg by the frame of the key that it leaves. */
export interface Selection {
  readonly keys: readonly number[];
  readonly leg: number | undefined;
}

export const NOTHING_SELECTED: Selection = { keys: [], leg: undefined };

/** A change as a person sees it: it has a name and is undone as one. */
export interface Transaction {
  /** In the history and on the undo button: "Delete key". */
  readonly label: string;
  readonly steps: readonly Step[];
  /** The selection afterwards; unchanged unless said. */
  readonly selection?: Selection;
  /** Changes with the same key that follow each other closely are undone as one. */
  readonly mergeKey?: string;
}

interface Done {
  readonly label: string;
  readonly steps: readonly Step[];
  readonly selectionBefore: Selection;
  readonly selectionAfter: Selection;
  readonly mergeKey: string | undefined;
  readonly atMs: number;
}

/** Everything that editing changes. Immutable: a change makes another. */
export interface EditorState {
  readonly move: MoveDocument;
  readonly selection: Selection;
  readonly past: readonly Done[];
  readonly future: readonly Done[];
}

/** How soon a change must follow another of the same merge key to be joined to it. */
const MERGE_WITHIN_MS = 500;

export function openState(move: MoveDocument): EditorState {
  return { move, selection: NOTHING_SELECTED, past: [], future: [] };
}

/**
 * @param atMs a clock's milliseconds, for joining what belongs together
 * @returns the state with a transaction done and recorded; what had been undone can no longer be redone
 */
export function transact(state: EditorState, transaction: Transaction, atMs: number): EditorState {
  const { label, steps, mergeKey } = transaction;
  const selection = transaction.selection ?? state.selection;
  const done: Done = {
    label,
    steps,
    selectionBefore: state.selection,
    selectionAfter: selection,
    mergeKey,
    atMs,
  };
  return {
    move: steps.reduce(applyStep, state.move),
    selection,
    past: recorded(state.past, done),
    future: [],
  };
}

function recorded(past: readonly Done[], done: Done): readonly Done[] {
  const last = past.at(-1);
  const joins =
    last !== undefined &&
    done.mergeKey !== undefined &&
    last.mergeKey === done.mergeKey &&
    done.atMs - last.atMs <= MERGE_WITHIN_MS;
  if (!joins) return [...past, done];
  const joined = { ...done, steps: [...last.steps, ...done.steps], selectionBefore: last.selectionBefore };
  return [...past.slice(0, -1), joined];
}

export function undo(state: EditorState): EditorState {
  const done = state.past.at(-1);
  if (!done) return state;
  return {
    move: [...done.steps].reverse().map(invert).reduce(applyStep, state.move),
    selection: done.selectionBefore,
    past: state.past.slice(0, -1),
    future: [done, ...state.future],
  };
}

export function redo(state: EditorState): EditorState {
  const done = state.future[0];
  if (!done) return state;
  return {
    move: done.steps.reduce(applyStep, state.move),
    selection: done.selectionAfter,
    // What is done anew is never joined to: the person stepped through it on purpose.
    past: [...state.past, { ...done, mergeKey: undefined }],
    future: state.future.slice(1),
  };
}

export function select(state: EditorState, selection: Selection): EditorState {
  return { ...state, selection };
}
