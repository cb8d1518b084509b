import fc from 'fast-check';

import { type Key, type Leg, type MoveDocument, type Shot } from '#schemas/move';
import { measureMove } from '#shared/measure/measure-move';
import { MEASURES } from '#shared/measure/measures';
import { compileMove } from '#shared/path/compile';
import { joined, key, moveWith } from '../../support/moves';

const LEVEL: Leg = { path: 'level', ease: 'linear' };

function shotted(keys: Key[], over: Partial<Shot> = {}): MoveDocument {
  const move = moveWith(keys);
  return { ...move, shot: { ...move.shot, ...over } };
}

/** One turn to the right in ten delivered seconds, at 24 frames a second. */
const turn = (fov: number, eye = 0, over: Partial<Shot> = {}) =>
  shotted(joined([key(0, { fov, eye }), key(240, { yaw: 360, fov, eye })], LEVEL), over);

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('a full turn in ten seconds', () => {
  // Truth: MATHS §8, arithmetic: 2 r(50°) / 36°/s.
  it.each([
    [0, 3.793],
    [0.2, 3.472],
  ])('is crossed at eye point %d in %d s', (eye, seconds) => {
    expect(measureMove(turn(100, eye)).worst.crossingTimeSec.value).toBeCloseTo(seconds, 3);
  });

  // Truth: arithmetic. 36 °/s; 805.5 px a radian (MATHS §8) times 1.5° a frame.
  it('pans at 36 °/s and steps 21.09 px, and nothing else moves', () => {
    const { worst } = measureMove(turn(100));
    expect(worst.panRateDegPerSec.value).toBeCloseTo(36, 10);
    expect(worst.stepPx.value).toBeCloseTo((805.5 * 1.5 * Math.PI) / 180, 1);
    for (const still of ['rollRateDegPerSec', 'zoomRatePerSec', 'accelerationDegPerSec2'] as const)
      expect(worst[still].value).toBeCloseTo(0, 8);
  });

  it('jolts by its whole rate where it starts and ends, as standing counts as 0', () => {
    const { joltDegPerSec } = measureMove(turn(100)).perFrame;
    expect(joltDegPerSec[0]).toBeCloseTo(36, 10);
    expect(joltDegPerSec[240]).toBeCloseTo(36, 10);
    expect(Math.max(...joltDegPerSec.subarray(1, 240))).toBe(0);
  });

  it('delivered six times faster pans six times faster and breaks the crossing limit throughout', () => {
    const { worst, perFrame } = measureMove(turn(100, 0, { speed: 6 }));
    expect(perFrame.panRateDegPerSec).toHaveLength(41);
    expect(worst.panRateDegPerSec.value).toBeCloseTo(216, 9);
    expect(worst.crossingTimeSec).toMatchObject({ frame: 0, limit: 7, breaks: true, breakingFrames: 41 });
  });
});

// Truth: MATHS §8, arithmetic.
it.each([
  [100, 1.214],
  [60, 0.588],
])('a 6144 px source seen %d° wide in 1920 px is %d px a picture px sharp', (fov, sharpness) => {
  const { worst } = measureMove(turn(fov));
  expect(worst.sharpness.value).toBeCloseTo(sharpness, 3);
  expect(worst.sharpness.breaks).toBe(sharpness < 1);
});

// Truth: arithmetic: a level yaw at pitch θ turns the axis by cos θ and rolls by sin θ of the yaw's rate.
it('yaw at a pitch is shared between pan and roll', () => {
  fc.assert(
    fc.property(number(-85, 85), number(-300, 300), (pitch, yaw) => {
      const move = shotted(joined([key(0, { pitch }), key(24, { pitch, yaw })], LEVEL));
      const { panRateDegPerSec, rollRateDegPerSec, horizonLeanDeg } = measureMove(move).perFrame;
      const rad = (pitch * Math.PI) / 180;
      expect(panRateDegPerSec[12]).toBeCloseTo(Math.abs(yaw) * Math.cos(rad), 8);
      expect(rollRateDegPerSec[12]).toBeCloseTo(Math.abs(yaw * Math.sin(rad)), 8);
      expect(horizonLeanDeg[12]).toBeCloseTo(0, 9);
    }),
  );
});

