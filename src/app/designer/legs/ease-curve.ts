import { type Ease } from '#schemas/move';
import { bezierCoefficients, bezierHandles, bezierHeight } from '#shared/path/ease';

const POINTS = 24;

/**
 * The drawn curve of an ease in a box of 100 × 100, time to the right, progress up.
 *
 * @param restBefore, restAfter whether a fair leg begins or ends at rest: then it swings in or out
 * @returns an SVG path
 */
export function easePath(ease: Ease, restBefore: boolean, restAfter: boolean): string {
  if (ease === 'hold') return 'M0 100H100V0';
  const handles = ease === 'fair' ? fairHandles(restBefore, restAfter) : bezierHandles(ease);
  if (!handles) return 'M0 100L100 0';
  const table = Float64Array.from(bezierCoefficients(handles));
  const points = Array.from({ length: POINTS + 1 }, (_, i) => {
    const p = i / POINTS;
    const x = ((table[0] * p + table[1]) * p + table[2]) * p;
    return `${(100 * x).toFixed(1)} ${(100 - 100 * bezierHeight(table, 0, p)).toFixed(1)}`;
  });
  return `M${points.join('L')}`;
}

/** A fair leg is a cubic in time: x1 = 1/3, x2 = 2/3; at rest its end is flat. The slope at a shared key is its own. */
function fairHandles(restBefore: boolean, restAfter: boolean): readonly [number, number, number, number] {
  return [1 / 3, restBefore ? 0 : 1 / 3, 2 / 3, restAfter ? 1 : 2 / 3];
}
