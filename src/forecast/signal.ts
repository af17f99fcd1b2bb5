import type { Body, Planet } from '../bodies/index.js';
import { subtractMotions } from '../ephemeris/index.js';
import type { Frame, Motion } from '../ephemeris/index.js';
import { dot, length, scale, subtract, wrapPi } from '../math/index.js';
import type { Jet } from '../math/index.js';
import type { TtDays } from '../time/index.js';

/** Where signals read the bodies' motions: the ephemeris through its tracks, or the Kepler orbits. */
export interface SkyModel {
  /** Geocentric; apparent for the ephemeris, geometric for Kepler orbits. au, days. */
  geocentric(body: Body, frame: Frame, tt: TtDays): Motion;
  /** Right ascension or ecliptic longitude of the same, radians. */
  longitude(body: Body, frame: Frame, tt: TtDays): Jet;
  /** Geometric, axes of J2000.0. */
  heliocentric(planet: Planet, tt: TtDays): Motion;
  /** Geometric, ecliptic and equinox of date, radians. */
  heliocentricLongitude(planet: Planet, tt: TtDays): Jet;
}

/** A smooth function of TT with its first two time derivatives: what a kind of event looks for. */
export type Signal = (tt: TtDays) => Jet;

/** a − b − target for two longitudes, wrapped into (−π, π]. */
export const longitudeDifference = (a: Jet, b: Jet, target: number): Jet => ({
  value: wrapPi(a.value - b.value - target),
  rate: a.rate - b.rate,
  acceleration: a.acceleration - b.acceleration,
});

/** Half the squared length of a motion: it turns where the length turns, and is smooth even where that vanishes. */
export const distanceJet = ({ position, velocity, acceleration }: Motion): Jet => ({
  value: dot(position, position) / 2,
  rate: dot(position, velocity),
  acceleration: dot(velocity, velocity) + dot(position, acceleration),
});

/**
 * `1 − cos(separation)` of two bodies, which is half the squared chord between their directions: it turns where the
 * separation turns, and has no cusp where the separation vanishes.
 */
export function separationJet(a: Motion, b: Motion): Jet {
  const product =
    dot(a.acceleration, b.position) + 2 * dot(a.velocity, b.velocity) + dot(a.position, b.acceleration);
  const productRate = dot(a.velocity, b.position) + dot(a.position, b.velocity);
  const la = logarithmicLength(a);
  const lb = logarithmicLength(b);
  const lengths = Math.sqrt(la.value * lb.value);
  const growth = la.rate + lb.rate;
  const cosine = dot(a.position, b.position) / lengths;
  const cosineRate = productRate / lengths - cosine * growth;
  return {
    value: 1 - cosine,
    rate: -cosineRate,
    acceleration: -(
      (product - productRate * growth) / lengths -
      cosineRate * growth -
      cosine * (la.acceleration + lb.acceleration)
    ),
  };
}

/** The squared length of a motion, and the first two derivatives of the logarithm of the length. */
function logarithmicLength({ position, velocity, acceleration }: Motion): Jet {
  const square = dot(position, position);
  const rate = dot(position, velocity) / square;
  return {
    value: square,
    rate,
    acceleration: (dot(velocity, velocity) + dot(position, acceleration)) / square - 2 * rate * rate,
  };
}

/** The chord from direction b to direction a on the unit sphere, with its derivatives. */
export const relativeDirection = (a: Motion, b: Motion): Motion =>
  subtractMotions(directionOf(a), directionOf(b));

/** The unit vector along a motion, with its derivatives. */
function directionOf({ position, velocity, acceleration }: Motion): Motion {
  const r = length(position);
  const u = scale(position, 1 / r);
  const rRate = dot(u, velocity);
  const uRate = scale(subtract(velocity, scale(u, rRate)), 1 / r);
  const rAcceleration = dot(uRate, velocity) + dot(u, acceleration);
  return {
    position: u,
    velocity: uRate,
    acceleration: {
      x: (acceleration.x - rAcceleration * u.x - 2 * rRate * uRate.x) / r,
      y: (acceleration.y - rAcceleration * u.y - 2 * rRate * uRate.y) / r,
      z: (acceleration.z - rAcceleration * u.z - 2 * rRate * uRate.z) / r,
    },
  };
}

/** The separation, radians, that belongs to the value of `separationJet`. */
export const separationOf = (halfSquaredChord: number): number =>
  2 * Math.asin(Math.min(1, Math.sqrt(halfSquaredChord / 2)));
