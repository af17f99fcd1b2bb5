import { localDateTime, utcMillis } from '../time/index.js';
import type { UtcMillis } from '../time/index.js';
import { fixed } from './numbers.js';

const MINUTE = 60;
const HOUR = 3600;
const DAY = 86_400;

/** A 95 % half-width in plain words, never finer than it deserves: `± 2 min`, `about 4 h either way`. */
export function uncertaintyWords(seconds: number): string {
  if (seconds < 0.95) return '± 1 s';
  if (seconds < 50) return `± ${Math.ceil(seconds)} s`;
  if (seconds < 90 * MINUTE) return `± ${Math.max(1, Math.round(seconds / MINUTE))} min`;
  if (seconds < 36 * HOUR) return `about ${fixed(seconds / HOUR, 0)} h either way`;
  return `about ${fixed(seconds / DAY, 0)} days either way`;
}

/** The same for a table: `± 2 min`, `± 4 h`, `± 3 d`. */
export function uncertaintyShort(seconds: number): string {
  if (seconds < 90 * MINUTE) return uncertaintyWords(seconds);
  if (seconds < 36 * HOUR) return `± ${fixed(seconds / HOUR, 0)} h`;
  return `± ${fixed(seconds / DAY, 0)} d`;
}

/** How finely an instant may be told: no digit that is not known. */
type Grain = 'second' | 'minute' | 'ten minutes' | 'hour' | 'day';

function grainOf(uncertaintySeconds: number): Grain {
  if (uncertaintySeconds < 10) return 'second';
  if (uncertaintySeconds < 20 * MINUTE) return 'minute';
  if (uncertaintySeconds < 90 * MINUTE) return 'ten minutes';
  return uncertaintySeconds < 12 * HOUR ? 'hour' : 'day';
}

const grainMillis: Readonly<Record<Exclude<Grain, 'day'>, number>> = {
  second: 1000,
  minute: 60_000,
  'ten minutes': 600_000,
  hour: 3_600_000,
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

/** An instant on the clocks of a zone, rounded to what its uncertainty allows. */
export function tellInstant(utc: UtcMillis, uncertaintySeconds: number, zone: string): ToldInstant {
  const grain = grainOf(uncertaintySeconds);
  const rounded =
    grain === 'day' ? utc : utcMillis(Math.round(utc / grainMillis[grain]) * grainMillis[grain]);
  const local = localDateTime(rounded, zone);
  const time = {
    second: local.toFormat('HH:mm:ss'),
    minute: local.toFormat('HH:mm'),
    'ten minutes': local.toFormat('HH:mm'),
    hour: `about ${local.toFormat('H')} h`,
    day: '',
  }[grain];
  return {
    isoDate: local.toFormat('yyyy-MM-dd'),
    weekday: local.toFormat('ccc'),
    longDate: local.toFormat('cccc d LLLL yyyy'),
    time,
  };
}
