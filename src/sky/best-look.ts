import type { SkyPlanet } from '../bodies/index.js';
import { localIso, ttDays, ttFromUtc, utcFromTt, utcMillis } from '../time/index.js';
import type { TtDays, UtcMillis } from '../time/index.js';
import { compassWords } from './compass.js';
import { darknessNeeded, outshineTwilight } from './darkness-needed.js';
import type { SkyOverSite } from './horizontal.js';
import { darkHours, safeHours } from './looking-hours.js';
import type { Night } from './night.js';
import { refractionDeg } from './refraction.js';
import { separationDeg } from './separation.js';
import { horizonAltitudeDeg } from './site.js';
import type { Stretch } from './stretch.js';

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

const MINUTE_DAYS = 1 / 1440;
const MINUTE_MILLIS = 60_000;
const COARSE_MINUTES = 10;

/**
 * The minute of a night at which the lowest of the bodies stands highest above the local horizon in a dark enough
 * sky, or null where no minute will do. Bright twilight is tried when darkness offers nothing to bodies that outshine it.
 */
export function bestLook(sky: SkyOverSite, bodies: readonly SkyPlanet[], night: Night): BestLook | null {
  const dark = highestMinute(sky, bodies, darkHours(sky.site, night, bodies));
  if (dark !== null) return describe(sky, bodies, dark, false);
  if (!outshineTwilight(bodies)) return null;
  const bright = highestMinute(sky, bodies, safeHours(sky.site, night));
  return bright === null ? null : describe(sky, bodies, bright, true);
}

interface Moment {
  readonly tt: TtDays;
  readonly clearanceDeg: number;
}

function highestMinute(
  sky: SkyOverSite,
  bodies: readonly SkyPlanet[],
  hours: readonly Stretch[],
): TtDays | null {
  const moments = hours.flatMap((stretch): Moment[] => {
    const { start, minutes } = wholeMinutes(stretch);
    const at = (minute: number): Moment => {
      const tt = ttDays(start + minute * MINUTE_DAYS);
      return { tt, clearanceDeg: clearanceDeg(sky, bodies, tt) };
    };
    const coarse = highest(at, 0, minutes, COARSE_MINUTES);
    if (coarse === null) return [];
    const near = Math.round((coarse.tt - start) / MINUTE_DAYS);
    const fine = highest(at, Math.max(0, near - COARSE_MINUTES), Math.min(minutes, near + COARSE_MINUTES), 1);
    return fine === null ? [] : [fine];
  });
  return higher(moments)?.tt ?? null;
}

/** The whole minutes of UTC in a stretch, since people are told minutes: the first, and how many follow it. */
function wholeMinutes({ from, to }: Stretch): { start: TtDays; minutes: number } {
  const start = ttFromUtc(utcMillis(Math.ceil(utcFromTt(from) / MINUTE_MILLIS) * MINUTE_MILLIS));
  return { start, minutes: Math.floor((to - start) / MINUTE_DAYS) };
}

/** Both ends are tried: at dusk and at dawn a body is often at its best. */
function highest(at: (minute: number) => Moment, from: number, to: number, step: number): Moment | null {
  const moments: Moment[] = [];
  for (let minute = from; minute < to; minute += step) moments.push(at(minute));
  if (to >= from) moments.push(at(to));
  return higher(moments);
}

/** The earliest of the highest; null where none shows. */
const higher = (moments: readonly Moment[]): Moment | null =>
  moments.reduce<Moment | null>(
    (best, moment) => (moment.clearanceDeg > (best?.clearanceDeg ?? -Infinity) ? moment : best),
    null,
  );

/** How far the lowest of the bodies clears the local horizon, degrees; −∞ where one of them does not show. */
function clearanceDeg(sky: SkyOverSite, bodies: readonly SkyPlanet[], tt: TtDays): number {
  let least = Infinity;
  for (const body of bodies) {
    const { altitudeDeg, azimuthDeg } = sky.horizontal(body, tt);
    const refracted = altitudeDeg + refractionDeg(altitudeDeg);
    const clearance = refracted - Math.max(0, horizonAltitudeDeg(sky.site, azimuthDeg));
    if (refracted < LOWEST_LOOK_DEG || clearance <= 0 || isDrowned(sky, body, altitudeDeg, tt))
      return -Infinity;
    least = Math.min(least, clearance);
  }
  return least;
}

/** Whether the twilight outshines a body. The Sun, below the horizon at such times, need not be asked about a high one. */
function isDrowned(sky: SkyOverSite, body: SkyPlanet, altitudeDeg: number, tt: TtDays): boolean {
  const { arcusVisionisDeg } = darknessNeeded[body];
  return (
    altitudeDeg < arcusVisionisDeg && altitudeDeg - sky.horizontal('sun', tt).altitudeDeg < arcusVisionisDeg
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
  const utc = utcMillis(Math.round(utcFromTt(tt) / MINUTE_MILLIS) * MINUTE_MILLIS);
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
