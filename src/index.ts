/** The library face: what the command line itself uses, and no more. The core is pure and runs anywhere. */
export { bodies, isBody, majorPlanets, planets } from './bodies/index.js';
export type { Body, Planet, SkyPlanet } from './bodies/index.js';
export {
  CALENDAR_YEAR_DAYS,
  PeriodError,
  nearRepeats,
  siderealPeriodDays,
  synodicPeriodDays,
  synodicPeriodOf,
} from './cycles/index.js';
export type { NearRepeat } from './cycles/index.js';
export { NoSuchPairError, forecast, kindNames, residuals } from './forecast/index.js';
export type * from './forecast/index.js';
export {
  eventsCsv,
  eventsJson,
  eventsMarkdown,
  residualsCsv,
  residualsJson,
  terminalLines,
} from './output/index.js';
export { eventsCalendar } from './output/calendar/index.js';
export { SiteError, makeSite } from './sky/index.js';
export type { HorizonPoint, LocalView, Site, SiteWords } from './sky/index.js';
export { isoUtc, parseInstantUtc, ttFromUtc, utcFromTt, utcMillis } from './time/index.js';
export type { LocalDate, TtDays, UtcMillis } from './time/index.js';
