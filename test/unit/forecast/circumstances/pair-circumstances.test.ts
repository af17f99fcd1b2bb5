import { describe, expect, it } from 'vitest';
import {
  heliocentricCircumstances,
  pairCircumstances,
} from '../../../../src/forecast/circumstances/index.js';
import type { SkyGeometry } from '../../../../src/forecast/circumstances/index.js';
import { RADIANS_PER_DEGREE, dot, unitVector } from '../../../../src/math/index.js';
import { ttDays, ttFromUtc, utcMillis } from '../../../../src/time/index.js';
import { librarySky } from './library-sky.js';

/** A sky in which Jupiter stands at (ra, dec) and Saturn at another place, on the equator of date. */
const skyWith = (jupiter: readonly [number, number], saturn: readonly [number, number]): SkyGeometry => ({
  ...librarySky,
  apparent: (body, frame, tt) => {
    if (frame === 'ecliptic-of-date' || body === 'sun') return librarySky.apparent(body, frame, tt);
    const [ra, dec] = body === 'jupiter' ? jupiter : saturn;
    return unitVector(ra * RADIANS_PER_DEGREE, dec * RADIANS_PER_DEGREE);
  },
});
const pairAt = (jupiter: readonly [number, number], saturn: readonly [number, number]) =>
  pairCircumstances('jupiter', 'saturn', ttDays(0), skyWith(jupiter, saturn));

describe('two planets together', () => {
  it.each([
    ['north', [100, 20], [100, 21], 0, 1],
    ['south', [100, 20], [100, 18], 180, 2],
    ['east', [100, 0], [103, 0], 90, 3],
    ['west, across 0 h', [1, 0], [359, 0], 270, 2],
  ] as const)('the second %s of the first', (_, jupiter, saturn, positionAngleDeg, separationDeg) => {
    const pair = pairAt(jupiter, saturn);
    expect(pair.positionAngleDeg).toBeCloseTo(positionAngleDeg, 9);
    expect(pair.separationDeg).toBeCloseTo(separationDeg, 9);
  });

  it('has the angle of the great circle between them far from the equator', () => {
    // By vectors: the direction from the first to the second against north and east at the first.
    const [ra, dec] = [10 * RADIANS_PER_DEGREE, 60 * RADIANS_PER_DEGREE];
    const second = unitVector(40 * RADIANS_PER_DEGREE, 55 * RADIANS_PER_DEGREE);
    const east = unitVector(ra + Math.PI / 2, 0);
    const north = unitVector(ra, dec + Math.PI / 2);
    const expected = Math.atan2(dot(second, east), dot(second, north)) / RADIANS_PER_DEGREE;
    expect(pairAt([10, 60], [40, 55]).positionAngleDeg).toBeCloseTo(expected, 9);
  });

  it('keeps a separation of a thousandth of an arcsecond', () => {
    const tiny = 0.001 / 3600;
    expect(pairAt([200, -10], [200, -10 + tiny]).separationDeg / tiny).toBeCloseTo(1, 5);
  });

  it('tells both, in the order given, and the smaller elongation', () => {
    const pair = pairCircumstances('venus', 'jupiter', ttDays(9000), librarySky);
    expect(pair.bodies.map(({ body }) => body)).toEqual(['venus', 'jupiter']);
    expect(pair.leastElongationDeg).toBe(Math.min(...pair.bodies.map((each) => each.elongationDeg)));
  });

  it('the great conjunction of 2020-12-21 18:20 UTC: 6.1′ apart, 30° from the Sun, in Capricornus', () => {
    // Source: the table of great conjunctions in Wikipedia, to 1′; the library is good to 0.2′ in each.
    const tt = ttFromUtc(utcMillis(Date.UTC(2020, 11, 21, 18, 20)));
    const pair = pairCircumstances('jupiter', 'saturn', tt, librarySky);
    expect(Math.abs(pair.separationDeg * 60 - 6.1)).toBeLessThan(0.4);
    expect(Math.abs(pair.leastElongationDeg - 30.2)).toBeLessThan(0.1);
    expect(pair.bodies.map(({ constellation }) => constellation)).toEqual(['Capricornus', 'Capricornus']);
  });
});

describe('two planets as seen from the Sun', () => {
  it('the Earth and Mars at the opposition of 2027: less than the inclination apart, Mars farther out', () => {
    const tt = ttFromUtc(utcMillis(Date.UTC(2027, 1, 19, 15, 45)));
    const told = heliocentricCircumstances('earth', 'mars', tt, librarySky);
    const [earth, mars] = told.bodies;
    // An opposition is one of apparent longitudes; seen from the Sun it is off by light-time and aberration, 0.02°.
    expect(Math.abs(earth.heliocentricLongitudeDeg - mars.heliocentricLongitudeDeg)).toBeLessThan(0.02);
    // Off the line by the latitude of Mars, 1.85° at most; the Earth stays in its ecliptic of date to 1.5″.
    expect(told.separationDeg).toBeCloseTo(mars.heliocentricLatitudeDeg - earth.heliocentricLatitudeDeg, 3);
    expect(told.separationDeg).toBeLessThan(1.85);
    expect(Math.abs(earth.heliocentricLatitudeDeg)).toBeLessThan(1.5 / 3600);
    expect(mars.heliocentricDistanceAu).toBeGreaterThan(1.66);
  });
});
