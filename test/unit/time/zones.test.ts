import { Settings } from 'luxon';
import { afterEach, describe, expect, it } from 'vitest';
import {
  isZone,
  localDate,
  localDateTime,
  localIso,
  utcMillis,
  utcOfLocal,
  zoneAbbreviation,
} from '../../../src/time/index.js';

const utc = (text: string) => utcMillis(Date.parse(text));
const instant = (date: string, hour: number, minute: number, zone: string) =>
  new Date(utcOfLocal(localDate(date), hour, minute, zone)).toISOString().slice(0, 16);

describe('localIso', () => {
  it.each([
    ['2027-02-19T15:45:12Z', 'Europe/Vienna', '2027-02-19T16:45:12+01:00'],
    ['2027-07-19T15:45:12.500Z', 'Europe/Vienna', '2027-07-19T17:45:13+02:00'],
    ['2027-01-01T00:00:00Z', 'America/New_York', '2026-12-31T19:00:00-05:00'],
    ['2027-01-01T00:00:00Z', 'Asia/Kathmandu', '2027-01-01T05:45:00+05:45'],
    ['2027-01-01T00:00:00Z', 'UTC', '2027-01-01T00:00:00+00:00'],
    // Local mean time, offsets from the IANA database: Berlin until 1893-04, Monrovia until 1972-01-07.
    ['1850-01-01T00:00:00Z', 'Europe/Berlin', '1850-01-01T00:53:28+00:53:28'],
    ['1900-01-01T00:00:00Z', 'Africa/Monrovia', '1899-12-31T23:16:52-00:43:08'],
  ])('tells %s at %s as %s', (text, zone, local) => {
    expect(localIso(utc(text), zone)).toBe(local);
  });

  it('teaches what a zone is called', () => {
    expect(() => localIso(utc('2027-01-01T00:00:00Z'), 'Vienna')).toThrow(
      /"Vienna" is unknown.*"Europe\/Vienna"/,
    );
  });
});

describe('utcOfLocal', () => {
  it.each([
    // A plain evening on either side of the changes.
    ['2027-01-15', 20, 30, 'Europe/Vienna', '2027-01-15T19:30'],
    ['2027-07-15', 20, 30, 'Europe/Vienna', '2027-07-15T18:30'],
    // 28 March 2027: 02:00 to 03:00 does not exist. 31 October 2027: 02:00 to 03:00 comes twice.
    ['2027-03-28', 1, 59, 'Europe/Vienna', '2027-03-28T00:59'],
    ['2027-03-28', 2, 30, 'Europe/Vienna', '2027-03-28T01:30'],
    ['2027-03-28', 3, 0, 'Europe/Vienna', '2027-03-28T01:00'],
    ['2027-10-31', 1, 59, 'Europe/Vienna', '2027-10-30T23:59'],
    ['2027-10-31', 2, 30, 'Europe/Vienna', '2027-10-31T00:30'],
    ['2027-10-31', 3, 0, 'Europe/Vienna', '2027-10-31T02:00'],
    ['2027-03-14', 2, 30, 'America/New_York', '2027-03-14T07:30'],
    ['2027-11-07', 1, 30, 'America/New_York', '2027-11-07T05:30'],
    // The southern hemisphere, a change by half an hour.
    ['2027-04-04', 1, 45, 'Australia/Lord_Howe', '2027-04-03T14:45'],
    ['2027-10-03', 2, 15, 'Australia/Lord_Howe', '2027-10-02T15:45'],
    // Samoa crossed the date line and had no 30 December 2011.
    ['2011-12-29', 23, 0, 'Pacific/Apia', '2011-12-30T09:00'],
    ['2011-12-31', 1, 0, 'Pacific/Apia', '2011-12-30T11:00'],
    // Local midnight at the far ends of the day.
    ['2027-01-01', 0, 0, 'Pacific/Kiritimati', '2026-12-31T10:00'],
    ['2027-01-01', 0, 0, 'Pacific/Pago_Pago', '2027-01-01T11:00'],
  ])('%s %d:%d at %s is %s UTC', (date, hour, minute, zone, expected) => {
    expect(instant(date, hour, minute, zone)).toBe(expected);
  });

  it('counts hours past midnight into the next day', () => {
    expect(instant('2027-01-15', 24, 0, 'Europe/Vienna')).toBe(instant('2027-01-16', 0, 0, 'Europe/Vienna'));
  });
});

describe('isZone', () => {
  it.each(['Europe/Vienna', 'UTC', 'America/Argentina/Buenos_Aires', 'Etc/GMT+3'])('knows %s', (name) => {
    expect(isZone(name)).toBe(true);
  });

  it.each(['', 'Vienna', 'local', 'system', '+01:00', 'UTC+1', 'Europe/Atlantis', 'Europe/Vienna '])(
    'does not know %j',
    (name) => {
      expect(isZone(name)).toBe(false);
    },
  );
});

describe('whatever the host is', () => {
  const { defaultLocale } = Settings;
  afterEach(() => {
    Settings.defaultLocale = defaultLocale;
    Settings.defaultZone = 'system';
  });

  it('speaks English, counts in Latin digits and uses no zone of the host', () => {
    Settings.defaultLocale = 'ar-EG';
    Settings.defaultZone = 'Asia/Tokyo';
    const noon = utc('2027-01-01T12:00:00Z');
    expect(localDateTime(noon, 'Europe/Vienna').toFormat('cccc d LLLL yyyy, HH:mm')).toBe(
      'Friday 1 January 2027, 13:00',
    );
    expect(localIso(noon, 'Europe/Vienna')).toBe('2027-01-01T13:00:00+01:00');
    expect(zoneAbbreviation(noon, 'Europe/Vienna')).toBe('CET');
    expect(zoneAbbreviation(utc('2027-07-01T12:00:00Z'), 'Europe/Vienna')).toBe('CEST');
    expect(zoneAbbreviation(noon, 'America/New_York')).toBe('GMT-5');
    expect(zoneAbbreviation(noon, 'Asia/Kathmandu')).toBe('GMT+5:45');
  });
});