// Truth: arithmetic: a bead on a circle of pitch θ turning evenly: |ω̇| = 0 for pure yaw; an eased yaw has the ease's ü.
it('acceleration of an eased yaw is that of its ease', () => {
  const ease = { bezier: [1 / 3, 0, 2 / 3, 1] } as const; // u = 3t² − 2t³: ü = 6 − 12 t
  const move = shotted(
    joined([key(0), key(48, { yaw: 90 })], { path: 'level', ease: { bezier: [...ease.bezier] } }),
  );
  const { accelerationDegPerSec2 } = measureMove(move).perFrame;
  for (const frame of [0, 6, 12, 24, 40])
    expect(accelerationDegPerSec2[frame]).toBeCloseTo((90 * Math.abs(6 - (12 * frame) / 48)) / 4, 5);
});

it('an even zoom of a doubling a second is one doubling a second', () => {
  // Truth: tan(fov/4) halves each second, by the definition of ζ.
  const wide = 100;
  const narrow = (4 * 180 * Math.atan(Math.tan((wide * Math.PI) / 720) / 4)) / Math.PI;
  const move = shotted(joined([key(0, { fov: wide }), key(48, { fov: narrow })], LEVEL));
  expect(measureMove(move).worst.zoomRatePerSec.value).toBeCloseTo(1, 9);
});

it('the horizon leans to the other side than the camera rolls, wrapped', () => {
  const move = shotted([key(0, { roll: 30 })]);
  expect(measureMove(move).worst.horizonLeanDeg.value).toBeCloseTo(-30, 9);
  expect(measureMove(shotted([key(0, { roll: 350 })])).worst.horizonLeanDeg.value).toBeCloseTo(10, 9);
  const up = measureMove(shotted([key(0, { pitch: 90 })])).worst.horizonLeanDeg;
  expect(up).toMatchObject({ value: null, frame: null, why: expect.stringContaining('no direction') });
});

describe('jolts', () => {
  // Truth: arithmetic: 24 °/s of yaw becomes 24 °/s of pitch; the jump is the diagonal of the two.
  it('at a corner are the difference of the rates on either side', () => {
    const keys = joined([key(0), key(24, { yaw: 24 }), key(48, { yaw: 24, pitch: 24 })], LEVEL);
    const { joltDegPerSec } = measureMove(shotted(keys)).perFrame;
    expect(joltDegPerSec[24]).toBeCloseTo(24 * Math.SQRT2, 8);
  });

  it('stand at the first delivered frame after a key between two frames', () => {
    const keys = joined([key(0), key(25, { yaw: 24 }), key(48, { yaw: 24 })], LEVEL);
    const { joltDegPerSec } = measureMove(shotted(keys, { speed: 2 })).perFrame;
    expect([...joltDegPerSec.subarray(11, 15)].map(jolt => jolt > 1)).toEqual([false, false, true, false]);
  });

  it('are none at a hold’s cut, which is listed', () => {
    const keys = [
      key(0, { leg: { path: 'level', ease: 'hold' } }),
      key(24, { yaw: 40, leg: { path: 'level', ease: 'linear' } }),
      key(48, { yaw: 64 }),
    ];
    const { perFrame, notes } = measureMove(shotted(keys));
    expect(perFrame.joltDegPerSec[24]).toBe(0);
    expect(notes).toContainEqual(expect.objectContaining({ kind: 'cut', sourceFrame: 24, frame: 24 }));
  });

  // Truth: arithmetic: at five times the speed frames 0 and 5 are shown, and frame 7, where the cut is, never.
  it('at a key that no frame shows any more stand at the last', () => {
    const keys = [key(0, { leg: { path: 'level', ease: 'hold' } }), key(7, { yaw: 40 })];
    const { notes, perFrame } = measureMove(shotted(keys, { speed: 5 }));
    expect(perFrame.panRateDegPerSec).toHaveLength(2);
    expect(notes).toContainEqual(expect.objectContaining({ kind: 'cut', sourceFrame: 7, frame: 1 }));
  });

  it('are none at fair joints and rests', () => {
    const keys = joined(
      [key(0, { rest: true }), key(40, { yaw: 50, pitch: 20 }), key(100, { yaw: 90, rest: true })],
      { path: 'arc', ease: 'fair' },
    );
    expect(measureMove(shotted(keys)).worst.joltDegPerSec.value).toBeLessThan(1e-9);
  });
});

