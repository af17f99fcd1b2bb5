import { degreesFromRadians, dot, length, radiansFromDegrees, unitVector } from '../../math/index.js';
import type { Vector } from '../../math/index.js';
import { centuriesOf } from '../../time/index.js';
import type { TtDays } from '../../time/index.js';

/** North poles on the axes of J2000.0. Source: Archinal et al., Celest. Mech. Dyn. Astr. 130 (2018) 22. */
const poles = {
  saturn: (centuries: number) => ({ raDeg: 40.589 - 0.036 * centuries, decDeg: 83.537 - 0.004 * centuries }),
  uranus: () => ({ raDeg: 257.311, decDeg: -15.175 }),
};
/** Of the same source: 1 − 24,973 km / 25,559 km. */
const URANUS_FLATTENING = 0.022927;

/**
 * The planetocentric latitude on a planet of someone who sees it in a direction, degrees, north positive. For Saturn
 * that is the height above the plane of its rings. The pole is taken now and not a light-time ago: 10⁻⁶ degree.
 * @param towardsPlanet from the viewer to the planet, axes of J2000.0
 */
export function viewerLatitudeDeg(planet: keyof typeof poles, towardsPlanet: Vector, tt: TtDays): number {
  const { raDeg, decDeg } = poles[planet](centuriesOf(tt));
  const pole = unitVector(radiansFromDegrees(raDeg), radiansFromDegrees(decDeg));
  return degreesFromRadians(Math.asin(-dot(pole, towardsPlanet) / length(towardsPlanet)));
}

/** From a planetocentric latitude on Uranus to the planetographic one, degrees. */
export function uranusGraphicLatitudeDeg(centricDeg: number): number {
  const tangent = Math.tan(radiansFromDegrees(centricDeg)) / (1 - URANUS_FLATTENING) ** 2;
  return degreesFromRadians(Math.atan(tangent));
}
