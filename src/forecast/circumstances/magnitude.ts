import { marsSeasonMagnitude } from './mars-season.js';

/**
 * Apparent visual magnitudes of the planets, the formulae that the Astronomical Almanac has used since 2018.
 * Source: A. Mallama & J. L. Hilton, Astronomy and Computing 25 (2018) 10; equation numbers are theirs.
 * Their fits scatter by 0.02 to 0.1 magnitude.
 */
export interface Illumination {
  /** From the Sun to the planet when the light that arrives now was there. */
  readonly sunDistanceAu: number;
  /** From the planet then to the Earth now. */
  readonly earthDistanceAu: number;
  /** The angle Sun–planet–Earth between the two. */
  readonly phaseDeg: number;
}

/** What Saturn's rings and Uranus's poles add: latitudes on the planet of the Sun and of the Earth. */
export interface Tilt {
  readonly sunLatitudeDeg: number;
  readonly earthLatitudeDeg: number;
}

const distanceTerm = ({ sunDistanceAu, earthDistanceAu }: Illumination): number =>
  5 * Math.log10(sunDistanceAu * earthDistanceAu);

/** Σ cᵢ xⁱ, the constant term first. */
const polynomial = (coefficients: readonly number[], x: number): number =>
  coefficients.reduceRight((sum, c) => sum * x + c, 0);

/** Equation 2; observed from 2° to 170°. */
export function mercuryMagnitude(light: Illumination): number {
  const phase = polynomial(
    [-0.613, 6.328e-2, -1.6336e-3, 3.3644e-5, -3.4265e-7, 1.6893e-9, -3.0334e-12],
    light.phaseDeg,
  );
  return distanceTerm(light) + phase;
}

/** Beyond this phase angle sunlight comes through Venus's air around the whole limb. */
const VENUS_THREAD_PHASE_DEG = 163.7;

/** Equations 3 and 4; observed from 2° to 179°. */
export function venusMagnitude(light: Illumination): number {
  const coefficients =
    light.phaseDeg < VENUS_THREAD_PHASE_DEG
      ? [-4.384, -1.044e-3, 3.687e-4, -2.814e-6, 8.938e-9]
      : [236.05828, -2.81914, 8.39034e-3];
  return distanceTerm(light) + polynomial(coefficients, light.phaseDeg);
}

/**
 * Equations 6 and 7; reliable to 120°. Averaged over the rotation of Mars, whose darker and brighter faces turn past
 * us in a day and move the magnitude by −0.06 to +0.05 about this mean (0.034 rms).
 */
export function marsMagnitude(light: Illumination, solarLongitudeDeg: number): number {
  const coefficients = light.phaseDeg <= 50 ? [-1.601, 2.267e-2, -1.302e-4] : [-0.367, -0.02573, 3.445e-4];
  return (
    distanceTerm(light) + polynomial(coefficients, light.phaseDeg) + marsSeasonMagnitude(solarLongitudeDeg)
  );
}

/** Equations 8 (as seen from the Earth) and 9; observed to 130°. */
export function jupiterMagnitude(light: Illumination): number {
  if (light.phaseDeg <= 12)
    return distanceTerm(light) + polynomial([-9.395, -3.7e-4, 6.16e-4], light.phaseDeg);
  const share = polynomial([1, -1.507, -0.363, -0.062, 2.809, -1.876], light.phaseDeg / 180);
  return distanceTerm(light) - 9.428 - 2.5 * Math.log10(share);
}

/**
 * Equation 10, globe and rings: for phase angles to 6.5° and an effective tilt to 27°, which hold whatever is seen
 * from the Earth; null beyond, where the rings are not covered. Takes planetocentric latitudes.
 */
export function saturnMagnitude(
  light: Illumination,
  { sunLatitudeDeg, earthLatitudeDeg }: Tilt,
): number | null {
  // With the Sun and the Earth on different sides of the rings, their dark face is turned to us.
  const product = sunLatitudeDeg * earthLatitudeDeg;
  const tiltDeg = product > 0 ? Math.sqrt(product) : 0;
  if (light.phaseDeg > 6.5 || tiltDeg > 27) return null;
  const sine = Math.sin((tiltDeg * Math.PI) / 180);
  return (
    distanceTerm(light) -
    8.914 -
    1.825 * sine +
    0.026 * light.phaseDeg -
    0.378 * sine * Math.exp(-2.25 * light.phaseDeg)
  );
}

/** Equations 14 and 15; observed to 154°. Takes planetographic latitudes, as their fit does. */
export function uranusMagnitude(light: Illumination, { sunLatitudeDeg, earthLatitudeDeg }: Tilt): number {
  const latitudeDeg = (Math.abs(sunLatitudeDeg) + Math.abs(earthLatitudeDeg)) / 2;
  const phase = light.phaseDeg > 3.1 ? polynomial([0, 6.587e-3, 1.045e-4], light.phaseDeg) : 0;
  return distanceTerm(light) - 7.11 - 8.4e-4 * latitudeDeg + phase;
}

/** Equation 16: Neptune brightened from 1980 to 2000. As seen from the Earth, where its phase angle is below 1.9°. */
export function neptuneMagnitude(light: Illumination, year: number): number {
  const atUnitDistance = year < 1980 ? -6.89 : year > 2000 ? -7 : -6.89 - 0.0054 * (year - 1980);
  return distanceTerm(light) + atUnitDistance;
}
