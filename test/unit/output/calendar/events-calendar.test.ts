import { describe, expect, it } from 'vitest';
import { eventsCalendar, uidOf } from '../../../../src/output/calendar/index.js';
import { cautions } from '../../../../src/output/index.js';
import type { ForecastEvent } from '../../../../src/forecast/index.js';
import type { Site } from '../../../../src/sky/index.js';
import { ttDays } from '../../../../src/time/index.js';
import {
  aForecast,
  aSite,
  at,
  heliocentricEvent,
  pairEvent,
  seenFrom,
  soloEvent,
} from '../../../fixtures/events.js';
import { readStrictly, strictEntries } from '../../../fixtures/read-calendar.js';

const STAMP = at('2027-01-01T00:00:00Z');
const hill = aSite();
const south = aSite({ id: 'south', name: 'Southern Dome', zone: 'America/Santiago', latitudeDeg: -33.4 });
const calendar = (events: readonly ForecastEvent[], sites: readonly Site[] = []): string =>
  eventsCalendar({ name: 'Sky', description: 'All of it' }, aForecast(events), sites, STAMP);
const descriptionOf = (event: ForecastEvent, sites: readonly Site[] = []): string[] =>
  readStrictly(calendar([event], sites))[0]!.description.split('\n');

describe('the events calendar', () => {
  it('has an entry of a minute an event, at its minute, under its own name', () => {
    expect(readStrictly(calendar([soloEvent({ utc: at('2027-02-19T15:45:40Z') })]))[0]).toMatchObject({
      uid: 'opposition.mars.+13.a@synodos',
      startMillis: at('2027-02-19T15:46:00Z'),
      endMillis: at('2027-02-19T15:47:00Z'),
      wholeDay: false,
      summary: 'Mars at opposition',
    });
  });

  it('says first what to do, then why, then how sure', () => {
    const event = seenFrom(seenFrom(pairEvent(), hill), south, {
      verdict: 'Not visible from here: too low.',
    });
    expect(descriptionOf(event, [hill, south])).toEqual([
      'Venus and Jupiter stand 57′ apart on the evening of Wednesday 9 June 2027; look low in the west-north-west at 22:10.',
      'Southern Dome: Not visible from here: too low.',
      'Leo, 24′ apart, 30° from the Sun',
      'UTC: Wednesday 9 June 2027, 19:13, ± 2 min',
      'Hill Observatory: Wednesday 9 June 2027, 21:13 CEST',
      'Southern Dome: Wednesday 9 June 2027, 15:13 GMT-4',
      'Refined minus first estimate: mean cycle −0.5 d, Kepler orbits +0.2 h.',
      'Cycle +13; conjunction-ra.venus-jupiter.+13.a',
    ]);
  });

  it('puts the caution right after what to do, near the Sun only', () => {
    expect(descriptionOf(pairEvent({}, { elongationDeg: 9 }))[1]).toBe(`Caution. ${cautions.besideTheSun}`);
    expect(descriptionOf(pairEvent()).join()).not.toContain('Caution');
  });

  it('makes a whole day at the first site of what is not known to hours', () => {
    const vague = {
      kind: 'perihelion',
      utc: at('2042-09-03T23:30:00Z'),
      uncertaintySeconds: { tt: 4e5, utc: 4e5 },
    } as const;
    const event = soloEvent(vague, { body: 'neptune' });
    expect(readStrictly(calendar([event], [hill]))[0]).toMatchObject({
      wholeDay: true,
      startMillis: at('2042-09-04T00:00:00Z'),
    });
    expect(descriptionOf(event)).toContain('UTC: Wednesday 3 September 2042, about 5 days either way');
  });

  it('names the place where there is something to see, and no place where there is not', () => {
    const seen = strictEntries(calendar([seenFrom(soloEvent(), hill)], [hill]))[0]!;
    expect(seen.getFirstPropertyValue('location')).toBe('Hill Observatory');
    expect(seen.getFirstPropertyValue('geo')).toEqual([48.2, 16.3]);
    for (const event of [seenFrom(soloEvent(), hill, { bestLook: null }), heliocentricEvent()]) {
      const hidden = strictEntries(calendar([event], [hill]))[0]!;
      expect(hidden.getFirstProperty('location')).toBeNull();
      expect(hidden.getFirstProperty('geo')).toBeNull();
    }
  });

  it('says how sure it is that there is an event at all', () => {
    const interval = {
      from: ttDays(9900),
      to: ttDays(9902),
      meaning: 'the source cannot tell whether they pass',
    };
    const event = pairEvent({ certain: false, interval });
    expect(strictEntries(calendar([event]))[0]!.getFirstPropertyValue('status')).toBe('TENTATIVE');
    expect(descriptionOf(event)).toEqual(
      expect.arrayContaining([
        'From Monday 8 February 2027 to Wednesday 10 February 2027: the source cannot tell whether they pass.',
        'Another ephemeris of the same quality could lack this event.',
      ]),
    );
  });

  it('ties the moments of one meeting together, and nothing else', () => {
    const moments = [
      pairEvent(),
      pairEvent({ kind: 'appulse' }),
      pairEvent({ kind: 'conjunction-longitude' }),
    ];
    const entries = strictEntries(calendar([...moments, soloEvent()]));
    const related = entries.map((entry) =>
      entry.getAllProperties('related-to').map((p) => p.getFirstValue()),
    );
    expect(related[0]).toEqual([moments[1]!.id, moments[2]!.id].map(uidOf));
    expect(related[3]).toEqual([]);
  });

  it('keeps an entry’s uid when a better ephemeris moves its instant', () => {
    const [before, after] = [at('2027-02-19T15:45:12Z'), at('2027-02-19T15:51:40Z')].map((utc) =>
      readStrictly(calendar([soloEvent({ utc })])),
    );
    expect(after![0]!.uid).toBe(before![0]!.uid);
    expect(after![0]!.startMillis).not.toBe(before![0]!.startMillis);
  });
});
