/**
 * Apparent visual magnitudes of the planets, the formulae that the Astronomical Almanac has used since 2018.
 * Source: A. Mallama & J. L. Hilton, Astronomy and Computing 25 (2018) 10; equation numbers are theirs.
 * Their fits scatter by 0.02 to 0.1 magnitude; Mars, whose face turns, is averaged over its rotation (±0.06) and its
 * seasons (±0.03).
 */
export interface Illumination {
  readonly sunDistanceAu: number;
  readonly earthDistanceAu: number;
  readonly phaseDeg: number;
}

/** What Saturn's rings and Uranus's poles add: planetocentric latitudes of the Sun and of the Earth. */
export interface Tilt {
  readonly sunLatitudeDeg: number;
  readonly earthLatitudeDeg: number;
}

const distanceTerm = ({ sunDistanceAu, earthDistanceAu }: Illumination): number =>
  5 * Math.log10(sunDistanceAu * earthDistanceAu);

/** Σ cᵢ xⁱ, the constant term first. */
const polynomial = (coefficients: readonly number[], x: number): number =>
  coefficients.reduceRight((sum, c) => sum * x + c, 0);

/** Equation 2. */
export function mercuryMagnitude(light: Illumination): number {
  const phase = polynomial(
    [-0.613, 6.328e-2, -1.6336e-3, 3.3644e-5, -3.4265e-7, 1.6893e-9, -3.0334e-12],
    light.phaseDeg,
  );
  return distanceTerm(light) + phase;
}

/** Beyond this phase angle sunlight comes through Venus's air around the whole limb. */
const VENUS_THREAD_PHASE_DEG = 163.7;

/** Equations 3 and 4. */
export function venusMagnitude(light: Illumination): number {
  const coefficients =
    light.phaseDeg <= VENUS_THREAD_PHASE_DEG
      ? [-4.384, -1.044e-3, 3.687e-4, -2.814e-6, 8.938e-9]
      : [236.05828, -2.81914, 8.39034e-3];
  return distanceTerm(light) + polynomial(coefficients, light.phaseDeg);
}

/** Equations 6 and 7, without the terms of rotation and season. */
export function marsMagnitude(light: Illumination): number {
  const coefficients = light.phaseDeg <= 50 ? [-1.601, 2.267e-2, -1.302e-4] : [-0.367, -0.02573, 3.445e-4];
  return distanceTerm(light) + polynomial(coefficients, light.phaseDeg);
}

/** Equation 8: as seen from the Earth the phase angle stays below 12°. */
export function jupiterMagnitude(light: Illumination): number {
  return distanceTerm(light) + polynomial([-9.395, -3.7e-4, 6.16e-4], light.phaseDeg);
}

/** Equation 10, globe and rings: for phase angles to 6.5° and an effective tilt to 27°, else null. */
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

/** The flattening with which the paper turns Uranus's planetocentric latitudes into planetographic ones. */
const URANUS_FLATTENING = 0.022927;

/** Equations 13 and 14. */
export function uranusMagnitude(light: Illumination, { sunLatitudeDeg, earthLatitudeDeg }: Tilt): number {
  const latitudeDeg = (graphicDeg(sunLatitudeDeg) + graphicDeg(earthLatitudeDeg)) / 2;
  const phase = light.phaseDeg > 3.1 ? polynomial([0, 6.587e-3, 1.045e-4], light.phaseDeg) : 0;
  return distanceTerm(light) - 7.11 - 8.4e-4 * latitudeDeg + phase;
}

function graphicDeg(centricDeg: number): number {
  const tangent = Math.tan((Math.abs(centricDeg) * Math.PI) / 180) / (1 - URANUS_FLATTENING) ** 2;
  return (Math.atan(tangent) * 180) / Math.PI;
}

/** Equation 16: Neptune brightened from 1980 to 2000. As seen from the Earth its phase angle stays below 1.9°. */
export function neptuneMagnitude(light: Illumination, year: number): number {
  const atUnitDistance = Math.min(-6.89, Math.max(-7, -6.89 - 0.0054 * (year - 1980)));
  return distanceTerm(light) + atUnitDistance;
}
