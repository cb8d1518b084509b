/*
 * Framed pictures from an equirectangular source, four pixels at a time (AssemblyScript, WebAssembly SIMD).
 *
 * Model. A row of the picture is cut into spans of 32 pixels. At the spans' ends the place in the source is computed
 * exactly (inverse projection, rotation, longitude and latitude). Between them it is the cubic through the four ends
 * around, wherever the fourth difference of the ends says that the cubic is off by less than TOLERANCE source pixels;
 * elsewhere (near the poles, at extreme fields of view) every pixel is computed, and within NEAR_POLE of a pole in double precision,
 * because there a direction's rounding turns into source pixels. Colours are blended with 14-bit weights.
 *
 * Memory is the host's: nothing is allocated here, so instances on several threads can share one memory. Each call gets
 * a scratch area of its own.
 */

/** Pixels in a span. */
const SPAN: i32 = 32;

/** Largest error of a span's cubic, source pixels: 255 · 0.006 = 1.5 of 255 on the hardest edge. */
const TOLERANCE: f32 = 0.006;

/** Error of the cubic in the middle of four even points, as a share of the fourth difference: 9/384. */
const CUBIC_ERROR: f32 = 0.0234375;

/** Horizontal part of a unit direction below which float32 longitudes are off by more than 0.003 pixels of 6144. */
const NEAR_POLE: f32 = 0.02;

/** Beyond this, ends of a span lie on two sides of a pole, as a share of the source's width. */
const LARGEST_STEP: f32 = 0.25;

/** 1.5 · 2²³: adding it rounds a small float to the nearest whole number, in one instruction where truncating takes ten. */
const MAGIC: f32 = 12582912;
const MAGIC_BITS: i32 = 0x4b400000;

const PI: f32 = 3.14159274;
const HALF_PI: f32 = 1.57079637;

// Parameters, in doubles from the address given: see wasm-frame.ts.
const WIDTH: usize = 0;
const HEIGHT: usize = 8;
const OUT: usize = 16;
const MATRIX: usize = 24;
const EYE: usize = 96;
const HALF_WIDTH: usize = 104;
const LEVEL_COUNT: usize = 112;
const REDUCE_AT: usize = 120;
const SAMPLE_COUNT: usize = 128;
const SAMPLES: usize = 136;
const LEVELS: usize = 392;
/** Per level: offset, stride, width, height. */
const LEVEL_SIZE: usize = 32;

// A view's numbers, read once a call. Globals belong to the instance, so to one thread.
let width: i32 = 0;
let eye: f32 = 0;
let eye64: f64 = 0;
let m0: f64 = 0;
let m1: f64 = 0;
let m2: f64 = 0;
let m3: f64 = 0;
let m4: f64 = 0;
let m5: f64 = 0;
let m6: f64 = 0;
let m7: f64 = 0;
let m8: f64 = 0;
let sourceWidth: f64 = 0;
let sourceHeight: f64 = 0;
let perPixel: f64 = 0;
let levelCount: i32 = 0;
let reduceAt: f32 = 0;
let texelsAtCentre: f32 = 0;

// The level that the present span is taken from.
let levelOffset: i32 = 0;
let levelStride: i32 = 0;
let levelWidth: f32 = 0;
let levelHeight: f32 = 0;
let scaleX: f32 = 1;
let scaleY: f32 = 1;

/** Whether colours are added up, several samples a pixel. */
let adding: bool = false;

// Where the present row's ends of spans stand: places x, places y, scales t.
let endsX: usize = 0;
let endsY: usize = 0;
let endsT: usize = 0;
/** Places of four pixels computed one by one: x, y, t, horizontal part. */
let four: usize = 0;

/** Ends before the first span and after the last that the cubic and its error test look at. */
const ENDS_BEFORE: i32 = 4;

/** Bytes of scratch that `renderRows` wants for a picture of a width. */
export function scratchSize(pictureWidth: i32): i32 {
  const padded = (pictureWidth + SPAN + 15) & ~15;
  return 64 + 3 * 4 * (padded / SPAN + 16) + 4 * padded + 8 * padded + 64;
}

