/**
 * The one set of conventions, everywhere: client, server, documents, exports.
 *
 * - World: right-handed, +Y up, +X right, −Z forward. A camera at rest looks along −Z with +Y up.
 * - yaw ψ > 0 looks right, pitch θ > 0 looks up, roll ρ > 0 turns the camera clockwise as its operator sees it.
 * - Orientation `q = Ry(−ψ) · Rx(θ) · Rz(−ρ)` takes camera directions to world directions; "as built" means the product
 *   of the three half-angle quaternions of the unwrapped angles.
 * - Angles are degrees in documents, forms and tables, radians inside `shared/`; names say which.
 */

/** A row of numbers that can be written into: plain or typed. */
export type Numbers = number[] | Float64Array;

/** Unit quaternion `[x, y, z, w]`; q and −q are one orientation. */
export type Quat = Numbers;

/** `[x, y, z]`. */
export type Vec3 = Numbers;

export const RAD_PER_DEG = Math.PI / 180;
export const DEG_PER_RAD = 180 / Math.PI;

/** Narrowest horizontal field of view, degrees. */
export const FOV_MIN_DEG = 10;

/** Widest horizontal field of view for any eye point, degrees. */
export const FOV_MAX_DEG = 330;

/** How far the field of view stays away from the widest that an eye point can draw at all, degrees. */
export const FOV_MARGIN_DEG = 10;

/** Slack in degrees by which a document's field of view may exceed its limits: the noise of decimal text. */
export const FOV_TOLERANCE_DEG = 1e-9;

/**
 * Horizontal part of a unit forward direction below which yaw and roll cannot be told apart: looking at a pole. At
 * 1e-6 rad the two are still known to 1e-10, so nothing jumps where the rule begins to hold.
 */
export const POLE_SINE = 1e-6;
