import {
  AstroTime,
  BaryState,
  Body,
  C_AUDAY,
  HelioState,
  HelioVector,
  Rotation_EQJ_ECT,
  Rotation_EQJ_EQD,
} from 'astronomy-engine';
import type { RotationMatrix } from 'astronomy-engine';
import type { PlanetName, SkyName } from './scan-row.js';

/**
 * The judge's own textbook reduction, independent of everything in the program that it judges. It shares with it
 * nothing but the positions of the ephemeris library. The model, after Urban & Seidelmann, Explanatory Supplement
 * to the Astronomical Almanac, 3rd ed. (2013), chapter 7, in the form of the ERFA routines `ld` and `ab`:
 *
 * 1. barycentric positions at TT: the library's heliocentric planet plus its barycentric Sun;
 * 2. light-time iterated until it changes by less than 1e-9 day: planet at t − τ minus Earth at t;
 * 3. deflection of light by the Sun, with the planet's true direction from the Sun (none for the Sun itself);
 * 4. relativistic aberration with the Earth's barycentric velocity, without the potential term (below 1e-11 rad);
 * 5. rotation from J2000 to the true equator, or the true ecliptic, and the true equinox of date.
 */

export type Triple = readonly [number, number, number];

export const libraryBody: Readonly<Record<PlanetName, Body>> = {
  mercury: Body.Mercury,
  venus: Body.Venus,
  earth: Body.Earth,
  mars: Body.Mars,
  jupiter: Body.Jupiter,
  saturn: Body.Saturn,
  uranus: Body.Uranus,
  neptune: Body.Neptune,
};

/** Twice the Sun's gravitational radius 2GM/c², au (ERFA `SRS`). */
const SUN_SCHWARZSCHILD_RADIUS_AU = 1.97412574336e-8;
/** Below this value of q·(q + e) the deflection is held, as in ERFA `ldsun`: 5′ from the Sun's centre, behind its disc. */
const DEFLECTION_LIMIT = 1e-6;
const LIGHT_TIME_TOLERANCE_DAYS = 1e-9;
const LIGHT_TIME_STEPS = 10;
const TIME_STEPS = 6;
const TIME_TOLERANCE_DAYS = 2e-11;

const minus = (a: Triple, b: Triple): Triple => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
/** a + k b */
const plusTimes = (a: Triple, k: number, b: Triple): Triple => [
  a[0] + k * b[0],
  a[1] + k * b[1],
  a[2] + k * b[2],
];
const dot = (a: Triple, b: Triple): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
const cross = (a: Triple, b: Triple): Triple => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
const scaled = (a: Triple, k: number): Triple => [k * a[0], k * a[1], k * a[2]];
export const length = (a: Triple): number => Math.sqrt(dot(a, a));
const unit = (a: Triple): Triple => scaled(a, 1 / length(a));
/** The angle between two vectors, radians, good at every size. */
export const angleBetween = (a: Triple, b: Triple): number => Math.atan2(length(cross(a, b)), dot(a, b));

/**
 * The library's time object for a given TT. Its own inversion loops for ever at some instants (TT
 * −16383.99964084432 is one), so ΔT is inverted here with a bounded iteration. Error below 2e-11 day.
 */
export function timeAt(tt: number): AstroTime {
  let time = new AstroTime(tt);
  for (let step = 0; step < TIME_STEPS && Math.abs(tt - time.tt) > TIME_TOLERANCE_DAYS; step++) {
    time = new AstroTime(time.ut + (tt - time.tt));
  }
  return time;
}

/** Geometric heliocentric place, J2000 equator, au. */
function heliocentric(planet: PlanetName, time: AstroTime): Triple {
  const { x, y, z } = HelioVector(libraryBody[planet], time);
  return [x, y, z];
}

/** A direction from the Earth with what belongs to the light that shows it. */
export interface Place {
  /** Apparent direction, unit vector on J2000 axes. */
  readonly direction: Triple;
  /** The body from the Earth, light-time corrected, no aberration or deflection, au. */
  readonly astrometric: Triple;
  /** The body from the Sun at the moment when the light left, au. */
  readonly heliocentric: Triple;
}

/** The Earth's sky at one instant of TT. */
export class Sky {
  readonly time: AstroTime;
  /** The Earth from the Sun, geometric, au. */
  readonly earthFromSun: Triple;
  private readonly sun: Triple;
  private readonly sunVelocity: Triple;
  private readonly earth: Triple;
  private readonly earthVelocityOverC: Triple;
  private readonly toEquator: RotationMatrix;
  private readonly toEcliptic: RotationMatrix;
  private readonly seen = new Map<SkyName | 'sun', Place>();

