import { PerspectiveCamera, Quaternion, Raycaster, Sphere, Vector2, Vector3 } from 'three';

import { maxFovRad } from '#shared/projection/field-of-view';
import { sourceOrientation } from '#shared/render/camera';
import { type Picture, type View } from '#shared/render/picture';
import { referenceFrame } from '#shared/render/reference';
import { quatFromYawPitchRoll } from '#shared/rotation/yaw-pitch-roll';
import { jsonFixture } from '../../support/fixtures';
import { renderPoses } from '../../support/render-poses';

const RAD = Math.PI / 180;

const orientation = (yawDeg: number, pitchDeg: number, rollDeg: number): Float64Array => {
  const out = new Float64Array(4);
  quatFromYawPitchRoll(out, yawDeg * RAD, pitchDeg * RAD, rollDeg * RAD);
  return out;
};

/**
 * A panorama whose red, green and blue are the direction's x, y, z, −1…1 spread over 0…255. Written from the convention's
 * words alone: longitude 0 in the middle growing to the right, latitude growing upwards.
 */
function directionCoded(width: number): Picture {
  const height = width / 2;
  const rgba = new Uint8Array(4 * width * height);
  for (let row = 0; row < height; row++) {
    const latitude = (0.5 - (row + 0.5) / height) * Math.PI;
    for (let column = 0; column < width; column++) {
      const longitude = ((column + 0.5) / width - 0.5) * 2 * Math.PI;
      const direction = [
        Math.cos(latitude) * Math.sin(longitude),
        Math.sin(latitude),
        -Math.cos(latitude) * Math.cos(longitude),
      ];
      direction.forEach((part, i) => (rgba[4 * (row * width + column) + i] = Math.round((part + 1) * 127.5)));
      rgba[4 * (row * width + column) + 3] = 255;
    }
  }
  return { width, height, rgba };
}

const coded = directionCoded(2048);

/** The direction that a pixel of a framed picture of the coded panorama shows, to about half a step of 1/127.5. */
function shown(frame: Float64Array, width: number, column: number, row: number): Vector3 {
  const at = 4 * (row * width + column);
  return new Vector3(frame[at], frame[at + 1], frame[at + 2]).divideScalar(127.5).subScalar(1);
}

/** Rounding to bytes: half a step in each of three channels. */
const CODE_NOISE = (Math.sqrt(3) * 0.5) / 127.5;

interface V360View {
  readonly d: 0 | 1;
  readonly W: number;
  readonly H: number;
  readonly yaw: number;
  readonly pitch: number;
  readonly roll: number;
  readonly hfov: number;
  readonly px: readonly (readonly [number, number, number, number, number])[];
}

