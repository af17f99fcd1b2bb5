import { bodies, isBody } from '../bodies/index.js';
import type { Body } from '../bodies/index.js';
import { siderealPeriodDays } from '../cycles/index.js';
import { didYouMean, quoted } from '../plan/words/index.js';
import type { Reading } from '../plan/words/index.js';
import { DAYS_PER_JULIAN_YEAR } from '../time/index.js';

/** A body's sidereal period, or one that the user knows. */
export interface NamedPeriod {
  readonly name: string;
  readonly body: Body | null;
  readonly periodDays: number;
}

const daysPerUnit: Readonly<Record<string, number>> = { h: 1 / 24, d: 1, y: DAYS_PER_JULIAN_YEAR };

/** Reads `mars`, `687d`, `1.88y` (Julian years) or `23.93h`. */
export function readPeriod(word: string): Reading<NamedPeriod> {
  const name = word.trim().toLowerCase();
  if (isBody(name)) return { value: { name, body: name, periodDays: siderealPeriodDays(name) } };
  const match = /^(\d{1,12}(?:\.\d{1,12})?)([hdy]?)$/.exec(name);
  if (match === null) {
    return {
      problem: `${quoted(word)} is neither a body nor a period.${didYouMean(name, bodies) || ' Write mars, 687d, 1.88y or 23.93h'}`,
    };
  }
  const perUnit = daysPerUnit[match[2]!];
  if (perUnit === undefined)
    return { problem: `${quoted(word)} has no unit: write ${name}d, ${name}y or ${name}h` };
  return { value: { name, body: null, periodDays: Number(match[1]) * perUnit } };
}
