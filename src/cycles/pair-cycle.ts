import { isInner } from '../bodies/index.js';
import type { SkyPlanet } from '../bodies/index.js';
import { sunCycle } from './configurations.js';
import { heliocentricCycle } from './heliocentric-cycle.js';
import type { MeanCycle } from './mean-cycle.js';
import { PeriodError } from './period.js';

/** The cycle that numbers the meetings of two planets in the Earth's sky. */
export interface PairCycle {
  readonly cycle: MeanCycle;
  readonly follows: 'own' | 'sun-outer' | 'sun-mercury';
  /** Whether the mean instant is an estimate of the date, or only a name for the cycle. */
  readonly meanIsEstimate: boolean;
}

/**
 * Two outer planets meet once or thrice in each of their own synodic cycles. An inner planet never leaves the Sun, so
 * it meets an outer one about when the Sun does, months early or late: the Sun's cycle numbers the meeting but does
 * not date it. Mercury and Venus have no cycle of their own; Mercury's with the Sun numbers them. The order in which
 * the two are named does not matter.
 */
export function pairCycle(a: SkyPlanet, b: SkyPlanet): PairCycle {
  if (a === b) throw new PeriodError(`${a} twice: a meeting is between two different planets`);
  const outer = [a, b].filter((planet) => !isInner(planet));
  if (outer.length === 2) {
    return { cycle: heliocentricCycle(a, b, 'conjunction'), follows: 'own', meanIsEstimate: true };
  }
  const [met] = outer;
  return met === undefined
    ? { cycle: sunCycle('mercury', 'inferior-conjunction'), follows: 'sun-mercury', meanIsEstimate: false }
    : { cycle: sunCycle(met, 'conjunction'), follows: 'sun-outer', meanIsEstimate: false };
}
