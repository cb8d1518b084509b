import { validateString } from 'gltf-validator';
import { Euler, MathUtils, Quaternion, QuaternionLinearInterpolant } from 'three';

import { type Ease, type Key, type MoveDocument } from '#schemas/move';
import { UnknownDeliverable } from '#shared/document/deliverable-named';
import { base64FromBytes } from '#shared/export/base64-text';
import { cameraGltf } from '#shared/export/gltf';
import { FilmTooLong, MOST_GLTF_FRAMES } from '#shared/export/gltf-film';
import { compileMove } from '#shared/path/compile';
import { fullMove, quayMove } from '../../support/documents';
import { joined, key, moveWith } from '../../support/moves';

/** The members of a glTF file that are looked at here. */
interface Gltf {
  readonly asset: {
    readonly version: string;
    readonly generator: string;
    readonly extras: {
      readonly note: string;
      readonly level: number[];
      readonly fov: number[];
      readonly eye: number[];
    };
  };
  readonly extensionsUsed?: string[];
  readonly extensionsRequired?: string[];
  readonly nodes: { readonly name: string; readonly rotation: number[] }[];
  readonly cameras: { readonly perspective: { readonly yfov: number; readonly aspectRatio: number } }[];
  readonly accessors?: {
    readonly bufferView: number;
    readonly count: number;
    readonly min?: number[];
    readonly max?: number[];
  }[];
  readonly bufferViews: { readonly byteOffset: number; readonly byteLength: number }[];
  readonly buffers?: { readonly uri: string; readonly byteLength: number }[];
  readonly animations?: {
    readonly samplers: { readonly input: number; readonly output: number; readonly interpolation: string }[];
    readonly channels: {
      readonly sampler: number;
      readonly target: { readonly path: string; readonly extensions?: unknown };
    }[];
  }[];
}

const parsed = (text: string) => JSON.parse(text) as Gltf;

/** The floats of an accessor, read with Node's own base64 and little-endian reader. */
function floats(gltf: Gltf, accessor: number): number[] {
  const view = gltf.bufferViews[gltf.accessors?.[accessor].bufferView ?? -1];
  const bytes = Buffer.from(gltf.buffers?.[0].uri.split(';base64,')[1] ?? '', 'base64');
  return Array.from({ length: view.byteLength / 4 }, (_, i) => bytes.readFloatLE(view.byteOffset + 4 * i));
}

/** Times and values of the channel with a target path. */
function channel(gltf: Gltf, path: string): { times: number[]; values: number[] } {
  const animation = gltf.animations?.[0];
  const found = animation?.channels.find(each => each.target.path === path);
  const sampler = animation?.samplers[found?.sampler ?? -1];
  if (!sampler) throw new Error(`no channel "${path}"`);
  expect(sampler.interpolation).toBe('LINEAR');
  return { times: floats(gltf, sampler.input), values: floats(gltf, sampler.output) };
}

const read = (move: MoveDocument, deliverable?: string) => parsed(cameraGltf(move, deliverable));
const quaternions = (values: number[]) =>
  Array.from({ length: values.length / 4 }, (_, i) => new Quaternion().fromArray(values, 4 * i));

/** Truth: three.js' quaternion of the three rotations Ry(−yaw) · Rx(pitch) · Rz(−roll). */
function looking(yaw: number, pitch: number, roll = 0): Quaternion {
  const [x, y, z] = [pitch, -yaw, -roll].map(MathUtils.degToRad);
  return new Quaternion().setFromEuler(new Euler(x, y, z, 'YXZ'));
}

/** How far two unit quaternions are apart, up to sign. */
function apart(a: Quaternion, b: Quaternion): number {
  const far = (sign: number) =>
    Math.hypot(a.x - sign * b.x, a.y - sign * b.y, a.z - sign * b.z, a.w - sign * b.w);
  return Math.min(far(1), far(-1));
}

/** The formula of the format's description, in degrees: 2 · atan(r(fov/2) · H/W), r = (1 + d) sin c / (d + cos c). */
function yfovRad(fovDeg: number, eye: number, heightPerWidth: number): number {
  const c = MathUtils.degToRad(fovDeg / 2);
  return 2 * Math.atan((((1 + eye) * Math.sin(c)) / (eye + Math.cos(c))) * heightPerWidth);
}