describe('what is not known', () => {
  it('says why', () => {
    const { worst, perFrame } = measureMove(shotted([key(0)], { frames: 10 }));
    expect(worst.shutterAngleDeg).toMatchObject({ value: null, why: expect.stringContaining('exposure') });
    expect(worst.seamInView).toMatchObject({ value: null, why: expect.stringContaining('seam') });
    expect(worst.loopGapDeg).toMatchObject({ value: null, why: expect.stringContaining('loop') });
    expect(worst.crossingTimeSec).toMatchObject({ value: null, why: expect.stringContaining('stands') });
    expect([...perFrame.crossingTimeSec]).toEqual(Array.from({ length: 10 }, () => NaN));
  });

  it('is the rate where an ease is vertical, in that frame alone', () => {
    const steep: Leg = { path: 'level', ease: { bezier: [0, 1, 1, 0] } };
    const { perFrame, worst } = measureMove(shotted(joined([key(0), key(24, { yaw: 9 })], steep)));
    expect(Number.isFinite(perFrame.panRateDegPerSec[0])).toBe(false);
    expect(Number.isFinite(perFrame.panRateDegPerSec[6])).toBe(true);
    expect(worst.panRateDegPerSec).toMatchObject({ why: expect.stringContaining('vertical') });
  });
});

describe('shutter', () => {
  it('under 90° is noted as strobing, over the interval as impossible', () => {
    const notes = (exposure: number) => measureMove(turn(100, 0, { exposure, speed: 6 })).notes;
    expect(notes(1 / 50)).toContainEqual(expect.objectContaining({ kind: 'strobing' }));
    expect(notes(1 / 20)).toContainEqual(expect.objectContaining({ kind: 'impossible-shutter' }));
    expect(measureMove(turn(100, 0, { exposure: 1 / 48 })).notes.map(note => note.kind)).not.toContain(
      'strobing',
    );
  });
});

it('another deliverable is measured by its own frame', () => {
  const move = {
    ...turn(100),
    deliverables: [
      { name: 'Wide', width: 1920, height: 1080 },
      { name: 'Tall', width: 1080, height: 1920, match: 'height' as const },
    ],
  };
  const wide = measureMove(move).worst.crossingTimeSec.value ?? NaN;
  const tall = measureMove(move, { deliverable: 'Tall' }).worst;
  // Truth: arithmetic: same height, so 9/16 of 9/16 of the width.
  expect(tall.crossingTimeSec.value).toBeCloseTo(wide * (9 / 16) ** 2, 9);
  expect(() => measureMove(move, { deliverable: 'Square' })).toThrow('no deliverable "Square"');
});

it('a loop’s gap is the turn between its ends', () => {
  const loop = (yaw: number) =>
    measureMove(shotted(joined([key(0), key(24, { yaw })], LEVEL), { loops: true })).worst.loopGapDeg;
  expect(loop(360).value).toBeCloseTo(0, 6);
  expect(loop(350)).toMatchObject({ frame: 24 });
  expect(loop(350).value).toBeCloseTo(10, 9);
});

