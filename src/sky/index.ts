export { LOWEST_LOOK_DEG } from './best-look.js';
export type { BestLook } from './best-look.js';
export { compassWords } from './compass.js';
export { SkyOverSite } from './horizontal.js';
export type { Horizontal } from './horizontal.js';
export { localViewer } from './local-view.js';
export type { BodyFromSite, LocalView } from './local-view.js';
export { brightPlanetsByMeridian } from './meridian.js';
export type { MeridianPlanet } from './meridian.js';
export { TWILIGHT_ALTITUDE_DEG, eveningOf, nightOf, twilightsOf } from './night.js';
export type { Night, Twilight } from './night.js';
export { fromJ2000, toJ2000 } from './precession.js';
export type { EquatorOfDate, EquatorialPlace } from './precession.js';
export { refractionDeg } from './refraction.js';
export { PLANET_RISE_ALTITUDE_DEG, SUN_RISE_ALTITUDE_DEG, dayArc, meridianTransits } from './rise-set.js';
export type { Crossing, DayArc } from './rise-set.js';
export {
  SIDEREAL_TURNS_PER_DAY,
  greenwichApparentSidereal,
  greenwichMeanSidereal,
  localSidereal,
  siderealDayShorterSeconds,
} from './sidereal.js';
export { SiteError, horizonAltitudeDeg, makeSite } from './site.js';
export type { HorizonPoint, Site, SiteWords } from './site.js';
export type { Stretch } from './stretch.js';
