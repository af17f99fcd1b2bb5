import { describe, expect, it } from 'vitest';
import { bodyCircumstances } from '../../src/forecast/circumstances/index.js';
import { ttDays, ttFromUtc, utcMillis } from '../../src/time/index.js';
import { librarySky } from '../unit/forecast/circumstances/library-sky.js';

/**
 * Largest apparent diameters and least distances of Mars at its oppositions, from the SEDS list. Left out are its
 * rows before 2003 and that of 2020, whose diameters disagree with the distances printed beside them by up to 2 %
 * (2020: 23.0″ at 62 million km, where a planet of that size shows 22.6″).
 */
describe('diameters and distances of Mars in the SEDS list of oppositions', () => {
  it.each([
    ['2003-08-28', 25.1, 56],
    ['2007-12-28', 15.9, 88],
    ['2012-03-03', 13.9, 101],
    ['2014-04-08', 15.2, 92],
    ['2016-05-22', 18.6, 75],
    ['2018-07-27', 24.3, 58],
  ])('around %s: %f″, %i million km', (date, diameterArcsec, millionKm) => {
    const opposition = ttFromUtc(utcMillis(Date.parse(`${date}T00:00:00Z`)));
    // The closest approach is within nine days of the opposition, and the diameter flat about it.
    const days = Array.from({ length: 61 }, (_, i) => ttDays(opposition - 15 + i / 2));
    const told = days.map((tt) => bodyCircumstances('mars', tt, librarySky));
    const largest = Math.max(...told.map((each) => each.diameterArcsec));
    const least = Math.min(...told.map((each) => each.distanceKm)) / 1e6;
    expect(Math.abs(largest - diameterArcsec)).toBeLessThan(0.05);
    expect(Math.abs(least - millionKm)).toBeLessThan(0.5);
  });
});
