import { type Key } from '#schemas/move';
import { RAD_PER_DEG } from '#shared/conventions';
import { zoomFromFov } from '#shared/projection/field-of-view';
import { inverseRateCoefficient } from '#shared/rotation/rotation-vector';
import { clampedSplineSlopes, writeCubic } from './cubic-spline';
import * as at from './leg-table';
import { solveRotationSpline } from './rotation-spline';
import { type Run } from './runs';
import { wholeTurns } from './whole-turns';
import { keyOrientation, legRotation } from './write-eased';

/** A run being written: its keys, their frames, and where its first leg's row begins. */
interface RunPlace {
  readonly table: Float64Array;
  readonly firstRow: number;
  readonly keys: readonly Key[];
  readonly frames: readonly number[];
}

/** Sort and flags of a run's rows, the same for all its legs, and whether its rotation spline fell back. */
export interface WrittenRun {
  readonly sort: number;
  readonly flags: number;
  readonly fellBack: boolean;
}

/** Writes the rows of a fair run: one spline through its keys. */
export function writeRun(table: Float64Array, run: Run, allKeys: readonly Key[]): WrittenRun {
  const keys = allKeys.slice(run.firstKey, run.lastKey + 1);
  const place = { table, firstRow: run.firstKey * at.ROW, keys, frames: keys.map(key => key.frame) };
  writeChannel(
    place,
    at.ZOOM,
    keys.map(key => zoomFromFov(key.fov * RAD_PER_DEG)),
  );
  writeChannel(
    place,
    at.EYE,
    keys.map(key => key.eye),
  );
  const zooms = keys.every(key => key.fov === keys[0].fov) ? 0 : at.ZOOMS;
  const written = run.path === 'level' ? writeLevelRun(place) : writeArcRun(place);
  return { ...written, flags: written.flags | zooms };
}

function writeLevelRun(place: RunPlace): WrittenRun {
  const { keys } = place;
  writeChannel(
    place,
    at.YAW,
    keys.map(key => key.yaw),
  );
  writeChannel(
    place,
    at.PITCH,
    keys.map(key => key.pitch),
  );
  writeChannel(
    place,
    at.ROLL,
    keys.map(key => key.roll),
  );
  return { sort: at.LEVEL, flags: keys.every(key => key.roll === 0) ? 0 : at.ROLLS, fellBack: false };
}

function writeArcRun(place: RunPlace): WrittenRun {
  const { table, firstRow, keys, frames } = place;
  const yawTurns = accumulatedTurns(keys.map(key => key.yaw));
  const rollTurns = accumulatedTurns(keys.map(key => key.roll));
  const orientations = keys.map((key, i) => keyOrientation(key, yawTurns[i], rollTurns[i]));
  const vectors = new Float64Array(3 * (keys.length - 1));
  for (let leg = 0; leg < keys.length - 1; leg++) {
    vectors.set(legRotation(orientations[leg], orientations[leg + 1]), 3 * leg);
  }
  const durations = frames.slice(1).map((frame, leg) => frame - frames[leg]);
  const spline = solveRotationSpline(
    durations,
    vectors,
    keys[0].rest === true,
    keys[keys.length - 1].rest === true,
  );
  durations.forEach((duration, leg) => {
    const row = firstRow + leg * at.ROW;
    table.set(orientations[leg], row + at.START);
    writeVectorCubic(
      table,
      row + at.VECTOR,
      vectors.subarray(3 * leg, 3 * leg + 3),
      spline.rates,
      3 * leg,
      duration,
    );
  });
  const turns = [...yawTurns, ...rollTurns].some(count => count !== 0);
  if (turns) {
    writeChannel(
      place,
      at.YAW_TURN_CUBIC,
      yawTurns.map(count => Math.PI * count),
    );
    writeChannel(
      place,
      at.ROLL_TURN_CUBIC,
      rollTurns.map(count => Math.PI * count),
    );
  }
  return { sort: at.FAIR_ARC, flags: turns ? at.TURNS : 0, fellBack: spline.fellBack };
}

/** Whole turns since the run's first key. */
function accumulatedTurns(anglesDeg: readonly number[]): number[] {
  let total = 0;
  return anglesDeg.map((angle, i) => (i === 0 ? 0 : (total += wholeTurns(angle - anglesDeg[i - 1]))));
}

/**
 * The cubic of a leg's rotation vector: from 0 to `vector`, its derivative ω at the start and J⁻¹ω at the end.
 *
 * @param rates angular rates at the keys, per source frame; the leg's first at `key`, its last 3 further
 */
function writeVectorCubic(
  table: Float64Array,
  place: number,
  vector: Readonly<Float64Array>,
  rates: Readonly<Float64Array>,
  key: number,
  duration: number,
): void {
  const [x, y, z] = vector;
  const [wx, wy, wz] = rates.subarray(key + 3, key + 6);
  const c = inverseRateCoefficient(x * x + y * y + z * z);
  const p = [y * wz - z * wy, z * wx - x * wz, x * wy - y * wx];
  const end = [
    wx + 0.5 * p[0] + c * (y * p[2] - z * p[1]),
    wy + 0.5 * p[1] + c * (z * p[0] - x * p[2]),
    wz + 0.5 * p[2] + c * (x * p[1] - y * p[0]),
  ];
  for (let k = 0; k < 3; k++) {
    const d0 = rates[key + k] * duration;
    const d1 = end[k] * duration;
    table[place + k] = d0;
    table[place + 3 + k] = 3 * vector[k] - 2 * d0 - d1;
    table[place + 6 + k] = d0 + d1 - 2 * vector[k];
  }
}

/** A clamped cubic spline through one value a key, into each leg's row: ends at rest, or at the end leg's average rate. */
function writeChannel(
  { table, firstRow, keys, frames }: RunPlace,
  channel: number,
  values: readonly number[],
): void {
  const last = keys.length - 1;
  const average = (leg: number) => (values[leg + 1] - values[leg]) / (frames[leg + 1] - frames[leg]);
  const slopes = clampedSplineSlopes(
    frames,
    values,
    keys[0].rest === true ? 0 : average(0),
    keys[last].rest === true ? 0 : average(last - 1),
  );
  for (let leg = 0; leg < last; leg++) {
    writeCubic(
      table,
      firstRow + leg * at.ROW + channel,
      values[leg],
      values[leg + 1],
      slopes[leg],
      slopes[leg + 1],
      frames[leg + 1] - frames[leg],
    );
  }
}
