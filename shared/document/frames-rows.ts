import { type Key, type MoveDocument } from '#schemas/move';
import { type CsvRecord, readCsv } from '#shared/export/read-csv';
import { type Fault, shown } from './fault';
import { overPole } from './counted-on';
import { MOST_KEYS } from './readable-part';
import { checkMove } from './validate';

/** A row of a frames table, as a key that has no leg; its frame need not be whole. */
export interface FramesRow {
  /** Its number in the text, as a spreadsheet counts. */
  readonly row: number;
  readonly key: Key;
}

/** Most faults that are listed: a table that is wrong throughout says so often enough. */
const MOST_FAULTS = 100;

/** Most faults that are counted: after that many, the rest of the table is not read. */
const MOST_COUNTED = 10_000;

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

/** Where a wanted column stands. */
interface Column {
  readonly name: Wanted;
  readonly header: string;
  readonly index: number;
}

/** Collects what is wrong, as far as somebody will read it. */
class TableFaults {
  readonly #faults: Fault[] = [];
  #more = 0;

  get none(): boolean {
    return this.#faults.length === 0;
  }

  get tooMany(): boolean {
    return this.#more >= MOST_COUNTED;
  }

  add(place: string, detail: string): void {
    if (this.#faults.length === MOST_FAULTS) this.#more++;
    else this.#faults.push({ pointer: '', detail: `${place}: ${detail}` });
  }

  list(): Fault[] {
    const count = this.tooMany ? `${MOST_COUNTED} more or above` : `${this.#more} more`;
    const more = { pointer: '', detail: `the table: has ${count}` };
    return this.#more === 0 ? this.#faults : [...this.#faults, more];
  }
}

/**
 * Reads a frames table: columns in any order, others passed over, an eye point that no column gives 0.
 *
 * @param onto the move whose shot the rows must fall in
 * @returns its rows, each in range and after the one before, at least one; else its faults, each with row and column, the
 *   first hundred of them; never throws
 */
export function framesRows(
  text: string,
  onto: MoveDocument,
): { readonly rows: FramesRow[] } | { readonly faults: Fault[] } {
  const faults = new TableFaults();
  const records = readCsv(text);
  const first = records.next();
  if (first.done === true)
    faults.add('row 1', 'is missing: a frames table begins with the names of its columns');
  const columns = first.done === true ? [] : columnsOf(first.value, faults);
  const rows = faults.none ? readRows(records, columns, faults) : [];
  if (rows.length === 0 && faults.none) faults.add('the table', 'has no row below the names of its columns');
  addOrderFaults(rows, columns[0]?.header, faults);
  addRangeFaults(rows, onto, columns, faults);
  return faults.none ? { rows } : { faults: faults.list() };
}

function columnsOf({ row, fields, wrongQuotes }: CsvRecord, faults: TableFaults): Column[] {
  if (wrongQuotes !== undefined) faults.add(`row ${row}`, wrongQuotes);
  const headers = fields.map(field => field.trim().toLowerCase());
  return NAMES.flatMap((name): Column[] => {
    const header = WANTED[name].find(each => headers.includes(each));
    if (header === undefined) {
      if (name !== 'eye') faults.add(`row ${row}, column ${WANTED[name][0]}`, 'is missing');
      return [];
    }
    const index = headers.indexOf(header);
    if (headers.includes(header, index + 1)) faults.add(`row ${row}, column ${header}`, 'stands twice');
    return [{ name, header, index }];
  });
}

function readRows(
  records: Iterable<CsvRecord>,
  columns: readonly Column[],
  faults: TableFaults,
): FramesRow[] {
  const rows: FramesRow[] = [];
  for (const record of records) {
    const { row, wrongQuotes } = record;
    if (wrongQuotes !== undefined) faults.add(`row ${row}`, wrongQuotes);
    const key = wrongQuotes === undefined ? keyOf(record, columns, faults) : undefined;
    if (key) rows.push({ row, key });
    if (faults.tooMany) break;
  }
  return rows;
}

/** @returns the row's numbers; undefined where one of them is none */
function keyOf({ row, fields }: CsvRecord, columns: readonly Column[], faults: TableFaults): Key | undefined {
  const key: Key = { frame: 0, yaw: 0, pitch: 0, roll: 0, fov: 0, eye: 0 };
  let whole = true;
  for (const { name, header, index } of columns) {
    const text = fields[index]?.trim() ?? '';
    const value = NUMBER.test(text) ? Number(text) : NaN;
    // Adding 0 turns −0 into 0.
    key[name] = value + 0;
    if (Number.isFinite(value)) continue;
    whole = false;
    faults.add(
      `row ${row}, column ${header}`,
      text === '' ? 'is missing' : `must be a number, is ${shown(text)}`,
    );
  }
  const nearest = Math.round(key.frame);
  if (Math.abs(key.frame - nearest) < FRAME_SLACK) key.frame = nearest + 0;
  return whole ? key : undefined;
}

function addOrderFaults(rows: readonly FramesRow[], header: string | undefined, faults: TableFaults): void {
  for (let i = 1; i < rows.length; i++) {
    const { row, key } = rows[i];
    const before = rows[i - 1].key.frame;
    if (key.frame <= before)
      faults.add(`row ${row}, column ${header}`, `must be after ${before}, is ${key.frame}`);
  }
}

/** What the document's own rules say of the rows, taken as keys of moves as long as a move may be. */
function addRangeFaults(
  rows: readonly FramesRow[],
  onto: MoveDocument,
  columns: readonly Column[],
  faults: TableFaults,
): void {
  for (let from = 0; from < rows.length; from += MOST_KEYS) {
    const part = rows.slice(from, from + MOST_KEYS);
    const checked = checkMove({ ...onto, keys: withLegs(part.map(standIn)) });
    for (const { pointer, detail } of checked.ok ? [] : checked.faults) {
      const [, list, index, member] = pointer.split('/');
      const at = list === 'keys' ? part[Number(index)] : undefined;
      const header = columns.find(each => each.name === member)?.header ?? member;
      // The order has been looked at, frames between two source frames included.
      if (at && member === 'frame' && detail.startsWith('must be after')) continue;
      faults.add(at ? `row ${at.row}, column ${header}` : pointer, detail);
    }
  }
}

/** A row between two source frames as if it stood on the earlier; one that leans over a pole from the other side. */
function standIn({ key }: FramesRow): Key {
  return { ...overPole(key), frame: Math.floor(key.frame) };
}

/** Keys joined by even legs along the shortest rotation; the last has none. */
export function withLegs(keys: readonly Key[]): Key[] {
  return keys.map((key, i) =>
    i === keys.length - 1 ? key : { ...key, leg: { path: 'arc', ease: 'linear' } },
  );
}
