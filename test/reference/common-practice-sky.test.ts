import { describe, expect, it } from 'vitest';
import {
  RADIANS_PER_DEGREE,
  RADIANS_PER_HOUR,
  angleBetween,
  degreesFromRadians,
  hoursFromRadians,
  sphericalOf,
  unitVector,
  wrapTwoPi,
} from '../../src/math/index.js';
import {
  SIDEREAL_TURNS_PER_DAY,
  brightPlanetsByMeridian,
  fromJ2000,
  greenwichApparentSidereal,
  localSidereal,
  meridianTransits,
  siderealDayShorterSeconds,
  toJ2000,
} from '../../src/sky/index.js';
import type { EquatorialPlace } from '../../src/sky/index.js';
import { localDate, ttDays, ttFromUtc, utcOfLocal } from '../../src/time/index.js';
import { paths, skyAt, ttOf } from '../unit/sky/sky-over.js';

/** Facts that everybody in the trade knows: common practice, no source. */

const directionOf = ({ rightAscensionHours, declinationDeg }: EquatorialPlace) =>
  unitVector(rightAscensionHours * RADIANS_PER_HOUR, declinationDeg * RADIANS_PER_DEGREE);

describe('the sidereal day', () => {
  it('lasts about 23 h 56 min, 3 min 55.9 s less than the solar day', () => {
    expect(siderealDayShorterSeconds()).toBeCloseTo(235.909, 3);
    expect(24 - siderealDayShorterSeconds() / 3600).toBeCloseTo(23 + 56 / 60, 2);
  });

  it('is shorter by P²/365.24 d, P being the day itself', () => {
    // Exact for the sidereal P: 1/P − 1 = 1/365.24 gives 1 − P = P/365.24; with P² it holds to 1/365 of 236 s.
    const siderealDays = 1 / SIDEREAL_TURNS_PER_DAY;
    expect(Math.abs(siderealDayShorterSeconds() - (siderealDays ** 2 / 365.24) * 86_400)).toBeLessThan(0.7);
  });

  it('makes a planet far from the Sun cross the meridian four minutes earlier each night', () => {
    const from = ttOf('2027-03-01T00:00:00Z');
    const transits = meridianTransits(skyAt(48, 11), 'neptune', from, ttDays(from + 30), 'upper');
    const minutes = (transits.at(-1)! - transits[0]!) * 1440 - (transits.length - 1) * 1440;
    expect(transits.length).toBeGreaterThanOrEqual(30);
    expect(minutes / (transits.length - 1)).toBeCloseTo(-3.8, 0);
  });
});

describe('the Sun', () => {
  it('moves about 1° a day', () => {
    const longitude = (tt: number) =>
      sphericalOf(paths.position('sun', 'ecliptic-of-date', ttDays(tt))).longitude;
    for (let tt = 9862; tt < 9862 + 365; tt += 30) {
      expect(degreesFromRadians(wrapTwoPi(longitude(tt + 1) - longitude(tt)))).toBeCloseTo(0.986, 1);
    }
  });
});

describe('local sidereal time', () => {
  it('is near 6 h 50 min around midnight at the start of January in mid-longitudes of a zone', () => {
    for (const [zone, longitudeDeg] of [
      ['Europe/Vienna', 15],
      ['America/Chicago', -90],
      ['Asia/Tokyo', 135],
    ] as const) {
      const tt = ttFromUtc(utcOfLocal(localDate('2027-01-03'), 0, 0, zone));
      const hours = hoursFromRadians(localSidereal(greenwichApparentSidereal(tt), longitudeDeg));
      expect(Math.abs(hours - (6 + 50 / 60))).toBeLessThan(5 / 60);
    }
  });

  it('is the right ascension of what stands on the meridian', () => {
    const sky = skyAt(48, 11);
    const from = ttOf('2027-02-19T12:00:00Z');
    const [transit] = meridianTransits(sky, 'mars', from, ttDays(from + 1), 'upper');
    const { direction, azimuthDeg } = sky.horizontal('mars', transit!);
    const sidereal = localSidereal(greenwichApparentSidereal(transit!), 11);
    expect(wrapTwoPi(sphericalOf(direction).longitude)).toBeCloseTo(sidereal, 7);
    expect(azimuthDeg).toBeCloseTo(180, 4);
    expect(brightPlanetsByMeridian(sky, transit!)[0]?.body).toBe('mars');
  });

  it('has Mars at opposition near the meridian at local midnight', () => {
    const midnight = ttOf('2027-02-19T23:16:00Z');
    const mars = brightPlanetsByMeridian(skyAt(48, 11), midnight).find(({ body }) => body === 'mars');
    expect(Math.abs(mars!.hourAngleHours)).toBeLessThan(0.5);
  });
});

describe('precession', () => {
  it('takes 25,000 to 26,000 years to turn once', () => {
    const century = ttDays(36_525);
    const equinox = toJ2000({ rightAscensionHours: 0, declinationDeg: 0 }, century, 'mean');
    const moved = angleBetween(directionOf(equinox), { x: 1, y: 0, z: 0 });
    const years = (2 * Math.PI * 100) / moved;
    expect(years).toBeGreaterThan(25_000);
    expect(years).toBeLessThan(26_000);
  });

  it('puts a bright star a fraction of a degree off its J2000 place after two decades', () => {
    // Sirius, from memory.
    const sirius = { rightAscensionHours: 6.7525, declinationDeg: -16.716 };
    const then = fromJ2000(sirius, ttOf('2027-01-01T00:00:00Z'), 'true');
    const apartDeg = degreesFromRadians(angleBetween(directionOf(sirius), directionOf(then)));
    expect(apartDeg).toBeGreaterThan(0.2);
    expect(apartDeg).toBeLessThan(0.5);
  });
});
