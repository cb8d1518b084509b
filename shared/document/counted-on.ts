import { type Key } from '#schemas/move';
import { wholeTurns } from '#shared/path/whole-turns';

/** So near, in source frames, that over half a turn between two rows is a change of count and not a motion. */
const NEIGHBOURS = 1;

/** Range of yaw and roll either way (schemas/move.schema.json): beyond it, rows had better count as they do. */
const MOST_TURNED_DEG = 36_000;

/** Keys as a move can have them, and what had to be changed. */
export interface CountedOn {
  readonly keys: Key[];
  /** Rows that lean over a pole. */
  readonly leaning: number;
  /** Steps from which whole turns were taken. */
  readonly steps: number;
}

/**
 * Rows of a frames table whose pitch a key can have, and whose yaw and roll count on.
 *
 * A level leg may lean over a pole; a key cannot, but looks the same from the other side with half a turn of roll. And at
 * a key the columns may step by whole turns: from one source frame to the next such a step is taken out, with all that
 * follows. Orientations stay as they are.
 */
export function countedOn(rows: readonly Key[]): CountedOn {
  const keys: Key[] = [];
  let steps = 0;
  let yawOff = 0;
  let rollOff = 0;
  rows.forEach((row, i) => {
    const key = overPole(row);
    if (i > 0 && (row.frame - rows[i - 1].frame <= NEIGHBOURS || leans(row) !== leans(rows[i - 1]))) {
      const yawTurns = wholeTurns(key.yaw + yawOff - keys[i - 1].yaw);
      const rollTurns = wholeTurns(key.roll + rollOff - keys[i - 1].roll);
      yawOff -= 360 * yawTurns;
      rollOff -= 360 * rollTurns;
      if (!leans(row) && !leans(rows[i - 1]) && (yawTurns !== 0 || rollTurns !== 0)) steps++;
    }
    if (Math.abs(key.yaw + yawOff) > MOST_TURNED_DEG) yawOff = 0;
    if (Math.abs(key.roll + rollOff) > MOST_TURNED_DEG) rollOff = 0;
    keys.push(
      yawOff === 0 && rollOff === 0 ? key : { ...key, yaw: key.yaw + yawOff, roll: key.roll + rollOff },
    );
  });
  return { keys, leaning: rows.filter(leans).length, steps };
}

function leans({ pitch }: Key): boolean {
  return Math.abs(pitch) > 90 && Math.abs(pitch) <= 270;
}

/** @returns the same look with a pitch within ±90; the key itself where it does not lean over a pole */
export function overPole(key: Key): Key {
  if (!leans(key)) return key;
  const pitch = Math.sign(key.pitch) * 180 - key.pitch;
  return { ...key, yaw: key.yaw + 180, pitch, roll: key.roll + 180 };
}
