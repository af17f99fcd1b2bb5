import type { Body, Planet } from '../bodies/index.js';
import type { Vector } from '../math/index.js';
import type { TtDays } from '../time/index.js';

/** How far a source may be off for one body: 95 % half-widths, measured against a better ephemeris. */
export interface Accuracy {
  /** Geocentric direction, arcseconds. */
  readonly directionArcsec: number;
  /** Rate of the geocentric direction, arcseconds a day. */
  readonly directionRateArcsecPerDay: number;
  /** Rate of the geocentric distance, au a day. */
  readonly distanceRateAuPerDay: number;
  /** Heliocentric longitude, arcseconds. */
  readonly heliocentricArcsec: number;
  /** Rate of the heliocentric distance, au a day. */
  readonly heliocentricDistanceRateAuPerDay: number;
}

/**
 * The port behind which every ephemeris stands: where the bodies are, geometrically, at an instant of TT.
 * Vectors are in au, on the axes of the ICRF (the mean equator and equinox of J2000.0 to within 0.02″).
 */
export interface EphemerisSource {
  /** A short name for outputs, such as `library`. */
  readonly name: string;
  /** One sentence for the reader of a report: what it is, in which version. */
  readonly description: string;
  /** From the Sun's centre to the planet's. Zero light-time: where the planet is at `tt`. */
  heliocentric(planet: Planet, tt: TtDays): Vector;
  /** From the barycentre of the solar system to the Sun's centre. */
  sunFromBarycentre(tt: TtDays): Vector;
  accuracy(body: Body): Accuracy;
}
