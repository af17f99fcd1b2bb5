import type { Body, Planet } from '../../bodies/index.js';
import type { Frame } from '../../ephemeris/index.js';
import type { Vector } from '../../math/index.js';
import type { TtDays } from '../../time/index.js';

/** The places that circumstances are read from, au. */
export interface SkyGeometry {
  /** Apparent and geocentric; its length is the light-time distance. */
  apparent(body: Body, frame: Frame, tt: TtDays): Vector;
  /** Light-time alone, axes of J2000.0: what star catalogues compare with. */
  astrometric(body: Body, tt: TtDays): Vector;
  /** Geometric, from the Sun, axes of J2000.0. */
  heliocentric(planet: Planet, tt: TtDays): Vector;
  /** Geometric, from the Sun, true ecliptic and equinox of date. */
  heliocentricEclipticOfDate(planet: Planet, tt: TtDays): Vector;
}
