import { describe, expect, it } from 'vitest';
import { angleWords, degreesMinutesSeconds, fixed, hoursWords, signed } from '../../../src/output/index.js';

describe('numbers in words', () => {
  it('writes a true minus sign, and none before a zero', () => {
    expect(fixed(-1.25, 1)).toBe('−1.3');
    expect(fixed(-0.04, 1)).toBe('0.0');
    expect(signed(-0.04, 1)).toBe('+0.0');
    expect(signed(2, 1)).toBe('+2.0');
    expect(signed(-0.5, 1)).toBe('−0.5');
  });

  it('carries hours, minutes and seconds, and never writes 60', () => {
    expect(hoursWords(10 + 17 / 60 + 50 / 3600)).toBe('10h 17m 50s');
    expect(hoursWords(5.9999999)).toBe('06h 00m 00s');
    expect(hoursWords(0.5 + 59.6 / 3600)).toBe('00h 31m 00s');
    expect(hoursWords(23.99999)).toBe('00h 00m 00s');
    expect(hoursWords(-0.5)).toBe('23h 30m 00s');
    expect(hoursWords(24.25)).toBe('00h 15m 00s');
  });

  it('carries degrees the same way and keeps the sign of what is below one degree', () => {
    expect(degreesMinutesSeconds(15.3697222)).toBe('+15° 22′ 11″');
    expect(degreesMinutesSeconds(-0.5)).toBe('−00° 30′ 00″');
    expect(degreesMinutesSeconds(-29.99999)).toBe('−30° 00′ 00″');
    expect(degreesMinutesSeconds(-0.0001)).toBe('+00° 00′ 00″');
  });

  it.each([
    [8.6 / 3600, '9″'],
    [59.4 / 3600, '59″'],
    [59.7 / 3600, '1.0′'],
    [1.4 / 60, '1.4′'],
    [24 / 60, '24′'],
    [59.4 / 60, '59′'],
    [59.7 / 60, '1.0°'],
    [1.449, '1.4°'],
    [9.949, '9.9°'],
    [9.96, '10°'],
    [17.2, '17°'],
  ])('tells a separation of %f° as %s', (degrees, words) => {
    expect(angleWords(degrees)).toBe(words);
  });
});
