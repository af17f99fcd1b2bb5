import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nearRepeats, synodicPeriodDays } from '../../src/cycles/index.js';

const periods = fc.double({ min: 1, max: 100_000, noNaN: true });

describe('periods', () => {
  it('turn once more or once less in a synodic period', () => {
    fc.assert(
      fc.property(periods, periods, (a, b) => {
        fc.pre(Math.abs(a - b) > 1e-3 * a);
        const synodic = synodicPeriodDays(a, b);
        expect(Math.abs(synodic / a - synodic / b)).toBeCloseTo(1, 6);
        expect(synodic).toBe(synodicPeriodDays(b, a));
      }),
    );
  });

  it('near-repeat better than any smaller number of cycles does', () => {
    const year = 365.2425;
    fc.assert(
      fc.property(fc.double({ min: 100, max: 3000, noNaN: true }), (period) => {
        for (const { cycles, misfitDays } of nearRepeats(period, year, 100)) {
          for (let fewer = 1; fewer < cycles; fewer++) {
            const miss = Math.abs(fewer * period - Math.round((fewer * period) / year) * year);
            // Two misfits may be equal in truth; 1e-6 day covers the rounding of either.
            expect(miss).toBeGreaterThan(Math.abs(misfitDays) - 1e-6);
          }
        }
      }),
    );
  });
});
