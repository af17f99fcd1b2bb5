import { describe, expect, it } from 'vitest';
import { librarySource } from '../../src/ephemeris/index.js';
import { bodyCircumstances } from '../../src/forecast/circumstances/index.js';
import type { SkyGeometry } from '../../src/forecast/circumstances/index.js';
import { add } from '../../src/math/index.js';
import { ttFromUtc, utcMillis } from '../../src/time/index.js';
import { librarySky } from '../unit/forecast/circumstances/library-sky.js';

/**
 * Magnitudes of 2021-10-04 0 h UT in the documentation of Skyfield, which follows Mallama & Hilton on DE421 but
 * takes the Sun to be at the barycentre of the solar system. On that footing ours must be the same; with the Sun
 * where it is, Venus differs by 0.03.
 */
const tt = ttFromUtc(utcMillis(Date.UTC(2021, 9, 4)));
const sunAtBarycentre: SkyGeometry = {
  ...librarySky,
  heliocentric: (planet, at) => add(librarySky.heliocentric(planet, at), librarySource.sunFromBarycentre(at)),
};

describe('magnitudes in the documentation of Skyfield', () => {
  /**
   * Printed to 0.001: 0.002 leaves room for the library's places. Uranus is taken at planetographic latitudes here
   * and at planetocentric ones there (0.001).
   */
  it.each([
    ['mercury', 2.393],
    ['venus', -4.278],
    ['jupiter', -2.693],
    ['saturn', 0.508],
    ['uranus', 5.701],
    ['neptune', 7.69],
  ] as const)('%s: %f', (body, expected) => {
    const { magnitude } = bodyCircumstances(body, tt, sunAtBarycentre);
    expect(Math.abs(magnitude! - expected)).toBeLessThan(0.002);
  });

  it('Mars: 1.592, there without its season', () => {
    // Its solar longitude was 108°, where the season makes it brighter by 0.034.
    const { magnitude } = bodyCircumstances('mars', tt, sunAtBarycentre);
    expect(Math.abs(magnitude! + 0.034 - 1.592)).toBeLessThan(0.002);
  });
});
