import { MILLIS_PER_DAY, localDate, localDateTime, ttDays, ttFromUtc, utcOfLocal } from '../time/index.js';
import type { LocalDate, TtDays, UtcMillis } from '../time/index.js';
import type { SkyOverSite } from './horizontal.js';
import { SUN_RISE_ALTITUDE_DEG, dayArc } from './rise-set.js';
import type { DayArc } from './rise-set.js';

/** True altitude of the Sun's centre at which each twilight ends or begins. U.S. Naval Observatory definitions. */
export const TWILIGHT_ALTITUDE_DEG = { civil: -6, nautical: -12, astronomical: -18 } as const;

const HOUR_DAYS = 1 / 24;

/** One night at a site, from local noon to the next; what does not happen at this latitude and season is null. */
export interface Night {
  /** The date on which it begins. */
  readonly date: LocalDate;
  readonly from: TtDays;
  /** Not included. */
  readonly to: TtDays;
  readonly sunset: TtDays | null;
  /** The one that ends the night; where the Sun does not set in it, any. */
  readonly sunrise: TtDays | null;
  /** The Sun's arc from an hour before the night to an hour after it, so that a sunrise close by is seen coming. */
  readonly sun: DayArc;
}

export interface Twilight {
  readonly dusk: TtDays | null;
  readonly dawn: TtDays | null;
}

/** The evening that holds an instant: the date of the local noon before it. */
export function eveningOf(utc: UtcMillis, zone: string): LocalDate {
  const local = localDateTime(utc, zone);
  return localDate((local.hour >= 12 ? local : local.minus({ days: 1 })).toFormat('yyyy-MM-dd'));
}

/** The night that begins on a date. Nights in which clocks change have 23 or 25 hours. */
export function nightOf(sky: SkyOverSite, date: LocalDate): Night {
  const { zone } = sky.site;
  const next = localDate(new Date(Date.parse(date) + MILLIS_PER_DAY).toISOString().slice(0, 10));
  const from = ttFromUtc(utcOfLocal(date, 12, 0, zone));
  const to = ttFromUtc(utcOfLocal(next, 12, 0, zone));
  const sun = dayArc(sky, 'sun', ttDays(from - HOUR_DAYS), ttDays(to + HOUR_DAYS));
  const { dusk: sunset, dawn: sunrise } = duskAndDawn(sun, from, to, SUN_RISE_ALTITUDE_DEG);
  return { date, from, to, sunset, sunrise, sun };
}

/** When each twilight of a night ends in the evening (dusk) and begins in the morning (dawn). */
export const twilightsOf = ({
  sun,
  from,
  to,
}: Night): Record<keyof typeof TWILIGHT_ALTITUDE_DEG, Twilight> => ({
  civil: duskAndDawn(sun, from, to, TWILIGHT_ALTITUDE_DEG.civil),
  nautical: duskAndDawn(sun, from, to, TWILIGHT_ALTITUDE_DEG.nautical),
  astronomical: duskAndDawn(sun, from, to, TWILIGHT_ALTITUDE_DEG.astronomical),
});

/** Near the polar night, and where a zone is far from the Sun's time, the Sun may come up before it goes down. */
function duskAndDawn(sun: DayArc, from: TtDays, to: TtDays, altitudeDeg: number): Twilight {
  const crossings = sun.crossings(altitudeDeg).filter(({ tt }) => tt >= from && tt < to);
  const dusk = crossings.find(({ is }) => is === 'set')?.tt ?? null;
  const rises = crossings.filter(({ is }) => is === 'rise').map(({ tt }) => tt);
  return { dusk, dawn: rises.find((tt) => dusk !== null && tt > dusk) ?? rises[0] ?? null };
}
