import { cycleNumberAt, meanInstant, sunCycle } from '../cycles/index.js';
import { subtractMotions } from '../ephemeris/index.js';
import { length } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import { closenessOf } from './circumstances/index.js';
import type { Approach } from './circumstances/index.js';
import type { Closeness } from './event.js';
import { keplerSky } from './kepler-sky.js';
import { nearest } from './refine.js';
import { distanceJet } from './signal.js';

/** Neighbours on either side: 79 years, after which the approaches of Mars repeat. */
const NEIGHBOURS = 37;
const REACH_DAYS = 120;

const kepler = keplerSky('by-date');
const cycle = sunCycle('mars', 'closest-approach');

/**
 * How near Mars comes at the approach nearest to an instant, among its neighbours of 79 years before and after. Ranked
 * on the Kepler orbits, whose distances are good to 0.0002 au; approaches that differ by less are rare, and no one
 * could tell them apart.
 */
export function marsCloseness(tt: TtDays): Closeness {
  const here = cycleNumberAt(cycle, tt);
  const approaches = Array.from({ length: 2 * NEIGHBOURS + 1 }, (_, i) => approachOf(here - NEIGHBOURS + i));
  return closenessOf(approaches[NEIGHBOURS]!, approaches);
}

/** Neighbouring approaches share most of their neighbours. */
const known = new Map<number, Approach>();

function approachOf(n: number): Approach {
  const approach = known.get(n) ?? findApproach(n);
  known.set(n, approach);
  return approach;
}

function findApproach(n: number): Approach {
  const relative = (tt: TtDays) =>
    subtractMotions(kepler.heliocentric('mars', tt), kepler.heliocentric('earth', tt));
  const mean = meanInstant(cycle, n);
  const tt = nearest('minimum', (at) => distanceJet(relative(at)), mean, REACH_DAYS) ?? mean;
  return { tt, distanceAu: length(relative(tt).position) };
}
