import { type Quat, RAD_PER_DEG, type Vec3 } from '#shared/conventions';
import { conjugate, rotate } from '#shared/rotation/quaternion';
import { ACROSS, INSIDE, type Lens, Rectangle } from './lens';

/** What shows the tripod: this far about the source's nadir. */
const TRIPOD_RAD = 20 * RAD_PER_DEG;
const TRIPOD_COSINE = Math.cos(TRIPOD_RAD);
const TRIPOD_SINE = Math.sin(TRIPOD_RAD);

/** Something in the source that a frame shows or does not. */
export interface InView {
  /**
   * @param orientation camera → world
   * @param forward where the camera looks, in the world: it decides most frames without turning anything
   */
  isSeen(orientation: Readonly<Quat>, forward: Readonly<Vec3>): boolean;
}

/**
 * The source's seam, seen where it crosses the middle third of the frame's width. It is the great circle through the
 * source's poles at `seamYaw` and `seamYaw + 180`, in source directions.
 */
export class SeamView implements InView {
  readonly #normal = new Float64Array(3);
  readonly #seen = new Float64Array(3);
  readonly #inverse = new Float64Array(4);
  readonly #third: Rectangle;

  /**
   * @param level the shot's rotation, source direction → levelled world
   * @param lens the frame's, which is followed
   */
  constructor(seamYawRad: number, level: Readonly<Quat>, lens: Lens) {
    this.#third = new Rectangle(lens, 1 / 3);
    rotate(this.#normal, level, [Math.cos(seamYawRad), 0, Math.sin(seamYawRad)]);
  }

  isSeen(orientation: Readonly<Quat>, forward: Readonly<Vec3>): boolean {
    const normal = this.#normal;
    const z = -(normal[0] * forward[0] + normal[1] * forward[1] + normal[2] * forward[2]);
    // It comes nearest to the axis at an angle whose sine is |z|.
    const place = this.#third.placeOf(Math.sqrt(1 - z * z));
    if (place !== ACROSS) return place === INSIDE;
    const seen = rotate(this.#seen, conjugate(this.#inverse, orientation), normal);
    const x = seen[0];
    const y = seen[1];
    const beyond = this.#third.cornersBeyond(x, y, z, 0);
    const centreBeyond = z <= 0;
    // Nothing but the seam parts the corners from each other, or all of them from the centre.
    const parted = beyond !== (centreBeyond ? 4 : 0);
    return parted || this.#third.isCrossedBy(x, y, z, 0);
  }
}

/** The cone about the source's nadir where the tripod stands, seen where any of it shows. */
export class TripodView implements InView {
  readonly #nadir = new Float64Array(3);
  readonly #seen = new Float64Array(3);
  readonly #inverse = new Float64Array(4);
  readonly #frame: Rectangle;

  /**
   * @param level the shot's rotation, source direction → levelled world
   * @param lens the frame's, which is followed
   */
  constructor(level: Readonly<Quat>, lens: Lens) {
    this.#frame = new Rectangle(lens, 1);
    rotate(this.#nadir, level, [0, -1, 0]);
  }

  isSeen(orientation: Readonly<Quat>, forward: Readonly<Vec3>): boolean {
    const nadir = this.#nadir;
    const z = -(nadir[0] * forward[0] + nadir[1] * forward[1] + nadir[2] * forward[2]);
    const frame = this.#frame;
    if (-z >= TRIPOD_COSINE) return true;
    // Of the cone that is nearest to the axis which lies straight towards it.
    const place = frame.placeOf(Math.sqrt(1 - z * z) * TRIPOD_SINE - z * TRIPOD_COSINE);
    if (place !== ACROSS) return place === INSIDE;
    const seen = rotate(this.#seen, conjugate(this.#inverse, orientation), nadir);
    const x = seen[0];
    const y = seen[1];
    return (
      frame.holds(x, y, z) ||
      frame.cornersBeyond(x, y, z, TRIPOD_COSINE) > 0 ||
      frame.isCrossedBy(x, y, z, TRIPOD_COSINE)
    );
  }
}
