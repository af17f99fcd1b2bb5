import type { SkyPlanet } from '../bodies/index.js';
import { hoursFromRadians, wrapPi } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import type { SkyOverSite } from './horizontal.js';
import { refractionDeg } from './refraction.js';

/** The planets that the naked eye sees. */
const BRIGHT: readonly SkyPlanet[] = ['mercury', 'venus', 'mars', 'jupiter', 'saturn'];

export interface MeridianPlanet {
  readonly body: SkyPlanet;
  /** Before the upper transit negative, after it positive: (−12, 12]. */
  readonly hourAngleHours: number;
  /** Refracted. */
  readonly altitudeDeg: number;
  readonly azimuthDeg: number;
}

/** The bright planets with their hour angles at a site, the one nearest its upper transit first. */
export function brightPlanetsByMeridian(sky: SkyOverSite, tt: TtDays): MeridianPlanet[] {
  return BRIGHT.map((body) => {
    const { hourAngle, altitudeDeg, azimuthDeg } = sky.horizontal(body, tt);
    return {
      body,
      hourAngleHours: hoursFromRadians(wrapPi(hourAngle)),
      altitudeDeg: altitudeDeg + refractionDeg(altitudeDeg),
      azimuthDeg,
    };
  }).sort((a, b) => Math.abs(a.hourAngleHours) - Math.abs(b.hourAngleHours));
}
