import { describe, expect, it } from 'vitest';
import {
  CALENDAR_YEAR_DAYS,
  PeriodError,
  nearRepeats,
  siderealPeriodDays,
  synodicPeriodDays,
  synodicPeriodOf,
} from '../../../src/cycles/index.js';

describe('synodic periods', () => {
  it('lets periods of 6 and 4.5 meet every 18 (common practice)', () => {
    expect(synodicPeriodDays(6, 4.5)).toBeCloseTo(18, 12);
  });

  it('gives Mars with 1.88 years against one year a meeting every 2.14 years (common practice)', () => {
    expect(synodicPeriodDays(1.88, 1)).toBeCloseTo(2.136, 3);
  });

  it('lets the Sun stand for the Earth', () => {
    expect(siderealPeriodDays('sun')).toBe(siderealPeriodDays('earth'));
    expect(synodicPeriodOf('sun', 'mars')).toBe(synodicPeriodOf('mars', 'earth'));
  });

  it.each([
    [() => synodicPeriodDays(0, 10), /a period of 0 days is not a turn: write a length greater than zero/],
    [() => synodicPeriodDays(10, -3), /a period of -3 days is not a turn/],
    [() => synodicPeriodDays(NaN, 3), /a period of NaN days is not a turn/],
    [() => synodicPeriodDays(Infinity, 3), /a period of Infinity days is not a turn/],
    [() => synodicPeriodDays(365.25, 365.25), /two equal periods of 365.25 days never gain on each other/],
    [() => synodicPeriodOf('mars', 'mars'), /mars twice: a synodic period is between two different bodies/],
    [() => synodicPeriodOf('sun', 'earth'), /sun and earth mirror one motion/],
  ])('teaches what has no synodic period %#', (ask, message) => {
    expect(ask).toThrow(PeriodError);
    expect(ask).toThrow(message);
  });
});

describe('near-repeats', () => {
  const yearsOf = (repeats: readonly { years: number }[]) => repeats.map(({ years }) => years);

  it('ends at once where a cycle is a year', () => {
    expect(nearRepeats(365.2425, 365.2425)).toEqual([{ cycles: 1, years: 1, misfitDays: 0, misfitDeg: 0 }]);
  });

  it('ends where cycles fill years exactly', () => {
    expect(nearRepeats(18, 12)).toEqual([{ cycles: 2, years: 3, misfitDays: 0, misfitDeg: 0 }]);
  });

  it.each([
    ['venus', [8, 243, 251]],
    ['mars', [15, 32, 47, 79, 205]],
    ['jupiter', [12, 83]],
    ['uranus', [1, 83, 84]],
  ] as const)('of %s in 300 calendar years come after %j, and no farther off than 20°', (planet, years) => {
    const repeats = nearRepeats(synodicPeriodOf(planet, 'earth'), CALENDAR_YEAR_DAYS);
    expect(yearsOf(repeats)).toEqual(years);
    for (const { misfitDeg } of repeats) expect(Math.abs(misfitDeg)).toBeLessThan(20);
  });

  it.each([
    [() => nearRepeats(0, 365), /a period of 0 days is not a turn/],
    [() => nearRepeats(780, NaN), /a period of NaN days is not a turn/],
  ])('refuse what is no period %#', (ask, message) => {
    expect(ask).toThrow(PeriodError);
    expect(ask).toThrow(message);
  });

  it('stops at the limit asked for', () => {
    const mars = synodicPeriodOf('mars', 'earth');
    expect(yearsOf(nearRepeats(mars, CALENDAR_YEAR_DAYS, 40))).toEqual([15, 32]);
  });

  it('tells the misfit as the Sun moves, about 1° a day (common practice)', () => {
    for (const { misfitDays, misfitDeg } of nearRepeats(398.88, CALENDAR_YEAR_DAYS)) {
      expect(misfitDeg / misfitDays).toBeCloseTo(0.9856, 3);
    }
  });
});
