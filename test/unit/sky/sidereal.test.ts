import { describe, expect, it } from 'vitest';
import { degreesFromRadians, wrapPi } from '../../../src/math/index.js';
import {
  SIDEREAL_TURNS_PER_DAY,
  greenwichApparentSidereal,
  greenwichMeanSidereal,
  localSidereal,
} from '../../../src/sky/index.js';
import { ttDays } from '../../../src/time/index.js';
import { ttOf } from './sky-over.js';

describe('sidereal time', () => {
  it('is ahead in the east and stays within the circle', () => {
    expect(localSidereal(1, 90)).toBeCloseTo(1 + Math.PI / 2, 12);
    expect(localSidereal(1, -180)).toBeCloseTo(1 + Math.PI, 12);
    expect(localSidereal(6, 90)).toBeLessThan(2 * Math.PI);
  });

  it('has the equinoxes part by at most 1.2 s', () => {
    for (let tt = -140_000; tt < 200_000; tt += 977) {
      const parted = wrapPi(greenwichApparentSidereal(ttDays(tt)) - greenwichMeanSidereal(ttDays(tt)));
      expect(Math.abs(degreesFromRadians(parted)) * 240).toBeLessThan(1.2);
    }
  });

  it('answers at the instants at which a conversion of the library never returns', () => {
    // A few seconds after −2ⁿ days, as in February 1955.
    for (const tt of [-16383.99964084432, -32767.9997, -8191.9995]) {
      expect(greenwichApparentSidereal(ttDays(tt))).toBeGreaterThanOrEqual(0);
    }
  });

  it('turns evenly through the start of 1972, where UTC takes over from ΔT', () => {
    // UT1 is 0.05 s behind UTC then, which is 0.0002°.
    const before = ttOf('1971-12-31T12:00:00Z');
    for (let day = 0; day < 2; day += 0.25) {
      const turned = greenwichMeanSidereal(ttDays(before + day)) - greenwichMeanSidereal(before);
      expect(
        Math.abs(degreesFromRadians(wrapPi(turned - 2 * Math.PI * SIDEREAL_TURNS_PER_DAY * day))),
      ).toBeLessThan(0.001);
    }
  });
});
