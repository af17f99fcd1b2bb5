import { describe, expect, it } from 'vitest';
import { RADIANS_PER_DEGREE, RADIANS_PER_HOUR, scale, unitVector } from '../../src/math/index.js';
import type { Vector } from '../../src/math/index.js';
import {
  SkyOverSite,
  fromJ2000,
  greenwichApparentSidereal,
  greenwichMeanSidereal,
  localSidereal,
  toJ2000,
} from '../../src/sky/index.js';
import type { EquatorOfDate } from '../../src/sky/index.js';
import { JD_J2000, ttDays } from '../../src/time/index.js';
import { pathsAt, siteAt, ttOf } from '../unit/sky/sky-over.js';

/** Values asserted by ERFA's own test program, t_erfa_c.c (liberfa/erfa 1d9738b, 2025), identical to IAU SOFA's. */

describe('sidereal time', () => {
  /**
   * ERFA is given MJD 53736.0 both as UT1 and as TT. Here UT1 is UTC and TT runs 65.184 s ahead of it, in which the
   * precession in right ascension moves on by 0.0001″ = 5e-10 rad.
   */
  const tt = ttOf('2006-01-01T00:00:00Z');

  it('is gmst06 at MJD 53736', () => {
    expect(Math.abs(greenwichMeanSidereal(tt) - 1.754174971870091203)).toBeLessThan(6e-10);
  });

  it('is gst06a at MJD 53736 within the 0.1″ of the nutation used', () => {
    expect(Math.abs(greenwichApparentSidereal(tt) - 1.754166137675019159)).toBeLessThan(5e-7);
  });
});

describe('precession', () => {
  const tt = ttDays(2400000.5 + 50123.9999 - JD_J2000);
  const firstRow = (equator: EquatorOfDate): Vector => {
    const place = toJ2000({ rightAscensionHours: 0, declinationDeg: 0 }, tt, equator);
    return unitVector(
      place.rightAscensionHours * RADIANS_PER_HOUR,
      place.declinationDeg * RADIANS_PER_DEGREE,
    );
  };

  it('is pmat06, whose frame bias of at most 0.023″ (1.2e-7 rad) is left out here', () => {
    const row = firstRow('mean');
    expect(Math.abs(row.x - 0.9999995505176007047)).toBeLessThan(1e-9);
    expect(Math.abs(row.y - 0.8695404617348208406e-3)).toBeLessThan(1.2e-7);
    expect(Math.abs(row.z - 0.3779735201865589104e-3)).toBeLessThan(1.2e-7);
  });

  it('is pnm06a with nutation, within the 0.1″ of the nutation used and the frame bias', () => {
    const row = firstRow('true');
    expect(Math.abs(row.x - 0.9999995832794205484)).toBeLessThan(1e-9);
    expect(Math.abs(row.y - 0.8372382772630962111e-3)).toBeLessThan(6e-7);
  });

  it('goes back to where it came from', () => {
    const place = { rightAscensionHours: 7.755, declinationDeg: 28.026 };
    for (const equator of ['mean', 'true'] as const) {
      const back = toJ2000(fromJ2000(place, tt, equator), tt, equator);
      expect(back.rightAscensionHours).toBeCloseTo(place.rightAscensionHours, 12);
      expect(back.declinationDeg).toBeCloseTo(place.declinationDeg, 11);
    }
  });
});

describe('horizontal coordinates', () => {
  const tt = ttOf('2027-03-01T00:00:00Z');

  it('are hd2ae(1.1, 1.2, 0.3) for a body too far to have a parallax', () => {
    const site = siteAt(0.3 / RADIANS_PER_DEGREE, 0);
    const sidereal = localSidereal(greenwichApparentSidereal(tt), 0);
    const sky = new SkyOverSite(
      site,
      pathsAt(() => scale(unitVector(sidereal - 1.1, 1.2), 1e12)),
    );
    const { azimuthDeg, altitudeDeg, hourAngle } = sky.horizontal('mars', tt);
    expect(Math.abs(azimuthDeg * RADIANS_PER_DEGREE - 5.916889243730066194)).toBeLessThan(1e-12);
    expect(Math.abs(altitudeDeg * RADIANS_PER_DEGREE - 0.4472186304990486228)).toBeLessThan(1e-12);
    expect(Math.abs(hourAngle - 1.1)).toBeLessThan(1e-12);
  });

  it('start from the observer of gd2gc on WGS 84 (e 3.1, φ −0.5, h 2500 m)', () => {
    const site = siteAt(-0.5 / RADIANS_PER_DEGREE, 3.1 / RADIANS_PER_DEGREE, { elevationM: 2500 });
    const [x, y, z] = [-5599000.5577049947, 233011.67223479203, -3040909.4706983363];
    const radius = Math.hypot(x, y, z);
    // A body at the centre of the Earth is seen straight along the observer's own vector.
    const centre = new SkyOverSite(
      site,
      pathsAt(() => ({ x: 0, y: 0, z: 0 })),
    );
    expect(Math.abs(centre.horizontal('mars', tt).direction.z + z / radius)).toBeLessThan(1e-12);
    // A body 10,000 km up the Earth's axis shows how long that vector is.
    const metre = 1 / 149_597_870_700;
    const above = new SkyOverSite(
      site,
      pathsAt(() => ({ x: 0, y: 0, z: 1e7 * metre })),
    );
    const expected = (1e7 - z) / Math.hypot(x, y, 1e7 - z);
    expect(Math.abs(above.horizontal('mars', tt).direction.z - expected)).toBeLessThan(1e-12);
  });
});
