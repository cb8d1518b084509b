import { type Numbers } from '#shared/conventions';
import {
  clampFovRad,
  FOV_ALWAYS_DRAWN_RAD,
  FOV_MIN_RAD,
  fovFromZoom,
} from '#shared/projection/field-of-view';
import { COEFFICIENTS, REACH, STEPS_PER_UNIT, zoomTable } from '#shared/projection/zoom-table';
import * as at from './leg-table';

const zooms = zoomTable();

/**
 * Field of view and eye point along one row of a leg table, kept within their limits.
 *
 * @param out receives the horizontal field of view, radians, in its fifth place and the eye point in its sixth
 * @param row where the leg's row begins in `table`
 * @param place holds the ease's u, or the share of time on fair legs, 0…1 (see `orientationOnLeg`)
 */
export function lensOnLeg(
  out: Numbers,
  table: Readonly<Float64Array>,
  row: number,
  flags: number,
  place: Readonly<Float64Array>,
): void {
  const s = place[0];
  const eye =
    ((table[row + at.EYE + 3] * s + table[row + at.EYE + 2]) * s + table[row + at.EYE + 1]) * s +
    table[row + at.EYE];
  out[5] = eye < 0 ? 0 : eye > 1 ? 1 : eye;
  out[4] = table[row + at.FOV];
  if ((flags & at.ZOOMS) === 0 || s === 0) return;
  const z = row + at.ZOOM;
  const zoom = ((table[z + 3] * s + table[z + 2]) * s + table[z + 1]) * s + table[z];
  if (zoom > -REACH && zoom < REACH) {
    const step = (zoom + REACH) * STEPS_PER_UNIT;
    const whole = step | 0;
    const x = (step - whole - 0.5) / STEPS_PER_UNIT;
    const x2 = x * x;
    const n = whole * COEFFICIENTS;
    const c = zooms;
    const low = c[n] + x * c[n + 1] + x2 * (c[n + 2] + x * c[n + 3]);
    const high = c[n + 4] + x * c[n + 5] + x2 * (c[n + 6] + x * c[n + 7]);
    out[4] = low + x2 * x2 * high;
  } else out[4] = fovFromZoom(zoom);
  if (!(out[4] >= FOV_MIN_RAD && out[4] <= FOV_ALWAYS_DRAWN_RAD)) out[4] = clampFovRad(out[4], out[5]);
}
