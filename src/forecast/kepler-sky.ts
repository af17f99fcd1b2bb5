import { keplerMotion, keplerTableFor } from '../cycles/index.js';
import type { ElementTable } from '../cycles/index.js';
import type { Body, Planet } from '../bodies/index.js';
import { longitudeOfMotion, rotateMotion, subtractMotions } from '../ephemeris/index.js';
import type { Frame, Motion } from '../ephemeris/index.js';
import { RADIANS_PER_ARCSEC } from '../math/index.js';
import type { Rotation } from '../math/index.js';
import { centuriesOf, ttDays } from '../time/index.js';
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
  const orbit = (planet: Planet, tt: TtDays): Motion =>
    keplerMotion(planet, tt, table === 'by-date' ? keplerTableFor(tt) : table);
  // Two bodies are asked for at one instant, one after the other, on the same axes and from the same Earth.
  const earth = rememberLast((tt) => orbit('earth', tt));
  const axes = {
    'equator-of-date': rememberLast((tt) => fromEclipticJ2000('equator-of-date', tt)),
    'ecliptic-of-date': rememberLast((tt) => fromEclipticJ2000('ecliptic-of-date', tt)),
  };
  const relative = (body: Body, tt: TtDays): Motion =>
    subtractMotions(body === 'sun' ? still : orbit(body, tt), earth(tt));
  return {
    geocentric: (body, frame, tt) => rotateMotion(axes[frame](tt), relative(body, tt)),
    longitude: (body, frame, tt) => longitudeOfMotion(relative(body, tt), axes[frame](tt)),
    heliocentric: (planet, tt) => rotateMotion(equatorOfJ2000, orbit(planet, tt)),
    heliocentricLongitude: (planet, tt) => longitudeOfMotion(orbit(planet, tt), axes['ecliptic-of-date'](tt)),
  };
}

const still: Motion = {
  position: { x: 0, y: 0, z: 0 },
  velocity: { x: 0, y: 0, z: 0 },
  acceleration: { x: 0, y: 0, z: 0 },
};

function rememberLast<Value>(make: (tt: TtDays) => Value): (tt: TtDays) => Value {
  let last: { readonly tt: TtDays; readonly value: Value } | null = null;
  return (tt) => {
    if (last?.tt !== tt) last = { tt, value: make(tt) };
    return last.value;
  };
}

/** The ecliptic is taken as fixed (it tilts by 0.8′ in a century), the equinox as moving evenly along it. */
function fromEclipticJ2000(frame: Frame, tt: TtDays): Rotation {
  const centuries = centuriesOf(tt);
  const precession = PRECESSION_ARCSEC_PER_CENTURY * centuries * RADIANS_PER_ARCSEC;
  const obliquity =
    frame === 'ecliptic-of-date'
      ? 0
      : (OBLIQUITY_J2000_ARCSEC + OBLIQUITY_ARCSEC_PER_CENTURY * centuries) * RADIANS_PER_ARCSEC;
  const cp = Math.cos(precession);
  const sp = Math.sin(precession);
  const co = Math.cos(obliquity);
  const so = Math.sin(obliquity);
  return [
    { x: cp, y: -sp, z: 0 },
    { x: sp * co, y: cp * co, z: -so },
    { x: sp * so, y: cp * so, z: co },
  ];
}

const equatorOfJ2000 = fromEclipticJ2000('equator-of-date', ttDays(0));
