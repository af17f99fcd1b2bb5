/** Below this true altitude the formula has no meaning; the last value fades to nothing at the nadir. */
const LOWEST_DEG = -1;

/**
 * What the air adds to a true altitude, degrees, at 1010 hPa and 10 °C: 0.1′ accurate above the horizon, while near
 * it the weather alone changes it by several arcminutes.
 * Source: Sæmundsson, Sky and Telescope 72 (1986) 70, the inverse of Bennett (1982).
 */
export function refractionDeg(trueAltitudeDeg: number): number {
  if (trueAltitudeDeg < LOWEST_DEG) {
    return (refractionDeg(LOWEST_DEG) * (trueAltitudeDeg + 90)) / (LOWEST_DEG + 90);
  }
  const argumentDeg = trueAltitudeDeg + 10.3 / (trueAltitudeDeg + 5.11);
  return Math.max(0, 1.02 / 60 / Math.tan((argumentDeg * Math.PI) / 180));
}
