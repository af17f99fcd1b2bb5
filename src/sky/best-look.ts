import type { SkyPlanet } from '../bodies/index.js';
import { localIso, ttDays, utcFromTt, utcMillis, ttFromUtc } from '../time/index.js';
import type { TtDays, UtcMillis } from '../time/index.js';
import { compassWords } from './compass.js';
import type { SkyOverSite } from './horizontal.js';
import type { Night } from './night.js';
import { TWILIGHT_ALTITUDE_DEG } from './night.js';
import { refractionDeg } from './refraction.js';
import { SUN_RISE_ALTITUDE_DEG } from './rise-set.js';
import { separationDeg } from './separation.js';
import { horizonAltitudeDeg } from './site.js';

export interface BestLook {
  readonly utc: UtcMillis;
  readonly localTime: string;
  /** Of the lower body, refracted. */
  readonly altitudeDeg: number;
  readonly azimuthDeg: number;
  /** Sixteen-point compass in words: `west-north-west`. */
  readonly direction: string;
  /** True altitude of its centre. */
  readonly sunAltitudeDeg: number;
  /** Between two bodies then; null for one body. */
  readonly separationDeg: number | null;
  /** Whether the sky is only as dark as bright twilight allows. */
  readonly inBrightTwilight: boolean;
}

/** Lower than this, murk and turbulence spoil the view; common practice. */
export const LOWEST_LOOK_DEG = 5;
/** These need a dark sky and a telescope; the others show from the end of civil twilight; common practice. */
const FAINT: readonly SkyPlanet[] = ['uranus', 'neptune', 'pluto'];
const MINUTE_DAYS = 1 / 1440;
/** Nobody looks while any part of the Sun can still, or could soon, be met with an eyepiece. */
const AFTER_SUNSET_DAYS = 5 * MINUTE_DAYS;
const BEFORE_SUNRISE_DAYS = 10 * MINUTE_DAYS;
const COARSE_STEP_DAYS = 10 * MINUTE_DAYS;

/**
 * The minute of a night at which the lowest of the bodies stands highest above the local horizon in a dark enough
 * sky, or null where no minute will do. Bright twilight is tried when darkness offers nothing.
 */
export function bestLook(sky: SkyOverSite, bodies: readonly SkyPlanet[], night: Night): BestLook | null {
  const darkDeg = bodies.some((body) => FAINT.includes(body))
    ? TWILIGHT_ALTITUDE_DEG.nautical
    : TWILIGHT_ALTITUDE_DEG.civil;
  const dark = highestMinute(sky, bodies, night, darkDeg);
  if (dark !== null) return describe(sky, bodies, dark, false);
  if (darkDeg !== TWILIGHT_ALTITUDE_DEG.civil) return null;
  const bright = highestMinute(sky, bodies, night, SUN_RISE_ALTITUDE_DEG);
  return bright === null ? null : describe(sky, bodies, bright, true);
}

function highestMinute(
  sky: SkyOverSite,
  bodies: readonly SkyPlanet[],
  night: Night,
  darkDeg: number,
): TtDays | null {
  const { from, to } = safeHours(night);
  const height = (tt: TtDays): number =>
    sky.horizontal('sun', tt).altitudeDeg < darkDeg ? clearanceDeg(sky, bodies, tt) : -Infinity;
  const start = wholeMinute(from);
  const coarse = highest(height, start, to, COARSE_STEP_DAYS);
  if (coarse === null) return null;
  const around = ttDays(Math.max(start, coarse - COARSE_STEP_DAYS));
  return highest(height, around, ttDays(Math.min(to, coarse + COARSE_STEP_DAYS)), MINUTE_DAYS);
}

/** From a little after sunset to a little before sunrise; where the Sun does neither, the whole night. */
function safeHours({ from, to, sunset, sunrise }: Night): { from: TtDays; to: TtDays } {
  return {
    from: sunset === null ? from : ttDays(sunset + AFTER_SUNSET_DAYS),
    to: sunrise === null ? to : ttDays(sunrise - BEFORE_SUNRISE_DAYS),
  };
}

/** The next whole minute of UTC: people are told minutes. */
const wholeMinute = (tt: TtDays): TtDays => ttFromUtc(utcMillis(Math.ceil(utcFromTt(tt) / 60_000) * 60_000));

function highest(height: (tt: TtDays) => number, from: TtDays, to: TtDays, step: number): TtDays | null {
  let best: TtDays | null = null;
  let bestHeight = -Infinity;
  const count = Math.floor((to - from) / step + 1e-6);
  for (let i = 0; i <= count; i++) {
    const tt = ttDays(from + i * step);
    const here = height(tt);
    if (here > bestHeight) [best, bestHeight] = [tt, here];
  }
  return best;
}

/** How far the lowest of the bodies clears the local horizon, degrees; −∞ where one of them is too low to show. */
function clearanceDeg(sky: SkyOverSite, bodies: readonly SkyPlanet[], tt: TtDays): number {
  return Math.min(
    ...bodies.map((body) => {
      const { altitudeDeg, azimuthDeg } = sky.horizontal(body, tt);
      const refracted = altitudeDeg + refractionDeg(altitudeDeg);
      const clearance = refracted - Math.max(0, horizonAltitudeDeg(sky.site, azimuthDeg));
      return refracted >= LOWEST_LOOK_DEG && clearance > 0 ? clearance : -Infinity;
    }),
  );
}

function describe(
  sky: SkyOverSite,
  bodies: readonly SkyPlanet[],
  tt: TtDays,
  inBrightTwilight: boolean,
): BestLook {
  const [lowest] = bodies
    .map((body) => sky.horizontal(body, tt))
    .sort((a, b) => a.altitudeDeg - b.altitudeDeg);
  const { altitudeDeg, azimuthDeg } = lowest!;
  const utc = utcMillis(Math.round(utcFromTt(tt) / 60_000) * 60_000);
  return {
    utc,
    localTime: localIso(utc, sky.site.zone),
    altitudeDeg: altitudeDeg + refractionDeg(altitudeDeg),
    azimuthDeg,
    direction: compassWords(azimuthDeg),
    sunAltitudeDeg: sky.horizontal('sun', tt).altitudeDeg,
    separationDeg: separationDeg(sky, bodies, tt),
    inBrightTwilight,
  };
}