/**
 * Renders rows `from` to `to` (excluded) of the picture.
 *
 * @param p address of the parameters
 * @param scratch address of `scratchSize` bytes that no other thread uses
 */
export function renderRows(p: usize, scratch: usize, from: i32, to: i32): void {
  readParameters(p);
  const padded = (width + SPAN + 15) & ~15;
  const ends = padded / SPAN + 16;
  four = scratch;
  endsX = scratch + 64;
  endsY = endsX + 4 * ends;
  endsT = endsY + 4 * ends;
  const line = endsT + 4 * ends;
  const sums = line + 4 * padded;
  const out = <usize>load<f64>(p + OUT);
  const count = <i32>load<f64>(p + SAMPLE_COUNT);
  const middle = load<f64>(p + HEIGHT) / 2;
  adding = count > 1;
  for (let row = from; row < to; row++) {
    if (!adding) {
      rowOfSamples(p, 0.5, middle - <f64>row - 0.5, line, sums);
    } else {
      memory.fill(sums, 0, 8 * padded);
      for (let s = 0; s < count; s++) {
        const place = p + SAMPLES + 16 * s;
        rowOfSamples(p, load<f64>(place), middle - <f64>row - load<f64>(place + 8), line, sums);
      }
      resolve(line, sums, count);
    }
    memory.copy(out + 4 * <usize>(row * width), line, 4 * <usize>width);
  }
}

function readParameters(p: usize): void {
  width = <i32>load<f64>(p + WIDTH);
  eye64 = load<f64>(p + EYE);
  eye = <f32>eye64;
  m0 = load<f64>(p + MATRIX);
  m1 = load<f64>(p + MATRIX + 8);
  m2 = load<f64>(p + MATRIX + 16);
  m3 = load<f64>(p + MATRIX + 24);
  m4 = load<f64>(p + MATRIX + 32);
  m5 = load<f64>(p + MATRIX + 40);
  m6 = load<f64>(p + MATRIX + 48);
  m7 = load<f64>(p + MATRIX + 56);
  m8 = load<f64>(p + MATRIX + 64);
  sourceWidth = load<f64>(p + LEVELS + 16);
  sourceHeight = load<f64>(p + LEVELS + 24);
  perPixel = (2 * load<f64>(p + HALF_WIDTH)) / <f64>width;
  levelCount = <i32>load<f64>(p + LEVEL_COUNT);
  reduceAt = <f32>load<f64>(p + REDUCE_AT);
  texelsAtCentre = <f32>((perPixel * sourceWidth) / (2 * Math.PI));
}

/**
 * One sample of each pixel of a row.
 *
 * @param right of the pixel's left edge, 0…1
 * @param up of the picture's middle, pixels
 * @param line where colours go, unless `adding`
 * @param sums where they are added up, 16 bits a channel, if `adding`
 */
function rowOfSamples(p: usize, right: f64, up: f64, line: usize, sums: usize): void {
  const y = up * perPixel;
  const spans = (width + SPAN - 1) / SPAN;
  const ends = spans + 2 * ENDS_BEFORE;
  for (let k = 0; k < ends; k += 4) {
    placeFour(<f64>((k - ENDS_BEFORE) * SPAN) + right, <f64>SPAN, y);
    v128.store(endsX + 4 * k, v128.load(four));
    v128.store(endsY + 4 * k, v128.load(four, 16));
    v128.store(endsT + 4 * k, v128.load(four, 32));
  }
  unwrap(ends);
  for (let k = 0; k < spans; k++) {
    const end = <usize>(4 * (k + ENDS_BEFORE));
    const t = max(load<f32>(endsT + end), load<f32>(endsT + end, 4));
    takeLevel(p, t * texelsAtCentre);
    const at = k * SPAN;
    const lineAt = line + 4 * <usize>at;
    const sumsAt = sums + 8 * <usize>at;
    if (smooth(endsX + end, <f32>sourceWidth * LARGEST_STEP) && smooth(endsY + end, <f32>sourceHeight)) {
      span(end, lineAt, sumsAt);
    } else {
      for (let i = 0; i < SPAN; i += 4) {
        placeFour(<f64>(at + i) + right, 1, y);
        exactNearPole(<f64>(at + i) + right, y);
        colourFour(v128.load(four), v128.load(four, 16), lineAt + 4 * <usize>i, sumsAt + 8 * <usize>i);
      }
    }
  }
}

