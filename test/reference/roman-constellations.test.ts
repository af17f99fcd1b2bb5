import { describe, expect, it } from 'vitest';
import { constellationOf } from '../../src/forecast/circumstances/constellation.js';
import { toJ2000 } from '../../src/sky/index.js';
import { ttOfJd } from '../unit/forecast/circumstances/library-sky.js';

const B1950 = ttOfJd(2_433_282.4235);

describe('constellations in their IAU boundaries', () => {
  /**
   * The trial positions that go with Roman, Publ. Astron. Soc. Pacific 99 (1987) 695 (CDS catalogue VI/42), equinox
   * 1950, *from memory*. Precession alone, without the terms of aberration in places of that time: 0.3″.
   */
  it.each([
    [9, 65, 'Ursa Major'],
    [23.5, -20, 'Aquarius'],
    [5.12, 9.12, 'Orion'],
    [9.4555, -19.9, 'Hydra'],
    [12.8888, 22, 'Coma Berenices'],
    [15.6687, -12.1234, 'Libra'],
    [19, -40, 'Corona Australis'],
    [6.2222, -81.1234, 'Mensa'],
  ])('%f h, %f° (1950): %s', (rightAscensionHours, declinationDeg, name) => {
    const place = toJ2000({ rightAscensionHours, declinationDeg }, B1950, 'mean');
    expect(constellationOf(place.rightAscensionHours, place.declinationDeg)).toBe(name);
  });

  /** From the tests of Skyfield. The third was in Orion on the equator of 1875. */
  it.each([
    [0, 0, 'Pisces'],
    [24, 90, 'Ursa Minor'],
    [4.65, 0, 'Eridanus'],
    [4.75, 0.3, 'Orion'],
  ])('%f h, %f° (2000): %s', (rightAscensionHours, declinationDeg, name) => {
    expect(constellationOf(rightAscensionHours, declinationDeg)).toBe(name);
  });

  /** The thirteenth constellation of the ecliptic: the Sun is in it from 30 November to 17 December (*common practice*). */
  it('finds Ophiuchus on the ecliptic', () => {
    expect(constellationOf(17, -22.9)).toBe('Ophiuchus');
  });
});
