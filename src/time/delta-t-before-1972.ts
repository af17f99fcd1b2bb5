import { MEASURED_FIRST_YEAR, MEASURED_STEP_YEARS, measuredDeltaTHundredths } from './delta-t-table.js';
import { leapEras } from './leap-seconds.js';

/**
 * Published standard errors of ΔT before atomic time, seconds: Espenak & Meeus 2006, after Morrison & Stephenson 2004
 * (20 s, 1300–1600) and Stephenson & Houlden 1986 (1700, 1800, 1900). From 1956 atomic clocks carry the table, and what
 * is left is its own half-year step (argued: chords of a curve that bends by less than 0.1 s a year²).
 */
const standardErrors: readonly (readonly [year: number, seconds: number])[] = [
  [1600, 20],
  [1700, 5],
  [1800, 1],
  [1900, 0.1],
  [1956, 0.02],
];

/** Standard error of ΔT in a year before 1972, seconds: interpolated in its logarithm, constant outside the list. */
export function historicSigmaSeconds(year: number): number {
  const next = standardErrors.findIndex(([knot]) => knot > year);
  if (next === 0) return standardErrors[0]![1];
  if (next < 0) return standardErrors.at(-1)![1];
  const [year0, sigma0] = standardErrors[next - 1]!;
  const [year1, sigma1] = standardErrors[next]!;
  return sigma0 * (sigma1 / sigma0) ** ((year - year0) / (year1 - year0));
}

/** ΔT before 1600, seconds: Espenak & Meeus 2006, for the years 500–1600. */
function polynomialBefore1600(year: number): number {
  const u = (year - 1000) / 100;
  const coefficients = [0.0083572073, -0.005050998, -0.8503463, 0.319781, 71.23472, -556.01, 1574.2];
  return coefficients.reduce((sum, coefficient) => sum * u + coefficient, 0);
}

/** ΔT from 1600 to 1700, seconds: Espenak & Meeus 2006. */
function polynomialAfter1600(year: number): number {
  const t = year - 1600;
  return 120 - 0.9808 * t - 0.01532 * t ** 2 + t ** 3 / 7129;
}

/** The polynomials, and their bend towards the table: they meet each other in 1600 and the table in 1657. */
const GAP_AT_1600_SECONDS = 120 - polynomialBefore1600(1600);
const GAP_AT_TABLE_SECONDS = measuredDeltaTHundredths[0]! / 100 - polynomialAfter1600(MEASURED_FIRST_YEAR);

function beforeTable(year: number): number {
  if (year < 1600) return polynomialBefore1600(year) + GAP_AT_1600_SECONDS;
  return polynomialAfter1600(year) + (GAP_AT_TABLE_SECONDS * (year - 1600)) / (MEASURED_FIRST_YEAR - 1600);
}

/** The table, read linearly; its last half year leads to the 42.184 s with which UTC began, so that nothing jumps. */
function fromTable(year: number): number {
  const at = (year - MEASURED_FIRST_YEAR) / MEASURED_STEP_YEARS;
  const index = Math.min(Math.floor(at), measuredDeltaTHundredths.length - 1);
  const left = measuredDeltaTHundredths[index]! / 100;
  const next = measuredDeltaTHundredths[index + 1];
  const right = next === undefined ? leapEras[0]!.ttMinusUtcSeconds : next / 100;
  return left + (right - left) * Math.min(at - index, 1);
}

/** ΔT = TT − UT1 in a year (with its fraction) from 1500 to 1972, seconds, and what it rests on. */
export function historicDeltaT(year: number): { readonly seconds: number; readonly basis: string } {
  return year < MEASURED_FIRST_YEAR
    ? { seconds: beforeTable(year), basis: 'polynomial, Espenak & Meeus 2006' }
    : { seconds: fromTable(year), basis: 'measured, U.S. Naval Observatory' };
}
