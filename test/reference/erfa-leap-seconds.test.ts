import { describe, expect, it } from 'vitest';
import {
  LEAP_SECONDS_KNOWN_UNTIL,
  leapSeconds,
  ttFromUtc,
  utcFromTt,
  utcMillis,
} from '../../src/time/index.js';

// Judge: ERFA 2.0.1, routine `dat` (its table of changes, year, month, TAI − UTC in seconds) and the chain
// dtf2d → utctai → taitt, run once through pyerfa 2.0.1.5.
const changes = `1972-1 10, 1972-7 11, 1973-1 12, 1974-1 13, 1975-1 14, 1976-1 15, 1977-1 16, 1978-1 17, 1979-1 18,
  1980-1 19, 1981-7 20, 1982-7 21, 1983-7 22, 1985-7 23, 1988-1 24, 1990-1 25, 1991-1 26, 1992-7 27, 1993-7 28, 1994-7 29,
  1996-1 30, 1997-7 31, 1999-1 32, 2006-1 33, 2009-1 34, 2012-7 35, 2015-7 36, 2017-1 37`;

const ttOfUtc: readonly (readonly [utc: string, ttDays: number])[] = [
  ['1972-06-30T23:59:59.500Z', -10045.499517546295],
  ['1972-07-01T00:00:00.000Z', -10045.499500185186],
  ['1994-06-30T23:59:59.900Z', -2010.4993045833332],
  ['2000-01-01T12:00:00.000Z', 0.0007428703703703521],
  ['2005-12-31T23:59:59.000Z', 2191.500731296296],
  ['2006-01-01T00:00:00.250Z', 2191.500757337963],
  ['2016-12-31T23:59:59.500Z', 6209.50078337963],
  ['2026-11-08T12:34:56.789Z', 9808.025069131945],
];

// Both sides hold days as doubles, whose last digit is 2 µs here.
const MICROSECONDS = 5e-6 / 86_400;

describe('leap seconds against ERFA', () => {
  it('has every change, and no other', () => {
    const ours = leapSeconds.map(([year, month, seconds]) => `${year}-${month} ${seconds}`);
    expect(ours).toEqual(changes.split(/,\s+/));
  });

  it.each(ttOfUtc)('%s is %d days of TT, and back', (text, days) => {
    const utc = utcMillis(Date.parse(text));
    expect(Math.abs(ttFromUtc(utc) - days)).toBeLessThan(MICROSECONDS);
    expect(Math.abs(utcFromTt(ttFromUtc(utc)) - utc)).toBeLessThan(1);
  });

  it('knows the leap seconds up to a day after the last change', () => {
    expect(LEAP_SECONDS_KNOWN_UNTIL).toBe(Date.parse('2027-07-01T00:00:00Z'));
  });
});
