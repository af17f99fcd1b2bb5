import { Body as LibraryBody, Equator, Horizon, Observer } from 'astronomy-engine';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { skyPlanets } from '../../src/bodies/index.js';
import {
  LOWEST_LOOK_DEG,
  PLANET_RISE_ALTITUDE_DEG,
  SkyOverSite,
  dayArc,
  eveningOf,
  horizonAltitudeDeg,
  localViewer,
  makeSite,
  meridianTransits,
  nightOf,
} from '../../src/sky/index.js';
import { ttDays, ttFromUtc, utcFromTt, utcMillis } from '../../src/time/index.js';
import { paths } from '../unit/sky/sky-over.js';

const RUNS = 300;
const MINUTE_MILLIS = 60_000;

const planet = fc.constantFrom(...skyPlanets);
/** Whole minutes of 2027 and 2028: few blocks of the tracks are filled. */
const utc = fc
  .integer({ min: Date.UTC(2027, 0, 1) / MINUTE_MILLIS, max: Date.UTC(2028, 11, 31) / MINUTE_MILLIS })
  .map((minute) => utcMillis(minute * MINUTE_MILLIS));
/** Everywhere, the polar circles and the poles often; by its own zone or by one that has nothing to do with it. */
const site = fc
  .record({
    latitudeDeg: fc.oneof(
      fc.double({ min: -90, max: 90, noNaN: true }),
      fc.constantFrom(-90, -78, -66.6, 0, 65.7, 66.6, 69.6, 78, 89.5, 90),
    ),
    longitudeDeg: fc.double({ min: -180, max: 180, noNaN: true }),
    elevationM: fc.constantFrom(0, 400, 2500, 5000),
    zone: fc.constantFrom(undefined, 'UTC', 'Asia/Shanghai', 'America/St_Johns'),
    horizonDeg: fc.constantFrom(-1, 0, 8),
  })
  .map(({ zone, horizonDeg, ...words }) =>
    makeSite({
      id: 'x',
      ...words,
      ...(zone !== undefined && { zone }),
      horizon: [{ azimuthDeg: 0, altitudeDeg: horizonDeg }],
    }),
  );

/** The Sun's true altitude by the library alone: its own sidereal time, nutation and parallax. */
function sunAltitudeDeg(observer: Observer, utcOf: number): number {
  const date = new Date(utcOf);
  const { ra, dec } = Equator(LibraryBody.Sun, date, observer, true, true);
  return Horizon(date, observer, ra, dec).altitude;
}

describe('the sky of any site', () => {
  it('has altitudes within ±90° and azimuths within the circle', () => {
    fc.assert(
      fc.property(site, utc, planet, (place, at, body) => {
        const { altitudeDeg, azimuthDeg } = new SkyOverSite(place, paths).horizontal(body, ttFromUtc(at));
        expect(Math.abs(altitudeDeg)).toBeLessThanOrEqual(90);
        expect(azimuthDeg).toBeGreaterThanOrEqual(0);
        expect(azimuthDeg).toBeLessThan(360);
      }),
      { numRuns: RUNS },
    );
  });

  it('lets bodies rise, pass the meridian and set in this order, for ever', () => {
    fc.assert(
      fc.property(site, utc, planet, (place, at, body) => {
        // Nearer to a pole a body's own motion can carry it over the horizon without the Earth's turning.
        fc.pre(Math.abs(place.latitudeDeg) < 88);
        const sky = new SkyOverSite(place, paths);
        const from = ttFromUtc(at);
        const to = ttDays(from + 3);
        const happenings = [
          ...dayArc(sky, body, from, to).crossings(PLANET_RISE_ALTITUDE_DEG),
          ...meridianTransits(sky, body, from, to, 'upper').map((tt) => ({
            tt,
            is:
              sky.horizontal(body, tt).altitudeDeg > PLANET_RISE_ALTITUDE_DEG
                ? ('high' as const)
                : ('low' as const),
          })),
        ].sort((a, b) => a.tt - b.tt);
        // A transit may be low, below the horizon, or follow another high one, where the body does not set in between.
        const next = { rise: ['high'], high: ['set', 'high'], set: ['rise', 'low'], low: ['rise', 'low'] };
        happenings.slice(1).forEach(({ is }, i) => {
          expect(next[happenings[i]!.is]).toContain(is);
        });
        const rises = happenings.filter(({ is }) => is === 'rise').length;
        const sets = happenings.filter(({ is }) => is === 'set').length;
        expect(Math.abs(rises - sets)).toBeLessThanOrEqual(1);
      }),
      { numRuns: RUNS },
    );
  });

  it('has every instant in the night that is named after its evening', () => {
    fc.assert(
      fc.property(site, utc, (place, at) => {
        const { from, to } = nightOf(new SkyOverSite(place, paths), eveningOf(at, place.zone));
        expect(from).toBeLessThanOrEqual(ttFromUtc(at));
        expect(to).toBeGreaterThan(ttFromUtc(at));
        expect((to - from) * 24).toBeGreaterThan(22.9);
        expect((to - from) * 24).toBeLessThan(25.1);
      }),
      { numRuns: RUNS },
    );
  });
});

describe('a best look, at any site', () => {
  it('never comes while any part of the Sun is up, nor 5 minutes after that or 10 before', () => {
    let looks = 0;
    fc.assert(
      fc.property(site, utc, planet, planet, (place, at, one, other) => {
        const bodies = one === other ? [one] : [one, other];
        const { bestLook, evening } = localViewer(place, paths)(bodies, ttFromUtc(at));
        if (bestLook === null) return;
        looks++;
        const observer = new Observer(place.latitudeDeg, place.longitudeDeg, place.elevationM);
        for (let minute = -5; minute <= 10; minute++) {
          expect(sunAltitudeDeg(observer, bestLook.utc + minute * MINUTE_MILLIS)).toBeLessThan(-50 / 60);
        }
        expect(eveningOf(bestLook.utc, place.zone)).toBe(evening);
      }),
      { numRuns: 3 * RUNS },
    );
    expect(looks).toBeGreaterThan(RUNS / 2);
  });

  it('shows every body above the site’s own horizon and 5°, on a whole minute', () => {
    fc.assert(
      fc.property(site, utc, planet, (place, at, body) => {
        const { bestLook, verdict } = localViewer(place, paths)([body], ttFromUtc(at));
        expect(verdict).toMatch(bestLook === null ? /^Not .+\.$/ : /^Look .+\.$/);
        if (bestLook === null) return;
        expect(bestLook.utc % MINUTE_MILLIS).toBe(0);
        expect(bestLook.altitudeDeg).toBeGreaterThanOrEqual(LOWEST_LOOK_DEG);
        expect(bestLook.altitudeDeg).toBeGreaterThan(horizonAltitudeDeg(place, bestLook.azimuthDeg));
        expect(utcFromTt(ttFromUtc(bestLook.utc))).toBeCloseTo(bestLook.utc, 0);
      }),
      { numRuns: RUNS },
    );
  });
});
