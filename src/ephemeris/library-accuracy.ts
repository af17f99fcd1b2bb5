import type { Body } from '../bodies/index.js';
import type { Accuracy } from './source.js';

/**
 * How far astronomy-engine 2.1.19 is from JPL DE440 (Park et al. 2021): 95 % half-widths over 4000 random instants of
 * 1600–2600. Written by data/library-accuracy.py and .ts; do not edit.
 * Directions are geometric and of one coordinate, the worse of longitude and right ascension, and the worse of all instants and
 * the tenth at which the body is nearest; rates are differences of the error over a day. Jupiter to Pluto are judged by the
 * barycentre of planet and moons, 0.1″ from the planet at most. What has no meaning (the Earth seen from itself, the Sun
 * from itself) is zero.
 *
 * Geocentric direction, arcseconds: 95 % in longitude, in either coordinate when nearest, in latitude; worst longitude
 *                     1900–2100                     1600–2600
 *   sun         1.2   1.2   1.2   2.3       1.5   1.5   6.7   3.1
 *   mercury     5.1   6.9   3.5    12       9.3     9    14    30
 *   venus       5.9    13   4.2    19       6.7    15    12    25
 *   earth         0     0     0     0         0     0     0     0
 *   mars        4.5    10   4.1    13       5.1    12   9.8    33
 *   jupiter     6.5   7.6     7    10       7.6   9.5    12    17
 *   saturn      8.4    12    19    13        12    15    26    32
 *   uranus      7.2   7.4    15    12        17    18    15    27
 *   neptune      17    18   9.2    19        17    17    11    21
 *   pluto       6.6     3   1.3   7.9        70    89    15    91
 */
export const libraryAccuracy: Readonly<Record<Body, Accuracy>> = {
  sun: {
    directionArcsec: 2,
    directionRateArcsecPerDay: 0.13,
    distanceRateAuPerDay: 2.1e-7,
    heliocentricArcsec: 0,
    heliocentricDistanceRateAuPerDay: 0,
  },
  mercury: {
    directionArcsec: 9.3,
    directionRateArcsecPerDay: 2.2,
    distanceRateAuPerDay: 0.0000092,
    heliocentricArcsec: 18,
    heliocentricDistanceRateAuPerDay: 0.000012,
  },
  venus: {
    directionArcsec: 15,
    directionRateArcsecPerDay: 0.7,
    distanceRateAuPerDay: 5.2e-7,
    heliocentricArcsec: 5,
    heliocentricDistanceRateAuPerDay: 1.7e-7,
  },
  earth: {
    directionArcsec: 0,
    directionRateArcsecPerDay: 0,
    distanceRateAuPerDay: 0,
    heliocentricArcsec: 1.5,
    heliocentricDistanceRateAuPerDay: 2.1e-7,
  },
  mars: {
    directionArcsec: 12,
    directionRateArcsecPerDay: 0.29,
    distanceRateAuPerDay: 6.8e-7,
    heliocentricArcsec: 3.5,
    heliocentricDistanceRateAuPerDay: 5e-7,
  },
  jupiter: {
    directionArcsec: 9.5,
    directionRateArcsecPerDay: 0.057,
    distanceRateAuPerDay: 7.4e-7,
    heliocentricArcsec: 7.2,
    heliocentricDistanceRateAuPerDay: 4.4e-7,
  },
  saturn: {
    directionArcsec: 15,
    directionRateArcsecPerDay: 0.035,
    distanceRateAuPerDay: 9.3e-7,
    heliocentricArcsec: 12,
    heliocentricDistanceRateAuPerDay: 5.2e-7,
  },
  uranus: {
    directionArcsec: 18,
    directionRateArcsecPerDay: 0.016,
    distanceRateAuPerDay: 0.000001,
    heliocentricArcsec: 17,
    heliocentricDistanceRateAuPerDay: 3.8e-7,
  },
  neptune: {
    directionArcsec: 17,
    directionRateArcsecPerDay: 0.01,
    distanceRateAuPerDay: 0.0000013,
    heliocentricArcsec: 17,
    heliocentricDistanceRateAuPerDay: 2.4e-7,
  },
  pluto: {
    directionArcsec: 89,
    directionRateArcsecPerDay: 0.046,
    distanceRateAuPerDay: 0.000004,
    heliocentricArcsec: 70,
    heliocentricDistanceRateAuPerDay: 2.3e-7,
  },
};
