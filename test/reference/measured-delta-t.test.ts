import { describe, expect, it } from 'vitest';
import { deltaTAt, ttFromUtc, utcMillis } from '../../src/time/index.js';

const at = (text: string) => deltaTAt(ttFromUtc(utcMillis(Date.parse(`${text}T00:00:00Z`))));

/**
 * Morrison, Stephenson, Hohenkerk & Zawilski 2021, Proc. R. Soc. A 477, 20200776: the spline of Table S15.2020, TT − UT1 in
 * seconds at the beginning of the year, as carried by skyfield 1.55. (Not after 1950, where the spline smooths more than
 * the measurements err.)
 */
// prettier-ignore
const spline: readonly (readonly [year: number, seconds: number])[] = [
  [1600, 109.13], [1610, 93.83], [1620, 79.52], [1630, 66.34], [1640, 54.44], [1650, 43.95], [1660, 35.00], [1670, 27.58], [1680, 21.64], [1690, 17.16], [1700, 14.10], [1710, 12.41], [1720, 12.07], [1730, 12.96], [1740, 14.71], [1750, 16.88], [1760, 19.01], [1770, 20.67], [1780, 21.42], [1790, 20.80], [1800, 18.37], [1810, 15.68], [1820, 16.52], [1830, 10.80], [1840, 7.63], [1850, 9.34], [1860, 9.04], [1870, 2.37], [1880, -3.21], [1890, -3.88], [1900, -1.98], [1910, 11.14], [1920, 21.62], [1930, 24.42], [1940, 24.43], [1950, 28.93],
];

/** USNO deltat.data, TT − UT1 (rows as given by IERS/USNO); TT − UTC of the same instants must be within 0.9 s of it. */
const measured: readonly (readonly [date: string, seconds: number])[] = [
  ['1973-02-01', 43.4724],
  ['2000-01-01', 63.8285],
  ['2005-01-01', 64.6876],
  ['2010-01-01', 66.0699],
  ['2015-01-01', 67.6439],
  ['2017-01-01', 68.5927],
  ['2018-01-01', 68.9677],
  ['2019-01-01', 69.2202],
  ['2020-01-01', 69.3612],
  ['2022-01-01', 69.2945],
];

describe('TT − UT against determinations from observation', () => {
  it.each(spline)('in %d agrees with %d s within the stated 95 % half-width', (year, seconds) => {
    const ours = at(`${year}-01-01`);
    expect(ours.scale).toBe('UT1');
    expect(Math.abs(ours.seconds - seconds)).toBeLessThan(ours.uncertaintySeconds);
  });

  // Recommendation ITU-R TF.460 keeps UTC within 0.9 s of UT1.
  it.each(measured)('on %s is within 0.9 s of the measured %d s', (date, seconds) => {
    const ours = at(date);
    expect(ours.scale).toBe('UTC');
    expect(Math.abs(ours.seconds - seconds)).toBeLessThan(0.9);
  });

  // USNO historic_deltat.data, first entry, one within, and the last before UTC; printed to a second, 0.1 s and 0.001 s.
  it.each([
    ['1657-01-01', 44, 0.5],
    ['1900-01-01', -2.72, 0.05],
    ['1971-07-01', 41.686, 0.005],
  ])('on %s gives the table entry %d s', (date, seconds, rounding) => {
    expect(Math.abs(at(date).seconds - seconds)).toBeLessThan(rounding);
  });

  // Morrison et al. 2021: lod = 1.72 t − 3.5 sin(2π(t + 0.75)/14) ms; integrated here by the midpoint rule in steps of 0.1 year.
  it.each([2050, 2100, 2600])('grows to %d by the integral of the published length of day', (year) => {
    let sum = 0;
    const [from, steps] = [2027.4956, Math.round((year - 2027.4956) * 10)];
    const step = (year - from) / steps;
    for (let i = 0; i < steps; i++) {
      const t = (from + (i + 0.5) * step - 1825) / 100;
      sum += (1.72 * t - 3.5 * Math.sin((2 * Math.PI * (t + 0.75)) / 14)) * 1e-3 * 365.25 * step;
    }
    // The calendar's year and the rule's Julian one part by 0.02 year in 600, at up to 4 s a year.
    expect(Math.abs(at(`${year}-01-01`).seconds - 69.184 - sum)).toBeLessThan(0.1);
  });

  // Espenak & Meeus 2006 print the standard error of ΔT in a far year by Huber's formula; from memory, the formula itself:
  // 365.25 · 500 · √(500 · 0.058 / 3 · 1.2) / 1000 = 622.0 s.
  it('widens as Huber 2000 has it', () => {
    const known = Date.parse('2027-07-01T00:00:00Z');
    const far = deltaTAt(ttFromUtc(utcMillis(known + 500 * 365.2425 * 86_400_000)));
    expect(far.uncertaintySeconds).toBeCloseTo(0.9 + 1.96 * 622.0, 0);
  });
});
