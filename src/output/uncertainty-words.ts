import type { ForecastEvent } from '../forecast/index.js';
import { localDateTime, utcMillis, zoneAbbreviation } from '../time/index.js';
import type { UtcMillis } from '../time/index.js';

const MINUTE = 60;
const HOUR = 3600;
const DAY = 86_400;

/** Whole units, rounded so that an error bar is never told more than a quarter of a unit smaller than it is. */
const units = (seconds: number, unit: number): number => Math.max(1, Math.ceil(seconds / unit - 0.25));

/** A 95 % half-width in plain words, never finer than it deserves: `± 2 min`, `about 4 h either way`. */
export function uncertaintyWords(seconds: number): string {
  if (seconds < 90 * MINUTE) return uncertaintyShort(seconds);
  if (seconds < 36 * HOUR) return `about ${units(seconds, HOUR)} h either way`;
  return `about ${units(seconds, DAY)} days either way`;
}

/** The same for a table: `± 2 min`, `± 4 h`, `± 3 d`. */
export function uncertaintyShort(seconds: number): string {
  if (seconds < 50) return `± ${units(seconds, 1)} s`;
  if (seconds < 90 * MINUTE) return `± ${units(seconds, MINUTE)} min`;
  if (seconds < 36 * HOUR) return `± ${units(seconds, HOUR)} h`;
  return `± ${units(seconds, DAY)} d`;
}

/** How finely an instant may be told: no digit that is not known. */
export type Grain = 'second' | 'minute' | 'ten minutes' | 'hour' | 'day';

/** The finest unit of which the half-width is fewer than ten. */
export function grainOf(uncertaintySeconds: number): Grain {
  if (units(uncertaintySeconds, 1) < 10) return 'second';
  if (units(uncertaintySeconds, MINUTE) < 10) return 'minute';
  if (uncertaintySeconds < 90 * MINUTE) return 'ten minutes';
  return units(uncertaintySeconds, HOUR) < 10 ? 'hour' : 'day';
}

const grainMillis: Readonly<Record<Grain, number>> = {
  second: 1000,
  minute: 60_000,
  'ten minutes': 600_000,
  hour: 3_600_000,
  day: 1,
};

export interface ToldInstant {
  /** `2027-02-19`. */
  readonly isoDate: string;
  /** `Fri`. */
  readonly weekday: string;
  /** `Friday 19 February 2027`. */
  readonly longDate: string;
  /** `16:52`, `16:51:53`, `about 17 h`, or empty where not even the hour is known. */
  readonly time: string;
}

/** An instant on the clocks of a zone, rounded (as those clocks count) to what its uncertainty allows. */
export function tellInstant(utc: UtcMillis, uncertaintySeconds: number, zone: string): ToldInstant {
  const grain = grainOf(uncertaintySeconds);
  const local = localDateTime(roundedOnClock(utc, grainMillis[grain], zone), zone);
  // One pass of the formatter for all of it: tables tell thousands of instants.
  const [isoDate, weekday, longDate, time] = local
    .toFormat(`yyyy-MM-dd|ccc|cccc d LLLL yyyy|${clockFormats[grain]}`)
    .split('|') as [string, string, string, string];
  return { isoDate, weekday, longDate, time };
}

const clockFormats: Readonly<Record<Grain, string>> = {
  second: 'HH:mm:ss',
  minute: 'HH:mm',
  'ten minutes': 'HH:mm',
  hour: "'about' H 'h'",
  day: '',
};

/** Of an event, for a table: `2027-02-19 Fri 15:45 GMT`, `2042-09-03 Wed about 17 h UTC`, `2042-09-03 Wed`. */
export function dateAndClock(
  { utc, uncertaintySeconds }: Pick<ForecastEvent, 'utc' | 'uncertaintySeconds'>,
  zone: string,
): string {
  const { isoDate, weekday, time } = tellInstant(utc, uncertaintySeconds.utc, zone);
  return [isoDate, weekday, ...(time === '' ? [] : [time, zoneAbbreviation(utc, zone)])].join(' ');
}

/** Zones are not always whole hours from UTC, so what is round on a clock need not be round in UTC. */
function roundedOnClock(utc: UtcMillis, stepMillis: number, zone: string): UtcMillis {
  const offsetMillis = Math.round(localDateTime(utc, zone).offset * MINUTE) * 1000;
  return utcMillis(Math.round((utc + offsetMillis) / stepMillis) * stepMillis - offsetMillis);
}
