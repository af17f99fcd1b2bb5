import { expect, it } from 'vitest';
import { inBoth } from '../../../src/sky/stretch.js';
import { ttDays } from '../../../src/time/index.js';

const stretch = (from: number, to: number) => ({ from: ttDays(from), to: ttDays(to) });

it('keeps what lies in both lists, in order', () => {
  expect(inBoth([stretch(0, 4), stretch(6, 9)], [stretch(1, 2), stretch(3, 7)])).toEqual([
    stretch(1, 2),
    stretch(3, 4),
    stretch(6, 7),
  ]);
});

it('keeps a single instant and drops what does not touch', () => {
  expect(inBoth([stretch(0, 1)], [stretch(1, 2), stretch(3, 4)])).toEqual([stretch(1, 1)]);
  expect(inBoth([], [stretch(1, 2)])).toEqual([]);
});
