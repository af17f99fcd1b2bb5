import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { trace } from '../../src/forecast/trace.js';
import type { Signal } from '../../src/forecast/signal.js';
import { ttDays } from '../../src/time/index.js';

/** A cubic with given turning points, whose jets are exact: s = k·∫(t−a)(t−b), shifted so that s(a) = depth. */
function loop(a: number, b: number, depth: number): Signal {
  const k = 1e-4;
  const primitive = (t: number) => k * (t ** 3 / 3 - ((a + b) * t ** 2) / 2 + a * b * t);
  return (tt) => ({
    value: primitive(tt) - primitive(a) + depth,
    rate: k * (tt - a) * (tt - b),
    acceleration: k * (2 * tt - a - b),
  });
}

describe('trace', () => {
  it('finds a pair of turning points and a grazing pair of zeros however close they lie', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 5, max: 90, noNaN: true }),
        fc.double({ min: 0.01, max: 6, noNaN: true }),
        fc.double({ min: 0.05, max: 0.95, noNaN: true }),
        (a, gap, part) => {
          // The loop's own height is k·gap³/6; the zero line cuts it at `part` of that.
          const height = (1e-4 * gap ** 3) / 6;
          const found = trace(loop(a, a + gap, height * part), ttDays(0), ttDays(100), 8);
          expect(found.turns.map(({ is }) => is)).toEqual(['maximum', 'minimum']);
          expect(found.turns[0]!.tt).toBeCloseTo(a, 5);
          expect(found.turns[1]!.tt).toBeCloseTo(a + gap, 5);
          const inLoop = found.roots.filter(({ tt }) => tt > a - 2 * gap && tt < a + 3 * gap);
          expect(inLoop.map(({ branch }) => branch)).toEqual([0, 1, 2]);
        },
      ),
    );
  });

  it('finds every zero and turn of a sine exactly once, in order, whatever the span', () => {
    fc.assert(
      fc.property(
        // Sixty-fourths of a day, so that exact zeros at the ends are tried but not denormal numbers.
        fc.integer({ min: -3200, max: 3200 }).map((n) => n / 64),
        fc.integer({ min: 64, max: 19_200 }).map((n) => n / 64),
        (from, length) => {
          const w = 0.25;
          const sine: Signal = (tt) => ({
            value: Math.sin(w * tt),
            rate: w * Math.cos(w * tt),
            acceleration: -w * w * Math.sin(w * tt),
          });
          const { roots, turns } = trace(sine, ttDays(from), ttDays(from + length), 3);
          const zeros = (phase: number) =>
            Math.ceil((w * (from + length)) / Math.PI - phase) - Math.ceil((w * from) / Math.PI - phase);
          expect(roots).toHaveLength(zeros(0));
          expect(turns).toHaveLength(zeros(0.5));
        },
      ),
    );
  });

  it('takes the far side of an angle, where a difference jumps by a turn, for no zero', () => {
    const saw: Signal = (tt) => {
      const angle = ((((0.1 * tt + Math.PI) % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI)) - Math.PI;
      return { value: angle, rate: 0.1, acceleration: 0 };
    };
    const { roots } = trace(saw, ttDays(-30), ttDays(100), 5);
    expect(roots.map(({ tt }) => Math.round(tt * 1e4) / 1e4)).toEqual([0, 62.8319]);
  });

  it('is empty for an empty span', () => {
    expect(trace(loop(1, 2, 0), ttDays(5), ttDays(5), 1)).toEqual({ roots: [], turns: [] });
  });
});
