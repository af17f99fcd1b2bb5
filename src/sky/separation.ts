import type { SkyPlanet } from '../bodies/index.js';
import { angleBetween, degreesFromRadians } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import type { SkyOverSite } from './horizontal.js';

/** The angle between two bodies as a site sees them, degrees; null where there are not two. */
export function separationDeg(sky: SkyOverSite, [a, b]: readonly SkyPlanet[], tt: TtDays): number | null {
  if (a === undefined || b === undefined) return null;
  return degreesFromRadians(angleBetween(sky.horizontal(a, tt).direction, sky.horizontal(b, tt).direction));
}
