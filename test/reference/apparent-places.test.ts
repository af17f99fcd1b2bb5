import { describe, expect, it } from 'vitest';
import type { Body } from '../../src/bodies/index.js';
import { ApparentPlaces, geometryOf, librarySource, rotationTo } from '../../src/ephemeris/index.js';
import {
  RADIANS_PER_DEGREE,
  RADIANS_PER_HOUR,
  angleBetween,
  arcsecFromRadians,
  length,
  rotate,
  sphericalOf,
  unitVector,
} from '../../src/math/index.js';
import type { Spherical } from '../../src/math/index.js';
import { JD_J2000, ttDays } from '../../src/time/index.js';

/**
 * Apparent and astrometric places printed by the U.S. Naval Observatory and JPL Horizons, read in the tests of
 * general libraries. The library source is truncated: a place agrees if it is within one and a half times the 95 %
 * error that the source states for the body.
 */
const ACCURACIES_ALLOWED = 1.5;
/** Light-time or geometric distance, which the tables do not always say, differ by 1e-4 for Mercury at its fastest. */
const DISTANCE_TOLERANCE = 2e-4;

const places = new ApparentPlaces(geometryOf(librarySource));
const jdTt = (jd: number) => ttDays(jd - JD_J2000);
const hms = (h: number, m: number, s: number) => (h + m / 60 + s / 3600) * RADIANS_PER_HOUR;
const dms = (sign: 1 | -1, d: number, m: number, s: number) =>
  sign * (d + m / 60 + s / 3600) * RADIANS_PER_DEGREE;

interface Row {
  readonly what: string;
  readonly body: Body;
  /** TT: the printed UT plus ΔT of the year (63.8–69.2 s), which moves no planet here by more than 0.1″. */
  readonly jdTt: number;
  readonly rightAscension: number;
  readonly declination: number;
  readonly distanceAu?: number;
  readonly place: 'apparent' | 'astrometric';
}

const LIGHT_MINUTES_PER_AU = 8.316746397;
const rows: readonly Row[] = [
  // USNO table, quoted in the tests of pyephem.
  {
    what: 'Jupiter 2008-07-25',
    body: 'jupiter',
    jdTt: 2454672.50076,
    rightAscension: hms(19, 7, 26.047),
    declination: dms(-1, 22, 45, 58.37),
    distanceAu: 4.191907851,
    place: 'apparent',
  },
  {
    what: 'Mercury 2006-06-19',
    body: 'mercury',
    jdTt: 2453905.50075,
    rightAscension: hms(7, 37, 13.637),
    declination: dms(1, 22, 36, 52.66),
    distanceAu: 0.854999036,
    place: 'astrometric',
  },
  {
    what: 'Neptune 2006-02-03',
    body: 'neptune',
    jdTt: 2453769.50075,
    rightAscension: hms(21, 18, 20.161),
    declination: dms(-1, 15, 52, 9.81),
    distanceAu: 31.041484095,
    place: 'astrometric',
  },
  {
    what: 'Sun 2007-09-25',
    body: 'sun',
    jdTt: 2454368.50075,
    rightAscension: hms(12, 5, 42.537),
    declination: dms(-1, 0, 37, 7.31),
    distanceAu: 1.003053293,
    place: 'apparent',
  },
  // JPL Horizons, quoted in the tests of pyephem.
  {
    what: 'Mars 2003-12-16',
    body: 'mars',
    jdTt: 2452989.50074,
    rightAscension: hms(23, 59, 24.03),
    declination: dms(-1, 0, 27, 54.2),
    place: 'apparent',
  },
  {
    what: 'Mars 2003-12-16',
    body: 'mars',
    jdTt: 2452989.50074,
    rightAscension: hms(23, 59, 12.53),
    declination: dms(-1, 0, 29, 9.0),
    place: 'astrometric',
  },
  // JPL Horizons, quoted in the tests of astropy; distances given in light-minutes.
  {
    what: 'Mercury 1980-03-25',
    body: 'mercury',
    jdTt: 2444323.50059,
    rightAscension: hms(22, 41, 47.78),
    declination: dms(-1, 8, 29, 32.0),
    distanceAu: 6.323037 / LIGHT_MINUTES_PER_AU,
    place: 'apparent',
  },
  {
    what: 'Jupiter 1980-03-25',
    body: 'jupiter',
    jdTt: 2444323.50059,
    rightAscension: hms(10, 17, 12.82),
    declination: dms(1, 12, 2, 57.0),
    distanceAu: 37.694557 / LIGHT_MINUTES_PER_AU,
    place: 'apparent',
  },
  {
    what: 'Sun 1980-03-25',
    body: 'sun',
    jdTt: 2444323.50059,
    rightAscension: hms(0, 16, 31.0),
    declination: dms(1, 1, 47, 16.9),
    distanceAu: 8.294858 / LIGHT_MINUTES_PER_AU,
    place: 'apparent',
  },
];

describe('places against the Naval Observatory and JPL Horizons', () => {
  it.each(rows)('$what, $place', ({ body, jdTt: jd, rightAscension, declination, distanceAu, place }) => {
    const tt = jdTt(jd);
    const found =
      place === 'astrometric'
        ? places.astrometric(body, tt)
        : rotate(rotationTo('equator-of-date', tt), places.apparent(body, tt));
    const off = arcsecFromRadians(angleBetween(found, unitVector(rightAscension, declination)));
    expect(off).toBeLessThan(ACCURACIES_ALLOWED * librarySource.accuracy(body).directionArcsec);
    if (distanceAu !== undefined) {
      expect(Math.abs(length(found) / distanceAu - 1)).toBeLessThan(DISTANCE_TOLERANCE);
    }
  });

  it('Mars 2003-12-16: from the astrometric to the apparent place, where the position error cancels', () => {
    // Horizons' two places of one instant, printed to 0.01 s and 0.1″: aberration, deflection, precession and
    // nutation together. The library's nutation has five terms (0.1″).
    const tt = jdTt(2452989.50074);
    const turn = rotationTo('equator-of-date', tt);
    const printed = sphericalOf(unitVector(hms(23, 59, 24.03), dms(-1, 0, 27, 54.2)));
    const printedAstrometric = sphericalOf(unitVector(hms(23, 59, 12.53), dms(-1, 0, 29, 9.0)));
    const apparent = sphericalOf(rotate(turn, places.apparent('mars', tt)));
    const astrometric = sphericalOf(places.astrometric('mars', tt));
    const shift = (to: Spherical, from: Spherical) => [
      arcsecFromRadians(to.longitude - from.longitude),
      arcsecFromRadians(to.latitude - from.latitude),
    ];
    const [alpha, delta] = shift(apparent, astrometric);
    const [alphaPrinted, deltaPrinted] = shift(printed, printedAstrometric);
    expect(Math.abs(alpha! - alphaPrinted!)).toBeLessThan(0.35);
    expect(Math.abs(delta! - deltaPrinted!)).toBeLessThan(0.25);
  });
});
