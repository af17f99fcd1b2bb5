/** An iteration reached its bound: the function is not what its caller promised. */
export class NoConvergenceError extends Error {
  override readonly name = 'NoConvergenceError';
}

const MAX_BRACKETED_STEPS = 80;

/**
 * The root of a continuous function between two points where its signs differ: regula falsi with the Illinois
 * weighting, bisecting whenever a step shrinks the bracket too little, so that it always ends.
 *
 * @param f any continuous function with f(low)·f(high) ≤ 0
 * @param tolerance the bracket's width at which to stop, in the unit of x
 * @throws NoConvergenceError if the signs do not differ, or after 80 steps
 * Source: Dowell & Jarratt, BIT 11 (1971) 168 (the Illinois weighting).
 */
export function bracketedRoot(
  f: (x: number) => number,
  low: number,
  high: number,
  tolerance: number,
  fLow = f(low),
  fHigh = f(high),
): number {
  if (fLow === 0) return low;
  if (fHigh === 0) return high;
  if (fLow > 0 === fHigh > 0) {
    throw new NoConvergenceError(`no change of sign between ${low} (${fLow}) and ${high} (${fHigh})`);
  }
  let a = low;
  let b = high;
  let fa = fLow;
  let fb = fHigh;
  let width = Math.abs(b - a);
  for (let step = 0; step < MAX_BRACKETED_STEPS; step++) {
    const slow = step % 3 === 2 && Math.abs(b - a) > width / 2;
    if (step % 3 === 2) width = Math.abs(b - a);
    const x = slow ? (a + b) / 2 : b - (fb * (b - a)) / (fb - fa);
    const fx = f(x);
    if (fx === 0) return x;
    if (fx > 0 !== fb > 0) {
      a = b;
      fa = fb;
    } else {
      fa /= 2;
    }
    const moved = Math.abs(x - b);
    b = x;
    fb = fx;
    if (moved < tolerance || Math.abs(b - a) < tolerance) return b;
  }
  throw new NoConvergenceError(`no root to ${tolerance} after ${MAX_BRACKETED_STEPS} steps near ${b}`);
}
