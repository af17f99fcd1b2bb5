import { J2000_MILLIS, deltaTAt, ttDaysOf } from './delta-t.js';
import { MILLIS_PER_DAY, ttDays, utcMillis } from './instants.js';
import type { TtDays, UtcMillis } from './instants.js';
import { LEAP_SECONDS_KNOWN_UNTIL, leapEras } from './leap-seconds.js';

/** ΔT changes by at most 2 s a year, so every round brings the time 10⁷ times nearer. */
const INVERSION_ROUNDS = 4;

/**
 * UTC (UT1 before 1972) at an instant of TT. POSIX milliseconds cannot name a leap second: while one lasts, the
 * midnight that ends it is given.
 */
export function utcFromTt(tt: TtDays): UtcMillis {
  const utc = J2000_MILLIS + tt * MILLIS_PER_DAY - deltaTAt(tt).seconds * 1000;
  const next = leapEras.find(
    ({ from, ttMinusUtcSeconds }) => from <= utc && ttDaysOf(from, ttMinusUtcSeconds) > tt,
  );
  return utcMillis(next === undefined ? utc : next.from);
}

/** TT at an instant of UTC: the inverse of `utcFromTt`, to a microsecond. */
export function ttFromUtc(utc: UtcMillis): TtDays {
  const era = utc < LEAP_SECONDS_KNOWN_UNTIL ? leapEras.findLast(({ from }) => from <= utc) : undefined;
  if (era !== undefined) return ttDays(ttDaysOf(utc, era.ttMinusUtcSeconds));
  let tt = ttDays(ttDaysOf(utc, 0));
  for (let round = 0; round < INVERSION_ROUNDS; round++) tt = ttDays(ttDaysOf(utc, deltaTAt(tt).seconds));
  return tt;
}

/** How far the UTC of an instant of TT may be off through ΔT alone: 95 % half-width, seconds. */
export const utcUncertaintySeconds = (tt: TtDays): number => deltaTAt(tt).uncertaintySeconds;
