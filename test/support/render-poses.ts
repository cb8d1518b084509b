import { maxFovRad } from '#shared/projection/field-of-view';
import { quatFromYawPitchRoll } from '#shared/rotation/yaw-pitch-roll';
import { type View } from '#shared/render/picture';

const RAD = Math.PI / 180;

/** Six orientations: the ±180° column in the middle, both poles, a pole near an edge, and two ordinary ones. */
const LOOKS: readonly (readonly [name: string, yaw: number, pitch: number, roll: number])[] = [
  ['seam', 180, 0, 0],
  ['zenith', 20, 90, 0],
  ['nadir', -130, -88.7, 15],
  ['pole at an edge', 75, 55, -30],
  ['ordinary', 33.3, -12.5, 4],
  ['seam, rolled', -171, 21, 97],
];

const EYES = [0, 0.2, 0.5, 1];

export interface NamedView extends View {
  readonly name: string;
}

/**
 * 24 poses: each of six orientations at each of the eye points 0, 0.2, 0.5, 1; fields of view from 20° to each eye
 * point's limit, every eye point getting both ends.
 */
export function renderPoses(width: number, height: number): NamedView[] {
  return EYES.flatMap(eye =>
    LOOKS.map(([name, yaw, pitch, roll], i) => {
      // The order is shifted with the eye point, so that every orientation sees narrow and wide views.
      const share = ((i * 2 + Math.round(eye * 5)) % 6) / 5;
      const fovRad = 20 * RAD + share * (maxFovRad(eye) - 20 * RAD);
      return {
        name: `${name}, eye ${eye}, fov ${(fovRad / RAD).toFixed(0)}°`,
        orientation: quatFromYawPitchRoll([0, 0, 0, 1], yaw * RAD, pitch * RAD, roll * RAD),
        fovRad,
        eye,
        width,
        height,
      };
    }),
  );
}
