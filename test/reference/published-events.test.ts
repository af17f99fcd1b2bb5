import { describe, expect, it } from 'vitest';
import type { Planet } from '../../src/bodies/index.js';
import { librarySource } from '../../src/ephemeris/index.js';
import type { ForecastEvent, Reckoning } from '../../src/forecast/index.js';
import { keplerSky } from '../../src/forecast/kepler-sky.js';
import type { KindName } from '../../src/forecast/kind-names.js';
import { kindNamed } from '../../src/forecast/kinds.js';
import type { Subject } from '../../src/forecast/kinds.js';
import { search } from '../../src/forecast/search.js';
import { eventTeller } from '../../src/forecast/tell-event.js';
import { trackedSky } from '../../src/forecast/tracked-sky.js';
import { bodyCircumstancesOf } from '../../src/output/index.js';
import { SECONDS_PER_DAY, ttDays, ttFromUtc, utcMillis } from '../../src/time/index.js';
import type { TtDays } from '../../src/time/index.js';
import { readTable } from './published-rows.js';

/**
 * Instants and circumstances as printed by almanac offices, JPL, textbooks and encyclopedias: the source stands in each
 * row of `published-events.tsv`. A row agrees within the rounding of its source and the uncertainty that we state.
 */
const sky = trackedSky(librarySource);
const tell = eventTeller(sky, []);
const context = { sky, kepler: keplerSky('by-date'), limits: { withinDeg: 5 } };

/**
 * What the source's rounding, or its method, allows beside our own uncertainty. Days: a date may be in another zone or
 * of a slightly different definition. `4h`: the textbook's series of chapter 36, "a few hours". Apsides of the giants
 * are so flat that printed dates differ by weeks among good sources; the distance is the check.
 */
const HOUR = 3600;
const allowedSeconds: Readonly<Record<string, number>> = {
  stated: 0,
  minute: 60,
  quarterhour: HOUR / 4,
  halfhour: HOUR / 2,
  hour: HOUR,
  '4h': 4 * HOUR,
  plateau: 12 * HOUR,
  day: SECONDS_PER_DAY,
  '3d': 3 * SECONDS_PER_DAY,
  '5d': 5 * SECONDS_PER_DAY,
  '12d': 12 * SECONDS_PER_DAY,
  '20d': 20 * SECONDS_PER_DAY,
  '40d': 40 * SECONDS_PER_DAY,
};
const SEARCH_DAYS = 60;

const rows = readTable('published-events.tsv');

describe('published events', () => {
  it.each(rows)('$row: $kind of $bodies, $when', (row) => {
    const [from, to] = intervalOf(row['when']!, row['scale']!);
    const event = nearestEvent(row, from, to);
    const allowed = allowedSeconds[row['tolerance']!]! + event.uncertaintySeconds.utc;
    const early = (from - event.tt) * SECONDS_PER_DAY;
    const late = (event.tt - to) * SECONDS_PER_DAY;
    expect(Math.max(early, late), row['source']).toBeLessThanOrEqual(allowed);
    if (row['quantity'] !== '') {
      const found = quantityOf(event, row['quantity']!);
      expect(Math.abs(found - Number(row['value'])), `${found}: ${row['source']!}`).toBeLessThanOrEqual(
        Number(row['valueTolerance']),
      );
    }
  });

  it('drops no row', () => {
    expect(rows.length).toBe(293);
  });
});

/** A date covers its day; an interval is written `from/to`. */
function intervalOf(when: string, scale: string): [TtDays, TtDays] {
  const instant = (text: string): TtDays => {
    const millis = Date.parse(`${text.includes('T') ? text : `${text}T00:00:00`}Z`);
    return scale === 'TT'
      ? ttDays((millis - Date.UTC(2000, 0, 1, 12)) / 86_400_000)
      : ttFromUtc(utcMillis(millis));
  };
  const [first, last] = when.split('/');
  if (last !== undefined) return [instant(first!), instant(last)];
  return when.includes('T') ? [instant(when), instant(when)] : [instant(when), ttDays(instant(when) + 1)];
}

function nearestEvent(row: Record<string, string>, from: TtDays, to: TtDays): ForecastEvent {
  const kind = kindNamed(row['kind'] as KindName);
  const middle = (from + to) / 2;
  const reckoning = (
    row['reckoning'] === '' ? (kind.reckoning?.byDefault ?? 'longitude') : row['reckoning']
  ) as Reckoning;
  const subject = row['bodies']!.split(' ') as Planet[] as unknown as Subject;
  const span = { from: ttDays(middle - SEARCH_DAYS), to: ttDays(middle + SEARCH_DAYS) };
  const found = search({ kind, subject, reckoning }, span, context).sort(
    (a, b) => Math.abs(a.tt - middle) - Math.abs(b.tt - middle),
  );
  expect(found.length, `no ${kind.name} of ${subject.join('–')} near ${row['when']!}`).toBeGreaterThan(0);
  return tell(found[0]!, null);
}

function quantityOf(event: ForecastEvent, name: string): number {
  const { circumstances } = event;
  const holder = (name in circumstances ? circumstances : bodyCircumstancesOf(event)[0]) as unknown as Record<
    string,
    number
  >;
  return holder[name]!;
}
