import { type Key, type MoveDocument } from '#schemas/move';
import { RAD_PER_DEG } from '#shared/conventions';
import { countedOn } from './counted-on';
import { type Fault } from './fault';
import { framesRows, withLegs } from './frames-rows';
import { MOST_KEYS } from './readable-part';
import { thinRows } from './thin-rows';
import { checkMove } from './validate';

/** How a frames table becomes keys. */
export interface FramesImport {
  /** The fewest of the rows that keep every row within the tolerances below; else a key a row. */
  readonly thin: boolean;
  /** Degrees of orientation, over 0; 0.05 unless said. */
  readonly angleDeg?: number;
  /** Degrees, over 0; 0.05 unless said. */
  readonly fovDeg?: number;
  /** Over 0; 0.0005 unless said. */
  readonly eye?: number;
}

export type ImportedFrames =
  | {
      readonly ok: true;
      readonly document: MoveDocument;
      /** Sentences that say what of the table is not in the keys as it stands there. */
      readonly notes: readonly string[];
    }
  | { readonly ok: false; readonly faults: readonly Fault[] };

/** Keys made of rows. */
type Made =
  { readonly keys: readonly Key[]; readonly notes: readonly string[] } | { readonly faults: Fault[] };

/**
 * Reads a frames table (`framesCsv`, or any CSV with its columns) back into keys joined by linear arc legs.
 *
 * The columns `source_frame` (`frame` where there is none), `yaw`, `pitch`, `roll` and `fov` are needed, `eye` is 0 where
 * it is missing; they may stand in any order among others. A key stands on the row's source frame. The field of view is
 * taken as the first deliverable's. Rows between two source frames cannot be keys: a key a row leaves them out, thinning
 * keeps to them. The numbers are kept as they stand, but for rows that lean over a pole and whole turns from one source
 * frame to the next (`countedOn`).
 *
 * @param text CSV of unknown origin
 * @param onto the move whose keys are replaced; all else is its
 * @returns the document with the table's keys, or all that is wrong with the table, by row and column (the header is row
 *   1): at most 101 faults, each pointing to the document as a whole; never throws
 */
export function keysFromFramesCsv(text: string, onto: MoveDocument, options: FramesImport): ImportedFrames {
  const read = framesRows(text, onto);
  if ('faults' in read) return { ok: false, faults: read.faults };
  const { keys, leaning, steps } = countedOn(read.rows.map(each => each.key));
  const made = options.thin ? thinned(keys, options) : allWhole(keys);
  if ('faults' in made) return { ok: false, faults: made.faults };
  const checked = checkMove({ ...onto, keys: withLegs(made.keys) });
  if (!checked.ok) return checked;
  const notes = [...changeNotes(leaning, steps), ...made.notes];
  return { ok: true, document: checked.document, notes };
}

function allWhole(rows: readonly Key[]): Made {
  const keys = rows.filter(key => Number.isInteger(key.frame));
  if (keys.length === 0) return fault('has no row on a whole source frame, where a key could stand');
  if (keys.length > MOST_KEYS)
    return fault(
      `must have at most ${MOST_KEYS} rows on whole source frames to keep each, has ${keys.length}: thin it`,
    );
  const out = rows.length - keys.length;
  return {
    keys,
    notes: note(
      out,
      'stands between two source frames and is left out',
      'stand between two source frames and are left out',
    ),
  };
}

function thinned(rows: readonly Key[], { angleDeg = 0.05, fovDeg = 0.05, eye = 0.0005 }: FramesImport): Made {
  if (![angleDeg, fovDeg, eye].every(each => each > 0 && each < Infinity))
    return { faults: [{ pointer: '', detail: 'the tolerances must be over 0' }] };
  if (!rows.some(key => Number.isInteger(key.frame)))
    return fault('has no row on a whole source frame, where a key could stand');
  const done = thinRows(rows, { angleRad: angleDeg * RAD_PER_DEG, fovRad: fovDeg * RAD_PER_DEG, eye });
  if (!done.kept) return fault(tooManyKeys(done.factor, { angleDeg, fovDeg, eye }));
  const between = rows.filter(key => !Number.isInteger(key.frame)).length;
  return {
    keys: done.kept.map(row => rows[row]),
    notes: [
      ...note(
        between,
        'stands between two source frames and cannot be a key',
        'stand between two source frames and cannot be keys',
      ),
      ...legNote(done.missing),
      ...(done.fewest
        ? []
        : ['Fewer keys may do: the table is too long and too uneven to try every choice.']),
    ],
  };
}

function tooManyKeys(factor: number, tolerance: Required<Omit<FramesImport, 'thin'>>): string {
  const [angleDeg, fovDeg, eye] = [tolerance.angleDeg, tolerance.fovDeg, tolerance.eye].map(each =>
    Number((factor * each).toPrecision(4)),
  );
  return (
    `cannot be thinned to ${MOST_KEYS} keys within these tolerances; it can with ${factor} times as much: ` +
    `${angleDeg}° of orientation, ${fovDeg}° of field of view, ${eye} of eye point`
  );
}

function fault(detail: string): { readonly faults: Fault[] } {
  return { faults: [{ pointer: '', detail: `the table: ${detail}` }] };
}

function changeNotes(leaning: number, steps: number): string[] {
  const turned = 'over a pole: its key looks from the other side, upside down';
  return [
    ...note(leaning, `leans ${turned}`, `lean ${turned.replace('its key looks', 'their keys look')}`),
    ...note(
      steps,
      'steps by whole turns of yaw or roll from the source frame before, which are left out',
      'step by whole turns of yaw or roll from the source frame before, which are left out',
    ),
  ];
}

function legNote(missing: number): string[] {
  if (missing === 0) return [];
  return [
    `${missing} ${missing === 1 ? 'leg misses' : 'legs miss'} rows between two source frames by more than the tolerance.`,
  ];
}

/** @returns a sentence on so many rows; none on none */
function note(rows: number, one: string, more: string): string[] {
  if (rows === 0) return [];
  return [rows === 1 ? `1 row ${one}.` : `${rows} rows ${more}.`];
}
