import { geoGnomonicRaw, geoStereographicRaw } from 'd3-geo';
import { geoSatelliteRaw } from 'd3-geo-projection';
import fc from 'fast-check';

import { DEG_PER_RAD, RAD_PER_DEG } from '#shared/conventions';
import { directionFromLonLat } from '#shared/projection/equirectangular';
import {
  angleAtRadius,
  directionAtPicture,
  pictureOfDirection,
  radiusAtAngle,
} from '#shared/projection/general-perspective';
import { maxFovRad } from '#shared/projection/field-of-view';
import { jsonFixture } from '../../support/fixtures';

interface ProjectionReference {
  readonly d: Readonly<Record<string, { readonly values: readonly [number, number, number, number][] }>>;
}

/** Where a longitude and latitude, degrees, fall on the tangent plane. */
function picture(lonDeg: number, latDeg: number, eye: number): Float64Array {
  const out = new Float64Array(2);
  const direction = new Float64Array(3);
  pictureOfDirection(out, directionFromLonLat(direction, lonDeg * RAD_PER_DEG, latDeg * RAD_PER_DEG), eye);
  return out;
}

/** Longitudes and latitudes in front of every eye point. */
const ahead = [
  [0, 0],
  [10, 20],
  [-35, 42],
  [60, -30],
  [-75, 5],
  [12, 70],
] as const;

it.each(ahead)('is the gnomonic projection of d3-geo at eye point 0: %d, %d', (lon, lat) => {
  const truth = geoGnomonicRaw(lon * RAD_PER_DEG, lat * RAD_PER_DEG);
  expect([...picture(lon, lat, 0)]).toEqual(truth.map(part => expect.closeTo(part, 12)));
});

// d3's stereographic plane is half as large: it projects onto the plane through the sphere's middle.
it.each(ahead)('is twice the stereographic projection of d3-geo at eye point 1: %d, %d', (lon, lat) => {
  const truth = geoStereographicRaw(lon * RAD_PER_DEG, lat * RAD_PER_DEG).map(part => 2 * part);
  expect([...picture(lon, lat, 1)]).toEqual(truth.map(part => expect.closeTo(part, 12)));
});

// The general perspective of d3-geo-projection, its distance from the centre negative: the eye inside the sphere.
it.each([0.2, 0.5, 0.8])('is the general perspective of d3-geo-projection at eye point %d', eye => {
  const project = geoSatelliteRaw(-eye);
  for (const [lon, lat] of ahead) {
    const truth = project(lon * RAD_PER_DEG, lat * RAD_PER_DEG);
    expect([...picture(lon, lat, eye)]).toEqual(truth.map((part: number) => expect.closeTo(part, 12)));
  }
});

// Truth: test/fixtures/projection-reference.json, checked against d3-geo, PROJ and three.js (test/fixtures/README.md).
describe.each(Object.entries(jsonFixture<ProjectionReference>('projection-reference.json').d))(
  'eye point %s',
  (eye, { values }) => {
    it('agrees with the published values', () => {
      for (const [lon, lat, x, y] of values) {
        expect([...picture(lon, lat, Number(eye))]).toEqual([expect.closeTo(x, 8), expect.closeTo(y, 8)]);
      }
    });
  },
);

const eyes = fc.double({ min: 0, max: 1, noNaN: true });

it('comes back from the picture to the direction, and stays a unit vector', () => {
  fc.assert(
    fc.property(
      eyes,
      fc.double({ min: 0, max: 0.999, noNaN: true }),
      fc.double({ min: 0, max: 6.28, noNaN: true }),
      (eye, share, turn) => {
        const angle = (share * maxFovRad(eye)) / 2;
        const radius = radiusAtAngle(angle, eye);
        expect(angleAtRadius(radius, eye)).toBeCloseTo(angle, 12);
        const direction = new Float64Array(3);
        directionAtPicture(direction, radius * Math.cos(turn), radius * Math.sin(turn), eye);
        expect(Math.hypot(...direction)).toBeCloseTo(1, 13);
        expect(Math.atan2(Math.hypot(direction[0], direction[1]), -direction[2])).toBeCloseTo(angle, 9);
        const back = new Float64Array(2);
        expect(pictureOfDirection(back, direction, eye)).toBe(true);
        expect(Math.hypot(...back)).toBeCloseTo(radius, 9);
      },
    ),
  );
});

// MATHS §2: 170° at d = 0, 193.1° at 0.2, 230° at 0.5; arithmetic of 2·acos(−d) − 10°.
it.each([
  [0, 170],
  [0.2, 193.07],
  [0.5, 230],
  [1, 330],
])('limits the field of view at eye point %d to %d degrees', (eye, degrees) => {
  expect(maxFovRad(eye) * DEG_PER_RAD).toBeCloseTo(degrees, 1);
});
