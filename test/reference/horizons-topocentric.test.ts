import { expect, it } from 'vitest';
import { librarySource } from '../../src/ephemeris/index.js';
import {
  RADIANS_PER_DEGREE,
  RADIANS_PER_HOUR,
  angleBetween,
  arcsecFromRadians,
  unitVector,
} from '../../src/math/index.js';
import { skyAt, ttOf } from '../unit/sky/sky-over.js';

/**
 * JPL Horizons, apparent places from Kitt Peak at 2014-09-25 0 h UT, read in the tests of astropy. A place agrees if it
 * is within one and a half times the 95 % error that the source states for the body; the parallax itself is 6″ and 1″.
 */
const ACCURACIES_ALLOWED = 1.5;
const kittPeak = skyAt(31.9633, -111.6, { elevationM: 2096 });

it.each([
  ['mercury', 13 + 38 / 60 + 58.5 / 3600, -(13 + 34 / 60 + 42.6 / 3600)],
  ['jupiter', 9 + 9 / 60 + 55.55 / 3600, 16 + 51 / 60 + 57.8 / 3600],
] as const)('%s from Kitt Peak', (body, hours, deg) => {
  const { direction } = kittPeak.horizontal(body, ttOf('2014-09-25T00:00:00Z'));
  const printed = unitVector(hours * RADIANS_PER_HOUR, deg * RADIANS_PER_DEGREE);
  const apartArcsec = arcsecFromRadians(angleBetween(direction, printed));
  expect(apartArcsec).toBeLessThan(ACCURACIES_ALLOWED * librarySource.accuracy(body).directionArcsec);
});
