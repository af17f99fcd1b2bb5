import { describe, expect, it } from 'vitest';
import { byMonth, eventRows } from '../../../../src/output/report/event-rows.js';
import { aForecast, at, pairEvent, soloEvent } from '../../../fixtures/events.js';
import { aMeeting } from '../../../fixtures/report.js';

const inRa = pairEvent({ id: 'ra', utc: at('2027-06-08T00:00:00Z') });
const nearest = pairEvent({ id: 'near', kind: 'appulse', utc: at('2027-06-09T00:00:00Z') });
const inLongitude = pairEvent({ id: 'lon', kind: 'conjunction-longitude', utc: at('2027-06-10T00:00:00Z') });
const mars = soloEvent({ id: 'mars', utc: at('2027-06-08T12:00:00Z') });
const events = [inRa, mars, nearest, inLongitude];

describe('the rows of the full table', () => {
  it('keep the moments of a meeting together, at its least separation', () => {
    const rows = eventRows(aForecast(events, [aMeeting({ appulse: 'near' })]));
    expect(rows.map(({ event, moments }) => [event.id, moments.map(({ id }) => id)])).toEqual([
      ['mars', []],
      ['near', ['ra', 'lon']],
    ]);
  });

  it('date a meeting by its first moment where the least separation was not asked for', () => {
    const rows = eventRows(aForecast([inRa, mars, inLongitude], [aMeeting({ appulse: 'near' })]));
    expect(rows.map(({ event }) => event.id)).toEqual(['ra', 'mars']);
  });

  it('hold every event once', () => {
    const found = eventRows(aForecast(events, [aMeeting({ appulse: 'near' })])).flatMap(
      ({ event, moments }) => [event.id, ...moments.map(({ id }) => id)],
    );
    expect(found.sort()).toEqual(events.map(({ id }) => id).sort());
  });

  it('stand alone where the meeting is unknown', () => {
    expect(eventRows(aForecast(events))).toHaveLength(4);
  });

  it('fall into the months of the zone', () => {
    const late = { event: soloEvent({ utc: at('2027-03-31T22:30:00Z') }), moments: [] };
    expect(byMonth([late], 'UTC').map(({ title }) => title)).toEqual(['March 2027']);
    expect(byMonth([late], 'Europe/Vienna').map(({ id, title }) => [id, title])).toEqual([
      ['2027-04', 'April 2027'],
    ]);
  });
});
