import { utcFromTt } from '../../time/index.js';
import type { TtDays } from '../../time/index.js';
import type { Closeness } from '../event.js';

/** One approach of a planet to the Earth. */
export interface Approach {
  readonly tt: TtDays;
  readonly distanceAu: number;
}

/**
 * How near one approach comes among its neighbours.
 * @param all the approaches to compare with, in order of time; whether the target is among them does not matter
 */
export function closenessOf(target: Approach, all: readonly Approach[]): Closeness {
  const before = all.filter(({ tt }) => tt < target.tt);
  const after = all.filter(({ tt }) => tt > target.tt);
  const compared = [...before, target, ...after];
  const nearer = ({ distanceAu }: Approach): boolean => distanceAu < target.distanceAu;
  const farther = ({ distanceAu }: Approach): boolean => distanceAu > target.distanceAu;
  return {
    rank: 1 + compared.filter(nearer).length,
    of: compared.length,
    yearFrom: yearOf(compared[0]!),
    yearTo: yearOf(compared.at(-1)!),
    phrase: phraseOf(reachOf(nearer, before, after), reachOf(farther, before, after), compared),
  };
}

/** How far an approach stays unbeaten, in one sense: as the nearest, or as the farthest. */
interface Reach {
  /** The last one before it and the first one after it that beat it. */
  readonly beatenBefore: Approach | undefined;
  readonly beatenAfter: Approach | undefined;
  /** How many neighbours in between it outdoes. */
  readonly outdone: number;
}

function reachOf(
  beats: (approach: Approach) => boolean,
  before: readonly Approach[],
  after: readonly Approach[],
): Reach {
  const [last, next] = [before.findLastIndex(beats), after.findIndex(beats)];
  const outdone = before.length - 1 - last + (next < 0 ? after.length : next);
  return { beatenBefore: before[last], beatenAfter: after[next], outdone };
}

/** Of the two things that can be said, the one that outdoes more neighbours. */
function phraseOf(closest: Reach, mostDistant: Reach, compared: readonly Approach[]): string {
  return closest.outdone >= mostDistant.outdone
    ? `the closest ${spanOf(closest, compared)}`
    : `the most distant ${spanOf(mostDistant, compared)}`;
}

function spanOf({ beatenBefore, beatenAfter }: Reach, compared: readonly Approach[]): string {
  const [first, last] = [yearOf(compared[0]!), yearOf(compared.at(-1)!)];
  if (beatenBefore === undefined && beatenAfter === undefined) return `of all from ${first} to ${last}`;
  const since = beatenBefore === undefined ? `at least ${first}` : `${yearOf(beatenBefore)}`;
  const until = beatenAfter === undefined ? `at least ${last}` : `${yearOf(beatenAfter)}`;
  return `since ${since} and until ${until}`;
}

const yearOf = ({ tt }: Approach): number => new Date(utcFromTt(tt)).getUTCFullYear();
