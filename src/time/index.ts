export { deltaTAt } from './delta-t.js';
export type { DeltaT } from './delta-t.js';
export * from './instants.js';
export { isoUtc, julianDateTt, parseInstantUtc, parseLocalDate } from './iso.js';
export { LEAP_SECONDS_KNOWN_UNTIL, leapSeconds } from './leap-seconds.js';
export { ttFromUtc, utcFromTt, utcUncertaintySeconds } from './scales.js';
export { SUPPORTED_FROM, SUPPORTED_TO, spanRefusal } from './span.js';
export { isZone, localDateTime, localIso, utcOfLocal, zoneAbbreviation } from './zones.js';