describe('the double-precision renderer', () => {
  // Truth: FFmpeg 5.1 v360, flat and sg, on a panorama coded likewise; its decoding noise is ≤ 0.02°.
  it('looks where FFmpeg looks, pixel by pixel, at eye points 0 and 1', () => {
    for (const seen of jsonFixture<{ views: V360View[] }>('v360-reference.json').views.slice(0, 40)) {
      const view: View = {
        orientation: orientation(seen.yaw, seen.pitch, seen.roll),
        fovRad: seen.hfov * RAD,
        eye: seen.d,
        width: seen.W,
        height: seen.H,
      };
      const frame = referenceFrame(coded, view);
      for (const [column, row, x, y, z] of seen.px) {
        const off = shown(frame, seen.W, column, row).distanceTo(new Vector3(x, y, z));
        expect(off).toBeLessThan(CODE_NOISE + 0.02 * RAD);
      }
    }
  });

  // Truth: a three.js camera behind the centre of a unit sphere, at z = d, its rays met with the sphere's far side.
  it('looks where a camera behind the centre of a sphere looks, at every eye point', () => {
    for (const view of renderPoses(48, 32)) {
      const frame = referenceFrame(coded, view);
      const halfWidth = ((1 + view.eye) * Math.sin(view.fovRad / 2)) / (view.eye + Math.cos(view.fovRad / 2));
      const fovDown = 2 * Math.atan(((halfWidth / (1 + view.eye)) * view.height) / view.width);
      const camera = new PerspectiveCamera(fovDown / RAD, view.width / view.height, 1e-6, 10);
      camera.position.set(0, 0, view.eye);
      camera.updateMatrixWorld();
      const turn = new Quaternion(...view.orientation);
      const rays = new Raycaster();
      for (const [column, row] of [
        [0, 0],
        [47, 3],
        [20, 31],
        [24, 16],
        [7, 19],
      ]) {
        rays.setFromCamera(new Vector2((2 * (column + 0.5)) / 48 - 1, 1 - (2 * (row + 0.5)) / 32), camera);
        const hit = new Vector3();
        // From inside a sphere three.js gives the far side, which is the one seen.
        expect(rays.ray.intersectSphere(new Sphere(new Vector3(), 1 + 1e-9), hit)).not.toBeNull();
        const off = shown(frame, 48, column, row).distanceTo(hit.applyQuaternion(turn));
        expect([view.name, column, row, off < CODE_NOISE + 1e-3]).toEqual([view.name, column, row, true]);
      }
    }
  });

  const square = { fovRad: 90 * RAD, eye: 0, width: 65, height: 65 };
  const seenWith = (yaw: number, pitch: number, roll: number, column: number, row: number): Vector3 =>
    shown(referenceFrame(coded, { ...square, orientation: orientation(yaw, pitch, roll) }), 65, column, row);

  it('looks right with yaw, up with pitch, and leans the horizon against a clockwise roll', () => {
    // Yaw 20° looks at longitude 20°, and what is right in the picture is at a larger longitude.
    const ahead = seenWith(20, 0, 0, 32, 32);
    expect(Math.atan2(ahead.x, -ahead.z) / RAD).toBeCloseTo(20, 0);
    const right = seenWith(20, 0, 0, 60, 32);
    expect(Math.atan2(right.x, -right.z)).toBeGreaterThan(Math.atan2(ahead.x, -ahead.z));
    // Pitch 20° looks at latitude 20°, and what is above in the picture is higher.
    expect(Math.asin(seenWith(0, 20, 0, 32, 32).y) / RAD).toBeCloseTo(20, 0);
    expect(seenWith(0, 20, 0, 32, 5).y).toBeGreaterThan(seenWith(0, 20, 0, 32, 60).y);
    // Rolled clockwise, the camera's right side dips: the picture's right shows what lies below the horizon.
    expect(seenWith(0, 0, 20, 64, 32).y).toBeLessThan(-0.1);
    expect(seenWith(0, 0, 20, 0, 32).y).toBeGreaterThan(0.1);
  });

  it('takes the level rotation out of the picture: a level shot looks at the horizon that was marked', () => {
    // The source leans by 10° of roll; levelling turns it back, so a level camera sees source directions 10° rolled.
    const level = orientation(0, 0, -10);
    const sampled = sourceOrientation(new Float64Array(4), level, orientation(0, 0, 0));
    const right = shown(referenceFrame(coded, { ...square, orientation: sampled }), 65, 64, 32);
    const expected = new Vector3(1, 0, -1).normalize().applyQuaternion(new Quaternion(...level).invert());
    expect(right.distanceTo(expected)).toBeLessThan(0.02);
  });

  it.each([0, 0.2, 0.5, 1])('gives finite colours out to the limits of eye point %d', eye => {
    for (const fovRad of [10 * RAD, maxFovRad(eye)]) {
      const frame = referenceFrame(coded, { ...square, fovRad, eye, orientation: [0, 0, 0, 1] });
      expect(frame.every(value => value >= 0 && value <= 255.000001)).toBe(true);
    }
  });
});
