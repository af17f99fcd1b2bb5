import { describe, expect, it } from 'vitest';
import {
  LEAP_SECONDS_KNOWN_UNTIL,
  SECONDS_PER_DAY,
  deltaTAt,
  ttDays,
  ttFromUtc,
  utcMillis,
} from '../../../src/time/index.js';

const ttAt = (text: string) => ttFromUtc(utcMillis(Date.parse(text)));
const at = (text: string) => deltaTAt(ttAt(text));

describe('deltaTAt', () => {
  it('is 69.184 s without any doubt in 2026', () => {
    expect(at('2026-06-15T00:00:00Z')).toEqual({
      seconds: 69.184,
      uncertaintySeconds: 0,
      scale: 'UTC',
      basis: 'leap seconds, IERS',
    });
  });

  it('names the scale that it leads to', () => {
    expect(at('1971-12-31T23:59:59Z').scale).toBe('UT1');
    expect(at('1972-01-01T00:00:00Z').scale).toBe('UTC');
    expect(at('2400-01-01T00:00:00Z').scale).toBe('UTC');
  });

  it.each([
    ['1550-01-01', 'polynomial, Espenak & Meeus 2006'],
    ['1640-01-01', 'polynomial, Espenak & Meeus 2006'],
    ['1657-01-02', 'measured, U.S. Naval Observatory'],
    ['1971-12-31', 'measured, U.S. Naval Observatory'],
    ['1999-12-31', 'leap seconds, IERS'],
    ['2027-07-02', 'extrapolated, Morrison et al. 2021'],
  ])('says that %s rests on: %s', (date, basis) => {
    expect(at(`${date}T00:00:00Z`).basis).toBe(basis);
  });

  it('steps by a second exactly where a leap second ends', () => {
    const newYear = ttAt('2017-01-01T00:00:00Z');
    const justBefore = ttDays(newYear - 1e-3 / SECONDS_PER_DAY);
    expect(deltaTAt(newYear).seconds - deltaTAt(justBefore).seconds).toBeCloseTo(1, 9);
  });

  // Between leap seconds nothing moves by more than 2 s a year; a step of a day may change it by 0.01 s.
  it.each(['1600-01-01', '1657-01-01', '1700-01-01', '1971-07-01', '1972-01-01', '2027-07-01', '2100-01-01'])(
    'does not jump at the seam of %s',
    (date) => {
      const tt = ttAt(`${date}T00:00:00Z`);
      const change = deltaTAt(ttDays(tt + 0.5)).seconds - deltaTAt(ttDays(tt - 0.5)).seconds;
      expect(Math.abs(change)).toBeLessThan(0.01);
    },
  );

  it('holds the known value at the end of what is announced, and grows from it', () => {
    const end = ttFromUtc(LEAP_SECONDS_KNOWN_UNTIL);
    expect(deltaTAt(ttDays(end + 1e-6)).seconds).toBeCloseTo(69.184, 6);
    const years = [2028, 2030, 2050, 2100, 2200, 2400, 2599];
    const widths = years.map((year) => at(`${year}-01-01T00:00:00Z`).uncertaintySeconds);
    expect(widths).toEqual([...widths].sort((a, b) => a - b));
    expect(new Set(widths).size).toBe(years.length);
    // A leap second that nobody has announced yet may part UTC from our value at once.
    expect(widths[0]).toBeGreaterThan(0.9);
  });

  it('is less sure the farther back before atomic time', () => {
    const widths = [1550, 1600, 1650, 1700, 1750, 1800, 1850, 1900, 1960].map(
      (year) => at(`${year}-01-01T00:00:00Z`).uncertaintySeconds,
    );
    expect(widths).toEqual([...widths].sort((a, b) => b - a));
    expect(widths[0]).toBeGreaterThan(39);
    expect(widths.at(-1)).toBeLessThan(0.1);
  });

  it('answers without complaint outside the supported span, for margins', () => {
    for (const year of [1500, 1599, 2601, 2700]) {
      expect(Number.isFinite(at(`${year}-01-01T00:00:00Z`).seconds)).toBe(true);
    }
  });
});
