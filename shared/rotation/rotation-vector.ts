import { type Numbers, type Quat, type Vec3 } from '#shared/conventions';

/**
 * Rotation vectors: axis times angle, radians.
 *
 * With `q(t) = q₀ · exp(r(t))`, the angular rate in the body's own axes is `ω = J(r) ṙ` with
 * `J(r) = I − a [r]× + b [r]×²`, a = (1 − cos θ)/θ², b = (θ − sin θ)/θ³, θ = |r|, and the angular acceleration is
 * `ω̇ = J(r) r̈ + N(r, ṙ)`, N the derivative of J along the curve times ṙ, quadratic in ṙ.
 *
 * @see J. Sola, J. Deray, D. Atchuthan, "A micro Lie theory for state estimation in robotics", 2018, eq. 143–144
 */

/** Below this squared angle the closed forms lose digits to cancellation and series take over (their rest is under 1e-17 here). */
const SERIES_BELOW = 0.25;

/** @param out receives the unit quaternion of a rotation vector */
export function quatFromRotationVector(out: Quat, x: number, y: number, z: number): Quat {
  const squared = x * x + y * y + z * z;
  const angle = Math.sqrt(squared);
  // sin(θ/2)/θ: below 1e-4 two terms of the series are exact to 1e-18.
  const k = angle < 1e-4 ? 0.5 - squared / 48 : Math.sin(angle / 2) / angle;
  out[0] = k * x;
  out[1] = k * y;
  out[2] = k * z;
  out[3] = Math.cos(angle / 2);
  return out;
}

/**
 * @param out receives the rotation vector of a unit quaternion, taking the quaternion's sign at its word: its angle is
 *   2·atan2(|v|, w), in [0, 2π]
 */
export function rotationVectorFromQuat(out: Vec3, q: Readonly<Quat>): Vec3 {
  const sine = Math.hypot(q[0], q[1], q[2]);
  const k = sine < 1e-10 ? 2 : (2 * Math.atan2(sine, q[3])) / sine;
  out[0] = k * q[0];
  out[1] = k * q[1];
  out[2] = k * q[2];
  return out;
}

/** @param out receives `[a, b, a′/θ, b′/θ]` for the squared angle θ² */
export function rateCoefficients(out: Numbers, squared: number): Numbers {
  if (squared < SERIES_BELOW) return seriesCoefficients(out, squared);
  const angle = Math.sqrt(squared);
  const sine = Math.sin(angle);
  const cosine = Math.cos(angle);
  const fourth = squared * squared;
  out[0] = (1 - cosine) / squared;
  out[1] = (angle - sine) / (squared * angle);
  out[2] = (angle * sine - 2 * (1 - cosine)) / fourth;
  out[3] = (3 * sine - 2 * angle - angle * cosine) / (fourth * angle);
  return out;
}

function seriesCoefficients(out: Numbers, s: number): Numbers {
  out[0] =
    1 / 2 -
    s *
      (1 / 24 - s * (1 / 720 - s * (1 / 40320 - s * (1 / 3628800 - s * (1 / 479001600 - s / 87178291200)))));
  out[1] =
    1 / 6 -
    s *
      (1 / 120 -
        s * (1 / 5040 - s * (1 / 362880 - s * (1 / 39916800 - s * (1 / 6227020800 - s / 1307674368000)))));
  out[2] = -1 / 12 + s * (1 / 180 - s * (1 / 6720 - s * (1 / 453600 - s * (1 / 47900160 - s / 7264857600))));
  out[3] =
    -1 / 60 + s * (1 / 1260 - s * (1 / 60480 - s * (1 / 4989600 - s * (1 / 622702080 - s / 108972864000))));
  return out;
}

/**
 * The coefficient c of `J(r)⁻¹ = I + ½ [r]× + c [r]×²`, c = 1/θ² − cot(θ/2)/(2θ); finite up to (not at) θ = 2π.
 *
 * @param squared θ²
 */
export function inverseRateCoefficient(squared: number): number {
  if (squared < SERIES_BELOW) {
    const s = squared;
    return (
      1 / 12 +
      s *
        (1 / 720 +
          s *
            (1 / 30240 +
              s * (1 / 1209600 + s * (1 / 47900160 + s * (691 / 1307674368000 + s / 74724249600)))))
    );
  }
  const angle = Math.sqrt(squared);
  return 1 / squared - 1 / (2 * angle * Math.tan(angle / 2));
}

/** Scratch of {@link bodyRates}: destructuring or returning arrays would allocate; it holds nothing between calls. */
const coefficients = new Float64Array(4);

/**
 * Angular rate and acceleration in the body's own axes, of a rotation vector and its derivatives.
 *
 * @param rate receives ω = J(r) ṙ
 * @param acceleration receives ω̇ = J(r) r̈ + N(r, ṙ)
 * @param r, r1, r2 rotation vector (radians) and its first and second derivative, in any unit of time
 */
export function bodyRates(
  rate: Vec3,
  acceleration: Vec3,
  r: Readonly<Vec3>,
  r1: Readonly<Vec3>,
  r2: Readonly<Vec3>,
): void {
  const x = r[0];
  const y = r[1];
  const z = r[2];
  rateCoefficients(coefficients, x * x + y * y + z * z);
  const a = coefficients[0];
  const b = coefficients[1];
  const a1 = coefficients[2];
  const b1 = coefficients[3];
  const along = x * r1[0] + y * r1[1] + z * r1[2];
  // p = r × ṙ and t = r × p, and the same with r̈.
  const px = y * r1[2] - z * r1[1];
  const py = z * r1[0] - x * r1[2];
  const pz = x * r1[1] - y * r1[0];
  const tx = y * pz - z * py;
  const ty = z * px - x * pz;
  const tz = x * py - y * px;
  const sx = y * r2[2] - z * r2[1];
  const sy = z * r2[0] - x * r2[2];
  const sz = x * r2[1] - y * r2[0];
  const turn = -a1 * along;
  const twist = b1 * along;
  acceleration[0] =
    r2[0] - a * sx + b * (y * sz - z * sy) + turn * px + twist * tx + b * (r1[1] * pz - r1[2] * py);
  acceleration[1] =
    r2[1] - a * sy + b * (z * sx - x * sz) + turn * py + twist * ty + b * (r1[2] * px - r1[0] * pz);
  acceleration[2] =
    r2[2] - a * sz + b * (x * sy - y * sx) + turn * pz + twist * tz + b * (r1[0] * py - r1[1] * px);
  rate[0] = r1[0] - a * px + b * tx;
  rate[1] = r1[1] - a * py + b * ty;
  rate[2] = r1[2] - a * pz + b * tz;
}
