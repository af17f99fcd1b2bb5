import { beforeAll, describe, expect, it } from 'vitest';
import { majorPlanets } from '../../src/bodies/index.js';
import { librarySource } from '../../src/ephemeris/index.js';
import type { Reckoning } from '../../src/forecast/event.js';
import { eventId } from '../../src/forecast/identity.js';
import { keplerSky } from '../../src/forecast/kepler-sky.js';
import { kinds } from '../../src/forecast/kinds.js';
import type { Kind } from '../../src/forecast/kinds.js';
import { search } from '../../src/forecast/search.js';
import type { Finding } from '../../src/forecast/search.js';
import { trackedSky } from '../../src/forecast/tracked-sky.js';
import { SECONDS_PER_DAY, ttDays } from '../../src/time/index.js';
import { readScan } from './read-scan.js';
import type { ScanRow } from './read-scan.js';

/**
 * Every event of 1900–2100, both reckonings, against the stored brute-force scan on the same library: nothing missing,
 * nothing extra, no id twice. The scan rounds to 1e-6 day (0.09 s).
 */
const span = { from: ttDays(-36_524.5), to: ttDays(36_524.5) };
const context = {
  sky: trackedSky(librarySource),
  kepler: keplerSky('by-date'),
  limits: { withinDeg: 5 },
};

/** Roots are decided on exact places, extrema on tracks: 0.004″ in Mercury's rate is seconds at a flat maximum. */
const TOLERANCE_SECONDS: Readonly<Record<Kind['sought'], number>> = { zero: 1, maximum: 60, minimum: 60 };
/** No two events of one kind and subject lie this near to each other without being a pair that both sides list. */
const SAME_EVENT_DAYS = 0.5;

const cases = kinds.flatMap((kind) => {
  const reckonings: readonly Reckoning[] =
    kind.reckoning?.choice === true
      ? ['longitude', 'right-ascension']
      : [kind.reckoning?.byDefault ?? 'longitude'];
  return reckonings.map((reckoning) => ({ kind, name: kind.name, reckoning }));
});

describe('the forecast of 1900–2100 against a brute-force scan', () => {
  const judged = new Map<string, ScanRow[]>();
  let compared = 0;

  beforeAll(() => {
    for (const row of readScan()) {
      const key = keyOf(row.kind, row.bodies, row.reckoning);
      judged.set(key, [...(judged.get(key) ?? []), row]);
    }
  });

  it.each(cases)('$name in $reckoning', ({ kind, reckoning }) => {
    const ids = new Set<string>();
    for (const subject of kind.subjects(majorPlanets)) {
      const found = search({ kind, subject, reckoning }, span, context);
      const rows = judged.get(keyOf(kind.name, subject, kind.reckoning === null ? null : reckoning)) ?? [];
      compared += rows.length;
      expect(differences(found, rows)).toEqual([]);
      for (let i = 0; i < found.length; i++) {
        const off = Math.abs(found[i]!.tt - rows[i]!.tt) * SECONDS_PER_DAY;
        expect(off, `${subject.join('-')} at ${found[i]!.tt}`).toBeLessThan(TOLERANCE_SECONDS[kind.sought]);
      }
      for (const { cycle, ordinal } of found) ids.add(eventId(kind.name, subject, cycle, ordinal));
      expect(found.length, 'subjects with events').toBe(rows.length);
    }
    const total = kind
      .subjects(majorPlanets)
      .reduce(
        (sum, subject) =>
          sum +
          (judged.get(keyOf(kind.name, subject, kind.reckoning === null ? null : reckoning)) ?? []).length,
        0,
      );
    expect(ids.size).toBe(total);
  });

  it('drops no row of the scan', () => {
    expect(compared).toBe([...judged.values()].flat().length);
    expect(compared).toBeGreaterThan(50_000);
  });
});

const keyOf = (kind: string, bodies: readonly string[], reckoning: string | null): string =>
  [kind, bodies.join('-'), reckoning].join(' ');

/** What one side has and the other lacks, in words. */
function differences(found: readonly Finding[], rows: readonly ScanRow[]): string[] {
  const near = (tt: number, others: readonly { readonly tt: number }[]) =>
    others.some((other) => Math.abs(other.tt - tt) < SAME_EVENT_DAYS);
  return [
    ...rows.filter(({ tt }) => !near(tt, found)).map(({ tt }) => `missing at ${tt}`),
    ...found.filter(({ tt }) => !near(tt, rows)).map(({ tt }) => `extra at ${tt}`),
  ];
}