/** Ends that lie across the ±180° column continue beyond the source's edge instead of jumping back. */
function unwrap(ends: i32): void {
  const whole = <f32>sourceWidth;
  let before = load<f32>(endsX);
  for (let k = 1; k < ends; k++) {
    const at = endsX + 4 * <usize>k;
    const here = load<f32>(at);
    // Kept within one turn of the source: 32 times around a pole would lose precision.
    const placed = here + whole * nearest((before - here) / whole);
    before = placed < -whole || placed > 2 * whole ? here : placed;
    store<f32>(at, before);
  }
}

/** Whether the cubic through the ends around a span is close enough. */
@inline
function smooth(end: usize, largestStep: f32): bool {
  const a = load<f32>(end - 8);
  const b = load<f32>(end - 4);
  const c = load<f32>(end);
  const d = load<f32>(end, 4);
  const e = load<f32>(end, 8);
  const f = load<f32>(end, 12);
  const before = a - 4 * b + 6 * c - 4 * d + e;
  const after = b - 4 * c + 6 * d - 4 * e + f;
  return (
    max(abs(before), abs(after)) * CUBIC_ERROR < TOLERANCE &&
    max(abs(d - c), max(abs(c - b), abs(e - d))) < largestStep
  );
}

/** The pixels of a span, along the cubics. */
@inline
function span(end: usize, line: usize, sums: usize): void {
  const x = endsX + end;
  const y = endsY + end;
  const step = f32x4.splat(4.0 / <f32>SPAN);
  let t = f32x4(0, 1.0 / <f32>SPAN, 2.0 / <f32>SPAN, 3.0 / <f32>SPAN);
  const x0 = f32x4.splat(load<f32>(x));
  const x1 = f32x4.splat(slope(x));
  const x2 = f32x4.splat(bend(x));
  const x3 = f32x4.splat(twist(x));
  const y0 = f32x4.splat(load<f32>(y));
  const y1 = f32x4.splat(slope(y));
  const y2 = f32x4.splat(bend(y));
  const y3 = f32x4.splat(twist(y));
  for (let i = 0; i < SPAN; i += 4) {
    colourFour(
      f32x4.add(x0, f32x4.mul(t, f32x4.add(x1, f32x4.mul(t, f32x4.add(x2, f32x4.mul(t, x3)))))),
      f32x4.add(y0, f32x4.mul(t, f32x4.add(y1, f32x4.mul(t, f32x4.add(y2, f32x4.mul(t, y3)))))),
      line + 4 * <usize>i,
      sums + 8 * <usize>i,
    );
    t = f32x4.add(t, step);
  }
}

// Coefficients of the cubic through four even points, from the second (0) to the third (1).
@inline
function slope(p: usize): f32 {
  return (
    load<f32>(p, 4) - load<f32>(p) / 2 - load<f32>(p - 4) / 3 - load<f32>(p, 8) / 6
  );
}
@inline
function bend(p: usize): f32 {
  return (load<f32>(p, 4) - 2 * load<f32>(p) + load<f32>(p - 4)) / 2;
}
@inline
function twist(p: usize): f32 {
  return (load<f32>(p, 8) - 3 * load<f32>(p, 4) + 3 * load<f32>(p) - load<f32>(p - 4)) / 6;
}

/** Chooses the level whose pixels are not larger than what a sample stands for. */
@inline
function takeLevel(p: usize, texels: f32): void {
  let level = 0;
  let limit = reduceAt;
  while (level + 1 < levelCount && texels >= limit) {
    level++;
    limit *= 2;
  }
  const at = p + LEVELS + LEVEL_SIZE * <usize>level;
  levelOffset = <i32>load<f64>(at);
  levelStride = <i32>load<f64>(at, 8);
  levelWidth = <f32>load<f64>(at, 16);
  levelHeight = <f32>load<f64>(at, 24);
  scaleX = levelWidth / <f32>sourceWidth;
  scaleY = levelHeight / <f32>sourceHeight;
}

