import type { Planet } from '../bodies/index.js';
import { RADIANS_PER_DEGREE, scale, wrapPi } from '../math/index.js';
import type { Vector } from '../math/index.js';
import { DAYS_PER_JULIAN_CENTURY, centuriesOf } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import { eccentricAnomaly } from './eccentric-anomaly.js';
import { meanElements } from './elements.js';
import type { ElementTable, MeanElements } from './elements.js';

/** Position, velocity and acceleration: au, au a day, au a day². */
export interface OrbitalMotion {
  readonly position: Vector;
  readonly velocity: Vector;
  readonly acceleration: Vector;
}

/**
 * A planet's heliocentric motion on its mean Kepler orbit, geometric, axes of the mean ecliptic and equinox of J2000.0;
 * for the Earth, that of the Earth–Moon barycentre.
 *
 * Error in heliocentric longitude, the worst against VSOP87: Table 1 within 1800–2050 30″ (Mercury, Venus, Earth), 100″
 * (Mars), 510″ (Jupiter), 740″ (Saturn), 120″ (Uranus), 60″ (Neptune); Table 2 within 1600–2600 25″ (Mercury) … 1260″
 * (Saturn). The nominal errors that Standish prints (Table 1: 15″ Mercury … 600″ Saturn) lie between the root mean square
 * and the worst, save for Neptune's 10″.
 * Velocity and acceleration are those of the two-body orbit of the instant, its mean motion that of the mean longitude;
 * the drift of the other elements is left out, which is 1e-4 of the velocity at most (Pluto 2e-4).
 * Source: Standish, as in `elements.ts`.
 */
export function keplerMotion(planet: Planet, tt: TtDays, table: ElementTable): OrbitalMotion {
  const orbit = orbitAt(meanElements[table][planet], centuriesOf(tt));
  const { a, e, meanAnomaly, meanMotionPerDay } = orbit;
  const anomaly = eccentricAnomaly(meanAnomaly, e);
  const sine = Math.sin(anomaly);
  const cosine = Math.cos(anomaly);
  const nearness = 1 / (1 - e * cosine);
  const semiMinor = a * Math.sqrt(1 - e * e);
  const anomalyRate = meanMotionPerDay * nearness;
  const inSpace = planeToEcliptic(orbit);
  const position = inSpace(a * (cosine - e), semiMinor * sine);
  return {
    position,
    velocity: inSpace(-a * sine * anomalyRate, semiMinor * cosine * anomalyRate),
    acceleration: scale(position, -(meanMotionPerDay ** 2) * nearness ** 3),
  };
}

/** How an orbit's plane and its perihelion lie, radians. */
interface Plane {
  readonly inclination: number;
  readonly node: number;
  /** From the node to the perihelion, along the orbit. */
  readonly perihelionArgument: number;
}

/** An orbit at one instant: au, radians, radians a day. */
interface Orbit extends Plane {
  readonly a: number;
  readonly e: number;
  /** In (−π, π]. */
  readonly meanAnomaly: number;
  readonly meanMotionPerDay: number;
}

function orbitAt(elements: MeanElements, centuries: number): Orbit {
  const at = (element: readonly [number, number]): number => element[0] + element[1] * centuries;
  const perihelionDeg = at(elements.perihelionLongitudeDeg);
  const nodeDeg = at(elements.nodeLongitudeDeg);
  const extra = anomalyTermsAt(elements, centuries);
  return {
    a: at(elements.a),
    e: at(elements.eccentricity),
    meanAnomaly: wrapPi((at(elements.meanLongitudeDeg) - perihelionDeg + extra.deg) * RADIANS_PER_DEGREE),
    meanMotionPerDay:
      ((elements.meanLongitudeDeg[1] + extra.degPerCentury) * RADIANS_PER_DEGREE) / DAYS_PER_JULIAN_CENTURY,
    inclination: at(elements.inclinationDeg) * RADIANS_PER_DEGREE,
    node: nodeDeg * RADIANS_PER_DEGREE,
    perihelionArgument: (perihelionDeg - nodeDeg) * RADIANS_PER_DEGREE,
  };
}

/** What Table 2b adds to the mean anomaly, degrees, and its rate, degrees a century. */
function anomalyTermsAt(
  { anomalyTerms: terms }: MeanElements,
  centuries: number,
): { readonly deg: number; readonly degPerCentury: number } {
  if (terms === undefined) return noTerms;
  const f = terms.fDeg * RADIANS_PER_DEGREE;
  const sine = Math.sin(f * centuries);
  const cosine = Math.cos(f * centuries);
  return {
    deg: terms.b * centuries * centuries + terms.c * cosine + terms.s * sine,
    degPerCentury: 2 * terms.b * centuries + f * (terms.s * cosine - terms.c * sine),
  };
}

const noTerms = { deg: 0, degPerCentury: 0 };

/** From the orbit's own plane (x to the perihelion, y ahead of it) to the ecliptic. */
function planeToEcliptic({ inclination, node, perihelionArgument }: Plane): (x: number, y: number) => Vector {
  const sw = Math.sin(perihelionArgument);
  const cw = Math.cos(perihelionArgument);
  const sn = Math.sin(node);
  const cn = Math.cos(node);
  const si = Math.sin(inclination);
  const ci = Math.cos(inclination);
  return (x, y) => {
    const alongNode = cw * x - sw * y;
    const across = sw * x + cw * y;
    return { x: cn * alongNode - sn * ci * across, y: sn * alongNode + cn * ci * across, z: si * across };
  };
}
