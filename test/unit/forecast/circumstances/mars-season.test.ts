import { describe, expect, it } from 'vitest';
import {
  marsSeasonMagnitude,
  marsSolarLongitudeDeg,
} from '../../../../src/forecast/circumstances/mars-season.js';
import { ttFromUtc, utcMillis } from '../../../../src/time/index.js';
import { librarySky } from './library-sky.js';

describe('the season on Mars', () => {
  /** Northern spring equinoxes of Mars, as listed for its years 35 to 37 (*from memory*); half a degree is one day. */
  it.each(['2019-03-23', '2021-02-07', '2022-12-26'])('begins with northern spring on %s', (date) => {
    const mars = librarySky.heliocentric('mars', ttFromUtc(utcMillis(Date.parse(`${date}T12:00:00Z`))));
    const degrees = marsSolarLongitudeDeg(mars);
    expect(Math.min(degrees, 360 - degrees)).toBeLessThan(0.6);
  });

  it('passes through the tabulated points, and halfway between them halfway', () => {
    expect(marsSeasonMagnitude(0)).toBe(-0.029);
    expect(marsSeasonMagnitude(250)).toBe(0.055);
    expect(marsSeasonMagnitude(245)).toBeCloseTo((-0.033 + 0.055) / 2, 12);
  });

  it('closes the year without a step', () => {
    expect(marsSeasonMagnitude(350)).toBe(-0.017);
    expect(marsSeasonMagnitude(359.999999)).toBeCloseTo(-0.029, 6);
  });
});
