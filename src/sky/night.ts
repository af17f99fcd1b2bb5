import { localDate, localDateTime, ttFromUtc, utcOfLocal } from '../time/index.js';
import type { LocalDate, TtDays, UtcMillis } from '../time/index.js';
import type { SkyOverSite } from './horizontal.js';
import { SUN_RISE_ALTITUDE_DEG, altitudeCrossings } from './rise-set.js';

/** True altitude of the Sun's centre at which each twilight ends or begins. U.S. Naval Observatory definitions. */
export const TWILIGHT_ALTITUDE_DEG = { civil: -6, nautical: -12, astronomical: -18 } as const;

/** One night at a site, from local noon to the next; what does not happen at this latitude and season is null. */
export interface Night {
  /** The date on which it begins. */
  readonly date: LocalDate;
  readonly from: TtDays;
  /** Not included. */
  readonly to: TtDays;
  readonly sunset: TtDays | null;
  readonly sunrise: TtDays | null;
}

/** The evening that holds an instant: the date of the local noon before it. */
export function eveningOf(utc: UtcMillis, zone: string): LocalDate {
  const local = localDateTime(utc, zone);
  return localDate((local.hour >= 12 ? local : local.minus({ days: 1 })).toFormat('yyyy-MM-dd'));
}

/** The night that begins on a date. Nights in which clocks change have 23 or 25 hours. */
export function nightOf(sky: SkyOverSite, date: LocalDate): Night {
  const { zone } = sky.site;
  const next = localDate(new Date(Date.parse(date) + 86_400_000).toISOString().slice(0, 10));
  const from = ttFromUtc(utcOfLocal(date, 12, 0, zone));
  const to = ttFromUtc(utcOfLocal(next, 12, 0, zone));
  const crossings = altitudeCrossings(sky, 'sun', from, to, SUN_RISE_ALTITUDE_DEG);
  const first = (is: 'rise' | 'set') => crossings.find((crossing) => crossing.is === is)?.tt ?? null;
  return { date, from, to, sunset: first('set'), sunrise: first('rise') };
}
