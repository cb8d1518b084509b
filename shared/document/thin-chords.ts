import { angleBetween } from '#shared/rotation/angle-between';
import { slerp } from '#shared/rotation/slerp';
import { rowOrientation, type ThinTable } from './thin-table';

/** Rotation of a chord from which on nothing is said of its rows: half a turn has two shortest ways. */
const LONGEST_CHORD_RAD = 3;

/** What is known of one size of stretches. */
interface Size {
  /** The chord's rotation, radians. */
  readonly turn: Float64Array;
  /** How far, at most, the stretch's rows lie from the chord: radians, ζ, eye point. */
  readonly angle: Float64Array;
  readonly zoom: Float64Array;
  readonly eye: Float64Array;
}

/**
 * How far the rows of a table bend away from straight chords: for stretches of 2, 4, 8, … rows, each beginning at a
 * multiple of its size. A leg that passes near both ends of a stretch passes about as near to all of its rows, but for
 * that bend; so most legs are checked against a few rows.
 *
 * Stretch `index` of size 2^`power` goes from row `index · 2^power` to the first row of the next, or to the last row.
 */
export class ThinChords {
  readonly #sizes: Size[] = [];

  constructor(table: ThinTable) {
    for (let power = 0; 2 ** power < 2 * table.count; power++) this.#sizes.push(sizeOf(table, power));
  }

  /** @returns radians; not finite where the chord is too long for anything to be said */
  angle(power: number, index: number): number {
    return this.#sizes[power].angle[index];
  }

  turn(power: number, index: number): number {
    return this.#sizes[power].turn[index];
  }

  zoom(power: number, index: number): number {
    return this.#sizes[power].zoom[index];
  }

  eye(power: number, index: number): number {
    return this.#sizes[power].eye[index];
  }
}

function sizeOf(table: ThinTable, power: number): Size {
  const count = Math.ceil(table.count / 2 ** power);
  const [turn, angle, zoom, eye] = [0, 1, 2, 3].map(() => new Float64Array(count));
  const size = { turn, angle, zoom, eye };
  for (let index = 0; index < count; index++) writeBend(size, index, table, 2 ** power);
  return size;
}

const start = new Float64Array(4);
const end = new Float64Array(4);
const there = new Float64Array(4);
const chord = new Float64Array(4);

function writeBend(size: Size, index: number, table: ThinTable, length: number): void {
  const { frames, zooms, eyes } = table;
  const from = index * length;
  const to = Math.min(from + length, table.count - 1);
  rowOrientation(start, table, from);
  rowOrientation(end, table, to);
  size.turn[index] = angleBetween(start, end);
  if (!(size.turn[index] < LONGEST_CHORD_RAD)) size.angle[index] = Infinity;
  for (let row = from + 1; row < to; row++) {
    const u = (frames[row] - frames[from]) / (frames[to] - frames[from]);
    const zoomOff = Math.abs(zooms[from] + u * (zooms[to] - zooms[from]) - zooms[row]);
    const eyeOff = Math.abs(eyes[from] + u * (eyes[to] - eyes[from]) - eyes[row]);
    if (zoomOff > size.zoom[index]) size.zoom[index] = zoomOff;
    if (eyeOff > size.eye[index]) size.eye[index] = eyeOff;
    if (size.angle[index] === Infinity) continue;
    const angleOff = angleBetween(slerp(chord, start, end, u), rowOrientation(there, table, row));
    if (angleOff > size.angle[index]) size.angle[index] = angleOff;
  }
}
