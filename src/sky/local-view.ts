import type { SkyPlanet } from '../bodies/index.js';
import type { Paths } from '../ephemeris/index.js';
import { localIso, utcFromTt } from '../time/index.js';
import type { LocalDate, TtDays, UtcMillis } from '../time/index.js';
import { bestLook } from './best-look.js';
import type { BestLook } from './best-look.js';
import { SkyOverSite } from './horizontal.js';
import { sunGoneAltitudeDeg } from './looking-hours.js';
import { eveningOf, nightOf } from './night.js';
import type { Night } from './night.js';
import { refractionDeg } from './refraction.js';
import { PLANET_RISE_ALTITUDE_DEG, dayArc } from './rise-set.js';
import { separationDeg } from './separation.js';
import { horizonAltitudeDeg } from './site.js';
import type { Site } from './site.js';
import { verdictOf } from './verdict.js';

/** One event as it is seen, or not, from one site. */
export interface LocalView {
  /** The site's id. */
  readonly site: string;
  /** ISO 8601 with the offset in force, to the second: `2027-02-19T16:45:12+01:00`. */
  readonly localTime: string;
  readonly zone: string;
  /** True altitude of the Sun's centre at the instant. */
  readonly sunAltitudeDeg: number;
  /** All the bodies above the local horizon, and the whole Sun below the true one, at the instant itself. */
  readonly visibleAtInstant: boolean;
  readonly bodies: readonly BodyFromSite[];
  /** Between two bodies as this site sees them at the instant; null for one body. */
  readonly topocentricSeparationDeg: number | null;
  /** The evening (noon to noon, local) that holds the instant. */
  readonly evening: LocalDate;
  /** The best moment of that night to look, or null where there is none. */
  readonly bestLook: BestLook | null;
  /** One sentence in plain words: when and where to look, or "not visible from here" with the reason. */
  readonly verdict: string;
}

export interface BodyFromSite {
  readonly body: SkyPlanet;
  /** Topocentric and refracted. */
  readonly altitudeDeg: number;
  /** From north through east. */
  readonly azimuthDeg: number;
  readonly aboveHorizon: boolean;
  /** The first rise, upper transit and set in that local night (noon to noon); null where it does not happen. */
  readonly rise: UtcMillis | null;
  readonly transit: UtcMillis | null;
  readonly set: UtcMillis | null;
}

/** Events come by and large in the order of time, so a few nights are enough to be shared. */
const KEPT_NIGHTS = 64;

/** Makes the views of one site: events of one night share its sunset and sunrise. */
export function localViewer(
  site: Site,
  paths: Paths,
): (bodies: readonly SkyPlanet[], tt: TtDays) => LocalView {
  const sky = new SkyOverSite(site, paths);
  const nights = new Map<LocalDate, Night>();
  return (bodies, tt) => {
    const utc = utcFromTt(tt);
    const evening = eveningOf(utc, site.zone);
    const night = nights.get(evening) ?? nightOf(sky, evening);
    if (nights.size >= KEPT_NIGHTS) nights.clear();
    nights.set(evening, night);
    const sunAltitudeDeg = sky.horizontal('sun', tt).altitudeDeg;
    const fromSite = bodies.map((body) => bodyFromSite(sky, body, tt, night));
    const best = bestLook(sky, bodies, night);
    return {
      site: site.id,
      localTime: localIso(utc, site.zone),
      zone: site.zone,
      sunAltitudeDeg,
      visibleAtInstant:
        sunAltitudeDeg < sunGoneAltitudeDeg(site) && fromSite.every(({ aboveHorizon }) => aboveHorizon),
      bodies: fromSite,
      topocentricSeparationDeg: separationDeg(sky, bodies, tt),
      evening,
      bestLook: best,
      verdict: verdictOf(sky, bodies, night, best),
    };
  };
}

function bodyFromSite(sky: SkyOverSite, body: SkyPlanet, tt: TtDays, { from, to }: Night): BodyFromSite {
  const { altitudeDeg, azimuthDeg } = sky.horizontal(body, tt);
  const refracted = altitudeDeg + refractionDeg(altitudeDeg);
  const arc = dayArc(sky, body, from, to);
  const crossings = arc.crossings(PLANET_RISE_ALTITUDE_DEG);
  const utcOf = (at: TtDays | undefined): UtcMillis | null => (at === undefined ? null : utcFromTt(at));
  return {
    body,
    altitudeDeg: refracted,
    azimuthDeg,
    aboveHorizon: refracted > Math.max(0, horizonAltitudeDeg(sky.site, azimuthDeg)),
    rise: utcOf(crossings.find(({ is }) => is === 'rise')?.tt),
    transit: utcOf(arc.transits[0]),
    set: utcOf(crossings.find(({ is }) => is === 'set')?.tt),
  };
}
