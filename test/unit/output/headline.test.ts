import { describe, expect, it } from 'vitest';
import { kindNames } from '../../../src/forecast/index.js';
import type { ForecastEvent } from '../../../src/forecast/index.js';
import { headlineOf, isObservable } from '../../../src/output/index.js';
import { ttDays } from '../../../src/time/index.js';
import {
  aLook,
  aSite,
  at,
  heliocentricEvent,
  pairEvent,
  seenFrom,
  soloEvent,
} from '../../fixtures/events.js';

const site = aSite();
const hidden = { bestLook: null, verdict: 'Not visible from here: the Sun does not set.' };

describe('the headline of an event', () => {
  it('tells an opposition as a span of weeks', () => {
    expect(headlineOf(soloEvent())).toBe(
      'Mars is at its best from about 22 January to 19 March 2027: it stands opposite the Sun on Friday 19 February 2027, 13.8″ across.',
    );
    expect(headlineOf(soloEvent({ utc: at('2027-01-10T12:00:00Z') }))).toContain(
      'from about 13 December 2026 to 7 February 2027',
    );
  });

  it('says how close an opposition of Mars comes', () => {
    const event = soloEvent();
    const closeness = { rank: 3, of: 15, yearFrom: 2012, yearTo: 2042, phrase: 'the closest since 2018' };
    const close = { ...event, circumstances: { ...event.circumstances, closeness } } as ForecastEvent;
    expect(headlineOf(close)).toContain('13.8″ across, the closest since 2018.');
  });

  it('names the best evening here, and the separation then', () => {
    expect(headlineOf(seenFrom(pairEvent(), site))).toBe(
      'Venus and Jupiter stand 57′ apart on the evening of Wednesday 9 June 2027; look low in the west-north-west at 22:10.',
    );
    const small = aLook({ utc: at('2027-06-10T01:05:00Z'), altitudeDeg: 50, inBrightTwilight: true });
    expect(headlineOf(seenFrom(pairEvent(), site, { bestLook: small }))).toContain(
      'in the small hours of Thursday 10 June 2027; look high in the west-north-west at 03:05, in bright twilight.',
    );
  });

  it('says what eyes alone will not see', () => {
    const event = pairEvent({ bodies: ['venus', 'uranus'] });
    if (event.circumstances.about !== 'two-bodies') throw new Error('a pair was asked for');
    const [venus, uranus] = event.circumstances.bodies;
    const faint: ForecastEvent = {
      ...event,
      circumstances: { ...event.circumstances, bodies: [venus, { ...uranus, magnitude: 5.7 }] },
    };
    expect(headlineOf(seenFrom(faint, site))).toMatch(/\. Uranus needs binoculars\.$/);
    expect(headlineOf(soloEvent({}, { body: 'pluto', magnitude: 14.4 }))).toMatch(
      /Pluto needs a large telescope\.$/,
    );
  });

  it('does not advertise what is within 15° of the Sun', () => {
    const near = pairEvent({}, { elongationDeg: 9.6 });
    expect(isObservable(near)).toBe(false);
    expect(headlineOf(near)).toBe(
      'On Wednesday 9 June 2027 Venus and Jupiter stand 24′ apart. Not observable, 10° from the Sun.',
    );
    expect(isObservable(pairEvent({}, { elongationDeg: 15 }))).toBe(true);
  });

  it('gives the site’s own reason where nothing is to be seen from it', () => {
    expect(headlineOf(seenFrom(soloEvent(), site, hidden))).toBe(
      'On Friday 19 February 2027 Mars stands opposite the Sun, 13.8″ across. Not visible from here: the Sun does not set.',
    );
  });

  it('is as vague as the date', () => {
    const vague = { uncertaintySeconds: { tt: 300_000, utc: 300_000 } };
    expect(headlineOf(soloEvent({ kind: 'perihelion', ...vague }))).toMatch(
      /^Around Friday 19 February 2027 Mars is at the point/,
    );
  });

  it('tells greatest brilliancy as its days, not as an instant', () => {
    const event = soloEvent(
      { kind: 'greatest-brilliancy' },
      { body: 'venus', elongationSide: 'east', magnitude: -4.8 },
    );
    const interval = {
      from: ttDays(event.tt - 3),
      to: ttDays(event.tt + 3),
      meaning: 'within 0.01 magnitude',
    };
    expect(headlineOf({ ...event, interval })).toBe(
      'Venus is at its brightest in the evening sky, magnitude −4.8, from 16 February to 22 February 2027.',
    );
  });

  it('takes its dates from the zone asked for where the event has no view of its own', () => {
    const late = heliocentricEvent({ utc: at('2027-02-19T23:30:00Z') });
    expect(headlineOf(late)).toBe('On Friday 19 February 2027 Earth and Mars stand on one side of the Sun.');
    expect(headlineOf(late, 'Europe/Vienna')).toContain('On Saturday 20 February 2027');
  });

  it.each(kindNames)('is a printable sentence for every kind: %s', (kind) => {
    const event = kind.startsWith('heliocentric')
      ? heliocentricEvent({ kind })
      : ['conjunction-ra', 'conjunction-longitude', 'appulse'].includes(kind)
        ? pairEvent({ kind })
        : soloEvent({ kind });
    const variants = [
      event,
      ...(event.circumstances.about === 'heliocentric' ? [] : [seenFrom(event, site)]),
    ];
    for (const headline of variants.map((variant) => headlineOf(variant))) {
      expect(headline).toMatch(/^[A-Z].* 2027.*\.$/);
      expect(headline).not.toMatch(/!|undefined|NaN|null|spectac|celestial|-0|\s\s/i);
    }
  });
});
