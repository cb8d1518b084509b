import { type Leg } from '#schemas/move';
import { POSE_SIZE } from '#shared/path/compiled-move';
import * as at from '#shared/path/leg-table';
import { lensOnLeg } from '#shared/path/lens-on-leg';
import { orientationOnLeg } from '#shared/path/orientation';
import { wholeTurns } from '#shared/path/whole-turns';
import { writeEased } from '#shared/path/write-eased';
import { FOV_ALWAYS_DRAWN_RAD, fovFromZoom, maxFovRad } from '#shared/projection/field-of-view';
import { angleBetween } from '#shared/rotation/angle-between';
import { multiply } from '#shared/rotation/quaternion';
import { slerp } from '#shared/rotation/slerp';
import { quatFromYawPitchRoll } from '#shared/rotation/yaw-pitch-roll';
import { type ThinChords } from './thin-chords';
import { rowOrientation, type ThinTable, type Tolerance } from './thin-table';

const EVEN_ARC: Leg = { path: 'arc', ease: 'linear' };

/** Taken off what a bound leaves, so that rounding never lets a row pass that is not within the tolerance. */
const ROUNDING = 1e-10;

/** Beyond it two ways round are about as short, radians: which one is taken must not be guessed. */
const HALF_TURN = Math.PI - 1e-6;

/**
 * Whether a leg from one row to another keeps the rows between within a tolerance.
 *
 * The leg is the product's own (path/write-eased.ts). Its rows are halved again and again; a stretch with both ends so
 * near to the leg that its bend (`ThinChords`) cannot take a row out of the tolerance is done. What is answered is what
 * looking at every row would answer.
 */
export class ThinLeg {
  /** After a refusal: the row that is too far off, and by how many radians of orientation; 0 where only the lens is. */
  missedRow = 0;
  missedByRad = 0;
  /** What the search has cost: poses compared and stretches looked at so far, a leg made counting as ten. */
  compared = 0;
  readonly #table: ThinTable;
  readonly #tolerance: Tolerance;
  readonly #chords: ThinChords;
  readonly #leg = new Float64Array(at.ROW);
  readonly #pose = new Float64Array(POSE_SIZE);
  readonly #there = new Float64Array(4);
  readonly #start = new Float64Array(4);
  readonly #end = new Float64Array(4);
  readonly #place = new Float64Array(1);
  readonly #fovPerZoom: number;
  readonly #mayClamp: boolean;
  /** Of each row that has been compared with the present leg: how far off it is. */
  readonly #angleOff: Float64Array;
  readonly #zoomOff: Float64Array;
  readonly #eyeOff: Float64Array;
  #sort = 0;
  #flags = 0;
  #arcRad = 0;
  #yawTurnsRad = 0;
  #rollTurnsRad = 0;
  #from = 0;
  #to = 0;

  constructor(table: ThinTable, tolerance: Tolerance, chords: ThinChords) {
    this.#table = table;
    this.#tolerance = tolerance;
    this.#chords = chords;
    const narrowest = table.fovsRad.reduce((a, b) => Math.min(a, b), Infinity);
    const widest = table.fovsRad.reduce((a, b) => Math.max(a, b), 0);
    // dfov/dζ = 2 sin(fov/2), largest at 180°.
    this.#fovPerZoom = 2 * Math.sin(widest <= Math.PI ? widest / 2 : Math.max(narrowest, Math.PI) / 2);
    this.#mayClamp = widest > FOV_ALWAYS_DRAWN_RAD;
    this.#angleOff = new Float64Array(table.count);
    this.#zoomOff = new Float64Array(table.count);
    this.#eyeOff = new Float64Array(table.count);
  }

