import type { Planet } from '../bodies/index.js';
import { RADIANS_PER_DEGREE, wrapPi } from '../math/index.js';
import type { Vector } from '../math/index.js';
import { DAYS_PER_JULIAN_CENTURY, centuriesOf } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import { meanElements } from './elements.js';
import type { ElementTable } from './elements.js';

/** Position, velocity and acceleration: au, au a day, au a day². */
export interface OrbitalMotion {
  readonly position: Vector;
  readonly velocity: Vector;
  readonly acceleration: Vector;
}

const MAX_KEPLER_STEPS = 20;
const KEPLER_TOLERANCE = 1e-13;

/**
 * The eccentric anomaly, radians, by Newton's method from Danby's start.
 * @param meanAnomaly radians in (−π, π]
 * @param eccentricity 0 ≤ e < 1
 * Source: Danby, Fundamentals of Celestial Mechanics, 2nd ed. (1988), §6.6.
 */
export function eccentricAnomaly(meanAnomaly: number, eccentricity: number): number {
  let anomaly = meanAnomaly + 0.85 * eccentricity * Math.sign(Math.sin(meanAnomaly));
  for (let step = 0; step < MAX_KEPLER_STEPS; step++) {
    const sine = eccentricity * Math.sin(anomaly);
    const cosine = eccentricity * Math.cos(anomaly);
    const miss = anomaly - sine - meanAnomaly;
    if (Math.abs(miss) < KEPLER_TOLERANCE) break;
    // Halley's correction of Newton's step: third order.
    const slope = 1 - cosine;
    anomaly -= miss / (slope - (miss * sine) / (2 * slope));
  }
  return anomaly;
}

/**
 * A planet's heliocentric motion on its mean Kepler orbit, geometric, axes of the mean ecliptic and equinox of
 * J2000.0. Velocity and acceleration leave out the slow drift of the elements.
 * Error: Table 1 up to 15″ (Venus) … 600″ (Saturn) within 1800–2050; Table 2 up to 20″ … 1000″ over six millennia.
 * Source: Standish, as in `elements.ts`.
 */
export function keplerMotion(planet: Planet, tt: TtDays, table: ElementTable): OrbitalMotion {
  const T = centuriesOf(tt);
  const elements = meanElements[table][planet];
  const at = ([value, perCentury]: readonly [number, number]): number => value + perCentury * T;
  const a = at(elements.a);
  const e = at(elements.eccentricity);
  const inclination = at(elements.inclinationDeg) * RADIANS_PER_DEGREE;
  const perihelionDeg = at(elements.perihelionLongitudeDeg);
  const nodeDeg = at(elements.nodeLongitudeDeg);
  const terms = elements.anomalyTerms;
  const extraDeg =
    terms === undefined
      ? 0
      : terms.b * T * T +
        terms.c * Math.cos(terms.fDeg * T * RADIANS_PER_DEGREE) +
        terms.s * Math.sin(terms.fDeg * T * RADIANS_PER_DEGREE);
  const meanAnomaly = wrapPi((at(elements.meanLongitudeDeg) - perihelionDeg + extraDeg) * RADIANS_PER_DEGREE);
  const anomalyRatePerDay =
    ((elements.meanLongitudeDeg[1] - elements.perihelionLongitudeDeg[1]) * RADIANS_PER_DEGREE) /
    DAYS_PER_JULIAN_CENTURY;

  const anomaly = eccentricAnomaly(meanAnomaly, e);
  const [sine, cosine] = [Math.sin(anomaly), Math.cos(anomaly)];
  const flattening = Math.sqrt(1 - e * e);
  const anomalyRate = anomalyRatePerDay / (1 - e * cosine);
  const x = a * (cosine - e);
  const y = a * flattening * sine;
  const toEcliptic = orbitToEcliptic(
    (perihelionDeg - nodeDeg) * RADIANS_PER_DEGREE,
    nodeDeg * RADIANS_PER_DEGREE,
    inclination,
  );
  const radius = a * (1 - e * cosine);
  const pull = -(anomalyRatePerDay ** 2) * (a / radius) ** 3;
  return {
    position: toEcliptic(x, y),
    velocity: toEcliptic(-a * sine * anomalyRate, a * flattening * cosine * anomalyRate),
    acceleration: toEcliptic(pull * x, pull * y),
  };
}

/** From the orbit's own plane (x to perihelion) to the ecliptic. */
function orbitToEcliptic(
  argument: number,
  node: number,
  inclination: number,
): (x: number, y: number) => Vector {
  const [sw, cw] = [Math.sin(argument), Math.cos(argument)];
  const [sn, cn] = [Math.sin(node), Math.cos(node)];
  const [si, ci] = [Math.sin(inclination), Math.cos(inclination)];
  return (x, y) => ({
    x: (cw * cn - sw * sn * ci) * x + (-sw * cn - cw * sn * ci) * y,
    y: (cw * sn + sw * cn * ci) * x + (-sw * sn + cw * cn * ci) * y,
    z: sw * si * x + cw * si * y,
  });
}
