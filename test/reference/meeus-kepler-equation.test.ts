import { describe, expect, it } from 'vitest';
import { eccentricAnomaly } from '../../src/cycles/index.js';
import { RADIANS_PER_DEGREE, degreesFromRadians } from '../../src/math/index.js';

/**
 * Judge: J. Meeus, Astronomical Algorithms, 2nd ed. (1998), ch. 30, from memory. Tolerance: half a unit of the last
 * digit printed.
 */
describe("Kepler's equation", () => {
  it('example 30.a: e = 0.1 and M = 5° give E = 5.554589°', () => {
    expect(degreesFromRadians(eccentricAnomaly(5 * RADIANS_PER_DEGREE, 0.1))).toBeCloseTo(5.554589, 6);
  });

  it('the hard case e = 0.99 and M = 0.2 gives E = 1.066997365282', () => {
    expect(eccentricAnomaly(0.2, 0.99)).toBeCloseTo(1.066997365282, 12);
  });
});
