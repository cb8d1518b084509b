import { geoCircle, geoGnomonic } from 'd3-geo';

import {
  centredBox,
  deliverableBox,
  greatCirclePath,
  levelLinePath,
  SAFE_ACTION,
  SAFE_TITLE,
  seamPath,
} from '../../../src/app/designer/framed-view/overlays';
import { quatFromYawPitchRoll } from '#shared/rotation/yaw-pitch-roll';

const RAD = Math.PI / 180;

function pose(yaw: number, pitch: number, roll: number, fov = 90, eye = 0): Float64Array {
  const q = quatFromYawPitchRoll(new Float64Array(4), yaw * RAD, pitch * RAD, roll * RAD);
  return Float64Array.of(q[0], q[1], q[2], q[3], fov * RAD, eye);
}

const points = (path: string): [number, number][] =>
  [...path.matchAll(/[ML](-?[\d.]+) (-?[\d.]+)/g)].map(([, x, y]) => [Number(x), Number(y)]);

describe('the level line', () => {
  // Truth: arithmetic: looking up by θ, the horizon lies tan θ below the middle, in half widths of tan 45° = 1.
  it('lies level below the middle when the camera looks up', () => {
    const ys = points(levelLinePath(pose(33, 20, 0)))
      .filter(([x]) => Math.abs(x) < 1)
      .map(([, y]) => y);
    expect(ys.length).toBeGreaterThan(10);
    for (const y of ys) expect(y).toBeCloseTo(Math.tan(20 * RAD), 3);
  });

  it('leans against the camera’s roll', () => {
    // Clockwise by 10° as the operator sees it: the picture's horizon falls from right to left.
    const line = points(levelLinePath(pose(0, 0, 10))).filter(([x]) => Math.abs(x) < 1);
    for (const [x, y] of line) expect(y).toBeCloseTo(-x * Math.tan(10 * RAD), 3);
  });

  it('is round the frame at eye point 1 when it looks straight down, and out of sight at 0', () => {
    // Truth: stereographic: 90° off the axis falls at r = 2 tan 45° = 2; the frame's half width is 2 tan(330°/4) = 15.2.
    const circle = points(levelLinePath(pose(0, -90, 0, 330, 1)));
    expect(circle.length).toBeGreaterThan(170);
    for (const [x, y] of circle) expect(Math.hypot(x, y)).toBeCloseTo(2 / (2 * Math.tan(82.5 * RAD)), 3);
    expect(levelLinePath(pose(0, -90, 0))).toBe('');
  });
});

// Truth: d3-geo's gnomonic projection of the same great circle, turned the same way.
it('a great circle falls where d3-geo draws it', () => {
  const project = geoGnomonic().rotate([-40, -25, 0]).scale(1).translate([0, 0]).clipAngle(80);
  const { coordinates } = geoCircle().center([70, 10]).radius(90).precision(1)();
  const truth = coordinates[0].map(at => project([at[0], at[1]])).filter(at => at !== null);
  const [lon, lat] = [70 * RAD, 10 * RAD];
  const normal = [Math.cos(lat) * Math.sin(lon), Math.sin(lat), -Math.cos(lat) * Math.cos(lon)];
  const line = points(greatCirclePath(normal, pose(40, 25, 0, 120)));
  const half = Math.tan(60 * RAD);
  expect(line.length).toBeGreaterThan(20);
  for (const [x, y] of line.filter(([a, b]) => Math.abs(a) < 1 && Math.abs(b) < 1)) {
    const nearest = Math.min(...truth.map(at => Math.hypot(at[0] / half - x, at[1] / half - y)));
    expect(nearest).toBeLessThan(0.03);
  }
});

it('the seam is upright in the middle when the camera looks at it', () => {
  for (const [x, y] of points(seamPath(90, [0, 0, 0, 1], pose(90, 0, 0)))) {
    expect(x).toBeCloseTo(0, 4);
    expect(Number.isFinite(y)).toBe(true);
  }
  // A level rotation of a quarter turn about +Y takes source +X (yaw 90) to straight ahead.
  const level = [0, Math.SQRT1_2, 0, Math.SQRT1_2];
  for (const [x] of points(seamPath(90, level, pose(0, 0, 0)))) expect(x).toBeCloseTo(0, 4);
});

// Truth: SMPTE ST 2046-1:2009: 93 % and 90 % of width and height.
it('safe areas are 93 % and 90 % of the frame', () => {
  expect([SAFE_ACTION, SAFE_TITLE]).toEqual([0.93, 0.9]);
  const box = centredBox(9 / 16, SAFE_ACTION);
  expect(box.width / 2).toBeCloseTo(0.93, 12);
  expect(box.height / (2 * (9 / 16))).toBeCloseTo(0.93, 12);
});

// Truth: arithmetic: matched by height, 9:16 in 16:9 is 81/256 of its width, and as high.
it('another deliverable lies where it takes its picture from', () => {
  const wide = { name: 'Wide', width: 1920, height: 1080 };
  const box = deliverableBox(wide, { name: 'Tall', width: 1080, height: 1920, match: 'height' });
  expect(box.width).toBeCloseTo(2 * (81 / 256), 12);
  expect(box.height).toBeCloseTo(2 * (9 / 16), 12);
});
