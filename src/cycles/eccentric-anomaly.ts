import { NoConvergenceError } from '../math/index.js';

/** Four or five steps are usual; the hardest case, e → 1 near perihelion, takes about a dozen. */
const MAX_STEPS = 30;
const TOLERANCE = 1e-13;

/**
 * Solves Kepler's equation M = E − e·sin E for the eccentric anomaly E, by Halley's third-order step from Danby's start.
 * @param meanAnomaly radians in (−π, π]
 * @param eccentricity 0 ≤ e < 1
 * @returns radians; the equation is met to 1e-13
 * @throws NoConvergenceError outside those ranges, after 30 steps
 * Source: Danby, Fundamentals of Celestial Mechanics, 2nd ed. (1988), §6.6.
 */
export function eccentricAnomaly(meanAnomaly: number, eccentricity: number): number {
  let anomaly = meanAnomaly + 0.85 * eccentricity * Math.sign(meanAnomaly);
  for (let step = 0; step < MAX_STEPS; step++) {
    const sine = eccentricity * Math.sin(anomaly);
    const miss = anomaly - sine - meanAnomaly;
    if (Math.abs(miss) < TOLERANCE) return anomaly;
    const slope = 1 - eccentricity * Math.cos(anomaly);
    anomaly -= miss / (slope - (miss * sine) / (2 * slope));
  }
  throw new NoConvergenceError(
    `Kepler's equation has no solution for mean anomaly ${meanAnomaly} and eccentricity ${eccentricity}: ` +
      'the anomaly must lie in (−π, π], the eccentricity in [0, 1)',
  );
}
