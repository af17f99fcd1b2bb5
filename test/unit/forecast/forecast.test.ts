import { describe, expect, it } from 'vitest';
import type { Planet } from '../../../src/bodies/index.js';
import { forecast } from '../../../src/forecast/index.js';
import type { ForecastRequest } from '../../../src/forecast/index.js';
import { DAYS_PER_JULIAN_YEAR, utcMillis } from '../../../src/time/index.js';
import type { UtcMillis } from '../../../src/time/index.js';

const day = (text: string): UtcMillis => utcMillis(Date.parse(text));
const ask = (from: string, to: string, rest: Omit<ForecastRequest, 'from' | 'to'> = {}) =>
  forecast({ from: day(from), to: day(to), ...rest });

describe('forecast', () => {
  it('gives a span in two parts what it gives it whole: nothing lost on the seam, nothing twice', () => {
    const whole = ask('2027-01-01', '2028-01-01');
    const parts = ['2027-01-01', '2027-02-19T15:51:53Z', '2027-04-19T13:01:10Z', '2027-08-11', '2028-01-01'];
    const pieces = parts.slice(1).flatMap((to, i) => ask(parts[i]!, to).events);
    expect(pieces.map(({ id }) => id)).toEqual(whole.events.map(({ id }) => id));
    // A search that begins elsewhere ends within its own tolerance of the same instant: 0.01 s.
    pieces.forEach(({ tt }, i) => {
      expect(tt).toBeCloseTo(whole.events[i]!.tt, 6);
    });
    expect(whole.events.length).toBeGreaterThan(180);
  });

  it('includes its first instant and leaves out its last', () => {
    const [event] = ask('2027-02-01', '2027-03-01', { kinds: ['opposition'], bodies: ['mars'] }).events;
    const at = new Date(event!.utc).toISOString();
    const after = new Date(event!.utc + 1000).toISOString();
    const kinds = { kinds: ['opposition'], bodies: ['mars'] } as const;
    expect(ask('2027-02-01', at, kinds).events).toHaveLength(0);
    expect(ask('2027-02-01', after, kinds).events).toHaveLength(1);
    expect(ask(after, '2027-03-01', kinds).events).toHaveLength(0);
  });

  it('names and dates an event alike whatever else is asked for', () => {
    const all = new Map(ask('2027-01-01', '2028-01-01').events.map((event) => [event.id, event]));
    for (const bodies of [['mars'], ['mercury', 'saturn']] as Planet[][]) {
      const { events } = ask('2027-01-01', '2028-01-01', { bodies });
      expect(events.length).toBeGreaterThan(10);
      for (const event of events) {
        expect(event.bodies.some((body) => bodies.includes(body))).toBe(true);
        expect(event.tt).toBeCloseTo(all.get(event.id)!.tt, 7);
        expect(event.meeting).toBe(all.get(event.id)!.meeting);
      }
    }
    const { events } = ask('2027-01-01', '2028-01-01', { kinds: ['conjunction-ra'] });
    expect(new Set(events.map(({ kind }) => kind))).toEqual(new Set(['conjunction-ra']));
    for (const event of events) expect(event.meeting).toBe(all.get(event.id)!.meeting);
  });

  it('tells the triple meeting of Jupiter and Saturn of 1980–81 as one series', () => {
    const { events, meetings } = ask('1980-06-01', '1981-12-31', {
      bodies: ['jupiter'],
      kinds: ['conjunction-longitude', 'conjunction-ra', 'appulse'],
    });
    const saturn = events.filter(({ bodies }) => bodies.join() === 'jupiter,saturn');
    const inLongitude = saturn.filter(({ kind }) => kind === 'conjunction-longitude');
    expect(inLongitude.map(({ series }) => series)).toEqual([1, 2, 3].map((index) => ({ index, of: 3 })));
    // Longitude and right ascension part here by days, so the ids must not.
    expect(new Set(inLongitude.map(({ cycle }) => cycle)).size).toBe(1);
    const ofSaturn = meetings.filter(({ bodies }) => bodies.join() === 'jupiter,saturn');
    expect(ofSaturn.flatMap(({ conjunctionsLongitude }) => conjunctionsLongitude)).toEqual(
      inLongitude.map(({ id }) => id),
    );
    for (const meeting of ofSaturn) {
      const moments = [
        ...meeting.conjunctionsLongitude,
        ...meeting.conjunctionsRa,
        ...(meeting.appulse === null ? [] : [meeting.appulse]),
      ];
      for (const id of moments) expect(saturn.find((event) => event.id === id)!.meeting).toBe(meeting.id);
    }
  });

  it('numbers Mars 2027 as the thirteenth cycle and ranks it', () => {
    const [event] = ask('2027-02-01', '2027-03-01', { kinds: ['opposition'], bodies: ['mars'] }).events;
    expect(event!.id).toBe('opposition.mars.+13.a');
    expect(event!.circumstances).toMatchObject({
      about: 'one-body',
      constellation: 'Leo',
      closeness: { of: 75 },
    });
  });

  it('calls a meeting without a conjunction grazing', () => {
    // Jupiter overtakes a retrograde Mars without catching it: 4.3° apart at least.
    const { meetings } = ask('2027-03-01', '2027-04-30', { bodies: ['mars'], kinds: ['appulse'] });
    const [meeting] = meetings.filter(({ bodies }) => bodies.join() === 'mars,jupiter');
    expect(meeting).toMatchObject({ grazing: true, conjunctionsRa: [], conjunctionsLongitude: [] });
  });

  it('does not swear to a grazing pair of conjunctions', () => {
    // Uranus and Neptune in right ascension in 1993: two roots a week apart, 8″ deep, less than the source knows.
    const { events } = ask('1993-09-01', '1993-10-01', { bodies: ['uranus'], kinds: ['conjunction-ra'] });
    const pair = events.filter(({ bodies }) => bodies.join() === 'uranus,neptune');
    expect(pair).toHaveLength(2);
    expect(pair.map(({ certain }) => certain)).toEqual([false, false]);
    for (const { interval, tt } of pair) {
      expect(interval!.from).toBeLessThan(tt);
      expect(interval!.to).toBeGreaterThan(tt);
    }
    expect(new Set(pair.map(({ id }) => id)).size).toBe(2);
  });

  it('keeps one perihelion of Neptune and tells its lesser turns', () => {
    const { events } = ask('2030-01-01', '2060-01-01', { bodies: ['neptune'], kinds: ['perihelion'] });
    expect(events).toHaveLength(1);
    const { circumstances, tt, uncertaintySeconds } = events[0]!;
    const yearOf = (days: number) => 2000 + days / DAYS_PER_JULIAN_YEAR;
    expect(yearOf(tt)).toBeCloseTo(2042.69, 1);
    expect(uncertaintySeconds.tt).toBeGreaterThan(86_400);
    if (circumstances.about !== 'one-body') throw new Error('a perihelion is of one body');
    const localExtremes = circumstances.localExtremes ?? [];
    // The second deepest turn of this revolution is in mid-2050: found on daily scans of 1600–2600.
    expect(localExtremes.map(({ utc }) => new Date(utc).getUTCFullYear())).toContain(2050);
  });

  it('reports the sources of its first estimates honestly', () => {
    const { events } = ask('2027-01-01', '2028-01-01');
    for (const { kind, bodies, estimates, residualDays, tt } of events) {
      const innerMeeting =
        ['conjunction-ra', 'conjunction-longitude', 'appulse'].includes(kind) &&
        bodies.some((body) => body === 'mercury' || body === 'venus');
      if (innerMeeting) expect(estimates.mean).toBeNull();
      if (estimates.mean !== null) expect(residualDays.mean).toBeCloseTo(tt - estimates.mean, 9);
      if (estimates.kepler !== null) expect(Math.abs(residualDays.kepler!)).toBeLessThan(60);
    }
  });

  it('takes Pluto when it is named, and prints no magnitude for it', () => {
    const { events } = ask('2027-01-01', '2028-01-01', { bodies: ['pluto'] });
    const [opposition] = events.filter(({ kind }) => kind === 'opposition');
    expect(opposition!.circumstances).toMatchObject({ body: 'pluto', magnitude: null });
    expect(events.every(({ bodies }) => bodies.includes('pluto'))).toBe(true);
  });

  it('says how far it has come', () => {
    const heard: number[] = [];
    ask('2027-01-01', '2027-03-01', {
      kinds: ['opposition'],
      onProgress: (fraction) => heard.push(fraction),
    });
    expect(heard.at(-1)).toBe(1);
    expect([...heard].sort((a, b) => a - b)).toEqual(heard);
  });
});
