import { dot, length, radiansFromDegrees, unitVector } from '../../math/index.js';
import type { Vector } from '../../math/index.js';
import { centuriesOf } from '../../time/index.js';
import type { TtDays } from '../../time/index.js';

/** North poles on the axes of J2000.0. Source: Archinal et al., Celest. Mech. Dyn. Astr. 130 (2018) 22. */
const poles = {
  saturn: (centuries: number) => ({ raDeg: 40.589 - 0.036 * centuries, decDeg: 83.537 - 0.004 * centuries }),
  uranus: () => ({ raDeg: 257.311, decDeg: -15.175 }),
};

/**
 * The planetocentric latitude on a planet of someone who sees it in a direction, degrees, north positive.
 * @param towardsPlanet from the viewer to the planet, axes of J2000.0
 */
export function viewerLatitudeDeg(planet: keyof typeof poles, towardsPlanet: Vector, tt: TtDays): number {
  const { raDeg, decDeg } = poles[planet](centuriesOf(tt));
  const pole = unitVector(radiansFromDegrees(raDeg), radiansFromDegrees(decDeg));
  return (Math.asin(-dot(pole, towardsPlanet) / length(towardsPlanet)) * 180) / Math.PI;
}
