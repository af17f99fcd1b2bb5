import { describe, expect, it } from 'vitest';
import { eventsJson } from '../../../src/output/index.js';
import {
  aForecast,
  aSite,
  heliocentricEvent,
  pairEvent,
  seenFrom,
  soloEvent,
} from '../../fixtures/events.js';

interface Document {
  readonly events: readonly Record<string, unknown>[];
}
const read = (text: string) => JSON.parse(text) as Document;

describe('events as JSON', () => {
  it('keeps the contract of an event', () => {
    const [event] = read(eventsJson(aForecast([soloEvent()]), [])).events;
    expect(event).toMatchObject({
      id: 'opposition.mars.+13.a',
      kind: 'opposition',
      bodies: ['mars'],
      cycle: 13,
      series: null,
      utc: '2027-02-19T15:45:12Z',
      uncertaintySeconds: { tt: 120, utc: 120 },
      estimates: { mean: '2027-02-20T03:45:12Z', kepler: '2027-02-19T15:30:48Z' },
      residualDays: { mean: -0.5, kepler: 0.01 },
      circumstances: { about: 'one-body', body: 'mars', distanceAu: 0.678012, diameterArcsec: 13.81 },
      local: [],
    });
    // 2027-02-19T15:45:12Z is JD 2461456.156389; TT is 69.184 s ahead.
    expect(event!['tt']).toBeCloseTo(9911.15719, 5);
  });

  it('writes null for what a kind has not, never a missing field', () => {
    const none = { estimates: { mean: null, kepler: null }, residualDays: { mean: null, kepler: null } };
    const [event] = read(eventsJson(aForecast([pairEvent(none)]), [])).events;
    expect(event).toMatchObject(none);
    expect(event).toHaveProperty('interval', null);
    const [unlit] = read(eventsJson(aForecast([soloEvent({}, { magnitude: null })]), [])).events;
    expect(unlit).toMatchObject({ circumstances: { magnitude: null } });
  });

  it('never writes −0, and shows no digits that the source does not know', () => {
    const text = eventsJson(aForecast([seenFrom(pairEvent(), aSite()), heliocentricEvent()]), [aSite()]);
    expect(text).not.toMatch(/: -0(\.0*)?[,\n]/);
    // Days of TT have 6 decimals, 0.09 s; nothing has more.
    expect(text).not.toMatch(/\.\d{7,}/);
  });

  it('gives the same bytes for the same forecast, with a last line end', () => {
    const forecast = aForecast([soloEvent(), pairEvent()]);
    expect(eventsJson(forecast, [])).toBe(eventsJson(forecast, []));
    expect(eventsJson(forecast, []).endsWith('}\n')).toBe(true);
  });
});
