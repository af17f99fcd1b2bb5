import { Body as LibraryBody, Observer, SearchHourAngle, SearchRiseSet } from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import type { Body } from '../../src/bodies/index.js';
import { PLANET_RISE_ALTITUDE_DEG, SUN_RISE_ALTITUDE_DEG, dayArc } from '../../src/sky/index.js';
import { ttDays, utcFromTt } from '../../src/time/index.js';
import { skyAt, ttOf } from '../unit/sky/sky-over.js';

/**
 * astronomy-engine's own search for rise, transit and set, which has another sidereal time, another light-time and
 * aberration and another search, but the same planetary theory and the same 34′. Its ΔT is 6.5 s more than ours in
 * 2027, in which a planet moves 0.3″; its Sun has its true semidiameter, ours 16′: 0.3′ make 4 s at 60° of latitude.
 */
const PLANET_TOLERANCE_SECONDS = 0.5;
const SUN_TOLERANCE_SECONDS = 6;

const days = ['2027-01-05', '2027-03-20', '2027-06-21', '2027-09-10', '2028-02-29', '2028-11-11'];
const sites = [
  [48.2, 16.3],
  [-33.9, 151.2],
  [60, -150],
  [0, 0],
] as const;
const bodies = [
  ['sun', LibraryBody.Sun],
  ['mercury', LibraryBody.Mercury],
  ['venus', LibraryBody.Venus],
  ['mars', LibraryBody.Mars],
  ['jupiter', LibraryBody.Jupiter],
  ['saturn', LibraryBody.Saturn],
  ['neptune', LibraryBody.Neptune],
] as const satisfies readonly (readonly [Body, LibraryBody])[];

describe.each(bodies)('%s', (body, libraryBody) => {
  it.each(sites)('at latitude %d, longitude %d', (latitude, longitude) => {
    const observer = new Observer(latitude, longitude, 0);
    const tolerance = body === 'sun' ? SUN_TOLERANCE_SECONDS : PLANET_TOLERANCE_SECONDS;
    let compared = 0;
    for (const day of days) {
      const from = ttOf(`${day}T00:00:00Z`);
      const start = new Date(`${day}T00:00:00Z`);
      const arc = dayArc(skyAt(latitude, longitude), body, from, ttDays(from + 1.01));
      const crossings = arc.crossings(body === 'sun' ? SUN_RISE_ALTITUDE_DEG : PLANET_RISE_ALTITUDE_DEG);
      const judged = [
        [crossings.find(({ is }) => is === 'rise')?.tt, SearchRiseSet(libraryBody, observer, 1, start, 1.01)],
        [crossings.find(({ is }) => is === 'set')?.tt, SearchRiseSet(libraryBody, observer, -1, start, 1.01)],
        [arc.transits[0], SearchHourAngle(libraryBody, observer, 0, start).time],
      ] as const;
      for (const [ours, theirs] of judged) {
        expect(ours === undefined).toBe(theirs === null);
        if (ours === undefined || theirs === null) continue;
        compared++;
        expect(Math.abs(utcFromTt(ours) - theirs.date.getTime()) / 1000).toBeLessThan(tolerance);
      }
    }
    expect(compared).toBe(3 * days.length);
  });
});
