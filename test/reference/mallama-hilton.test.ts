import { describe, expect, it } from 'vitest';
import {
  jupiterMagnitude,
  marsMagnitude,
  mercuryMagnitude,
  neptuneMagnitude,
  saturnMagnitude,
  uranusMagnitude,
  venusMagnitude,
} from '../../src/forecast/circumstances/magnitude.js';

/**
 * The test magnitudes that Mallama & Hilton publish beside their paper (Astronomy and Computing 25 (2018) 10;
 * Ap_Mag_Input_V3.txt), read in the tests of general libraries. They are printed to 0.001, so 0.0006 allows for the
 * rounding and for the ten digits of the inputs.
 */
const PRINTED = 0.0006;

const light = (sunDistanceAu: number, earthDistanceAu: number, phaseDeg: number) => ({
  sunDistanceAu,
  earthDistanceAu,
  phaseDeg,
});
const expectWithin = (got: number | null, expected: number, tolerance: number) => {
  expect(got).not.toBeNull();
  expect(Math.abs(got! - expected)).toBeLessThan(tolerance);
};

describe('the published test magnitudes of Mallama & Hilton', () => {
  it.each([
    [0.310295423552, 1.32182643625754, 1.1677, -2.477],
    [0.413629222334, 0.92644808718613, 90.1662, 0.181],
    [0.448947624811, 0.56004973217883, 178.7284, 7.167],
  ])('Mercury at r %f, Δ %f, phase %f°: %f', (r, delta, phase, expected) => {
    expectWithin(mercuryMagnitude(light(r, delta, phase)), expected, PRINTED);
  });

  it.each([
    [0.722722540169, 1.71607489554051, 1.3232, -3.917],
    [0.721480714554, 0.37762511206278, 124.1348, -4.916],
    // The last is in the second range, where sunlight comes through the air.
    [0.726166592736, 0.28889582420642, 179.1845, -3.09],
  ])('Venus at r %f, Δ %f, phase %f°: %f', (r, delta, phase, expected) => {
    expectWithin(venusMagnitude(light(r, delta, phase)), expected, PRINTED);
  });

  /**
   * Ours is the mean over a rotation; the published one has the face that was turned to us, whose correction is
   * table 6 of Mallama (2007) at the mean of the two printed longitudes: 330.015°, 70.75°, 305.305° (which the third
   * row averages across 180°). Solar longitude: the printed heliocentric one − 85°. The seasons are interpolated
   * differently (0.002 at the first two), and the third row tests the second range of phase at a faint 9.0.
   */
  it.each([
    [1.381191244505, 0.37274381097911, 4.8948, 334.4996, 0.022, -2.862, 0.002],
    [1.664150453905, 2.5899516451846, 11.5877, 147.3485, -0.0126, 1.788, 0.003],
    [1.591952180003, 3.85882552272013, 167.9, 212.8886, 0.043, 8.977, 0.02],
  ])(
    'Mars at r %f, Δ %f, phase %f°, heliocentric longitude %f°',
    (r, delta, phase, longitude, face, expected, tolerance) => {
      expectWithin(marsMagnitude(light(r, delta, phase), longitude - 85) + face, expected, tolerance);
    },
  );

  it.each([
    [5.446231815414, 6.44985867459088, 0.2446, -1.667],
    [4.957681473205, 3.95393078136013, 0.3431, -2.934],
    // As a spacecraft sees it, in the second range.
    [5.227587855371, 5.23501920009381, 147.0989, 0.79],
  ])('Jupiter at r %f, Δ %f, phase %f°: %f', (r, delta, phase, expected) => {
    expectWithin(jupiterMagnitude(light(r, delta, phase)), expected, PRINTED);
  });

  it('Saturn with its rings wide open: −0.552', () => {
    const tilt = { sunLatitudeDeg: -26.2249, earthLatitudeDeg: -26.3323 };
    expectWithin(saturnMagnitude(light(9.014989659493, 8.03160470546889, 0.1055), tilt), -0.552, PRINTED);
  });

  it.each([
    [18.321003215845, 17.3229728525108, 0.041, -20.29, -20.28, 5.381],
    [20.096361095266, 21.0888470145276, 0.0568, 1.02, 0.97, 6.025],
    [19.38003071775, 11.1884243801383, 161.7728, -71.16, 55.11, 8.318],
  ])(
    'Uranus at r %f, Δ %f, phase %f°, latitudes %f° and %f°: %f',
    (r, delta, phase, sun, earth, expected) => {
      const tilt = { sunLatitudeDeg: sun, earthLatitudeDeg: earth };
      expectWithin(uranusMagnitude(light(r, delta, phase), tilt), expected, PRINTED);
    },
  );

  it('Neptune in 2009: 7.701', () => {
    expectWithin(neptuneMagnitude(light(30.028181709541, 29.0158521665744, 0.0381), 2009.6), 7.701, PRINTED);
  });
});
