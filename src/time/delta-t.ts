import { historicDeltaT, historicUncertaintySeconds } from './delta-t-before-1972.js';
import { extrapolationSigmaSeconds, longTermSeconds } from './delta-t-long-term.js';
import { MILLIS_PER_DAY, SECONDS_PER_DAY } from './instants.js';
import type { TtDays, UtcMillis } from './instants.js';
import { LEAP_SECONDS_KNOWN_UNTIL, leapEras } from './leap-seconds.js';
import type { LeapEra } from './leap-seconds.js';

/** TT − UTC at an instant, and how far it can be trusted. */
export interface DeltaT {
  readonly seconds: number;
  /** 95 % half-width; zero where the difference is laid down by leap seconds. */
  readonly uncertaintySeconds: number;
  /** The civil scale that the difference leads to: UTC since 1972, UT1 before. */
  readonly scale: 'UTC' | 'UT1';
  /** What the value rests on, for a reader of a report. */
  readonly basis: string;
}

/** 2000-01-01T12:00:00 as POSIX milliseconds: where days of TT would be counted from if ΔT were zero. */
export const J2000_MILLIS = 946_728_000_000;
/** J2000.0 in years, the calendar year beginning on 1 January at 0 h. */
const J2000_YEAR = 2000 + 0.5 / 365.2425;
const yearOf = (tt: TtDays): number => J2000_YEAR + tt / 365.2425;

/** 95 % of a normal distribution lies within this many standard deviations. */
const SIGMAS_OF_95_PERCENT = 1.96;

export const ttDaysOf = (utc: UtcMillis, ttMinusUtcSeconds: number): number =>
  (utc - J2000_MILLIS) / MILLIS_PER_DAY + ttMinusUtcSeconds / SECONDS_PER_DAY;

/** The last of the leap-second eras that begins at or before the instant; undefined before 1972. */
const eraAt = (tt: TtDays): LeapEra | undefined =>
  leapEras.findLast(({ from, ttMinusUtcSeconds }) => ttDaysOf(from, ttMinusUtcSeconds) <= tt);

const lastEra = leapEras.at(-1)!;
const UTC_BEGINS_YEAR = 1972;
const KNOWN_UNTIL_TT = ttDaysOf(LEAP_SECONDS_KNOWN_UNTIL, lastEra.ttMinusUtcSeconds) as TtDays;

function before1972(year: number): DeltaT {
  return {
    ...historicDeltaT(year),
    uncertaintySeconds: historicUncertaintySeconds(year),
    scale: 'UT1',
  };
}

/** UTC is kept within this of UT1 (Recommendation ITU-R TF.460), so a future leap second may part the two by as much. */
const UTC_FROM_UT1_SECONDS = 0.9;

function afterKnownLeapSeconds(tt: TtDays): DeltaT {
  const lastKnownYear = yearOf(KNOWN_UNTIL_TT);
  const year = yearOf(tt);
  return {
    seconds: lastEra.ttMinusUtcSeconds + longTermSeconds(year) - longTermSeconds(lastKnownYear),
    uncertaintySeconds:
      UTC_FROM_UT1_SECONDS + SIGMAS_OF_95_PERCENT * extrapolationSigmaSeconds(year - lastKnownYear),
    scale: 'UTC',
    basis: 'extrapolated, Morrison et al. 2021',
  };
}

/**
 * TT − UTC (TT − UT1 before 1972) at an instant of TT.
 *
 * Given any instant from 1500 on; returned in seconds with its 95 % half-width. Steps by one second where a leap second
 * ends, else continuous. After the last announced day the value goes on from there by a published long-term rule, and no
 * leap seconds are guessed: the half-width covers them.
 */
export function deltaTAt(tt: TtDays): DeltaT {
  if (tt >= KNOWN_UNTIL_TT) return afterKnownLeapSeconds(tt);
  const era = eraAt(tt);
  if (era === undefined) return before1972(Math.min(yearOf(tt), UTC_BEGINS_YEAR));
  return { seconds: era.ttMinusUtcSeconds, uncertaintySeconds: 0, scale: 'UTC', basis: 'leap seconds, IERS' };
}
