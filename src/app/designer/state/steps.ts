import { type Deliverable, type Key, type MoveDocument } from '#schemas/move';

/** The parts of a document that opening another file replaces; the shot stays this shot's. */
export interface MoveParts {
  readonly title: string;
  readonly notes: string | undefined;
  readonly deliverables: Deliverable[];
  readonly keys: Key[];
}

/**
 * The smallest changes of a move. Each is plain JSON and carries what it needs to be undone. A key is named by its frame:
 * frames are unique in a document, and need no ids that would have to be kept out of the saved file.
 */
export type Step =
  | { readonly kind: 'insertKey'; readonly key: Key }
  | { readonly kind: 'removeKey'; readonly key: Key }
  | { readonly kind: 'changeKey'; readonly before: Key; readonly after: Key }
  | { readonly kind: 'changeTitle'; readonly before: string; readonly after: string }
  | { readonly kind: 'replaceParts'; readonly before: MoveParts; readonly after: MoveParts };

/** @returns the move with a step done; the move itself is untouched, and so are all keys that the step does not name */
export function applyStep(move: MoveDocument, step: Step): MoveDocument {
  switch (step.kind) {
    case 'insertKey':
      return { ...move, keys: inOrder([...move.keys, step.key]) };
    case 'removeKey':
      return { ...move, keys: move.keys.filter(key => key.frame !== step.key.frame) };
    case 'changeKey':
      return {
        ...move,
        keys: inOrder(move.keys.map(key => (key.frame === step.before.frame ? step.after : key))),
      };
    case 'changeTitle':
      return { ...move, title: step.after };
    case 'replaceParts':
      return withParts(move, step.after);
  }
}

/** applyStep(applyStep(move, s), invert(s)) equals move, for every step valid on move. */
export function invert(step: Step): Step {
  switch (step.kind) {
    case 'insertKey':
      return { kind: 'removeKey', key: step.key };
    case 'removeKey':
      return { kind: 'insertKey', key: step.key };
    case 'changeKey':
      return { kind: 'changeKey', before: step.after, after: step.before };
    case 'changeTitle':
      return { kind: 'changeTitle', before: step.after, after: step.before };
    case 'replaceParts':
      return { kind: 'replaceParts', before: step.after, after: step.before };
  }
}

export function partsOf({ title, notes, deliverables, keys }: MoveDocument): MoveParts {
  return { title, notes, deliverables, keys };
}

function withParts(move: MoveDocument, { notes, ...parts }: MoveParts): MoveDocument {
  const { notes: _before, ...rest } = move;
  return { ...rest, ...parts, ...(notes === undefined ? {} : { notes }) };
}

function inOrder(keys: Key[]): Key[] {
  return keys.sort((a, b) => a.frame - b.frame);
}
