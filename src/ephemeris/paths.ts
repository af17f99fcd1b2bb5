import type { Body } from '../bodies/index.js';
import type { Jet, Vector } from '../math/index.js';
import type { TtDays } from '../time/index.js';

/** Axes in which a direction is given: the true equator, or ecliptic, and equinox of date (nutation included). */
export type Frame = 'equator-of-date' | 'ecliptic-of-date';

/** A vector with its first and second time derivatives, per day and per day². */
export interface Motion {
  readonly position: Vector;
  readonly velocity: Vector;
  readonly acceleration: Vector;
}

/**
 * The bodies' apparent geocentric paths (light-time and aberration applied; the Sun's deflection of light, 0.03″ at
 * 15° from it, left out): vectors whose direction is the apparent one and whose length is the light-time distance, au.
 */
export interface Paths {
  position(body: Body, frame: Frame, tt: TtDays): Vector;
  motion(body: Body, frame: Frame, tt: TtDays): Motion;
  /** Right ascension or ecliptic longitude with its derivatives: radians, per day, per day². */
  longitude(body: Body, frame: Frame, tt: TtDays): Jet;
}
