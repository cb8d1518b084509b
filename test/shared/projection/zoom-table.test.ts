import fc from 'fast-check';

import { COEFFICIENTS, REACH, STEPS_PER_UNIT, zoomTable } from '#shared/projection/zoom-table';

/** Truth: the definition, 4 atan(e^ζ), by Math; ζ + REACH alone rounds by up to 9e-16. */
it('gives the field of view of every zoom to the last digits', () => {
  const table = zoomTable();
  fc.assert(
    fc.property(fc.double({ min: -REACH, max: REACH, noNaN: true, maxExcluded: true }), zoom => {
      const step = Math.floor((zoom + REACH) * STEPS_PER_UNIT);
      const x = zoom + REACH - (step + 0.5) / STEPS_PER_UNIT;
      const row = table.subarray(step * COEFFICIENTS, (step + 1) * COEFFICIENTS);
      const fov = row.reduceRight((sum, coefficient) => sum * x + coefficient, 0);
      expect(Math.abs(fov - 4 * Math.atan(Math.exp(zoom)))).toBeLessThan(6e-15);
    }),
    { numRuns: 3000 },
  );
});
