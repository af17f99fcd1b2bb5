import { keplerMotion, keplerTableFor } from '../cycles/index.js';
import type { ElementTable } from '../cycles/index.js';
import type { Body } from '../bodies/index.js';
import { rotateMotion, subtractMotions } from '../ephemeris/index.js';
import type { Frame, Motion } from '../ephemeris/index.js';
import { RADIANS_PER_ARCSEC } from '../math/index.js';
import type { Rotation } from '../math/index.js';
import { centuriesOf } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import type { SkyModel } from './signal.js';

/** General precession in longitude and mean obliquity, first order. Source: Capitaine et al. 2003 (IAU 2006). */
const PRECESSION_ARCSEC_PER_CENTURY = 5028.796195;
const OBLIQUITY_J2000_ARCSEC = 84381.406;
const OBLIQUITY_ARCSEC_PER_CENTURY = -46.836769;

/**
 * The sky of the mean Kepler orbits: geometric, without light-time, aberration or nutation, as a first estimate is.
 * @param table one of Standish's tables throughout, or `by-date`: Table 1 within 1800–2050, Table 2 outside
 */
export function keplerSky(table: ElementTable | 'by-date'): SkyModel {
  const orbit = (planet: Exclude<Body, 'sun'>, tt: TtDays): Motion =>
    keplerMotion(planet, tt, table === 'by-date' ? keplerTableFor(tt) : table);
  const still: Motion = {
    position: { x: 0, y: 0, z: 0 },
    velocity: { x: 0, y: 0, z: 0 },
    acceleration: { x: 0, y: 0, z: 0 },
  };
  return {
    geocentric: (body, frame, tt) =>
      rotateMotion(
        fromEclipticJ2000(frame, tt),
        subtractMotions(body === 'sun' ? still : orbit(body, tt), orbit('earth', tt)),
      ),
    heliocentric: (planet, tt) => rotateMotion(fromEclipticJ2000('j2000', tt), orbit(planet, tt)),
    heliocentricOfDate: (planet, tt) =>
      rotateMotion(fromEclipticJ2000('ecliptic-of-date', tt), orbit(planet, tt)),
  };
}

/** The ecliptic is taken as fixed (it tilts by 0.8′ in a century), the equinox as moving evenly along it. */
function fromEclipticJ2000(frame: Frame, tt: TtDays): Rotation {
  const centuries = frame === 'j2000' ? 0 : centuriesOf(tt);
  const precession = PRECESSION_ARCSEC_PER_CENTURY * centuries * RADIANS_PER_ARCSEC;
  const obliquity =
    frame === 'ecliptic-of-date'
      ? 0
      : (OBLIQUITY_J2000_ARCSEC + OBLIQUITY_ARCSEC_PER_CENTURY * centuries) * RADIANS_PER_ARCSEC;
  const [cp, sp] = [Math.cos(precession), Math.sin(precession)];
  const [co, so] = [Math.cos(obliquity), Math.sin(obliquity)];
  return [
    { x: cp, y: -sp, z: 0 },
    { x: sp * co, y: cp * co, z: -so },
    { x: sp * so, y: cp * so, z: co },
  ];
}
