import { cycleNumberAt, meanInstant, sunCycle } from '../cycles/index.js';
import { length, subtract } from '../math/index.js';
import { DAYS_PER_JULIAN_YEAR } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import type { Closeness } from './event.js';
import { keplerSky } from './kepler-sky.js';
import { nearest } from './refine.js';
import { distanceJet } from './signal.js';
import { subtractMotions } from '../ephemeris/index.js';

/** Neighbours on either side: 79 years, after which the approaches of Mars repeat. */
const NEIGHBOURS = 37;
const REACH_DAYS = 120;

interface Approach {
  readonly year: number;
  readonly distanceAu: number;
}

/**
 * How near Mars comes at one approach among its neighbours of 79 years before and after. Ranked on the Kepler orbits,
 * whose distances are good to 0.0002 au; approaches that differ by less are rare, and no one could tell them apart.
 */
export function marsCloseness(tt: TtDays): Closeness {
  const cycle = sunCycle('mars', 'closest-approach');
  const here = cycleNumberAt(cycle, tt);
  const approaches = Array.from({ length: 2 * NEIGHBOURS + 1 }, (_, i) => approach(here - NEIGHBOURS + i));
  const own = approaches[NEIGHBOURS]!;
  const closer = ({ distanceAu }: Approach): boolean => distanceAu < own.distanceAu;
  const before = approaches.slice(0, NEIGHBOURS).findLast(closer);
  const after = approaches.slice(NEIGHBOURS + 1).find(closer);
  return {
    rank: 1 + approaches.filter(closer).length,
    of: approaches.length,
    yearFrom: approaches[0]!.year,
    yearTo: approaches.at(-1)!.year,
    phrase: phraseOf(before?.year ?? null, after?.year ?? null, approaches),
  };
}

function approach(n: number): Approach {
  const sky = kepler;
  const mean = meanInstant(sunCycle('mars', 'closest-approach'), n);
  const relative = (tt: TtDays) =>
    subtractMotions(sky.heliocentric('mars', tt), sky.heliocentric('earth', tt));
  const tt = nearest('minimum', (at) => distanceJet(relative(at)), mean, REACH_DAYS) ?? mean;
  return {
    year: Math.floor(2000 + tt / DAYS_PER_JULIAN_YEAR),
    distanceAu: length(
      subtract(sky.heliocentric('mars', tt).position, sky.heliocentric('earth', tt).position),
    ),
  };
}

const kepler = keplerSky('by-date');

function phraseOf(since: number | null, until: number | null, approaches: readonly Approach[]): string {
  if (since !== null && until !== null) return `the closest since ${since} and until ${until}`;
  if (since !== null) return `the closest since ${since}`;
  if (until !== null) return `the closest until ${until}`;
  return `the closest of ${approaches[0]!.year}–${approaches.at(-1)!.year}`;
}
