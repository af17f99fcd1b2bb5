import { utcMillis } from './instants.js';
import type { UtcMillis } from './instants.js';

/** TT − TAI, exactly, by definition. */
const TT_MINUS_TAI_SECONDS = 32.184;

/** The months on whose first day TAI − UTC became the given whole number of seconds. Source: ERFA, routine `dat` (IERS Bulletin C). */
export const leapSeconds: readonly (readonly [year: number, month: number, taiMinusUtcSeconds: number])[] = [
  [1972, 1, 10],
  [1972, 7, 11],
  [1973, 1, 12],
  [1974, 1, 13],
  [1975, 1, 14],
  [1976, 1, 15],
  [1977, 1, 16],
  [1978, 1, 17],
  [1979, 1, 18],
  [1980, 1, 19],
  [1981, 7, 20],
  [1982, 7, 21],
  [1983, 7, 22],
  [1985, 7, 23],
  [1988, 1, 24],
  [1990, 1, 25],
  [1991, 1, 26],
  [1992, 7, 27],
  [1993, 7, 28],
  [1994, 7, 29],
  [1996, 1, 30],
  [1997, 7, 31],
  [1999, 1, 32],
  [2006, 1, 33],
  [2009, 1, 34],
  [2012, 7, 35],
  [2015, 7, 36],
  [2017, 1, 37],
];

/** One stretch of UTC on which TT − UTC is constant. */
export interface LeapEra {
  readonly from: UtcMillis;
  readonly ttMinusUtcSeconds: number;
}

export const leapEras: readonly LeapEra[] = leapSeconds.map(([year, month, taiMinusUtcSeconds]) => ({
  from: utcMillis(Date.UTC(year, month - 1, 1)),
  ttMinusUtcSeconds: TT_MINUS_TAI_SECONDS + taiMinusUtcSeconds,
}));

/**
 * The instant up to which TT − UTC is known: IERS Bulletin C announced in July 2026 that no leap second follows
 * December 2026 (from memory), and the next date on which one is customary is the end of June 2027.
 */
export const LEAP_SECONDS_KNOWN_UNTIL = utcMillis(Date.UTC(2027, 6, 1));
