import { describe, expect, it } from 'vitest';
import { closeUpMeetings, headlineEvents, headlineMeetings } from '../../../../src/output/report/choose.js';
import { aForecast, aSite, pairEvent, seenFrom, soloEvent } from '../../../fixtures/events.js';
import { aMeeting } from '../../../fixtures/report.js';

const [home, partner] = [aSite(), aSite({ id: 'south' })];
const hidden = { bestLook: null, verdict: 'Not visible from here: why.' };
const pair = pairEvent();

describe('what is worth telling', () => {
  it('is a sight, in order of time', () => {
    const events = [
      soloEvent({ id: 'a' }),
      soloEvent({ id: 'b', kind: 'perihelion' }),
      soloEvent({ id: 'c', kind: 'conjunction' }, { elongationDeg: 1 }),
      soloEvent({ id: 'd', kind: 'greatest-elongation-east' }, { body: 'mercury', elongationDeg: 14 }),
      pair,
    ];
    expect(headlineEvents(aForecast(events, [aMeeting()])).map(({ id }) => id)).toEqual(['a', pair.id]);
  });

  it('tells a meeting once, by its least separation', () => {
    const near = { ...pair, id: 'near', kind: 'appulse' as const };
    const forecast = aForecast([pair, near], [aMeeting({ appulse: 'near' })]);
    expect(headlineEvents(forecast).map(({ id }) => id)).toEqual(['near']);
  });

  it('leaves out meetings that are wide, near the Sun, or not seen from home', () => {
    const meetingsOf = (event: typeof pair, over: Parameters<typeof aMeeting>[0] = {}) =>
      headlineMeetings(aForecast([event], [aMeeting(over)])).length;
    expect(meetingsOf(pair)).toBe(1);
    expect(meetingsOf(pair, { leastSeparationDeg: 3 })).toBe(0);
    expect(meetingsOf(pair, { observable: false })).toBe(0);
    expect(meetingsOf(seenFrom(pair, home, hidden))).toBe(0);
    expect(meetingsOf(seenFrom(seenFrom(pair, home, hidden), partner))).toBe(0);
  });
});

describe('what is worth a picture', () => {
  it('is nearer than 2°', () => {
    expect(closeUpMeetings(aForecast([pair], [aMeeting({ leastSeparationDeg: 1.99 })]))).toHaveLength(1);
    expect(closeUpMeetings(aForecast([pair], [aMeeting({ leastSeparationDeg: 2 })]))).toEqual([]);
  });

  it('is seen by the first site that can', () => {
    const seen = seenFrom(seenFrom(pair, home, hidden), partner);
    expect(closeUpMeetings(aForecast([seen], [aMeeting()])).map(({ seenFrom: view }) => view?.site)).toEqual([
      'south',
    ]);
    expect(closeUpMeetings(aForecast([seenFrom(pair, home, hidden)], [aMeeting()]))).toEqual([]);
  });
});
