import { type Key, type Leg } from '#schemas/move';
import { RAD_PER_DEG } from '#shared/conventions';
import { zoomFromFov } from '#shared/projection/field-of-view';
import { conjugate, dot, multiply } from '#shared/rotation/quaternion';
import { rotationVectorFromQuat } from '#shared/rotation/rotation-vector';
import { HALF_TURN_SLACK } from '#shared/rotation/slerp';
import { quatFromYawPitchRoll } from '#shared/rotation/yaw-pitch-roll';
import { bezierHandles, writeEase } from './ease';
import * as at from './leg-table';
import { wholeTurns } from './whole-turns';

/** Where a row of the leg table is being written. */
export interface Row {
  readonly table: Float64Array;
  /** Index of the row's first number. */
  readonly row: number;
}

/** @returns the orientation of a key as built, with whole turns of yaw and roll taken out */
export function keyOrientation(key: Key, yawTurns = 0, rollTurns = 0): Float64Array {
  return quatFromYawPitchRoll(
    new Float64Array(4),
    (key.yaw - 360 * yawTurns) * RAD_PER_DEG,
    key.pitch * RAD_PER_DEG,
    (key.roll - 360 * rollTurns) * RAD_PER_DEG,
  ) as Float64Array;
}

/** The pose of one key, held. @returns the row's sort and flags */
export function writeHeld({ table, row }: Row, key: Key): [sort: number, flags: number] {
  table[row + at.YAW] = key.yaw;
  table[row + at.PITCH] = key.pitch;
  table[row + at.ROLL] = key.roll;
  table[row + at.ZOOM] = zoomFromFov(key.fov * RAD_PER_DEG);
  table[row + at.EYE] = key.eye;
  return [at.LEVEL, key.roll === 0 ? 0 : at.ROLLS];
}

/** A leg travelled by u = ease(t), from one key to the next. @returns the row's sort and flags */
export function writeEased(place: Row, leg: Leg, from: Key, to: Key): [sort: number, flags: number] {
  if (leg.ease === 'hold') return writeHeld(place, from);
  const { table, row } = place;
  writeStraight(table, row + at.ZOOM, zoomFromFov(from.fov * RAD_PER_DEG), zoomFromFov(to.fov * RAD_PER_DEG));
  writeStraight(table, row + at.EYE, from.eye, to.eye);
  const handles = bezierHandles(leg.ease);
  if (handles) writeEase(table, row + at.EASE, handles);
  const flags = (handles ? at.CURVED_EASE : 0) | (from.fov === to.fov ? 0 : at.ZOOMS);
  return leg.path === 'level'
    ? [at.LEVEL, flags | writeLevel(place, from, to)]
    : [at.ARC, flags | writeArc(place, from, to)];
}

function writeStraight(table: Float64Array, place: number, from: number, to: number): void {
  table[place] = from;
  table[place + 1] = to - from;
}

function writeLevel({ table, row }: Row, from: Key, to: Key): number {
  writeStraight(table, row + at.YAW, from.yaw, to.yaw);
  writeStraight(table, row + at.PITCH, from.pitch, to.pitch);
  writeStraight(table, row + at.ROLL, from.roll, to.roll);
  return from.roll === 0 && to.roll === 0 ? 0 : at.ROLLS;
}

function writeArc({ table, row }: Row, from: Key, to: Key): number {
  const yawTurns = wholeTurns(to.yaw - from.yaw);
  const rollTurns = wholeTurns(to.roll - from.roll);
  const start = keyOrientation(from);
  const vector = legRotation(start, keyOrientation(to, yawTurns, rollTurns));
  const angle = Math.hypot(vector[0], vector[1], vector[2]);
  const axis = angle === 0 ? vector : vector.map(part => part / angle);
  table.set(start, row + at.START);
  table.set(axis, row + at.AXIS);
  table.set(multiply(new Float64Array(4), start, [axis[0], axis[1], axis[2], 0]), row + at.ASIDE);
  table[row + at.HALF_ANGLE] = angle / 2;
  table[row + at.YAW_HALF_TURNS] = Math.PI * yawTurns;
  table[row + at.ROLL_HALF_TURNS] = Math.PI * rollTurns;
  return yawTurns === 0 && rollTurns === 0 ? 0 : at.TURNS;
}

/**
 * The rotation of a leg in the camera's own axes, going to `to` where its dot product with `from` is ≥ −1e-12, else to
 * −to.
 *
 * @returns a rotation vector of angle ≤ π (but for rounding), radians
 */
export function legRotation(from: Float64Array, to: Float64Array): Float64Array {
  const way = multiply(new Float64Array(4), conjugate(new Float64Array(4), from), to) as Float64Array;
  const sign = dot(from, to) >= -HALF_TURN_SLACK ? 1 : -1;
  return rotationVectorFromQuat(
    new Float64Array(3),
    way.map(part => sign * part),
  ) as Float64Array;
}