/**
 * Places in the source of four pixels at columns `from`, `from + step`, …, written to `four`.
 *
 * @param from columns from the picture's left edge
 * @param y on the tangent plane
 */
function placeFour(from: f64, step: f64, y: f64): void {
  const left = (from - <f64>width / 2) * perPixel;
  const each = step * perPixel;
  const x = f32x4(<f32>left, <f32>(left + each), <f32>(left + 2 * each), <f32>(left + 3 * each));
  const d = f32x4.splat(eye);
  const a = f32x4.splat(1 + eye);
  const ySplat = f32x4.splat(<f32>y);
  const r2 = f32x4.add(f32x4.mul(x, x), f32x4.splat(<f32>(y * y)));
  const root = f32x4.sqrt(
    f32x4.add(f32x4.splat((1 + eye) * (1 + eye)), f32x4.mul(r2, f32x4.splat(1 - eye * eye))),
  );
  const t = f32x4.div(
    f32x4.add(f32x4.splat(eye * (1 + eye)), root),
    f32x4.add(r2, f32x4.splat((1 + eye) * (1 + eye))),
  );
  const vx = f32x4.mul(t, x);
  const vy = f32x4.mul(t, ySplat);
  const vz = f32x4.sub(d, f32x4.mul(t, a));
  const nx = turned(vx, vy, vz, m0, m1, m2);
  const ny = turned(vx, vy, vz, m3, m4, m5);
  const nz = turned(vx, vy, vz, m6, m7, m8);
  const level = f32x4.sqrt(f32x4.add(f32x4.mul(nx, nx), f32x4.mul(nz, nz)));
  const longitude = atan2Four(nx, f32x4.neg(nz));
  const latitude = atan2Four(ny, level);
  const w = <f32>sourceWidth;
  const h = <f32>sourceHeight;
  v128.store(four, f32x4.add(f32x4.mul(longitude, f32x4.splat(w / (2 * PI))), f32x4.splat(w / 2)));
  v128.store(four, f32x4.sub(f32x4.splat(h / 2), f32x4.mul(latitude, f32x4.splat(h / PI))), 16);
  v128.store(four, t, 32);
  v128.store(four, level, 48);
}

@inline
function turned(x: v128, y: v128, z: v128, a: f64, b: f64, c: f64): v128 {
  return f32x4.add(
    f32x4.add(f32x4.mul(x, f32x4.splat(<f32>a)), f32x4.mul(y, f32x4.splat(<f32>b))),
    f32x4.mul(z, f32x4.splat(<f32>c)),
  );
}

/** atan2 of four pairs, off by less than 2e-7; 0 where both are 0. */
@inline
function atan2Four(y: v128, x: v128): v128 {
  const ay = f32x4.abs(y);
  const ax = f32x4.abs(x);
  const steep = f32x4.gt(ay, ax);
  const low = f32x4.min(ax, ay);
  const high = f32x4.max(f32x4.max(ax, ay), f32x4.splat(1e-30));
  const q = f32x4.div(low, high);
  const z = f32x4.mul(q, q);
  // Through atan(√z)/√z at nine Chebyshev points of 0…1: off by less than 1e-8 before rounding.
  let s = f32x4.splat(0.0027662835013704803);
  s = f32x4.add(f32x4.mul(s, z), f32x4.splat(-0.01573124912083943));
  s = f32x4.add(f32x4.mul(s, z), f32x4.splat(0.04213762358738597));
  s = f32x4.add(f32x4.mul(s, z), f32x4.splat(-0.07456854825883957));
  s = f32x4.add(f32x4.mul(s, z), f32x4.splat(0.1061837063691118));
  s = f32x4.add(f32x4.mul(s, z), f32x4.splat(-0.14197797794076428));
  s = f32x4.add(f32x4.mul(s, z), f32x4.splat(0.1999187202910776));
  s = f32x4.add(f32x4.mul(s, z), f32x4.splat(-0.3333303670928616));
  s = f32x4.add(f32x4.mul(s, z), f32x4.splat(0.9999999817886557));
  let angle = f32x4.mul(s, q);
  angle = v128.bitselect(f32x4.sub(f32x4.splat(HALF_PI), angle), angle, steep);
  const behind = f32x4.lt(x, f32x4.splat(0));
  angle = v128.bitselect(f32x4.sub(f32x4.splat(PI), angle), angle, behind);
  const sign = v128.and(y, i32x4.splat(0x80000000));
  return v128.xor(angle, sign);
}

