import { DEG_PER_RAD, RAD_PER_DEG } from '#shared/conventions';
import { directionAtPicture, radiusAtAngle } from '#shared/projection/general-perspective';
import { rotate } from '#shared/rotation/quaternion';
import { quatFromYawPitchRoll } from '#shared/rotation/yaw-pitch-roll';
import { jsonFixture } from '../../support/fixtures';

/** One view of v360-reference.json: the world directions seen at some pixels. */
interface V360View {
  readonly d: number;
  readonly W: number;
  readonly H: number;
  readonly yaw: number;
  readonly pitch: number;
  readonly roll: number;
  readonly hfov: number;
  readonly v360: string;
  readonly px: readonly [number, number, number, number, number][];
}

const { views } = jsonFixture<{ views: V360View[] }>('v360-reference.json');

// Truth: FFmpeg 5.1's v360 filter on a direction-coded panorama; decoding it leaves up to 0.02° (test/fixtures/README.md).
it.each(views.map(view => [view.v360, view] as const))('sees where FFmpeg sees: %s', (_name, view) => {
  const q = new Float64Array(4);
  quatFromYawPitchRoll(q, view.yaw * RAD_PER_DEG, view.pitch * RAD_PER_DEG, view.roll * RAD_PER_DEG);
  const half = radiusAtAngle((view.hfov * RAD_PER_DEG) / 2, view.d);
  const direction = new Float64Array(3);
  for (const [column, row, ...world] of view.px) {
    const x = ((column + 0.5) / view.W) * 2 - 1;
    const y = (1 - ((row + 0.5) / view.H) * 2) * (view.H / view.W);
    directionAtPicture(direction, x * half, y * half, view.d);
    rotate(direction, q, direction);
    const apart = Math.hypot(...world.map((part, i) => part / Math.hypot(...world) - direction[i]));
    expect(apart * DEG_PER_RAD).toBeLessThan(0.02);
  }
});
