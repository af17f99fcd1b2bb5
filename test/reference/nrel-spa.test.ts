import { describe, expect, it } from 'vitest';
import { SUN_RISE_ALTITUDE_DEG, dayArc, refractionDeg } from '../../src/sky/index.js';
import { ttDays, utcFromTt } from '../../src/time/index.js';
import { skyAt, ttOf, utcOf } from '../unit/sky/sky-over.js';

/** I. Reda and A. Andreas, Solar Position Algorithm, NREL/TP-560-34302 (2003, revised 2008). */

describe('the worked example: Golden, Colorado, 2003-10-17 12:30:30 MST', () => {
  const sky = skyAt(39.742476, -105.1786, { elevationM: 1830.14 });
  const sun = sky.horizontal('sun', ttOf('2003-10-17T19:30:30Z'));
  /** The example assumes ΔT = 67 s and UT1, here TT − UTC = 64.184 s: 0.4 s of UT1 is 6″, the algorithm claims 1″. */
  const TOLERANCE_DEG = 0.0003;

  it('true altitude and azimuth', () => {
    expect(Math.abs(sun.altitudeDeg - 39.872046)).toBeLessThan(TOLERANCE_DEG);
    expect(Math.abs(sun.azimuthDeg - 194.340241)).toBeLessThan(TOLERANCE_DEG);
  });

  it('apparent altitude at 820 hPa and 11 °C', () => {
    const air = (820 / 1010) * (283 / 284);
    expect(Math.abs(air * refractionDeg(39.872046) - (39.888378 - 39.872046))).toBeLessThan(1e-5);
  });
});

describe('sunrise, transit and sunset', () => {
  /** Printed to the second; UT1 may differ from UTC by 0.9 s, the Sun by 1″ (0.1 s), the day's step of the report. */
  const TOLERANCE_MILLIS = 3000;

  it.each([
    // In the tests of pvlib: from the report.
    [-35, 0, '1996-07-05', '07:08:15', '12:04:36', '17:01:04'],
    [-35, 0, '2004-12-04', '04:38:57', '11:50:22', '19:02:03'],
    // From the laboratory's own calculator, in standard time (UTC − 7 h) there; the sunset of 2 August, 02:13:58 UTC,
    // belongs to 1 August in Colorado: the calculator goes by days of UTC.
    [39.742476, -105.1786, '2015-01-02', '14:21:55', '19:04:45', '23:47:43'],
    [39.742476, -105.1786, '2015-08-02', '12:00:27', '19:06:58', '02:13:58'],
  ])('at latitude %d, longitude %d on %s UTC', (latitude, longitude, date, rise, transit, set) => {
    const from = ttOf(`${date}T00:00:00Z`);
    const arc = dayArc(skyAt(latitude, longitude), 'sun', from, ttDays(from + 1));
    const crossings = arc.crossings(SUN_RISE_ALTITUDE_DEG);
    const found = [
      crossings.find(({ is }) => is === 'rise')?.tt,
      arc.transits[0],
      crossings.find(({ is }) => is === 'set')?.tt,
    ];
    [rise, transit, set].forEach((printed, i) => {
      expect(Math.abs(utcFromTt(found[i]!) - utcOf(`${date}T${printed}Z`))).toBeLessThan(TOLERANCE_MILLIS);
    });
  });
});
