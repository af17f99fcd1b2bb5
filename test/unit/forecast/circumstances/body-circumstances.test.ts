import { describe, expect, it } from 'vitest';
import { skyPlanets } from '../../../../src/bodies/index.js';
import type { SkyPlanet } from '../../../../src/bodies/index.js';
import { bodyCircumstances } from '../../../../src/forecast/circumstances/index.js';
import { ttFromUtc, utcMillis } from '../../../../src/time/index.js';
import { librarySky } from './library-sky.js';

const at = (utc: string) => ttFromUtc(utcMillis(Date.parse(utc)));
const told = (body: SkyPlanet, utc: string) => bodyCircumstances(body, at(utc), librarySky);

describe('the circumstances of a planet', () => {
  it.each(skyPlanets)('agree with each other for %s', (body) => {
    const all = told(body, '2027-02-19T15:45:00Z');
    expect(all.distanceKm / all.distanceAu).toBeCloseTo(149_597_870.7, 6);
    // Light takes 499.004784 s for an au (IAU 2012).
    expect((all.lightMinutes * 60) / all.distanceAu).toBeCloseTo(499.004784, 5);
    expect(all.illuminatedFraction).toBeCloseTo(Math.cos((all.phaseAngleDeg * Math.PI) / 360) ** 2, 12);
    expect(all.elongationSide).toMatch(/^(?:east|west)$/);
    expect(all.rightAscensionOfDateHours).toBeGreaterThanOrEqual(0);
    expect(all.rightAscensionOfDateHours).toBeLessThan(24);
    expect(all.eclipticLongitudeDeg).toBeGreaterThanOrEqual(0);
    expect(all.eclipticLongitudeDeg).toBeLessThan(360);
  });

  it('tell the tilt of the rings for Saturn alone', () => {
    const withTilt = skyPlanets.filter((body) => 'ringTiltDeg' in told(body, '2027-02-19T00:00:00Z'));
    expect(withTilt).toEqual(['saturn']);
  });

  it('put Venus east of the Sun before its inferior conjunction, west after it', () => {
    // Venus passed the Sun on 2020-06-03 (common practice).
    expect(told('venus', '2020-05-20T00:00:00Z').elongationSide).toBe('east');
    expect(told('venus', '2020-06-20T00:00:00Z').elongationSide).toBe('west');
  });

  it('keep the side where the longitudes of Sun and planet lie on both sides of 0°', () => {
    // On 2022-03-15 the Sun was at 354°; Uranus at 42° stood 48° east of it.
    const uranus = told('uranus', '2022-03-15T00:00:00Z');
    expect(uranus.elongationSide).toBe('east');
    expect(uranus.elongationDeg).toBeGreaterThan(45);
    expect(uranus.elongationDeg).toBeLessThan(50);
  });

  describe('give no magnitude', () => {
    it('of Pluto, which has no formula of that standing', () => {
      expect(told('pluto', '2027-02-19T00:00:00Z').magnitude).toBeNull();
    });

    it('of Mercury in transit, beyond 170° of phase, where nobody has measured it', () => {
      expect(told('mercury', '2019-11-11T15:00:00Z').phaseAngleDeg).toBeGreaterThan(170);
      expect(told('mercury', '2019-11-11T15:00:00Z').magnitude).toBeNull();
      expect(told('mercury', '2019-10-20T00:00:00Z').magnitude).not.toBeNull();
    });

    it('of Venus in transit, beyond 179° of phase', () => {
      expect(told('venus', '2012-06-06T01:30:00Z').phaseAngleDeg).toBeGreaterThan(179);
      expect(told('venus', '2012-06-06T01:30:00Z').magnitude).toBeNull();
      expect(told('venus', '2012-05-25T00:00:00Z').magnitude).not.toBeNull();
    });
  });

  it('give a magnitude of every other planet through two centuries', () => {
    const others = skyPlanets.filter((body) => !['mercury', 'venus', 'pluto'].includes(body));
    for (let year = 1900; year < 2100; year += 5) {
      for (const body of others) {
        const { magnitude } = told(body, `${year}-07-01T00:00:00Z`);
        expect(magnitude, `${body} in ${year}`).not.toBeNull();
      }
    }
  });
});