  constructor(readonly tt: number) {
    this.time = timeAt(tt);
    const sun = BaryState(Body.Sun, this.time);
    const earth = HelioState(Body.Earth, this.time);
    this.sun = [sun.x, sun.y, sun.z];
    this.sunVelocity = [sun.vx, sun.vy, sun.vz];
    this.earthFromSun = [earth.x, earth.y, earth.z];
    this.earth = plusTimes(this.sun, 1, this.earthFromSun);
    this.earthVelocityOverC = scaled([sun.vx + earth.vx, sun.vy + earth.vy, sun.vz + earth.vz], 1 / C_AUDAY);
    this.toEquator = Rotation_EQJ_EQD(this.time);
    this.toEcliptic = Rotation_EQJ_ECT(this.time);
  }

  /** Where the Sun or a planet is seen. */
  place(body: SkyName | 'sun'): Place {
    const known = this.seen.get(body);
    if (known) return known;
    const place = body === 'sun' ? this.sunPlace() : this.planetPlace(body);
    this.seen.set(body, place);
    return place;
  }

  /** A planet's true distance from the Earth at this TT, no light-time, au. */
  geometricDistanceAu(planet: SkyName): number {
    return length(minus(heliocentric(planet, this.time), this.earthFromSun));
  }

  /** Apparent right ascension on the true equator and equinox of date, −π … π. */
  rightAscension(body: SkyName | 'sun'): number {
    return azimuthOf(this.toEquator, this.place(body).direction);
  }

  /** Apparent longitude on the true ecliptic and equinox of date, −π … π. */
  longitude(body: SkyName | 'sun'): number {
    return azimuthOf(this.toEcliptic, this.place(body).direction);
  }

  /** Apparent angle between the Sun and a planet. */
  elongation(planet: SkyName): number {
    return angleBetween(this.place('sun').direction, this.place(planet).direction);
  }

  /** Geometric heliocentric longitude on the true ecliptic and equinox of date, no light-time, −π … π. */
  heliocentricLongitude(planet: PlanetName): number {
    return azimuthOf(this.toEcliptic, heliocentric(planet, this.time));
  }

  private sunPlace(): Place {
    const { fromEarth, fromSun } = this.lightTimeCorrected(() => [0, 0, 0]);
    return { direction: this.aberrated(unit(fromEarth)), astrometric: fromEarth, heliocentric: fromSun };
  }

  private planetPlace(planet: SkyName): Place {
    const { fromEarth, fromSun } = this.lightTimeCorrected((time) => heliocentric(planet, time));
    const direction = this.aberrated(this.deflected(unit(fromEarth), unit(fromSun)));
    return { direction, astrometric: fromEarth, heliocentric: fromSun };
  }

  /**
   * The Sun is carried back through the light-time by its velocity: its acceleration, 1.2e-8 au/day², is worth
   * less than 1e-11 rad over Neptune's four hours.
   */
  private lightTimeCorrected(fromSunAt: (time: AstroTime) => Triple): { fromEarth: Triple; fromSun: Triple } {
    let lightTimeDays = 0;
    let fromSun = fromSunAt(this.time);
    for (let step = 0; step < LIGHT_TIME_STEPS; step++) {
      const body = plusTimes(plusTimes(this.sun, -lightTimeDays, this.sunVelocity), 1, fromSun);
      const fromEarth = minus(body, this.earth);
      const next = length(fromEarth) / C_AUDAY;
      if (Math.abs(next - lightTimeDays) < LIGHT_TIME_TOLERANCE_DAYS) return { fromEarth, fromSun };
      lightTimeDays = next;
      fromSun = fromSunAt(timeAt(this.tt - lightTimeDays));
    }
    throw new Error(`The light-time did not settle at TT ${this.tt}.`);
  }

  /** ERFA `ld`: `p` from the Earth, `q` from the Sun to the planet, both unit vectors. */
  private deflected(p: Triple, q: Triple): Triple {
    const distance = length(this.earthFromSun);
    const e = scaled(this.earthFromSun, 1 / distance);
    const limited = Math.max(dot(q, plusTimes(q, 1, e)), DEFLECTION_LIMIT);
    const strength = SUN_SCHWARZSCHILD_RADIUS_AU / distance / limited;
    return unit(plusTimes(p, strength, cross(p, cross(e, q))));
  }

  /** ERFA `ab` without the term of the Sun's potential. */
  private aberrated(p: Triple): Triple {
    const v = this.earthVelocityOverC;
    const inverseLorentz = Math.sqrt(1 - dot(v, v));
    return unit(plusTimes(scaled(p, inverseLorentz), 1 + dot(p, v) / (1 + inverseLorentz), v));
  }
}

/** The library's matrices are stored by column: element [j][i] takes component j into component i. */
function azimuthOf(matrix: RotationMatrix, [x, y, z]: Triple): number {
  const [fromX, fromY, fromZ] = matrix.rot as [number[], number[], number[]];
  return Math.atan2(
    fromX[1]! * x + fromY[1]! * y + fromZ[1]! * z,
    fromX[0]! * x + fromY[0]! * y + fromZ[0]! * z,
  );
}