/** Does those of the four places in `four` again in double precision that lie near a pole. */
@inline
function exactNearPole(from: f64, y: f64): void {
  const near = f32x4.lt(v128.load(four, 48), f32x4.splat(NEAR_POLE));
  if (!v128.any_true(near)) return;
  for (let i = 0; i < 4; i++) exactPlace(four + 4 * <usize>i, (from + <f64>i - <f64>width / 2) * perPixel, y);
}

function exactPlace(at: usize, x: f64, y: f64): void {
  const a = 1 + eye64;
  const r2 = x * x + y * y;
  const t = (eye64 * a + Math.sqrt(a * a + r2 * (1 - eye64 * eye64))) / (r2 + a * a);
  const vx = t * x;
  const vy = t * y;
  const vz = eye64 - t * a;
  const nx = m0 * vx + m1 * vy + m2 * vz;
  const ny = m3 * vx + m4 * vy + m5 * vz;
  const nz = m6 * vx + m7 * vy + m8 * vz;
  const longitude = Math.atan2(nx, -nz);
  const latitude = Math.atan2(ny, Math.sqrt(nx * nx + nz * nz));
  store<f32>(at, <f32>((longitude / (2 * Math.PI) + 0.5) * sourceWidth));
  store<f32>(at, <f32>((0.5 - latitude / Math.PI) * sourceHeight), 16);
}

/** A whole number that was rounded by adding MAGIC: the low bits of the sum. */
@inline
function wholeOfMagic(sum: v128): v128 {
  return i32x4.sub(sum, i32x4.splat(MAGIC_BITS));
}

/**
 * Blends the colours at four places.
 *
 * @param x, y pixels of the source from its left and top edge; x may be up to a width beyond either edge
 */
