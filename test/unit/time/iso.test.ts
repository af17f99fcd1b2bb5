import { describe, expect, it } from 'vitest';
import {
  isoUtc,
  julianDateTt,
  parseInstantUtc,
  parseLocalDate,
  ttDays,
  utcMillis,
} from '../../../src/time/index.js';

describe('isoUtc', () => {
  it.each([
    [Date.UTC(2027, 1, 19, 15, 45, 12, 0), '2027-02-19T15:45:12Z'],
    [Date.UTC(2027, 1, 19, 15, 45, 12, 499), '2027-02-19T15:45:12Z'],
    [Date.UTC(2027, 1, 19, 15, 45, 12, 500), '2027-02-19T15:45:13Z'],
    [Date.UTC(2027, 11, 31, 23, 59, 59, 500), '2028-01-01T00:00:00Z'],
    [Date.UTC(1969, 11, 31, 23, 59, 59, 500), '1970-01-01T00:00:00Z'],
    [Date.UTC(1969, 11, 31, 23, 59, 59, 499), '1969-12-31T23:59:59Z'],
    [Date.UTC(1600, 1, 29), '1600-02-29T00:00:00Z'],
    [Date.UTC(1000, 0, 1), '1000-01-01T00:00:00Z'],
  ])('writes %d as %s', (millis, text) => {
    expect(isoUtc(utcMillis(millis))).toBe(text);
  });

  it.each([Date.UTC(999, 11, 31), Date.UTC(9999, 11, 31, 23, 59, 59, 500), NaN])(
    'refuses %d, which four digits cannot write',
    (millis) => {
      expect(() => isoUtc(utcMillis(millis))).toThrow(/years 1000 to 9999/);
    },
  );
});

describe('parseInstantUtc', () => {
  it.each([
    ['2027-01-01', '2027-01-01T00:00:00.000Z'],
    ['2028-02-29', '2028-02-29T00:00:00.000Z'],
    ['2027-01-01T12:30Z', '2027-01-01T12:30:00.000Z'],
    ['2027-01-01T12:30:15Z', '2027-01-01T12:30:15.000Z'],
    ['2027-01-01T12:30:15.25Z', '2027-01-01T12:30:15.250Z'],
    ['2027-01-01T00:30+01:00', '2026-12-31T23:30:00.000Z'],
    ['2027-01-01T20:00:00-05:30', '2027-01-02T01:30:00.000Z'],
    ['0050-06-01', '0050-06-01T00:00:00.000Z'],
  ])('reads %s as %s', (text, iso) => {
    expect(new Date(parseInstantUtc(text)!).toISOString()).toBe(iso);
  });

  it.each([
    '',
    '2027',
    '2027-1-1',
    '2027-01',
    '2027-06-31',
    '2027-02-29',
    '1900-02-29',
    '2027-13-01',
    '2027-00-10',
    '2027-01-00',
    '27-01-01',
    '+002027-01-01',
    '01/02/2027',
    'Jan 1 2027',
    ' 2027-01-01',
    '2027-01-01\n',
    '2027-01-01T12:30',
    '2027-01-01 12:30Z',
    '2027-01-01T12Z',
    '2027-01-01T24:00Z',
    '2027-01-01T12:60Z',
    '2016-12-31T23:59:60Z',
    '2027-01-01T12:30z',
    '2027-01-01T12:30+0100',
    '2027-01-01T12:30+24:00',
    '2027-01-01T12:30+01:60',
    '2027-06-31T12:30Z',
    '２０２７-01-01',
  ])('refuses %j', (text) => {
    expect(parseInstantUtc(text)).toBeNull();
  });
});

describe('parseLocalDate', () => {
  it('takes a real day as it is written', () => {
    expect(parseLocalDate('2027-02-28')).toBe('2027-02-28');
  });

  it.each(['2027-02-29', '2027-2-28', '2027-02-28T00:00Z', 'today', ''])('refuses %j', (text) => {
    expect(parseLocalDate(text)).toBeNull();
  });
});

describe('julianDateTt', () => {
  it('is 2451545 at J2000.0', () => {
    expect(julianDateTt(ttDays(0))).toBe(2_451_545);
    expect(julianDateTt(ttDays(-0.5))).toBe(2_451_544.5);
  });
});
