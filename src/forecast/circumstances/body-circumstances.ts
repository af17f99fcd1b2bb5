import { bodyFacts } from '../../bodies/index.js';
import type { SkyPlanet } from '../../bodies/index.js';
import { LIGHT_AU_PER_DAY } from '../../ephemeris/index.js';
import {
  angleBetween,
  arcsecFromRadians,
  degreesFromRadians,
  hoursFromRadians,
  length,
  sphericalOf,
  wrapPi,
  wrapTwoPi,
} from '../../math/index.js';
import { ttDays } from '../../time/index.js';
import type { TtDays } from '../../time/index.js';
import type { BodyCircumstances } from '../event.js';
import { constellationOf } from './constellation.js';
import type { Illumination } from './magnitude.js';
import { magnitudeOf } from './magnitude-of.js';
import { viewerLatitudeDeg } from './poles.js';
import type { SkyGeometry } from './sky-geometry.js';

/** IAU 2012. */
export const KM_PER_AU = 149_597_870.7;
const MINUTES_PER_DAY = 1440;

/** What is true of a planet in the Earth's sky at an instant of TT. */
export function bodyCircumstances(body: SkyPlanet, tt: TtDays, sky: SkyGeometry): BodyCircumstances {
  const astrometric = sky.astrometric(body, tt);
  const distanceAu = length(astrometric);
  const lightDays = distanceAu / LIGHT_AU_PER_DAY;
  // The Sun lit the planet, for us, a light-time ago.
  const fromSun = sky.heliocentric(body, ttDays(tt - lightDays));
  const phaseAngle = angleBetween(fromSun, astrometric);
  const light: Illumination = {
    sunDistanceAu: length(fromSun),
    earthDistanceAu: distanceAu,
    phaseDeg: degreesFromRadians(phaseAngle),
  };
  const ecliptic = sky.apparent(body, 'ecliptic-of-date', tt);
  const sun = sky.apparent('sun', 'ecliptic-of-date', tt);
  const { longitude, latitude } = sphericalOf(ecliptic);
  const ofDate = sphericalOf(sky.apparent(body, 'equator-of-date', tt));
  const j2000 = sphericalOf(astrometric);
  const rightAscensionJ2000Hours = hoursFromRadians(wrapTwoPi(j2000.longitude));
  const declinationJ2000Deg = degreesFromRadians(j2000.latitude);
  return {
    body,
    distanceAu,
    distanceKm: distanceAu * KM_PER_AU,
    lightMinutes: lightDays * MINUTES_PER_DAY,
    heliocentricDistanceAu: length(sky.heliocentric(body, tt)),
    elongationDeg: degreesFromRadians(angleBetween(ecliptic, sun)),
    elongationSide: wrapPi(longitude - sphericalOf(sun).longitude) >= 0 ? 'east' : 'west',
    phaseAngleDeg: light.phaseDeg,
    illuminatedFraction: (1 + Math.cos(phaseAngle)) / 2,
    magnitude: magnitudeOf(body, light, fromSun, astrometric, tt),
    diameterArcsec: arcsecFromRadians(
      2 * Math.asin(bodyFacts[body].equatorialRadiusKm / (distanceAu * KM_PER_AU)),
    ),
    ...(body === 'saturn' ? { ringTiltDeg: viewerLatitudeDeg('saturn', astrometric, tt) } : {}),
    constellation: constellationOf(rightAscensionJ2000Hours, declinationJ2000Deg),
    rightAscensionJ2000Hours,
    declinationJ2000Deg,
    rightAscensionOfDateHours: hoursFromRadians(wrapTwoPi(ofDate.longitude)),
    declinationOfDateDeg: degreesFromRadians(ofDate.latitude),
    eclipticLongitudeDeg: degreesFromRadians(wrapTwoPi(longitude)),
    eclipticLatitudeDeg: degreesFromRadians(latitude),
  };
}
