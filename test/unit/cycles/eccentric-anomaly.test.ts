import { describe, expect, it } from 'vitest';
import { eccentricAnomaly } from '../../../src/cycles/index.js';
import { NoConvergenceError } from '../../../src/math/index.js';

describe('the eccentric anomaly', () => {
  it('is the mean anomaly on a circle, and at the apsides of every ellipse', () => {
    expect(eccentricAnomaly(1.25, 0)).toBe(1.25);
    for (const eccentricity of [0, 0.2, 0.9, 0.999999]) {
      expect(eccentricAnomaly(0, eccentricity)).toBe(0);
      expect(eccentricAnomaly(Math.PI, eccentricity)).toBeCloseTo(Math.PI, 12);
    }
  });

  it.each([
    [1, NaN],
    [NaN, 0.5],
    [Infinity, 0.5],
  ])('of M = %f and e = %f does not exist, and the search for it ends', (meanAnomaly, eccentricity) => {
    expect(() => eccentricAnomaly(meanAnomaly, eccentricity)).toThrow(NoConvergenceError);
    expect(() => eccentricAnomaly(meanAnomaly, eccentricity)).toThrow(
      /the anomaly must lie in \(−π, π\], the eccentricity in \[0, 1\)/,
    );
  });
});
