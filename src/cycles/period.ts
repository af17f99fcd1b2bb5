import type { Body, Planet } from '../bodies/index.js';
import { centuryRatePerDay, numberingElements } from './elements.js';

/** Periods or planets that do not come round in the way asked for. Its message says which would. */
export class PeriodError extends Error {
  override readonly name = 'PeriodError';
}

/**
 * One mean revolution around the Sun against the stars, days of TT; the Sun stands for the Earth, whose motion it
 * mirrors. Good to the last digit that tables print (the outer planets' means depend on the years averaged: 0.2 %).
 * Source: Standish, Table 1, whose mean longitudes are counted from the fixed equinox of J2000.0.
 */
export const siderealPeriodDays = (body: Body): number =>
  360 / centuryRatePerDay(numberingElements[planetOf(body)].meanLongitudeDeg[1]);

/**
 * After how many days two evenly turning things are again in the same position to each other: 1/S = |1/P₁ − 1/P₂|.
 * Both in days, or both in any other one unit. Throws PeriodError for periods that are not positive, or are equal.
 */
export function synodicPeriodDays(firstDays: number, secondDays: number): number {
  checkPeriod(firstDays);
  checkPeriod(secondDays);
  if (firstDays === secondDays) {
    throw new PeriodError(
      `two equal periods of ${firstDays} days never gain on each other: the synodic period is for two that differ`,
    );
  }
  return (firstDays * secondDays) / Math.abs(firstDays - secondDays);
}

/** The synodic period of two bodies, days: how long from one mean alignment, seen from the Sun, to the next. */
export function synodicPeriodOf(first: Body, second: Body): number {
  if (planetOf(first) === planetOf(second)) {
    throw new PeriodError(
      first === second
        ? `${first} twice: a synodic period is between two different bodies`
        : 'sun and earth mirror one motion: a synodic period is between one of them and another planet',
    );
  }
  return synodicPeriodDays(siderealPeriodDays(first), siderealPeriodDays(second));
}

/** Throws PeriodError for a period that is not a positive, finite number of days. */
export function checkPeriod(days: number): void {
  if (!(days > 0 && Number.isFinite(days))) {
    throw new PeriodError(`a period of ${days} days is not a turn: write a length greater than zero`);
  }
}

const planetOf = (body: Body): Planet => (body === 'sun' ? 'earth' : body);
