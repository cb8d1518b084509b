import { directionAtPicture } from '#shared/projection/general-perspective';
import { sineCosines } from '#shared/rotation/sine-cosines';

/** Places in {@link Lens.numbers}: half sides on the tangent plane, and the eye point. */
export const HALF_WIDTH = 0;
export const HALF_HEIGHT = 1;
export const EYE = 2;

/** The frame on the tangent plane, of a deliverable, at one field of view and eye point. */
export class Lens {
  /** In an array, as numbers kept or handed on one by one may have to be put on the heap. */
  readonly numbers = new Float64Array(3);
  readonly #angle = new Float64Array(1);
  readonly #turn = new Float64Array(2);

  /**
   * @param ratio how much wider the deliverable's frame is than the first's (projection/deliverable-framing.ts)
   * @param heightPerWidth of the deliverable
   */
  constructor(
    readonly ratio: number,
    readonly heightPerWidth: number,
  ) {}

  /**
   * @param pose holds the first deliverable's horizontal field of view and the eye point, as `poseAt` leaves them
   */
  set(pose: Readonly<Float64Array>): void {
    const numbers = this.numbers;
    const eye = pose[5];
    if (pose[4] === 2 * this.#angle[0] && eye === numbers[EYE]) return;
    this.#angle[0] = pose[4] / 2;
    sineCosines(this.#turn, this.#angle, 1);
    const halfWidth = (this.ratio * (1 + eye) * this.#turn[0]) / (eye + this.#turn[1]);
    numbers[HALF_WIDTH] = halfWidth;
    numbers[HALF_HEIGHT] = halfWidth * this.heightPerWidth;
    numbers[EYE] = eye;
  }
}

/** Where a circle about the frame's centre lies: inside the rectangle, outside it, or across its sides. */
export const INSIDE = 1;
export const OUTSIDE = -1;
export const ACROSS = 0;

/**
 * A rectangle on the tangent plane about the frame's centre, as a set of directions: what of a circle on the sphere
 * shows in it. Lines on the plane are circles on the sphere, so nothing here is sampled.
 */
export class Rectangle {
  readonly #numbers: Readonly<Float64Array>;
  readonly #share: number;
  readonly #corner = new Float64Array(3);

  /** @param share of the frame's width that it has; all of its height. It follows the lens */
  constructor(lens: Lens, share: number) {
    this.#numbers = lens.numbers;
    this.#share = share;
  }

  /**
   * Where directions of one angle from the axis lie. Their radius on the plane, (1 + d) sin c / (d + cos c), is compared
   * in squares and without a quotient: this is asked of every frame.
   *
   * @param cosine of the angle
   * @returns INSIDE, OUTSIDE or ACROSS
   */
  placeOf(cosine: number): number {
    const numbers = this.#numbers;
    const x = numbers[HALF_WIDTH] * this.#share;
    const y = numbers[HALF_HEIGHT];
    const a = 1 + numbers[EYE];
    const depth = numbers[EYE] + cosine;
    if (depth <= 0) return OUTSIDE;
    const far = a * a * (1 - cosine * cosine);
    const near = depth * depth;
    const least = x < y ? x : y;
    if (far <= least * least * near) return INSIDE;
    return far > (x * x + y * y) * near ? OUTSIDE : ACROSS;
  }

  /** Whether a camera direction shows. */
  holds(x: number, y: number, z: number): boolean {
    const eye = this.#numbers[EYE];
    const depth = eye - z;
    if (depth <= 0) return false;
    const scale = (1 + eye) / depth;
    return (
      Math.abs(x) * scale <= this.#numbers[HALF_WIDTH] * this.#share &&
      Math.abs(y) * scale <= this.#numbers[HALF_HEIGHT]
    );
  }

  /**
   * Whether a corner lies on the far side of the circle `axis · direction = height`.
   *
   * @returns how many of the four have `axis · corner ≥ height`
   */
  cornersBeyond(x: number, y: number, z: number, height: number): number {
    const numbers = this.#numbers;
    directionAtPicture(this.#corner, numbers[HALF_WIDTH] * this.#share, numbers[HALF_HEIGHT], numbers[EYE]);
    const cx = this.#corner[0] * x;
    const cy = this.#corner[1] * y;
    const rest = this.#corner[2] * z - height;
    return (
      Number(cx + cy + rest >= 0) +
      Number(cx - cy + rest >= 0) +
      Number(cy - cx + rest >= 0) +
      Number(rest - cx - cy >= 0)
    );
  }

  /**
   * Whether the circle `axis · direction = height` crosses a side.
   *
   * A side stands on the plane `(1 + d) v = s (d − w)`, v the direction's part along the side's normal, w its depth and s
   * where the side stands; so the crossings are where two planes and the sphere meet.
   */
  isCrossedBy(x: number, y: number, z: number, height: number): boolean {
    const right = this.#numbers[HALF_WIDTH] * this.#share;
    const top = this.#numbers[HALF_HEIGHT];
    return (
      this.#sideCrossed(x, y, z, height, right, top) ||
      this.#sideCrossed(-x, y, z, height, right, top) ||
      this.#sideCrossed(y, x, z, height, top, right) ||
      this.#sideCrossed(-y, x, z, height, top, right)
    );
  }

  /**
   * The side at +s across the first axis, reaching ±reach along the second.
   *
   * With the side's plane `a v + s w = s d` (a = 1 + d) and the circle's `x v + y u + z w = h`, directions (v, u, w) on
   * both are P + λ L, L the cross product of the planes' normals and P the foot of the perpendicular from the centre.
   */
  #sideCrossed(x: number, y: number, z: number, h: number, s: number, reach: number): boolean {
    const d = this.#numbers[EYE];
    const a = 1 + d;
    const lv = -s * y;
    const lu = s * x - a * z;
    const lw = a * y;
    const squared = lv * lv + lu * lu + lw * lw;
    if (squared === 0) return false;
    // P = (k₁ (n₂ × L) + k₂ (L × n₁)) / |L|², n₁ = (a, 0, s), k₁ = s d, n₂ = (x, y, z), k₂ = h.
    const k = (s * d) / squared;
    const m = h / squared;
    const pv = k * (y * lw - z * lu) + m * (lu * s);
    const pu = k * (z * lv - x * lw) + m * (lw * a - lv * s);
    const pw = k * (x * lu - y * lv) - m * (lu * a);
    const room = 1 - pv * pv - pu * pu - pw * pw;
    if (room < 0) return false;
    const step = Math.sqrt(room / squared);
    return (
      onSide(pu + step * lu, pw + step * lw, d, reach) || onSide(pu - step * lu, pw - step * lw, d, reach)
    );
  }
}

function onSide(along: number, depth: number, eye: number, reach: number): boolean {
  const room = eye - depth;
  return room > 0 && Math.abs(along) * (1 + eye) <= reach * room;
}
