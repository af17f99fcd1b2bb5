import type { Planet } from '../bodies/index.js';
import { centuryRatePerDay, numberingElements } from './elements.js';
import { meanCycleOf } from './mean-cycle.js';
import type { MeanCycle } from './mean-cycle.js';
import { PeriodError } from './period.js';

/** The mean cycle in which two planets line up as seen from the Sun, on one side of it or on opposite ones. */
export function heliocentricCycle(
  a: Planet,
  b: Planet,
  configuration: 'conjunction' | 'opposition',
): MeanCycle {
  if (a === b) throw new PeriodError(`${a} twice: a cycle is between two different planets`);
  const [faster, slower] = rateOf(a) > rateOf(b) ? [a, b] : [b, a];
  return leadCycle(faster, slower, configuration === 'conjunction' ? 0 : 180);
}

/** The mean cycle in which the faster of two planets is ahead of the slower by an angle, degrees along the zodiac. */
export function leadCycle(faster: Planet, slower: Planet, leadDeg: number): MeanCycle {
  const fast = numberingElements[faster].meanLongitudeDeg;
  const slow = numberingElements[slower].meanLongitudeDeg;
  return meanCycleOf(fast[0] - slow[0], centuryRatePerDay(fast[1] - slow[1]), leadDeg);
}

const rateOf = (planet: Planet): number => numberingElements[planet].meanLongitudeDeg[1];
