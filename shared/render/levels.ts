import { type Picture } from './picture';

/**
 * A source's level 0 and its reductions to halves, each in memory with one column and one row more than it has: the
 * first column again after the last, the last row again below it, so that blending needs no test for the edges.
 */
export interface Level {
  readonly width: number;
  readonly height: number;
  /** Bytes from the start of the memory. */
  readonly offset: number;
  /** Bytes from one row to the next. */
  readonly stride: number;
}

/** Reductions stop before a side gets shorter than this, pixels. */
const SHORTEST_SIDE = 8;

/** Bytes between levels: reading a pixel pair at a level's end stays in memory. */
const GAP = 64;

/**
 * @param offset where level 0 begins, bytes
 * @returns all levels, the source's own size first
 */
export function layOutLevels(width: number, height: number, offset: number): Level[] {
  const levels: Level[] = [];
  let next = offset;
  while (levels.length === 0 || Math.min(width, height) >= SHORTEST_SIDE) {
    const stride = 4 * (width + 1);
    levels.push({ width, height, offset: next, stride });
    next += Math.ceil((stride * (height + 1) + GAP) / GAP) * GAP;
    width = Math.ceil(width / 2);
    height = Math.ceil(height / 2);
  }
  return levels;
}

/** @returns the first byte after the levels */
export function endOfLevels(levels: readonly Level[]): number {
  const last = levels[levels.length - 1];
  return last.offset + Math.ceil((last.stride * (last.height + 1) + GAP) / GAP) * GAP;
}

/** Writes a source and its reductions, each the mean of the pixels that it covers. */
export function fillLevels(memory: Uint8Array, levels: readonly Level[], source: Picture): void {
  const [first] = levels;
  for (let row = 0; row < first.height; row++) {
    const from = 4 * row * source.width;
    memory.set(source.rgba.subarray(from, from + 4 * source.width), first.offset + row * first.stride);
  }
  pad(memory, first);
  for (let i = 1; i < levels.length; i++) {
    reduce(memory, levels[i - 1], levels[i]);
    pad(memory, levels[i]);
  }
}

function pad(memory: Uint8Array, { width, height, offset, stride }: Level): void {
  for (let row = 0; row < height; row++) {
    const start = offset + row * stride;
    memory.copyWithin(start + 4 * width, start, start + 4);
  }
  const last = offset + (height - 1) * stride;
  memory.copyWithin(last + stride, last, last + stride);
}

function reduce(memory: Uint8Array, from: Level, to: Level): void {
  if (from.width !== 2 * to.width || from.height !== 2 * to.height) {
    reduceOdd(memory, from, to);
    return;
  }
  for (let row = 0; row < to.height; row++) {
    let out = to.offset + row * to.stride;
    let top = from.offset + 2 * row * from.stride;
    let below = top + from.stride;
    for (const end = out + 4 * to.width; out < end; top += 8, below += 8) {
      for (const stop = out + 4; out < stop; out++, top++, below++) {
        memory[out] = (memory[top] + memory[top + 4] + memory[below] + memory[below + 4] + 2) >> 2;
      }
      top -= 4;
      below -= 4;
    }
  }
}

/** A side that cannot be halved: each pixel is the mean of the area it covers, parts of pixels counted as such. */
function reduceOdd(memory: Uint8Array, from: Level, to: Level): void {
  const wide = from.width / to.width;
  const high = from.height / to.height;
  for (let row = 0; row < to.height; row++) {
    for (let column = 0; column < to.width; column++) {
      for (let channel = 0; channel < 4; channel++) {
        let sum = 0;
        for (let y = Math.floor(row * high); y < (row + 1) * high && y < from.height; y++) {
          const tall = Math.min(y + 1, (row + 1) * high) - Math.max(y, row * high);
          for (let x = Math.floor(column * wide); x < (column + 1) * wide && x < from.width; x++) {
            const broad = Math.min(x + 1, (column + 1) * wide) - Math.max(x, column * wide);
            sum += tall * broad * memory[from.offset + y * from.stride + 4 * x + channel];
          }
        }
        memory[to.offset + row * to.stride + 4 * column + channel] = Math.round(sum / (wide * high));
      }
    }
  }
}