describe('what shows', () => {
  const frames = 9;
  /** Truth: looked at point by point: a fine grid over the frame by the definition of the projection, in source directions. */
  function looked(
    move: MoveDocument,
    frame: number,
    shows: (v: number[]) => boolean,
    widthShare: number,
  ): boolean {
    const pose = new Float64Array(6);
    compileMove(move).poseAt(pose, frame);
    const [qx, qy, qz, qw, fov, d] = pose;
    const { width, height } = move.deliverables[0];
    const r = ((1 + d) * Math.sin(fov / 2)) / (d + Math.cos(fov / 2));
    for (let i = 0; i <= 90; i++)
      for (let j = 0; j <= 90; j++) {
        const x = (r * widthShare * (i - 45)) / 45;
        const y = (r * (height / width) * (j - 45)) / 45;
        const k = Math.hypot(x, y) / (1 + d);
        const s = (d + Math.sqrt(1 + k * k * (1 - d * d))) / (1 + k * k);
        const v = [(s * x) / (1 + d), (s * y) / (1 + d), d - s];
        const t = [2 * (qy * v[2] - qz * v[1]), 2 * (qz * v[0] - qx * v[2]), 2 * (qx * v[1] - qy * v[0])];
        const world = [
          v[0] + qw * t[0] + qy * t[2] - qz * t[1],
          v[1] + qw * t[1] + qz * t[0] - qx * t[2],
          v[2] + qw * t[2] + qx * t[1] - qy * t[0],
        ];
        if (shows(world)) return true;
      }
    return false;
  }

  const views = fc
    .record({
      yaw: number(-200, 200),
      pitch: number(-90, 90),
      roll: number(-180, 180),
      eye: fc.oneof(fc.constantFrom(0, 1), number(0, 1)),
      fov: number(10, 300),
      tall: fc.boolean(),
    })
    .map(({ fov, eye, ...rest }) => {
      const widest = Math.min(330, (360 * Math.acos(-eye)) / Math.PI - 10);
      return { ...rest, eye, fov: Math.min(fov, widest) };
    });

  const one = ({
    yaw,
    pitch,
    roll,
    fov,
    eye,
    tall,
  }: typeof views extends fc.Arbitrary<infer T> ? T : never) => ({
    ...shotted([key(0, { yaw, pitch, roll, fov, eye })], { frames, seamYaw: 90 }),
    deliverables: [
      tall ? { name: 'T', width: 1080, height: 1920 } : { name: 'W', width: 1920, height: 1080 },
    ],
  });

  it('of the tripod is what points of the frame see of its cone', () => {
    const cos = (degrees: number) => Math.cos((degrees * Math.PI) / 180);
    fc.assert(
      fc.property(views, view => {
        const move = one(view);
        const says = measureMove(move).perFrame.tripodInView[0] === 1;
        // Grid points lie a little apart: what is seen 1.5° inside is seen, what is not 1.5° outside is not.
        if (looked(move, 0, v => -v[1] > cos(18.5), 1)) expect(says).toBe(true);
        if (!looked(move, 0, v => -v[1] > cos(27), 1)) expect(says).toBe(false);
      }),
      { numRuns: 400 },
    );
  });

  it('of the seam in the middle third is where points of it lie on both its sides', () => {
    fc.assert(
      fc.property(views, view => {
        const move = one(view);
        const says = measureMove(move).perFrame.seamInView[0] === 1;
        // The seam at ±90° is the plane straight ahead: z = 0.
        const front = looked(move, 0, v => v[2] < -1e-3, 1 / 3);
        const back = looked(move, 0, v => v[2] > 1e-3, 1 / 3);
        if (front && back) expect(says).toBe(true);
        // A sliver that grid points miss is thinner than a few degrees.
        const deep = (sign: number) => looked(move, 0, v => sign * v[2] > -0.12, 1 / 3);
        if (!deep(1) || !deep(-1)) expect(says).toBe(false);
      }),
      { numRuns: 400 },
    );
  });

  it('follows the level rotation: a shot turned by 90° has its seam a quarter turn on', () => {
    // Source +X lies at levelled −Z: a rotation about +Y by +90°.
    const level: [number, number, number, number] = [0, Math.SQRT1_2, 0, Math.SQRT1_2];
    const seen = (yaw: number, over: Partial<Shot>) =>
      measureMove(shotted([key(0, { yaw })], { seamYaw: 90, ...over })).worst.seamInView.value;
    expect([seen(90, {}), seen(0, {})]).toEqual([1, 0]);
    expect([seen(90, { level }), seen(0, { level })]).toEqual([0, 1]);
  });
});

it('any valid move is measured without an error, and what is known is finite', () => {
  const leg = fc.record({
    path: fc.constantFrom('arc' as const, 'level' as const),
    ease: fc.oneof(
      fc.constantFrom('fair' as const, 'linear' as const, 'hold' as const, 'ease' as const),
      fc.record({ bezier: fc.tuple(number(0, 1), number(-10, 10), number(0, 1), number(-10, 10)) }),
    ),
  });
  const keys = fc
    .array(
      fc.record({
        yaw: number(-36_000, 36_000),
        pitch: number(-90, 90),
        roll: number(-36_000, 36_000),
        fov: number(10, 170),
        eye: number(0, 1),
        rest: fc.boolean(),
        leg,
      }),
      { minLength: 1, maxLength: 6 },
    )
    .map(drawn =>
      drawn.map(({ leg: travel, ...each }, i) => ({
        ...key(i * 7, each),
        ...(i < drawn.length - 1 ? { leg: travel } : {}),
      })),
    );
  fc.assert(
    fc.property(keys, number(0.01, 9), (drawn, speed) => {
      const { worst, perFrame } = measureMove(
        shotted(drawn, { speed, seamYaw: 12, exposure: 0.01, loops: true }),
      );
      for (const name of MEASURES) {
        const { value, why } = worst[name];
        if (value === null) expect(why).toMatch(/\w+ \w+/);
        else expect(Number.isFinite(value)).toBe(true);
      }
      expect([...perFrame.sharpness].every(Number.isFinite)).toBe(true);
    }),
    { numRuns: 300 },
  );
});
