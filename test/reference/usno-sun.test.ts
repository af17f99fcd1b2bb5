import { describe, expect, it } from 'vitest';
import { SUN_RISE_ALTITUDE_DEG, dayArc, nightOf, twilightsOf } from '../../src/sky/index.js';
import { localDate, ttDays, utcFromTt } from '../../src/time/index.js';
import type { TtDays } from '../../src/time/index.js';
import { skyAt, ttOf, utcOf } from '../unit/sky/sky-over.js';

/**
 * Times of sunrise, sunset and twilight by the U.S. Naval Observatory, read in the tests of general libraries. They are
 * printed to the minute: half a minute of rounding, and 2 s for UT1 and for a Sun whose semidiameter is not always 16′.
 */
const TOLERANCE_MILLIS = 32_000;

function expectNear(tt: TtDays | null | undefined, printed: string, tolerance = TOLERANCE_MILLIS): void {
  expect(Math.abs(utcFromTt(tt!) - utcOf(printed)), printed).toBeLessThan(tolerance);
}

describe('sunrise and sunset within a calendar day', () => {
  it.each([
    // UT, in riseset.txt of a general library.
    [60, 0, '2019-01-01', '09:02', '15:05', 0],
    [60, 0, '2019-03-20', '06:03', '18:14', 0],
    [60, 0, '2019-06-21', '02:36', '21:28', 0],
    [60, 0, '2019-09-22', '05:43', '18:01', 0],
    [29, -81, '2019-01-01', '12:18', '22:38', 0],
    [29, -81, '2019-03-20', '11:28', '23:35', 0],
    [29, -81, '2019-06-21', '10:26', '00:26', 0],
    [29, -81, '2019-12-21', '12:13', '22:31', 0],
    [-60, -150, '2019-06-21', '19:06', '00:58', 0],
    [-60, -150, '2019-12-21', '12:32', '07:24', 0],
    [-60, -150, '2019-01-01', '12:43', '07:24', 0],
    [15, 75, '1750-06-21', '00:31', '13:32', 0],
    // Atlanta, EST, in the tests of pyephem.
    [33 + 46 / 60, -(84 + 25 / 60), '2007-01-01', '07:43', '17:40', -5],
    [33 + 46 / 60, -(84 + 25 / 60), '2007-03-21', '06:40', '18:50', -5],
    [33 + 46 / 60, -(84 + 25 / 60), '2007-06-21', '05:27', '19:51', -5],
    [33 + 46 / 60, -(84 + 25 / 60), '2007-09-23', '06:26', '18:33', -5],
    [33 + 46 / 60, -(84 + 25 / 60), '2007-12-21', '07:38', '17:33', -5],
    // Bluffton, Ohio, UTC, in the tests of Skyfield.
    [40.8939, -83.8917, '2018-09-12', '11:13', '23:50', 0],
    // Golden, Colorado, MST, in the tests of pvlib.
    [39.742476, -105.1786, '2015-01-01', '07:22', '16:47', -7],
  ])('at %d, %d on %s', (latitude, longitude, date, rise, set, offsetHours) => {
    const from = ttDays(ttOf(`${date}T00:00:00Z`) - offsetHours / 24);
    const crossings = dayArc(skyAt(latitude, longitude), 'sun', from, ttDays(from + 1)).crossings(
      SUN_RISE_ALTITUDE_DEG,
    );
    const offset = `${offsetHours < 0 ? '-' : '+'}0${Math.abs(offsetHours)}:00`;
    expectNear(crossings.find(({ is }) => is === 'rise')?.tt, `${date}T${rise}:00${offset}`);
    expectNear(crossings.find(({ is }) => is === 'set')?.tt, `${date}T${set}:00${offset}`);
  });
});

describe('twilight', () => {
  const orlando = skyAt(28.538, -81.379, { zone: 'America/New_York' });
  /** Of the evening before, for the dawn, and of the date, for the dusk: a night runs from noon to noon. */
  const night = (date: string) => twilightsOf(nightOf(orlando, localDate(date)));

  /** This table drops the seconds: 35 of its 36 times lie 0–60 s before ours; 2022-04-16T00:45 lies 52 s after. */
  const DROPPED_SECONDS_MILLIS = 60_000;

  // Astronomical, nautical, civil dawn; civil, nautical, astronomical dusk. UTC. twilight.txt of a general library.
  it.each([
    [
      '2021-11-06',
      '2021-11-07',
      ['11-07T10:21', '11-07T10:49', '11-07T11:17', '11-07T23:00', '11-07T23:28', '11-07T23:56'],
    ],
    [
      '2022-01-21',
      '2022-01-22',
      ['01-22T10:55', '01-22T11:23', '01-22T11:52', '01-22T23:21', '01-22T23:50', '01-23T00:18'],
    ],
    [
      '2022-02-28',
      '2022-03-01',
      ['03-01T10:32', '03-01T10:59', '03-01T11:26', '03-01T23:49', '03-02T00:16', '03-02T00:43'],
    ],
    [
      '2022-04-14',
      '2022-04-15',
      ['04-15T09:38', '04-15T10:07', '04-15T10:35', '04-16T00:15', '04-16T00:45', '04-16T01:13'],
    ],
    [
      '2022-06-19',
      '2022-06-20',
      ['06-20T08:54', '06-20T09:28', '06-20T10:01', '06-21T00:52', '06-21T01:25', '06-21T02:00'],
    ],
    [
      '2022-08-31',
      '2022-09-01',
      ['09-01T09:42', '09-01T10:11', '09-01T10:39', '09-02T00:10', '09-02T00:38', '09-02T01:07'],
    ],
  ])('around %s/%s at 28.538° N 81.379° W', (eve, date, printed) => {
    const [morning, evening] = [night(eve), night(date)];
    const year = date.slice(0, 4);
    const found = [
      morning.astronomical.dawn,
      morning.nautical.dawn,
      morning.civil.dawn,
      evening.civil.dusk,
      evening.nautical.dusk,
      evening.astronomical.dusk,
    ];
    printed.forEach((minute, i) => {
      expectNear(found[i], `${year}-${minute}:00Z`, DROPPED_SECONDS_MILLIS);
    });
  });

  it('at Defiance, Ohio, on 2019-11-08 (Skyfield documentation, checked there against the Observatory)', () => {
    const sky = skyAt(41.281944, -84.362778, { zone: 'America/New_York' });
    const eve = nightOf(sky, localDate('2019-11-07'));
    const day = nightOf(sky, localDate('2019-11-08'));
    const [morning, evening] = [twilightsOf(eve), twilightsOf(day)];
    expectNear(morning.astronomical.dawn, '2019-11-08T10:42:00Z');
    expectNear(morning.nautical.dawn, '2019-11-08T11:15:00Z');
    expectNear(morning.civil.dawn, '2019-11-08T11:48:00Z');
    expectNear(eve.sunrise, '2019-11-08T12:17:00Z');
    expectNear(day.sunset, '2019-11-08T22:25:00Z');
    expectNear(evening.civil.dusk, '2019-11-08T22:54:00Z');
    expectNear(evening.nautical.dusk, '2019-11-08T23:27:00Z');
    expectNear(evening.astronomical.dusk, '2019-11-08T23:59:00Z');
  });
});
