import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { planets } from '../../src/bodies/index.js';
import {
  cycleNumberAt,
  cyclesOverlapping,
  heliocentricCycle,
  meanInstant,
  stretchOf,
} from '../../src/cycles/index.js';
import type { MeanCycle } from '../../src/cycles/index.js';
import { ttDays } from '../../src/time/index.js';

const twoPlanets = fc.shuffledSubarray([...planets], { minLength: 2, maxLength: 2 });
const cycles: fc.Arbitrary<MeanCycle> = fc.oneof(
  fc
    .tuple(twoPlanets, fc.constantFrom('conjunction' as const, 'opposition' as const))
    .map(([pair, configuration]) => heliocentricCycle(pair[0]!, pair[1]!, configuration)),
  fc
    .tuple(fc.double({ min: -5000, max: 5000, noNaN: true }), fc.double({ min: 1, max: 10_000, noNaN: true }))
    .map(([epoch, periodDays]) => ({ epoch: ttDays(epoch), periodDays })),
);
const numbers = fc.integer({ min: -2000, max: 2000 });
/** 1600–2600. */
const instants = fc.double({ min: -146_000, max: 219_000, noNaN: true }).map(ttDays);

describe('mean cycles', () => {
  it('number their own mean instants', () => {
    fc.assert(
      fc.property(cycles, numbers, (cycle, n) => {
        expect(cycleNumberAt(cycle, meanInstant(cycle, n))).toBe(n);
      }),
    );
  });

  it('hold every instant in the stretch of the cycle that numbers it', () => {
    fc.assert(
      fc.property(cycles, instants, (cycle, tt) => {
        const { from, to } = stretchOf(cycle, cycleNumberAt(cycle, tt));
        // An instant within rounding of an edge may be counted to either side.
        const rounding = 1e-9;
        expect(tt).toBeGreaterThanOrEqual(from - rounding);
        expect(tt).toBeLessThan(to + rounding);
      }),
    );
  });

  it('tile the time: a stretch ends where the next begins, to the last bit', () => {
    fc.assert(
      fc.property(cycles, numbers, (cycle, n) => {
        expect(stretchOf(cycle, n).to).toBe(stretchOf(cycle, n + 1).from);
      }),
    );
  });

  it('overlap a span without a gap, from the stretch of its start to that of its end', () => {
    fc.assert(
      fc.property(cycles, instants, fc.double({ min: 1e-3, max: 4000, noNaN: true }), (cycle, from, days) => {
        const to = ttDays(from + days);
        const found = cyclesOverlapping(cycle, from, to);
        const [first, last] = [found[0]!, found.at(-1)!];
        expect(found).toEqual(Array.from({ length: found.length }, (_, i) => first + i));
        expect(stretchOf(cycle, first).from).toBeLessThanOrEqual(from);
        expect(stretchOf(cycle, last).from).toBeLessThan(to);
        expect(stretchOf(cycle, last).to).toBeGreaterThanOrEqual(to);
      }),
    );
  });
});
