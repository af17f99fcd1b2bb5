import { describe, expect, it } from 'vitest';
import {
  cycleNumberAt,
  cyclesOverlapping,
  meanInstant,
  stretchOf,
  sunCycle,
} from '../../../src/cycles/index.js';
import type { MeanCycle } from '../../../src/cycles/index.js';
import { ttDays, ttFromUtc, utcMillis } from '../../../src/time/index.js';

/** Mean instants at 3, 13, 23 …; stretches from −2 to 8, from 8 to 18 … */
const decade: MeanCycle = { epoch: ttDays(3), periodDays: 10 };
const overlapping = (from: number, to: number) => cyclesOverlapping(decade, ttDays(from), ttDays(to));

describe('mean cycles', () => {
  it('count from the epoch', () => {
    expect(meanInstant(decade, 0)).toBe(3);
    expect(meanInstant(decade, -2)).toBe(-17);
  });

  it('number an instant by the nearest mean instant, a tie by the later one', () => {
    expect([-2.001, -2, 7.999, 8].map((tt) => cycleNumberAt(decade, ttDays(tt)))).toEqual([-1, 0, 0, 1]);
    expect(Object.is(cycleNumberAt(decade, ttDays(2.9)), 0)).toBe(true);
  });

  it('stretch half a cycle to either side', () => {
    expect(stretchOf(decade, 1)).toEqual({ from: 8, to: 18 });
  });

  it('overlap a span with every cycle that has a part in it, and no other', () => {
    expect(overlapping(0, 1)).toEqual([0]);
    expect(overlapping(7.9, 8.1)).toEqual([0, 1]);
    expect(overlapping(-12, 28)).toEqual([-1, 0, 1, 2]);
  });

  it('leave out the cycles that only touch a span: its start is in it, its end is not', () => {
    expect(overlapping(8, 18)).toEqual([1]);
  });

  it('have no part in an empty span', () => {
    expect(overlapping(5, 5)).toEqual([]);
    expect(overlapping(5, -40)).toEqual([]);
  });

  it('name the Mars opposition of February 2027 +13 for ever', () => {
    const february = ttFromUtc(utcMillis(Date.UTC(2027, 1, 19, 15, 45)));
    expect(cycleNumberAt(sunCycle('mars', 'opposition'), february)).toBe(13);
  });
});