/** 32-bit floats below 4: half of 2⁻²². */
const FLOAT = 1.2e-7;

/** Source frames 20 to 230 at 2.5 times the speed: the range cuts the first leg, and outlasts the last key. */
function arcMove(keys: Key[], ease: Ease = 'linear', path: 'arc' | 'level' = 'arc'): MoveDocument {
  const move = moveWith(joined(keys, { path, ease }));
  return { ...move, shot: { ...move.shot, frames: 251, speed: 2.5, from: 20, to: 230 } };
}

const arcKeys = [
  key(0, { yaw: 10, pitch: -20, roll: 5 }),
  key(50, { yaw: 80, pitch: 40, roll: -30 }),
  key(125, { yaw: -70, pitch: 10 }),
  key(200, { yaw: -71, pitch: 89, roll: 60 }),
];

const zoomKeys = [key(0, { yaw: 170, fov: 100, eye: 0 }), key(48, { yaw: 190, fov: 50, eye: 0.5 })];
const zoomMove = () => moveWith(joined(zoomKeys, { path: 'level', ease: 'linear' }));

describe('Khronos’ glTF validator', () => {
  // It only lists extensions that it does not know in full: that is information, not a fault.
  const INCOMPLETE = 'INCOMPLETE_EXTENSION_SUPPORT';

  it.each<[string, MoveDocument, string[]]>([
    ['one turn with a dip', quayMove(), []],
    ['every member of a document', fullMove(), [INCOMPLETE]],
    ['arcs that the keys say exactly', arcMove(arcKeys), []],
    ['a still', moveWith([key(0, { yaw: 30, pitch: 20 })]), []],
    ['a constant field of view', arcMove(arcKeys, 'ease'), []],
    ['a zoom', zoomMove(), [INCOMPLETE]],
    ['a move without a title', moveWith([key(0)], { title: '' }), []],
  ])('finds nothing wrong with %s', async (_what, move, codes) => {
    for (const { name } of move.deliverables) {
      const { issues } = await validateString(cameraGltf(move, name));
      expect(issues.messages.map(message => message.code)).toEqual(codes);
      expect([issues.numErrors, issues.numWarnings]).toEqual([0, 0]);
    }
  });

  it('does find a quaternion that is not of unit length', async () => {
    const broken = read(moveWith([key(0)]));
    broken.nodes[0].rotation[3] = 2;
    expect((await validateString(JSON.stringify(broken))).issues.numErrors).toBeGreaterThan(0);
  });
});

describe('the described move, one turn with a dip', () => {
  const gltf = read(quayMove());

  it('says what made it, what it is and that a glTF camera is rectilinear', () => {
    expect(gltf.asset).toMatchObject({ version: '2.0', generator: 'Fairlead' });
    expect(gltf.nodes[0].name).toBe('Quay, one turn with a dip');
    expect(gltf.asset.extras.note).toContain('A glTF camera is rectilinear');
    expect(gltf.asset.extras.level).toEqual([0, 0, 0, 1]);
  });

  // Yaw goes 0.25° a source frame. Pitch is the clamped cubic through 0, −8, 0 with end rates −8 and 8 a leg: with
  // the middle rate 0 by symmetry, 8 (t³ − t² − t) on the first leg (Hermite form), mirrored on the second.
  it('turns as the film does, at each delivered frame, without a change of sign', () => {
    const turned = quaternions(channel(gltf, 'rotation').values);
    expect(turned).toHaveLength(241); // 1440 / 6 + 1
    const off = turned.map((q, j) => {
      const t = Math.min(j, 240 - j) / 120;
      return apart(q, looking(1.5 * j, 8 * (t ** 3 - t ** 2 - t)));
    });
    expect(Math.max(...off)).toBeLessThan(FLOAT);
    expect(turned.slice(1).filter((q, j) => q.dot(turned[j]) <= 0)).toEqual([]);
    expect(apart(new Quaternion().fromArray(gltf.nodes[0].rotation), looking(0, 0))).toBeLessThan(1e-15);
  });

  it('gives times in delivered seconds, with their range', () => {
    const { times } = channel(gltf, 'rotation');
    expect(times).toEqual(Array.from({ length: 241 }, (_, j) => Math.fround(j / 24)));
    expect(gltf.accessors?.[0]).toMatchObject({ count: 241, min: [0], max: [10] });
  });

  it('has one unmoving field of view, with the film’s scale at the centre', () => {
    const { yfov, aspectRatio } = gltf.cameras[0].perspective;
    expect(yfov).toBeCloseTo(yfovRad(100, 0.2, 9 / 16), 14);
    expect(aspectRatio).toBe(16 / 9);
    expect(gltf.animations?.[0].channels.map(each => each.target.path)).toEqual(['rotation']);
    expect(gltf.extensionsUsed).toBeUndefined();
  });

  it('lists the film’s own field of view and eye point for each frame', () => {
    expect(gltf.asset.extras.fov).toEqual(Array<number>(241).fill(100));
    expect(gltf.asset.extras.eye).toEqual(Array<number>(241).fill(0.2));
  });

  // Matched by height, the tall frame is as high on the tangent plane as the wide one: ρ · 9/16 either way.
  it('frames another deliverable by the side that it matches', () => {
    const tall = read(quayMove(), 'Tall');
    expect(tall.cameras[0].perspective.aspectRatio).toBe(1080 / 1920);
    expect(tall.cameras[0].perspective.yfov).toBeCloseTo(yfovRad(100, 0.2, 9 / 16), 14);
    expect(yfovRad(tall.asset.extras.fov[0], 0.2, 16 / 9)).toBeCloseTo(yfovRad(100, 0.2, 9 / 16), 12);
    expect(() => cameraGltf(quayMove(), 'Square')).toThrow(UnknownDeliverable);
  });
});

