import { rotationTo } from '../ephemeris/index.js';
import {
  RADIANS_PER_ARCSEC,
  RADIANS_PER_DEGREE,
  RADIANS_PER_HOUR,
  rotate,
  sphericalOf,
  transpose,
  unitVector,
  wrapTwoPi,
} from '../math/index.js';
import type { Rotation, Vector } from '../math/index.js';
import { centuriesOf } from '../time/index.js';
import type { TtDays } from '../time/index.js';

export interface EquatorialPlace {
  readonly rightAscensionHours: number;
  readonly declinationDeg: number;
}

/** `mean`: precession alone, as catalogues of a date are; `true`: with nutation, as a telescope's circles see it. */
export type EquatorOfDate = 'mean' | 'true';

/** A place of J2000.0 on the equator and equinox of a date. No proper motion, parallax or aberration. */
export const fromJ2000 = (place: EquatorialPlace, tt: TtDays, equator: EquatorOfDate): EquatorialPlace =>
  placeOf(rotate(rotationOf(equator, tt), vectorOf(place)));

/** A place on the equator and equinox of a date, brought to J2000.0. */
export const toJ2000 = (place: EquatorialPlace, tt: TtDays, equator: EquatorOfDate): EquatorialPlace =>
  placeOf(rotate(transpose(rotationOf(equator, tt)), vectorOf(place)));

const rotationOf = (equator: EquatorOfDate, tt: TtDays): Rotation =>
  equator === 'true' ? rotationTo('equator-of-date', tt) : meanRotation(tt);

/**
 * From J2000.0 to the mean equator of date: R3(−z) · R2(θ) · R3(−ζ).
 * Source: Capitaine, Wallace & Chapront, Astron. Astrophys. 412 (2003) 567, eq. 40 (IAU 2006).
 */
function meanRotation(tt: TtDays): Rotation {
  const t = centuriesOf(tt);
  const arcsec = (c: readonly number[]): number =>
    c.reduceRight((sum, coefficient) => sum * t + coefficient, 0) * RADIANS_PER_ARCSEC;
  const zeta = arcsec([2.650545, 2306.083227, 0.2988499, 0.01801828, -5.971e-6, -3.173e-7]);
  const z = arcsec([-2.650545, 2306.077181, 1.0927348, 0.01826837, -2.8596e-5, -2.904e-7]);
  const theta = arcsec([0, 2004.191903, -0.4294934, -0.04182264, -7.089e-6, -1.274e-7]);
  const [cz, sz] = [Math.cos(z), Math.sin(z)];
  const [ct, st] = [Math.cos(theta), Math.sin(theta)];
  const [cx, sx] = [Math.cos(zeta), Math.sin(zeta)];
  return [
    { x: cx * ct * cz - sx * sz, y: -sx * ct * cz - cx * sz, z: -st * cz },
    { x: cx * ct * sz + sx * cz, y: -sx * ct * sz + cx * cz, z: -st * sz },
    { x: cx * st, y: -sx * st, z: ct },
  ];
}

const vectorOf = ({ rightAscensionHours, declinationDeg }: EquatorialPlace): Vector =>
  unitVector(rightAscensionHours * RADIANS_PER_HOUR, declinationDeg * RADIANS_PER_DEGREE);

function placeOf(vector: Vector): EquatorialPlace {
  const { longitude, latitude } = sphericalOf(vector);
  return {
    rightAscensionHours: wrapTwoPi(longitude) / RADIANS_PER_HOUR,
    declinationDeg: latitude / RADIANS_PER_DEGREE,
  };
}
