import { DAYS_PER_JULIAN_YEAR } from './instants.js';

/**
 * The long-term part of ΔT up to a constant, seconds: the length of day 1.72 t − 3.5 sin(2π(t + 0.75)/14) ms, t in centuries
 * from 1825 (Morrison, Stephenson, Hohenkerk & Zawilski 2021, Proc. R. Soc. A 477, 20200776), integrated over time.
 */
export function longTermSeconds(year: number): number {
  const t = (year - 1825) / 100;
  const secondsPerMillisecond = (100 * DAYS_PER_JULIAN_YEAR) / 1000;
  const waves = (2 * Math.PI) / 14;
  return secondsPerMillisecond * ((1.72 / 2) * t ** 2 + (3.5 / waves) * Math.cos(waves * (t + 0.75)));
}

/** Standard error of a ΔT extrapolated by this many years, seconds: Huber 2000, as used by Espenak & Meeus 2006. */
export function extrapolationSigmaSeconds(years: number): number {
  const variancePerYear = 0.058;
  const calibrationYears = 2500;
  const milliseconds = Math.sqrt(((years * variancePerYear) / 3) * (1 + years / calibrationYears));
  return (DAYS_PER_JULIAN_YEAR * years * milliseconds) / 1000;
}
