import { describe, expect, it } from 'vitest';
import { cyclesOverlapping, stretchOf } from '../../src/cycles/index.js';
import { librarySource } from '../../src/ephemeris/index.js';
import { kinds } from '../../src/forecast/kinds.js';
import { trace } from '../../src/forecast/trace.js';
import { trackedSky } from '../../src/forecast/tracked-sky.js';
import { skyPlanets } from '../../src/bodies/index.js';
import { DAYS_PER_JULIAN_YEAR, ttDays } from '../../src/time/index.js';

/**
 * The kinds that are searched as turning once a cycle do so: in every cycle's stretch of 1600–2600, in both reckonings.
 * Every tenth of the thousand years is followed here; the whole was followed once, for all planets and Pluto.
 */
const decades = Array.from({ length: 10 }, (_, i) => ({
  from: ttDays((-400 + 100 * i) * DAYS_PER_JULIAN_YEAR),
  to: ttDays((-390 + 100 * i) * DAYS_PER_JULIAN_YEAR),
}));
const sky = trackedSky(librarySource);

const cases = kinds
  .filter(({ search }) => search === 'one-turn-a-cycle')
  .flatMap((kind) =>
    (kind.reckoning === null ? (['longitude'] as const) : (['longitude', 'right-ascension'] as const)).map(
      (reckoning) => ({ name: kind.name, kind, reckoning }),
    ),
  );

describe('kinds that turn once a cycle', () => {
  it.each(cases)('$name in $reckoning', ({ kind, reckoning }) => {
    const counts = kind.subjects(skyPlanets).flatMap((subject) => {
      const { cycle } = kind.numbering(subject);
      const signal = kind.signal(sky, subject, reckoning);
      return decades
        .flatMap(({ from, to }) => cyclesOverlapping(cycle, from, to))
        .map((n) => {
          const stretch = stretchOf(cycle, n);
          const { turns } = trace(signal, stretch.from, stretch.to, kind.stepDays(subject));
          return turns.filter(({ is, tt }) => is === kind.sought && kind.accepts(sky, subject, tt)).length;
        });
    });
    expect(counts.length).toBeGreaterThan(kind.subjects(skyPlanets).length * decades.length);
    expect(new Set(counts)).toEqual(new Set([1]));
  });
});
