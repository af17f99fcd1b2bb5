import { MEASURED_FIRST_YEAR, MEASURED_STEP_YEARS, measuredDeltaTHundredths } from './delta-t-table.js';
import { leapEras } from './leap-seconds.js';

/**
 * 95 % half-widths of ΔT, seconds. In 1600 and 1700 from the published standard errors of 20 and 5 s (Espenak & Meeus 2006,
 * after Morrison & Stephenson 2004 and Stephenson & Houlden 1986). Elsewhere the published ones (1 s in 1800, 0.1 s in
 * 1900) are smaller than the difference between our table and the newest determination (Morrison et al. 2021), so that
 * difference counts. From 1956 atomic clocks carry the table, and what is left is its half-year step.
 */
const halfWidths: readonly (readonly [year: number, seconds: number])[] = [
  [1500, 100],
  [1600, 39.2],
  [1700, 9.8],
  [1800, 8],
  [1830, 6],
  [1850, 3.5],
  [1890, 2.3],
  [1910, 1],
  [1930, 0.5],
  [1950, 0.5],
  [1956, 0.04],
];

/** 95 % half-width of ΔT in a year before 1972, seconds: interpolated in its logarithm, constant outside the list. */
export function historicUncertaintySeconds(year: number): number {
  const next = halfWidths.findIndex(([knot]) => knot > year);
  if (next === 0) return halfWidths[0]![1];
  if (next < 0) return halfWidths.at(-1)![1];
  const [year0, seconds0] = halfWidths[next - 1]!;
  const [year1, seconds1] = halfWidths[next]!;
  return seconds0 * (seconds1 / seconds0) ** ((year - year0) / (year1 - year0));
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
