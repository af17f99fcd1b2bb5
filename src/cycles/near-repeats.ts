import { checkPeriod } from './period.js';

/** A whole number of cycles that takes nearly a whole number of years. */
export interface NearRepeat {
  readonly cycles: number;
  readonly years: number;
  /** By how much the cycles outlast the years: the event comes that many days later in the calendar. */
  readonly misfitDays: number;
  /** The same as the Sun's mean motion along the zodiac in that time. */
  readonly misfitDeg: number;
}

/** The mean Gregorian year: an event that nearly repeats in it comes back at nearly the same date and season. */
export const CALENDAR_YEAR_DAYS = 365.2425;

const DEFAULT_LIMIT_YEARS = 300;
/** Mars is said to repeat after 15 years, 19° off; that Jupiter did so after 11, 28° off, nobody says. */
const NEAR_DEG = 20;
/** The digits of a double are used up after that many partial quotients. */
const MAX_QUOTIENTS = 40;
/** A misfit below this part of the period is rounding noise: the repeat is exact and the fraction ends. */
const EXACT = 1e-9;

/**
 * The near-repeats of a period, fewest years first: the convergents of the continued fraction of period ÷ year. Each
 * misses by less than any smaller number of cycles does (Khinchin, Continued Fractions, 1964, theorems 16 and 17).
 * @param periodDays length of one cycle, positive
 * @param yearDays length of the year to return in; `CALENDAR_YEAR_DAYS` keeps the date, a sidereal year the stars
 * @param limitYears the longest repeat to tell of
 * @throws PeriodError for a length that is not positive and finite
 */
export function nearRepeats(
  periodDays: number,
  yearDays: number,
  limitYears = DEFAULT_LIMIT_YEARS,
): NearRepeat[] {
  checkPeriod(periodDays);
  checkPeriod(yearDays);
  const repeats: NearRepeat[] = [];
  let ratio = periodDays / yearDays;
  let [yearsBefore, cyclesBefore, years, cycles] = [0, 1, 1, 0];
  for (let step = 0; step < MAX_QUOTIENTS; step++) {
    const quotient = Math.floor(ratio);
    [yearsBefore, cyclesBefore, years, cycles] = [
      years,
      cycles,
      quotient * years + yearsBefore,
      quotient * cycles + cyclesBefore,
    ];
    if (years > limitYears) break;
    const misfitDays = cycles * periodDays - years * yearDays;
    const misfitDeg = (misfitDays / yearDays) * 360;
    if (years > 0 && Math.abs(misfitDeg) < NEAR_DEG) repeats.push({ cycles, years, misfitDays, misfitDeg });
    if (Math.abs(misfitDays) <= EXACT * periodDays) break;
    ratio = 1 / (ratio - quotient);
  }
  return repeats;
}
