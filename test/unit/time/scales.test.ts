import { describe, expect, it } from 'vitest';
import {
  isoUtc,
  ttDays,
  ttFromUtc,
  utcFromTt,
  utcMillis,
  utcUncertaintySeconds,
} from '../../../src/time/index.js';

const SECOND = 1 / 86_400;

describe('utcFromTt and ttFromUtc', () => {
  // Instants at which the ephemeris library's own inversion of ΔT never returns: a few seconds above −2ⁿ days.
  it.each([-16383.99964084432, -32767.9997, -8191.9997, -131071.9999, -65535.9998])(
    'come to an end at %d days, where a fixed-point iteration of the library hangs',
    (days) => {
      const tt = ttDays(days);
      expect(Math.abs(ttFromUtc(utcFromTt(tt)) - tt)).toBeLessThan(1e-3 * SECOND);
    },
  );

  it('give the day before 1972 in which the library hangs its right date', () => {
    expect(isoUtc(utcFromTt(ttDays(-16383.99964084432)))).toBe('1955-02-22T12:00:00Z');
  });

  it('hold the midnight while a leap second lasts, and never run backwards', () => {
    const midnight = utcMillis(Date.UTC(2017, 0, 1));
    const after = ttFromUtc(midnight);
    const during = [0.9, 0.5, 0.1].map((left) => utcFromTt(ttDays(after - left * SECOND)));
    expect(during).toEqual([midnight, midnight, midnight]);
    expect(utcFromTt(ttDays(after - 1.5 * SECOND))).toBeCloseTo(midnight - 500, 1);
    expect(utcFromTt(ttDays(after + 0.5 * SECOND))).toBeCloseTo(midnight + 500, 1);
  });

  it('lie 42.184 s apart at the birth of UTC', () => {
    const birth = utcMillis(Date.UTC(1972, 0, 1));
    expect((ttFromUtc(birth) - -10_227.5) / SECOND).toBeCloseTo(42.184, 4);
  });
});

describe('utcUncertaintySeconds', () => {
  it('is zero between 1972 and the last announced day, and nowhere else', () => {
    const at = (text: string) => utcUncertaintySeconds(ttFromUtc(utcMillis(Date.parse(text))));
    expect(at('1972-01-01T00:00:00Z')).toBe(0);
    expect(at('2027-06-30T23:59:59Z')).toBe(0);
    expect(at('1971-12-31T00:00:00Z')).toBeGreaterThan(0);
    expect(at('2027-07-01T00:00:01Z')).toBeGreaterThan(0);
  });
});