it('says the level to which the camera’s world was turned', () => {
  const { level } = fullMove().shot;
  expect(read(fullMove()).asset.extras.level).toEqual(level);
});

describe('a field of view that changes', () => {
  const gltf = read(zoomMove());
  // Even in ζ = ln tan(fov/4) from 100° to 50°, the eye point even from 0 to 0.5 (the maths of the path).
  const zoomed = Array.from({ length: 49 }, (_, j) => {
    const [wide, tele] = [100, 50].map(fov => Math.log(Math.tan(MathUtils.degToRad(fov / 4))));
    const fov = MathUtils.radToDeg(4 * Math.atan(Math.exp(wide + (j / 48) * (tele - wide))));
    return { fov, eye: j / 96 };
  });

  it('goes through KHR_animation_pointer to the camera’s yfov, which readers need not know', () => {
    expect(gltf.extensionsUsed).toEqual(['KHR_animation_pointer']);
    expect(gltf.extensionsRequired).toBeUndefined();
    expect(gltf.animations?.[0].channels[1].target).toEqual({
      path: 'pointer',
      extensions: { KHR_animation_pointer: { pointer: '/cameras/0/perspective/yfov' } },
    });
  });

  it('is the rectilinear one with the same scale at the centre, at each frame', () => {
    const { times, values } = channel(gltf, 'pointer');
    expect(times).toEqual(channel(gltf, 'rotation').times);
    expect(values).toHaveLength(49);
    values.forEach((value, j) => {
      expect(Math.abs(value - yfovRad(zoomed[j].fov, zoomed[j].eye, 9 / 16))).toBeLessThan(FLOAT);
    });
    expect(gltf.cameras[0].perspective.yfov).toBeCloseTo(yfovRad(100, 0, 9 / 16), 14);
  });

  it('is listed as the film has it', () => {
    gltf.asset.extras.fov.forEach((fov, j) => expect(fov).toBeCloseTo(zoomed[j].fov, 10));
    gltf.asset.extras.eye.forEach((eye, j) => expect(eye).toBeCloseTo(zoomed[j].eye, 12));
  });
});

/** three.js' reading of a rotation channel: slerp along the shortest path between 32-bit quaternions. */
function readerOf(gltf: Gltf): (seconds: number) => Quaternion {
  const { times, values } = channel(gltf, 'rotation');
  const [at, rotations] = [times, values].map(numbers => new Float32Array(numbers));
  const interpolant = new QuaternionLinearInterpolant(at, rotations, 4);
  return seconds => new Quaternion().fromArray(interpolant.evaluate(seconds));
}

/** Delivered seconds of a source frame of `arcMove`. */
const secondsOf = (frame: number) => (frame - 20) / (24 * 2.5);

