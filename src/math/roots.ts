/** An iteration reached its bound: the function is not what its caller promised. */
export class NoConvergenceError extends Error {
  override readonly name = 'NoConvergenceError';
}

const MAX_BRACKETED_STEPS = 100;

/**
 * The root of a continuous function between two points where its signs differ: inverse quadratic interpolation and
 * secants, with bisection wherever they do not shrink the bracket.
 *
 * @param f any continuous function with f(low)·f(high) ≤ 0
 * @param tolerance the root is within this of the value returned, in the unit of x
 * @throws NoConvergenceError if the signs do not differ, or after 100 steps
 * Source: R. P. Brent, Algorithms for Minimization without Derivatives (1973), ch. 4.
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
  // b is the best point so far, c the other side of the root, a the point before b.
  let a = low;
  let fa = fLow;
  let b = high;
  let fb = fHigh;
  let c = a;
  let fc = fa;
  let step = b - a;
  let stepBefore = step;
  for (let count = 0; count < MAX_BRACKETED_STEPS; count++) {
    if (Math.abs(fc) < Math.abs(fb)) {
      a = b;
      fa = fb;
      b = c;
      fb = fc;
      c = a;
      fc = fa;
    }
    const half = (c - b) / 2;
    const least = tolerance / 2 + 2 * Number.EPSILON * Math.abs(b);
    if (Math.abs(half) <= least || fb === 0) return b;
    const proposed = interpolatedStep(a, fa, b, fb, c, fc, half);
    const trusted =
      Math.abs(fa) > Math.abs(fb) &&
      Math.abs(stepBefore) >= least &&
      Math.abs(proposed) < Math.min(1.5 * Math.abs(half) - least / 2, Math.abs(stepBefore) / 2) &&
      proposed > 0 === half > 0;
    stepBefore = trusted ? step : half;
    step = trusted ? proposed : half;
    a = b;
    fa = fb;
    b += Math.abs(step) > least ? step : Math.sign(half) * least;
    fb = f(b);
    if (fb > 0 === fc > 0) {
      c = a;
      fc = fa;
      step = stepBefore = b - a;
    }
  }
  throw new NoConvergenceError(`no root to ${tolerance} after ${MAX_BRACKETED_STEPS} steps near ${b}`);
}

/** From b: a secant where only two points differ, inverse quadratic interpolation through three. */
function interpolatedStep(
  a: number,
  fa: number,
  b: number,
  fb: number,
  c: number,
  fc: number,
  half: number,
): number {
  const s = fb / fa;
  if (a === c) return (2 * half * s) / (s - 1);
  const q = fa / fc;
  const r = fb / fc;
  return (-s * (2 * half * q * (q - r) - (b - a) * (r - 1))) / ((q - 1) * (r - 1) * (s - 1));
}
