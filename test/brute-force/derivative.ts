import type { Grid } from './roots-on-grid.js';

/**
 * First derivative by the five-point difference of half-width 2h. Its error is h⁴/30 of the fifth derivative, plus
 * 1.5/h times the roundoff of the values (1e-12 rad here): with h = 0.25 day both move a station or an extremum by
 * less than 0.1 s.
 */
export const derivative =
  (f: (tt: number) => number, hDays: number) =>
  (tt: number): number =>
    (8 * (f(tt + hDays) - f(tt - hDays)) - (f(tt + 2 * hDays) - f(tt - 2 * hDays))) / (12 * hDays);

/** The same for an angle that `f` gives within −π … π: the differences are taken across the seam. */
export const angularDerivative =
  (f: (tt: number) => number, hDays: number) =>
  (tt: number): number => {
    const inner = wrapped(f(tt + hDays) - f(tt - hDays));
    const outer = wrapped(f(tt + 2 * hDays) - f(tt - 2 * hDays));
    return (8 * inner - outer) / (12 * hDays);
  };

/**
 * The same on samples, h being `stride` steps of the grid, so that samples and direct values agree in sign. The ends,
 * which have no derivative, are left NaN: no root is sought there.
 */
export function sampledDerivative(
  { step, count }: Grid,
  samples: Float64Array,
  { stride, angular }: { stride: number; angular: boolean },
): Float64Array {
  const rates = new Float64Array(count).fill(NaN);
  const difference = angular ? wrapped : (x: number): number => x;
  for (let i = 2 * stride; i < count - 2 * stride; i++) {
    const inner = difference(samples[i + stride]! - samples[i - stride]!);
    const outer = difference(samples[i + 2 * stride]! - samples[i - 2 * stride]!);
    rates[i] = (8 * inner - outer) / (12 * stride * step);
  }
  return rates;
}

/** An angle brought into −π … π, radians. */
export function wrapped(angle: number): number {
  const turns = Math.round(angle / (2 * Math.PI));
  return angle - turns * 2 * Math.PI;
}
