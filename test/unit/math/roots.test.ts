import { describe, expect, it } from 'vitest';
import { NoConvergenceError, bracketedRoot } from '../../../src/math/index.js';

describe('bracketedRoot', () => {
  it('finds simple roots to the tolerance', () => {
    expect(bracketedRoot((x) => x * x - 2, 0, 2, 1e-12)).toBeCloseTo(Math.SQRT2, 11);
    expect(bracketedRoot(Math.cos, 0, 3, 1e-12)).toBeCloseTo(Math.PI / 2, 11);
  });

  it('takes few steps on a smooth function', () => {
    let calls = 0;
    bracketedRoot((x) => (calls++, Math.sin(x) - 0.3), -1, 1.2, 1e-10);
    expect(calls).toBeLessThan(12);
  });

  it('ends on functions made to be slow', () => {
    expect(bracketedRoot((x) => x ** 15, -1, 1.7, 1e-9)).toBeCloseTo(0, 1);
    expect(bracketedRoot((x) => (x < 0.123 ? -1 : 1e9), 0, 1, 1e-9)).toBeCloseTo(0.123, 8);
  });

  it('returns an end that is a root itself', () => {
    expect(bracketedRoot((x) => x, 0, 1, 1e-9)).toBe(0);
    expect(bracketedRoot((x) => x - 1, 0, 1, 1e-9)).toBe(1);
  });

  it('refuses an interval without a change of sign', () => {
    expect(() => bracketedRoot((x) => x * x + 1, -1, 1, 1e-9)).toThrow(NoConvergenceError);
  });
});
