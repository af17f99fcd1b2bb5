import { expect, it } from 'vitest';
import { compassWords } from '../../../src/sky/index.js';

it.each([
  [0, 'north'],
  [11.24, 'north'],
  [11.26, 'north-north-east'],
  [90, 'east'],
  [292.5, 'west-north-west'],
  [348.76, 'north'],
  [360, 'north'],
  [-45, 'north-west'],
  [540, 'south'],
])('%d° is %s', (azimuthDeg, words) => {
  expect(compassWords(azimuthDeg)).toBe(words);
});