describe('arcs with linear ease, without whole turns, of one field of view and eye point', () => {
  const gltf = read(arcMove(arcKeys));

  it('have poses at the film’s ends and at the keys between alone', () => {
    const frames = [20, 50, 125, 200, 230];
    expect(channel(gltf, 'rotation').times).toEqual(frames.map(frame => Math.fround(secondsOf(frame))));
    expect(gltf.asset.extras.fov).toHaveLength(85); // 210 / 2.5 + 1
  });

  // Truth: three.js' slerp, in doubles, of its quaternions of the keys; after the last key the pose stands. And so the
  // poses that everything else is made from.
  it('are met at all times between, the cut leg and the standing end too', () => {
    const at = readerOf(gltf);
    const poses = compileMove(arcMove(arcKeys));
    const built = arcKeys.map(({ yaw, pitch, roll }) => looking(yaw, pitch, roll));
    for (let frame = 20; frame <= 230; frame += 0.625) {
      const leg = Math.min(arcKeys.filter(each => each.frame <= frame).length - 1, 2);
      const [from, to] = [arcKeys[leg].frame, arcKeys[leg + 1].frame];
      const share = Math.min((frame - from) / (to - from), 1);
      const truth = new Quaternion().slerpQuaternions(built[leg], built[leg + 1], share);
      expect(apart(at(secondsOf(frame)), truth)).toBeLessThan(1e-6);
      expect(apart(at(secondsOf(frame)), new Quaternion().fromArray(poses.poseAt([], frame)))).toBeLessThan(
        1e-6,
      );
    }
  });

  // Half a turn of yaw is half a turn of the camera, whatever the pitches: a · b = 0, and the numbers' sign decides
  // which way round. The slerp of a and b as they are built is then a cos(u·90°) + b sin(u·90°).
  it.each([0, 7, 30, 77, 123, 150, 200, 301])(
    'go the way their numbers say at half a turn, from yaw %d',
    yaw => {
      for (const way of [180, -180]) {
        const at = readerOf(
          read(
            arcMove([
              key(20, { yaw, pitch: 20, roll: 35 }),
              key(220, { yaw: yaw + way, pitch: -47, roll: 35 }),
            ]),
          ),
        );
        const [a, b] = [looking(yaw, 20, 35), looking(yaw + way, -47, 35)].map(q => q.toArray());
        for (const frame of [50, 99, 121, 150, 219]) {
          const turn = ((frame - 20) / 200) * (Math.PI / 2);
          const truth = a.map((part, i) => part * Math.cos(turn) + b[i] * Math.sin(turn));
          expect(apart(at(secondsOf(frame)), new Quaternion().fromArray(truth))).toBeLessThan(1e-6);
        }
      }
    },
  );

  it('have a pose half-way on a leg of more than 170° too', () => {
    const move = arcMove([key(0), key(100, { yaw: 171 }), key(200, { yaw: 2 })]);
    const seconds = [20, 50, 100, 200, 230].map(frame => Math.fround(secondsOf(frame)));
    expect(channel(read(move), 'rotation').times).toEqual(seconds);
  });

  it('stand before the first key and when there is but one', () => {
    const move = arcMove([key(100, { yaw: 40, pitch: 10 }), key(120, { yaw: 60, pitch: 10 })]);
    const frames = [20, 100, 120, 230];
    const seconds = frames.map(frame => Math.fround(secondsOf(frame)));
    expect(channel(read(move), 'rotation').times).toEqual(seconds);
    expect(apart(readerOf(read(move))(secondsOf(60)), looking(40, 10))).toBeLessThan(1e-6);
    const lone = read(arcMove([key(240, { yaw: 40 })]));
    expect(channel(lone, 'rotation').times).toEqual([0, Math.fround(secondsOf(230))]);
    quaternions(channel(lone, 'rotation').values).forEach(q =>
      expect(apart(q, looking(40, 0))).toBeLessThan(1e-7),
    );
  });

  const [first, second, ...rest] = arcKeys;
  it.each<[string, MoveDocument]>([
    ['with another ease', arcMove(arcKeys, 'ease-in')],
    ['held', arcMove(arcKeys, 'hold')],
    ['on level legs', arcMove(arcKeys, 'linear', 'level')],
    ['with a whole turn of yaw', arcMove([first, { ...second, yaw: 280 }, ...rest])],
    ['with a whole turn of roll', arcMove([first, { ...second, roll: 280 }, ...rest])],
    ['zooming', arcMove([first, { ...second, fov: 91 }, ...rest])],
    ['with a moving eye point', arcMove([first, { ...second, eye: 0.1 }, ...rest])],
  ])('have a pose for each frame where they are %s', (_what, move) => {
    expect(channel(read(move), 'rotation').times).toHaveLength(85);
  });
});

