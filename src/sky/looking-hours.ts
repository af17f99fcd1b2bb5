import type { SkyPlanet } from '../bodies/index.js';
import { ttDays } from '../time/index.js';
import { darknessNeeded } from './darkness-needed.js';
import type { Night } from './night.js';
import { TWILIGHT_ALTITUDE_DEG } from './night.js';
import { SUN_RISE_ALTITUDE_DEG } from './rise-set.js';
import type { Site } from './site.js';
import { inBoth } from './stretch.js';
import type { Stretch } from './stretch.js';

const MINUTE_DAYS = 1 / 1440;
/** Nobody looks while any part of the Sun can still, or could soon, be met with an eyepiece. */
const AFTER_SUNSET_DAYS = 5 * MINUTE_DAYS;
const BEFORE_SUNRISE_DAYS = 10 * MINUTE_DAYS;
/** Weather bends light at the horizon by some minutes of arc more or less than the standard air; common practice. */
const WEATHER_MARGIN_DEG = 10 / 60;
/** From a height the horizon lies lower, by 2.08′ (dip and refraction) times the root of the metres; common practice. */
const DIP_DEG_PER_ROOT_METRE = 0.0347;

/** The true altitude of the Sun's centre below which no part of it shows, however free the view from the site is. */
export const sunGoneAltitudeDeg = ({ elevationM }: Site): number =>
  SUN_RISE_ALTITUDE_DEG - DIP_DEG_PER_ROOT_METRE * Math.sqrt(Math.max(0, elevationM));

/**
 * The hours of a night in which it is safe to look: from five minutes after sunset to ten minutes before sunrise. The
 * night's last minute is left to the next one.
 */
export const safeHours = (site: Site, night: Night): Stretch[] =>
  night.sun
    .stretchesBelow(sunGoneAltitudeDeg(site) - WEATHER_MARGIN_DEG)
    .map(({ from, to }) => ({
      from: ttDays(Math.max(night.from, from + AFTER_SUNSET_DAYS)),
      to: ttDays(Math.min(night.to - MINUTE_DAYS, to - BEFORE_SUNRISE_DAYS)),
    }))
    .filter(({ from, to }) => from <= to);

/** The safe hours after civil twilight, or where one of the bodies is telescopic after nautical twilight. */
export function darkHours(site: Site, night: Night, bodies: readonly SkyPlanet[]): Stretch[] {
  const telescopic = bodies.some((body) => darknessNeeded[body].sky === 'nautical');
  const darkDeg = TWILIGHT_ALTITUDE_DEG[telescopic ? 'nautical' : 'civil'];
  return inBoth(safeHours(site, night), night.sun.stretchesBelow(darkDeg));
}
