import { type Key, type MoveDocument } from '#schemas/move';
import { readCsv, type CsvRecord } from '#shared/export/read-csv';
import { type Fault, shown } from './fault';
import { checkMove } from './validate';

/** A row of a frames table, as a key that has no leg; its frame need not be whole. */
export interface FramesRow {
  /** Its number in the text, as a spreadsheet counts. */
  readonly row: number;
  readonly key: Key;
}

/** Most keys of a move (schemas/move.schema.json). */
export const MOST_KEYS = 2000;

/** Most faults that are listed: a table that is wrong throughout says so often enough. */
const MOST_FAULTS = 100;

/** Noise of decimals, in frames, that does not keep a source frame from being whole. */
const FRAME_SLACK = 1e-9;

const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?$/i;

/** What is read of each row, and the columns that may hold it; the first that the table has counts. */
const WANTED = {
  frame: ['source_frame', 'frame'],
  yaw: ['yaw'],
  pitch: ['pitch'],
  roll: ['roll'],
  fov: ['fov'],
  eye: ['eye'],
} as const satisfies Partial<Record<keyof Key, readonly string[]>>;

type Wanted = keyof typeof WANTED;

const NAMES: readonly Wanted[] = ['frame', 'yaw', 'pitch', 'roll', 'fov', 'eye'];

/** Where a wanted column stands; an eye point that no column gives is 0. */
interface Column {
  readonly name: Wanted;
  readonly header: string;
  readonly index: number;
}

/**
 * Reads a frames table.
 *
 * @param onto the move whose shot the rows must fall in
 * @returns its rows, each in range and after the one before, at least one; else its faults, each with row and column,
 *   the first hundred of them; never throws
 */
export function framesRows(
  text: string,
  onto: MoveDocument,
): { readonly rows: FramesRow[] } | { readonly faults: Fault[] } {
  const faults = new TableFaults();
  let columns: Column[] | undefined;
  const rows: FramesRow[] = [];
  for (const record of readCsv(text)) {
    if (record.wrongQuotes !== undefined) faults.add(`row ${record.row}`, record.wrongQuotes);
    else if (!columns) columns = columnsOf(record, faults);
    else {
      const key = keyOf(record, columns, faults);
      if (key) rows.push({ row: record.row, key });
    }
    if (columns?.length === 0) break;
  }
  if (!columns && faults.none) faults.add('row 1', 'is missing: a frames table begins with its columns’ names');
  else if (rows.length === 0 && faults.none) faults.add('the table', 'has no row below its columns’ names');
  addRangeFaults(rows, onto, columns ?? [], faults);
  return faults.none ? { rows } : { faults: faults.list() };
}

/** Collects what is wrong, as far as somebody will read it. */
class TableFaults {
  readonly #faults: Fault[] = [];
  #more = 0;

  get none(): boolean {
    return this.#faults.length === 0;
  }

  add(place: string, detail: string): void {
    if (this.#faults.length === MOST_FAULTS) this.#more++;
    else this.#faults.push({ pointer: '', detail: `${place}: ${detail}` });
  }

  list(): Fault[] {
    const more = { pointer: '', detail: `the table: has ${this.#more} more faults` };
    return this.#more === 0 ? this.#faults : [...this.#faults, more];
  }
}

/** @returns none where one that is needed is missing or stands twice */
function columnsOf({ row, fields }: CsvRecord, faults: TableFaults): Column[] {
  const headers = fields.map(field => field.trim().toLowerCase());
  const columns = NAMES.flatMap((name): Column[] => {
    const header = WANTED[name].find(each => headers.includes(each));
    if (header === undefined && name !== 'eye')
      faults.add(`row ${row}, column ${WANTED[name][0]}`, 'is missing');
    if (header === undefined) return [];
    const index = headers.indexOf(header);
    if (headers.includes(header, index + 1)) faults.add(`row ${row}, column ${header}`, 'stands twice');
    return [{ name, header, index }];
  });
  return faults.none ? columns : [];
}

/** @returns the row's numbers; undefined where one of them is none */
function keyOf({ row, fields }: CsvRecord, columns: readonly Column[], faults: TableFaults): Key | undefined {
  const key: Key = { frame: 0, yaw: 0, pitch: 0, roll: 0, fov: 0, eye: 0 };
  let whole = true;
  for (const { name, header, index } of columns) {
    const text = fields[index]?.trim();
    const value = text !== undefined && NUMBER.test(text) ? Number(text) : NaN;
    // Adding 0 turns −0 into 0.
    key[name] = value + 0;
    if (Number.isFinite(value)) continue;
    whole = false;
    faults.add(
      `row ${row}, column ${header}`,
      text === undefined || text === '' ? 'is missing' : `must be a number, is ${shown(text)}`,
    );
  }
  const nearest = Math.round(key.frame);
  if (Math.abs(key.frame - nearest) < FRAME_SLACK) key.frame = nearest + 0;
  return whole ? withinPoles(key) : undefined;
}

/** A level leg may lean over a pole; a key cannot, but looks the same from the other side with half a turn of roll. */
function withinPoles(key: Key): Key {
  if (!(Math.abs(key.pitch) > 90 && Math.abs(key.pitch) <= 270)) return key;
  const pitch = Math.sign(key.pitch) * 180 - key.pitch;
  return { ...key, yaw: key.yaw + 180, pitch, roll: key.roll + 180 };
}

/**
 * What the document's own rules say of the rows, as keys of moves as long as a move may be. A row between two source
 * frames is looked at as if it stood on the earlier.
 */
function addRangeFaults(
  rows: readonly FramesRow[],
  onto: MoveDocument,
  columns: readonly Column[],
  faults: TableFaults,
): void {
  let before: FramesRow | undefined;
  for (const { row, key } of rows) {
    if (before && key.frame <= before.key.frame)
      faults.add(`row ${row}, column ${headerOf(columns, 'frame')}`, `must be after ${before.key.frame}, is ${key.frame}`);
    before = { row, key };
  }
  for (let from = 0; from < rows.length; from += MOST_KEYS) {
    const part = rows.slice(from, from + MOST_KEYS);
    const checked = checkMove({ ...onto, keys: withLegs(part.map(each => ({ ...each.key, frame: Math.floor(each.key.frame) }))) });
    if (checked.ok) continue;
    for (const { pointer, detail } of checked.faults) {
      const [, keys, index, member] = pointer.split('/');
      const at = keys === 'keys' ? part[Number(index)] : undefined;
      // Frames that do not rise have been found above, as they stand in the table.
      if (at && member === 'frame' && detail.startsWith('must be after')) continue;
      if (at) faults.add(`row ${at.row}, column ${headerOf(columns, member)}`, detail);
      else faults.add(pointer, detail);
    }
  }
}

function headerOf(columns: readonly Column[], name: string | undefined): string {
  return columns.find(each => each.name === name)?.header ?? String(name);
}

/** Keys joined by even legs along the shortest rotation; the last has none. */
export function withLegs(keys: readonly Key[]): Key[] {
  return keys.map((key, i) =>
    i === keys.length - 1 ? key : { ...key, leg: { path: 'arc', ease: 'linear' } },
  );
}