describe('a film of one frame', () => {
  it('is a camera without animation', () => {
    const gltf = read(moveWith([key(0, { yaw: 30, pitch: 20, roll: -10, fov: 60 })]));
    expect(gltf.animations).toBeUndefined();
    expect(gltf.buffers).toBeUndefined();
    expect(apart(new Quaternion().fromArray(gltf.nodes[0].rotation), looking(30, 20, -10))).toBeLessThan(
      1e-15,
    );
    expect(gltf.cameras[0].perspective.yfov).toBeCloseTo(yfovRad(60, 0, 9 / 16), 14);
    expect(gltf.asset.extras.fov).toHaveLength(1);
  });

  it('shows its own frame, not the first key', () => {
    const move = moveWith(joined([key(0), key(100, { yaw: 50 })], { path: 'level', ease: 'linear' }));
    const gltf = read({ ...move, shot: { ...move.shot, from: 40, to: 40 } });
    expect(gltf.animations).toBeUndefined();
    expect(apart(new Quaternion().fromArray(gltf.nodes[0].rotation), looking(20, 0))).toBeLessThan(1e-15);
  });
});

describe('times of long films', () => {
  const rises = (times: number[]) => times.every((time, i) => i === 0 || time > times[i - 1]);

  it('rise through ten minutes at 60 frames a second, each within half a step of 32-bit floats', () => {
    const move = moveWith(joined([key(0), key(35_999, { yaw: 90 })], { path: 'level', ease: 'linear' }));
    const { times } = channel(
      read({ ...move, shot: { ...move.shot, rate: { num: 60, den: 1 } } }),
      'rotation',
    );
    expect(times).toHaveLength(36_000);
    expect(rises(times)).toBe(true);
    // From 512 to 1024 the step is 2⁻¹⁴.
    expect(Math.max(...times.map((time, j) => Math.abs(time - j / 60)))).toBeLessThanOrEqual(2 ** -15);
  });

  // Ten steps of 1 / 300,000 s at 33.3 s, where 32-bit floats are 2⁻¹⁸ s apart, do not fit: two would be one.
  it('go to a pose for each frame where those of keys would fall together', () => {
    const close = Array.from({ length: 10 }, (_, i) => key(9_989_990 + i, { yaw: i }));
    const move = moveWith(joined([...close, key(9_990_000, { yaw: 10 })], { path: 'arc', ease: 'linear' }));
    const shot = { ...move.shot, rate: { num: 30, den: 1 }, speed: 10_000 };
    const { times } = channel(read({ ...move, shot }), 'rotation');
    expect(times).toHaveLength(1000); // 9,990,000 / 10,000 + 1
    expect(rises(times)).toBe(true);
  });

  it.each([
    [MOST_GLTF_FRAMES + 1, 1, '4194305'],
    [10_000_000, 0.01, '999999901'], // 9,999,999 / 0.01 + 1
  ])('%d source frames at speed %d are refused, with their number', (frames, speed, said) => {
    const move = moveWith([key(0)]);
    const long = { ...move, shot: { ...move.shot, frames, speed } };
    expect(() => cameraGltf(long)).toThrow(FilmTooLong);
    expect(() => cameraGltf(long)).toThrow(`The film has ${said} frames`);
  });
});

// Truth: Node's Buffer.
it('writes bytes of every remainder by three, and of many pieces, as base64', () => {
  for (const length of [0, 1, 2, 3, 4, 5, 12_287, 12_288, 12_289, 40_000]) {
    const bytes = Uint8Array.from({ length }, (_, i) => (i * 167 + 13) & 255);
    expect(base64FromBytes(bytes)).toBe(Buffer.from(bytes).toString('base64'));
  }
});