  /** @param from, to rows, the second after the first */
  fits(from: number, to: number): boolean {
    this.#turn(from, to);
    const before = this.missedRow;
    const middle = (from + to) >> 1;
    if (before > from && before < to && this.#surelyMisses(from, to, before)) return false;
    if (middle > from && this.#surelyMisses(from, to, middle)) return false;
    this.#make(from, to);
    const power = 32 - Math.clz32(from ^ to);
    return this.#holds(power, from >> power);
  }

  /** The turn about the leg's axis, radians. */
  get arcRad(): number {
    return this.#arcRad;
  }

  /** The leg's whole turns of yaw and of roll together, either way, radians. */
  get wholeTurnsRad(): number {
    return Math.abs(this.#yawTurnsRad) + Math.abs(this.#rollTurnsRad);
  }

  /** @returns how far off the rows between are: the sum of squares of shares of the tolerance; Infinity where one is beyond */
  squares(from: number, to: number): number {
    this.#make(from, to);
    const { angleRad, eye, fovRad } = this.#tolerance;
    let sum = 0;
    for (let row = from + 1; row < to; row++) {
      if (!this.#compare(row)) return Infinity;
      const fovOff = this.#pose[4] - this.#table.fovsRad[row];
      sum += (this.#angleOff[row] / angleRad) ** 2 + (fovOff / fovRad) ** 2 + (this.#eyeOff[row] / eye) ** 2;
    }
    return sum;
  }

  #turn(from: number, to: number): void {
    const { keys } = this.#table;
    rowOrientation(this.#start, this.#table, from);
    rowOrientation(this.#end, this.#table, to);
    this.#arcRad = angleBetween(this.#start, this.#end);
    this.#yawTurnsRad = 2 * Math.PI * wholeTurns(keys[to].yaw - keys[from].yaw);
    this.#rollTurnsRad = 2 * Math.PI * wholeTurns(keys[to].roll - keys[from].roll);
  }

  /** Whether a row is too far off, judged before the leg is made: most legs that are tried do not fit. */
  #surelyMisses(from: number, to: number, row: number): boolean {
    const { frames } = this.#table;
    const pose = this.#pose;
    if (this.#arcRad > HALF_TURN) return false;
    const u = (frames[row] - frames[from]) / (frames[to] - frames[from]);
    slerp(pose, this.#start, this.#end, u);
    const turned = this.#yawTurnsRad !== 0 || this.#rollTurnsRad !== 0;
    if (turned) {
      multiply(pose, quatFromYawPitchRoll(this.#there, u * this.#yawTurnsRad, 0, 0), pose);
      multiply(pose, pose, quatFromYawPitchRoll(this.#there, 0, 0, u * this.#rollTurnsRad));
    }
    const angleOff = angleBetween(pose, rowOrientation(this.#there, this.#table, row));
    this.compared += 2;
    if (!(angleOff > this.#tolerance.angleRad + ROUNDING)) return false;
    this.missedRow = row;
    this.missedByRad = angleOff - this.#tolerance.angleRad;
    return true;
  }

  #make(from: number, to: number): void {
    const { keys, fovsRad, frames } = this.#table;
    const leg = this.#leg;
    [this.#sort, this.#flags] = writeEased({ table: leg, row: 0 }, EVEN_ARC, keys[from], keys[to]);
    leg[at.FRAME] = frames[from];
    leg[at.PER_FRAME] = 1 / (frames[to] - frames[from]);
    leg[at.FOV] = fovsRad[from];
    this.#from = from;
    this.#to = to;
    for (const off of [this.#angleOff, this.#zoomOff, this.#eyeOff]) off[from] = off[to] = 0;
    this.compared += 10;
  }

  /** @returns whether a row is within the tolerance */
  #compare(row: number): boolean {
    const { frames, zooms, eyes, fovsRad } = this.#table;
    const { angleRad, fovRad, eye } = this.#tolerance;
    const leg = this.#leg;
    const pose = this.#pose;
    const u = (frames[row] - leg[at.FRAME]) * leg[at.PER_FRAME];
    this.#place[0] = u;
    orientationOnLeg(pose, leg, 0, this.#sort, this.#flags, this.#place);
    lensOnLeg(pose, leg, 0, this.#flags, this.#place);
    const angleOff = angleBetween(pose, rowOrientation(this.#there, this.#table, row));
    this.#angleOff[row] = angleOff;
    this.#zoomOff[row] = Math.abs(at.cubic(leg, at.ZOOM, u) - zooms[row]);
    this.#eyeOff[row] = Math.abs(pose[5] - eyes[row]);
    this.compared++;
    if (angleOff <= angleRad && Math.abs(pose[4] - fovsRad[row]) <= fovRad && this.#eyeOff[row] <= eye)
      return true;
    this.missedRow = row;
    this.missedByRad = Math.max(0, angleOff - angleRad);
    return false;
  }

  /** Whether the rows that a stretch shares with the leg are within the tolerance; its ends have been compared. */
  #holds(power: number, index: number): boolean {
    const low = index * 2 ** power;
    const high = Math.min(low + 2 ** power, this.#table.count - 1);
    const from = Math.max(low, this.#from);
    const to = Math.min(high, this.#to);
    if (to - from < 2) return true;
    this.compared++;
    if (from === low && to === high && this.#sure(power, index, low, high)) return true;
    const middle = low + 2 ** (power - 1);
    if (middle > from && middle < to && !this.#compare(middle)) return false;
    return this.#holds(power - 1, 2 * index) && (middle >= high || this.#holds(power - 1, 2 * index + 1));
  }

  /** Whether no row between the ends of a stretch can be beyond the tolerance. */
  #sure(power: number, index: number, low: number, high: number): boolean {
    const { angleRad, fovRad, eye } = this.#tolerance;
    const chords = this.#chords;
    const zoomOff = Math.max(this.#zoomOff[low], this.#zoomOff[high]) + chords.zoom(power, index);
    if (!(zoomOff * this.#fovPerZoom <= fovRad - ROUNDING)) return false;
    const eyeOff = Math.max(this.#eyeOff[low], this.#eyeOff[high]) + chords.eye(power, index);
    if (!(eyeOff <= eye - ROUNDING) || (this.#mayClamp && this.#clamps(low, high))) return false;
    const spread = spreadBetween(chords.turn(power, index) + 2 * angleRad);
    const endsOff = Math.max(this.#angleOff[low], this.#angleOff[high]);
    const bend = this.#bend(this.#table.frames[high] - this.#table.frames[low]);
    return endsOff * spread + chords.angle(power, index) + bend <= angleRad - ROUNDING;
  }

  /**
   * How far, at most, a stretch of the leg bends away from its own chord, radians. An arc without whole turns is
   * straight. With them its angular rate turns as fast as one of its rotations turns the axes of the others, and in a
   * flat space a curve with that acceleration a bends by at most a·b²/8 over a time b; twice that covers the sphere's
   * curvature up to a quarter turn.
   */
  #bend(frames: number): number {
    const arc = this.#arcRad;
    const yaw = Math.abs(this.#yawTurnsRad);
    const roll = Math.abs(this.#rollTurnsRad);
    if ((this.#flags & at.TURNS) === 0) return 0;
    const share = frames * this.#leg[at.PER_FRAME];
    if ((arc + yaw + roll) * share > Math.PI / 2) return Infinity;
    return ((arc * yaw + (arc + yaw) * roll) * share * share) / 4;
  }

  /** Whether the field of view may be kept within its limits somewhere on a stretch; both go evenly there. */
  #clamps(low: number, high: number): boolean {
    const { frames } = this.#table;
    const leg = this.#leg;
    const [a, b] = [frames[low], frames[high]].map(frame => (frame - leg[at.FRAME]) * leg[at.PER_FRAME]);
    const widest = fovFromZoom(Math.max(at.cubic(leg, at.ZOOM, a), at.cubic(leg, at.ZOOM, b)));
    const eye = Math.min(at.cubic(leg, at.EYE, a), at.cubic(leg, at.EYE, b));
    return widest > FOV_ALWAYS_DRAWN_RAD && widest > maxFovRad(eye);
  }
}

/**
 * By how much two arcs whose ends are near each other may be further apart in between: of unit quaternions a half angle φ
 * apart, slerp moves by at most (sin uφ + sin (1 − u)φ) / sin φ of what the ends do, largest half-way: 1 / cos(φ/2).
 *
 * @param turnRad the longer arc's rotation, 2φ
 */
function spreadBetween(turnRad: number): number {
  return turnRad < Math.PI ? 1 / Math.cos(turnRad / 4) : Infinity;
}
