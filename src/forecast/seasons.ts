import type { SkyPlanet } from '../bodies/index.js';
import { librarySource } from '../ephemeris/index.js';
import type { EphemerisSource } from '../ephemeris/index.js';
import { angleBetween, degreesFromRadians, wrapPi } from '../math/index.js';
import {
  LOWEST_LOOK_DEG,
  SkyOverSite,
  TWILIGHT_ALTITUDE_DEG,
  eveningOf,
  horizonAltitudeDeg,
  nightOf,
  refractionDeg,
} from '../sky/index.js';
import type { Night, Site } from '../sky/index.js';
import { ttDays, ttFromUtc, utcFromTt } from '../time/index.js';
import type { TtDays, UtcMillis } from '../time/index.js';
import { trackedSky } from './tracked-sky.js';
import type { TrackedSky } from './tracked-sky.js';

/** Where in the night a planet is: evening, morning, most of the night, too near the Sun, or not to be seen. */
export type SeasonState = 'dusk' | 'dawn' | 'full' | 'sun' | 'none';

export interface SeasonSample {
  readonly utc: UtcMillis;
  /** Degrees from the Sun, east (evening) positive. */
  readonly elongationDeg: number;
  /** Hours of that night in which the planet can be shown in the dark at the site; null without a site. */
  readonly darkHours: number | null;
  /**
   * The same hours before and after the middle of the night. Without a site: the hours from sunset, and to sunrise, for
   * which the elongation alone keeps the planet up in a night of twelve hours.
   */
  readonly eveningHours: number;
  readonly morningHours: number;
  readonly state: SeasonState;
}

/** One planet through a span. */
export interface Season {
  readonly body: SkyPlanet;
  readonly samples: readonly SeasonSample[];
}

export interface SeasonRequest {
  readonly from: UtcMillis;
  readonly to: UtcMillis;
  readonly bodies: readonly SkyPlanet[];
  /** Whose nights; without it the elongation alone speaks. */
  readonly site?: Site;
  readonly source?: EphemerisSource;
}

const STEP_DAYS = 4;
const NIGHT_STEP_DAYS = 1 / 72;
/** Nearer to the Sun nothing is shown; farther than the other, a planet is up for most of the night. */
const TOO_NEAR_DEG = 15;
const ALL_NIGHT_DEG = 135;
/** A planet with this long on either side of the middle of the night belongs to the whole night. */
const BOTH_HALVES_HOURS = 1.5;
const FAINT: readonly SkyPlanet[] = ['uranus', 'neptune', 'pluto'];

/** Each planet's place in the nights of a span, every four days. */
export function seasonsOf(request: SeasonRequest): Season[] {
  const sky = trackedSky(request.source ?? librarySource);
  const over = request.site === undefined ? null : new SkyOverSite(request.site, sky.tracks);
  const [from, to] = [ttFromUtc(request.from), ttFromUtc(request.to)];
  const days = Array.from({ length: Math.ceil((to - from) / STEP_DAYS) + 1 }, (_, i) =>
    ttDays(Math.min(to, from + i * STEP_DAYS)),
  );
  const samples = days.map((tt) => sampleAll(sky, over, request.bodies, tt));
  return request.bodies.map((body, i) => ({ body, samples: samples.map((ofDay) => ofDay[i]!) }));
}

function sampleAll(
  sky: TrackedSky,
  over: SkyOverSite | null,
  bodies: readonly SkyPlanet[],
  tt: TtDays,
): SeasonSample[] {
  const utc = utcFromTt(tt);
  const halves =
    over === null ? null : darkHalves(over, bodies, nightOf(over, eveningOf(utc, over.site.zone)));
  return bodies.map((body, i) => {
    const elongationDeg = signedElongationDeg(sky, body, tt);
    const dark = halves?.[i] ?? null;
    const { evening, morning } = dark ?? equinoxHalves(elongationDeg);
    return {
      utc,
      elongationDeg,
      darkHours: dark === null ? null : evening + morning,
      eveningHours: evening,
      morningHours: morning,
      state: dark === null ? stateByElongation(elongationDeg) : stateByHours(dark, elongationDeg),
    };
  });
}

function signedElongationDeg(sky: TrackedSky, body: SkyPlanet, tt: TtDays): number {
  const frame = 'ecliptic-of-date';
  const angle = angleBetween(sky.tracks.position(body, frame, tt), sky.tracks.position('sun', frame, tt));
  const ahead = sky.longitude(body, frame, tt).value - sky.longitude('sun', frame, tt).value;
  return degreesFromRadians(angle) * (wrapPi(ahead) >= 0 ? 1 : -1);
}

/** The sky turns 15° an hour, so a planet this far from the Sun sets (or rises) that much later (or earlier). */
function equinoxHalves(elongationDeg: number): DarkHours {
  const hours = Math.abs(elongationDeg) / 15;
  const [near, far] = [Math.min(6, hours), Math.max(0, hours - 6)];
  return elongationDeg >= 0 ? { evening: near, morning: far } : { evening: far, morning: near };
}

interface DarkHours {
  readonly evening: number;
  readonly morning: number;
}

/** How long each planet stands high enough over the site's horizon in the dark, before and after the middle of the night. */
function darkHalves(over: SkyOverSite, bodies: readonly SkyPlanet[], night: Night): DarkHours[] {
  const { from, to, sunset, sunrise } = night;
  // Clocks may be an hour and more from the Sun's time, so the middle is the Sun's wherever it sets.
  const middle = sunset === null || sunrise === null ? (from + to) / 2 : (sunset + sunrise) / 2;
  const counts = bodies.map(() => ({ evening: 0, morning: 0 }));
  for (let at = from; at < to; at = ttDays(at + NIGHT_STEP_DAYS)) {
    const sunDeg = over.horizontal('sun', at).altitudeDeg;
    if (sunDeg >= TWILIGHT_ALTITUDE_DEG.civil) continue;
    bodies.forEach((body, i) => {
      if (FAINT.includes(body) && sunDeg >= TWILIGHT_ALTITUDE_DEG.nautical) return;
      const { altitudeDeg, azimuthDeg } = over.horizontal(body, at);
      const seenDeg = altitudeDeg + refractionDeg(altitudeDeg);
      if (seenDeg < Math.max(LOWEST_LOOK_DEG, horizonAltitudeDeg(over.site, azimuthDeg))) return;
      counts[i]![at < middle ? 'evening' : 'morning'] += NIGHT_STEP_DAYS * 24;
    });
  }
  return counts;
}

function stateByHours({ evening, morning }: DarkHours, elongationDeg: number): SeasonState {
  if (evening + morning === 0) return Math.abs(elongationDeg) < TOO_NEAR_DEG ? 'sun' : 'none';
  if (evening >= BOTH_HALVES_HOURS && morning >= BOTH_HALVES_HOURS) return 'full';
  return evening >= morning ? 'dusk' : 'dawn';
}

function stateByElongation(elongationDeg: number): SeasonState {
  if (Math.abs(elongationDeg) < TOO_NEAR_DEG) return 'sun';
  if (Math.abs(elongationDeg) > ALL_NIGHT_DEG) return 'full';
  return elongationDeg > 0 ? 'dusk' : 'dawn';
}
