import { e_tilt } from 'astronomy-engine';
import { libraryTime } from '../ephemeris/index.js';
import { RADIANS_PER_ARCSEC, RADIANS_PER_DEGREE, TWO_PI, wrapTwoPi } from '../math/index.js';
import { MILLIS_PER_DAY, centuriesOf, utcFromTt } from '../time/index.js';
import type { TtDays } from '../time/index.js';

const J2000_UTC_MILLIS = Date.UTC(2000, 0, 1, 12);
/** Turns of the Earth relative to the equinox per day of mean solar time, at J2000.0. */
export const SIDEREAL_TURNS_PER_DAY = 1.002_737_909_350_795;

/**
 * Greenwich mean sidereal time, radians in [0, 2π).
 * UT1 is taken to be UTC from 1972 (within 0.9 s by definition until leap seconds are given up: 14″) and TT − ΔT before.
 * Source: Capitaine, Wallace & Chapront, Astron. Astrophys. 412 (2003) 567 (IAU 2006): Earth rotation angle plus the
 * accumulated precession.
 */
export function greenwichMeanSidereal(tt: TtDays): number {
  const ut1Days = (utcFromTt(tt) - J2000_UTC_MILLIS) / MILLIS_PER_DAY;
  const rotation = 0.779_057_273_264 + 0.002_737_811_911_354_48 * ut1Days + (ut1Days % 1);
  const t = centuriesOf(tt);
  const precessionArcsec =
    0.014506 + t * (4612.156534 + t * (1.3915817 + t * (-4.4e-7 + t * (-2.9956e-5 - 3.68e-8 * t))));
  return wrapTwoPi(rotation * TWO_PI + precessionArcsec * RADIANS_PER_ARCSEC);
}

/** Greenwich apparent sidereal time, radians in [0, 2π): the mean one plus the equation of the equinoxes (to 0.1″). */
export function greenwichApparentSidereal(tt: TtDays): number {
  const { dpsi, tobl } = e_tilt(libraryTime(tt));
  const equationOfEquinoxes = dpsi * RADIANS_PER_ARCSEC * Math.cos(tobl * RADIANS_PER_DEGREE);
  return wrapTwoPi(greenwichMeanSidereal(tt) + equationOfEquinoxes);
}

/** Local sidereal time from Greenwich's: radians in [0, 2π). */
export const localSidereal = (greenwich: number, longitudeDeg: number): number =>
  wrapTwoPi(greenwich + longitudeDeg * RADIANS_PER_DEGREE);

/** How much shorter the sidereal day is than the mean solar day, seconds of mean solar time. */
export const siderealDayShorterSeconds = (): number => 86_400 * (1 - 1 / SIDEREAL_TURNS_PER_DAY);