@inline
function colourFour(x: v128, y: v128, line: usize, sums: usize): void {
  const w = f32x4.splat(levelWidth);
  const zero = f32x4.splat(0);
  const half = f32x4.splat(0.5);
  const magic = f32x4.splat(MAGIC);
  let u = f32x4.sub(f32x4.mul(x, f32x4.splat(scaleX)), half);
  u = f32x4.add(u, v128.and(w, f32x4.lt(u, zero)));
  u = f32x4.pmax(f32x4.sub(u, v128.and(w, f32x4.ge(u, w))), zero);
  let v = f32x4.sub(f32x4.mul(y, f32x4.splat(scaleY)), half);
  v = f32x4.pmin(f32x4.pmax(v, zero), f32x4.splat(levelHeight - 1));
  // Nearest to half less: the pixel at or before the place. On a pixel's centre either neighbour will do.
  const column = f32x4.add(f32x4.sub(u, half), magic);
  const row = f32x4.add(f32x4.sub(v, half), magic);
  const fx = f32x4.mul(f32x4.sub(u, f32x4.sub(column, magic)), f32x4.splat(16384));
  const fy = f32x4.sub(v, f32x4.sub(row, magic));
  const rightWeight = wholeOfMagic(f32x4.add(fx, magic));
  const belowWeight = wholeOfMagic(f32x4.add(f32x4.mul(fy, f32x4.splat(16384)), magic));
  const bothWeight = wholeOfMagic(f32x4.add(f32x4.mul(fx, fy), magic));
  const topRight = i32x4.sub(rightWeight, bothWeight);
  const bottomLeft = i32x4.sub(belowWeight, bothWeight);
  const topLeft = i32x4.sub(i32x4.sub(i32x4.splat(16384), rightWeight), bottomLeft);
  const low = i32x4.splat(0xffff);
  const top = v128.or(v128.and(topLeft, low), i32x4.shl(topRight, 16));
  const bottom = v128.or(v128.and(bottomLeft, low), i32x4.shl(bothWeight, 16));
  const address = i32x4.add(
    i32x4.add(
      i32x4.mul(wholeOfMagic(row), i32x4.splat(levelStride)),
      i32x4.shl(wholeOfMagic(column), 2),
    ),
    i32x4.splat(levelOffset),
  );
  const a = blend(
    i32x4.extract_lane(address, 0),
    v128.shuffle<i32>(top, top, 0, 0, 0, 0),
    v128.shuffle<i32>(bottom, bottom, 0, 0, 0, 0),
  );
  const b = blend(
    i32x4.extract_lane(address, 1),
    v128.shuffle<i32>(top, top, 1, 1, 1, 1),
    v128.shuffle<i32>(bottom, bottom, 1, 1, 1, 1),
  );
  const c = blend(
    i32x4.extract_lane(address, 2),
    v128.shuffle<i32>(top, top, 2, 2, 2, 2),
    v128.shuffle<i32>(bottom, bottom, 2, 2, 2, 2),
  );
  const d = blend(
    i32x4.extract_lane(address, 3),
    v128.shuffle<i32>(top, top, 3, 3, 3, 3),
    v128.shuffle<i32>(bottom, bottom, 3, 3, 3, 3),
  );
  if (!adding) {
    const round = i32x4.splat(8192);
    v128.store(
      line,
      i8x16.narrow_i16x8_u(
        i16x8.narrow_i32x4_s(
          i32x4.shr_s(i32x4.add(a, round), 14),
          i32x4.shr_s(i32x4.add(b, round), 14),
        ),
        i16x8.narrow_i32x4_s(
          i32x4.shr_s(i32x4.add(c, round), 14),
          i32x4.shr_s(i32x4.add(d, round), 14),
        ),
      ),
    );
  } else {
    // Three bits after the point: sixteen samples fill 15 bits.
    const round = i32x4.splat(1024);
    const first = i16x8.narrow_i32x4_s(
      i32x4.shr_s(i32x4.add(a, round), 11),
      i32x4.shr_s(i32x4.add(b, round), 11),
    );
    const second = i16x8.narrow_i32x4_s(
      i32x4.shr_s(i32x4.add(c, round), 11),
      i32x4.shr_s(i32x4.add(d, round), 11),
    );
    v128.store(sums, i16x8.add(v128.load(sums), first));
    v128.store(sums, i16x8.add(v128.load(sums, 16), second), 16);
  }
}

/** Red, green, blue and alpha of four neighbouring source pixels, blended; 14 bits after the point. */
@inline
function blend(address: i32, top: v128, bottom: v128): v128 {
  const at = <usize>address;
  const below = <usize>(address + levelStride);
  return i32x4.add(
    i32x4.dot_i16x8_s(pair(at), top),
    i32x4.dot_i16x8_s(pair(below), bottom),
  );
}

/** Two neighbouring pixels, channel by channel: red, red, green, green, …, 16 bits each. */
@inline
function pair(at: usize): v128 {
  return i16x8.extend_low_i8x16_u(
    v128.shuffle<i8>(
      v128.load32_zero(at),
      v128.load32_zero(at, 4),
      0, 16, 1, 17, 2, 18, 3, 19, 4, 20, 5, 21, 6, 22, 7, 23,
    ),
  );
}

/** Sums of 4, 8 or 16 samples to bytes. */
function resolve(line: usize, sums: usize, count: i32): void {
  const bits: i32 = 3 + (31 - clz(count));
  const half: i32 = 1 << (bits - 1);
  const round = i16x8.splat(<i16>half);
  for (let i = 0; i < width; i += 4) {
    const at = sums + 8 * <usize>i;
    v128.store(
      line + 4 * <usize>i,
      i8x16.narrow_i16x8_u(
        i16x8.shr_u(i16x8.add(v128.load(at), round), bits),
        i16x8.shr_u(i16x8.add(v128.load(at, 16), round), bits),
      ),
    );
  }
}
