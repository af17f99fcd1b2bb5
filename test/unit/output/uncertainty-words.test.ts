import { describe, expect, it } from 'vitest';
import { dateAndClock, tellInstant, uncertaintyShort, uncertaintyWords } from '../../../src/output/index.js';
import { at } from '../../fixtures/events.js';

const MINUTE = 60;
const HOUR = 3600;
const DAY = 86_400;

describe('how sure an instant is', () => {
  it.each([
    [0.02, '± 1 s', '± 1 s'],
    [8.3, '± 9 s', '± 9 s'],
    [49, '± 49 s', '± 49 s'],
    [50, '± 1 min', '± 1 min'],
    [120, '± 2 min', '± 2 min'],
    [149, '± 3 min', '± 3 min'],
    [89 * MINUTE, '± 89 min', '± 89 min'],
    [90 * MINUTE, 'about 2 h either way', '± 2 h'],
    [4 * HOUR, 'about 4 h either way', '± 4 h'],
    [35.9 * HOUR, 'about 36 h either way', '± 36 h'],
    [2.2 * DAY, 'about 2 days either way', '± 2 d'],
    [12 * DAY, 'about 12 days either way', '± 12 d'],
  ])('%f s is %s', (seconds, words, short) => {
    expect(uncertaintyWords(seconds)).toBe(words);
    expect(uncertaintyShort(seconds)).toBe(short);
  });
});

describe('an instant told', () => {
  const instant = at('2027-02-19T15:45:32Z');

  it.each([
    [5, '15:45:32'],
    [120, '15:46'],
    [9 * MINUTE, '15:46'],
    [15 * MINUTE, '15:50'],
    [4 * HOUR, 'about 16 h'],
    [11 * HOUR, ''],
    [3 * DAY, ''],
  ])('with a half-width of %f s shows no digit that is not known: %s', (seconds, time) => {
    expect(tellInstant(instant, seconds, 'UTC').time).toBe(time);
  });

  it('is told on the clocks of its zone, summer time and date line and all', () => {
    const told = tellInstant(at('2027-07-01T22:30:00Z'), 60, 'Europe/Vienna');
    expect(told).toEqual({
      isoDate: '2027-07-02',
      weekday: 'Fri',
      longDate: 'Friday 2 July 2027',
      time: '00:30',
    });
    expect(tellInstant(at('2027-07-01T22:30:00Z'), 60, 'America/Santiago').isoDate).toBe('2027-07-01');
  });

  it('rounds as the clock of the place counts, where zones are not whole hours from UTC', () => {
    // 10:20 UTC is 16:05 in Kathmandu (UTC+5:45).
    expect(tellInstant(at('2027-02-19T10:20:00Z'), 4 * HOUR, 'Asia/Kathmandu').time).toBe('about 16 h');
    expect(tellInstant(at('2027-02-19T10:17:00Z'), 15 * MINUTE, 'Asia/Kathmandu').time).toBe('16:00');
  });

  it('carries into the next day together with the date', () => {
    const told = tellInstant(at('2027-12-31T23:58:00Z'), 15 * MINUTE, 'UTC');
    expect([told.isoDate, told.weekday, told.time]).toEqual(['2028-01-01', 'Sat', '00:00']);
  });

  it('names the clock only where it tells the time', () => {
    const event = { utc: instant, uncertaintySeconds: { tt: 120, utc: 120 } };
    expect(dateAndClock(event, 'Europe/London')).toBe('2027-02-19 Fri 15:46 GMT');
    expect(dateAndClock(event, 'UTC')).toBe('2027-02-19 Fri 15:46 UTC');
    const vague = { utc: instant, uncertaintySeconds: { tt: 3 * DAY, utc: 3 * DAY } };
    expect(dateAndClock(vague, 'Europe/London')).toBe('2027-02-19 Fri');
  });
});
