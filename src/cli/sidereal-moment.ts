import { ApparentPlaces, Tracks, geometryOf, librarySource } from '../ephemeris/index.js';
import { hoursFromRadians, wrapPi } from '../math/index.js';
import {
  SkyOverSite,
  brightPlanetsByMeridian,
  fromJ2000,
  greenwichApparentSidereal,
  greenwichMeanSidereal,
  localSidereal,
  siderealDayShorterSeconds,
  toJ2000,
} from '../sky/index.js';
import type { EquatorialPlace, MeridianPlanet, Site } from '../sky/index.js';
import { localIso, isoUtc, ttFromUtc } from '../time/index.js';
import type { UtcMillis } from '../time/index.js';

/** What the sidereal clock of a site says at an instant, and what it means for the sky. */
export interface SiderealMoment {
  readonly utc: string;
  readonly localTime: string;
  readonly localMeanSiderealHours: number;
  readonly localApparentSiderealHours: number;
  readonly greenwichMeanSiderealHours: number;
  readonly greenwichApparentSiderealHours: number;
  /** By how much the stars gain on the clock every day. */
  readonly siderealDayShorterSeconds: number;
  readonly planets: readonly MeridianPlanet[];
  readonly position: PositionAtMoment | null;
}

export interface PositionAtMoment {
  readonly j2000: EquatorialPlace;
  readonly meanOfDate: EquatorialPlace;
  readonly trueOfDate: EquatorialPlace;
  /** The true place of date, brought back. */
  readonly backToJ2000: EquatorialPlace;
  /** Of the true place of date: negative before the upper transit. */
  readonly hourAngleHours: number;
}

export function siderealMoment(
  site: Site,
  utc: UtcMillis,
  position: EquatorialPlace | undefined,
): SiderealMoment {
  const tt = ttFromUtc(utc);
  const [mean, apparent] = [greenwichMeanSidereal(tt), greenwichApparentSidereal(tt)];
  const local = (greenwich: number): number => localSidereal(greenwich, site.longitudeDeg);
  const sky = new SkyOverSite(site, new Tracks(new ApparentPlaces(geometryOf(librarySource))));
  return {
    utc: isoUtc(utc),
    localTime: localIso(utc, site.zone),
    localMeanSiderealHours: hoursFromRadians(local(mean)),
    localApparentSiderealHours: hoursFromRadians(local(apparent)),
    greenwichMeanSiderealHours: hoursFromRadians(mean),
    greenwichApparentSiderealHours: hoursFromRadians(apparent),
    siderealDayShorterSeconds: siderealDayShorterSeconds(),
    planets: brightPlanetsByMeridian(sky, tt),
    position: position === undefined ? null : positionAt(position),
  };

  function positionAt(j2000: EquatorialPlace): PositionAtMoment {
    const trueOfDate = fromJ2000(j2000, tt, 'true');
    const turn = local(apparent) - (trueOfDate.rightAscensionHours / 12) * Math.PI;
    return {
      j2000,
      meanOfDate: fromJ2000(j2000, tt, 'mean'),
      trueOfDate,
      backToJ2000: toJ2000(trueOfDate, tt, 'true'),
      hourAngleHours: hoursFromRadians(wrapPi(turn)),
    };
  }
}
