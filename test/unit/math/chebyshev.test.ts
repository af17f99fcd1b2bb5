import { describe, expect, it } from 'vitest';
import { chebyshevNodes, chebyshevValue, evaluateChebyshev, fitChebyshev } from '../../../src/math/index.js';

const fit = (f: (x: number) => number, n: number): Float64Array => {
  const coefficients = new Float64Array(n);
  fitChebyshev(chebyshevNodes(n).map(f), coefficients, 0);
  return coefficients;
};

describe('Chebyshev interpolation', () => {
  it('reproduces a polynomial of lower degree, with both derivatives, to rounding', () => {
    const c = fit((x) => 3 - 2 * x + 5 * x ** 4, 8);
    const jet = { value: 0, rate: 0, acceleration: 0 };
    for (const x of [-1, -0.37, 0, 0.5, 1]) {
      evaluateChebyshev(c, 0, 8, x, jet);
      expect(jet.value).toBeCloseTo(3 - 2 * x + 5 * x ** 4, 13);
      expect(jet.rate).toBeCloseTo(-2 + 20 * x ** 3, 12);
      expect(jet.acceleration).toBeCloseTo(60 * x ** 2, 11);
      expect(chebyshevValue(c, 0, 8, x)).toBeCloseTo(jet.value, 14);
    }
  });

  it('converges as fast as theory says on the exponential', () => {
    // The error of n-point interpolation of e^x is below 1/(2^(n−1) n!) · e: 1.5e-12 for n = 12.
    const c = fit(Math.exp, 12);
    for (let x = -1; x <= 1; x += 0.01)
      expect(Math.abs(chebyshevValue(c, 0, 12, x) - Math.exp(x))).toBeLessThan(3e-12);
  });

  it('reads its coefficients from the offset given', () => {
    const c = new Float64Array(9).fill(99);
    fitChebyshev(
      chebyshevNodes(3).map((x) => x * x),
      c,
      3,
    );
    expect(chebyshevValue(c, 3, 3, 0.6)).toBeCloseTo(0.36, 14);
    expect([c[2], c[6]]).toEqual([99, 99]);
  });
});
