import { JD_J2000, localDate, utcMillis } from './instants.js';
import type { LocalDate, TtDays, UtcMillis } from './instants.js';

const datePattern = /^(\d{4})-(\d{2})-(\d{2})$/;
const instantPattern =
  /^(\d{4}-\d{2}-\d{2})T(\d{2}):(\d{2})(?::(\d{2})(\.\d{1,3})?)?(?:Z|([+-])(\d{2}):(\d{2}))$/;

const FIRST_YEAR_MILLIS = -30_610_224_000_000;
const END_OF_YEARS_MILLIS = 253_402_300_800_000;

/** An instant as `2027-02-19T15:45:12Z`, to the nearest second, halves upwards. Years 1000 to 9999, else a RangeError. */
export function isoUtc(utc: UtcMillis): string {
  const rounded = Math.floor(utc / 1000 + 0.5) * 1000;
  if (!(rounded >= FIRST_YEAR_MILLIS && rounded < END_OF_YEARS_MILLIS)) {
    throw new RangeError(`Instant ${utc} ms: only the years 1000 to 9999 can be written with four digits.`);
  }
  return `${new Date(rounded).toISOString().slice(0, 19)}Z`;
}

/** The Julian Date of an instant on the scale of TT. */
export const julianDateTt = (tt: TtDays): number => tt + JD_J2000;

/** Midnight UTC of a written date of the proleptic Gregorian calendar; null if there is no such day. */
function midnightOf(text: string): number | null {
  const match = datePattern.exec(text);
  if (match === null) return null;
  const [year, month, day] = match.slice(1).map(Number) as [number, number, number];
  const date = new Date(0);
  date.setUTCFullYear(year, month - 1, day);
  return date.getUTCMonth() === month - 1 && date.getUTCDate() === day ? date.getTime() : null;
}

/**
 * Reads an ISO 8601 date (`2027-01-01`, meaning 0 h UTC) or instant (`2027-01-01T12:30Z`, `2027-01-01T12:30:15+01:00`),
 * proleptic Gregorian. A time of day needs its offset; anything else, an impossible day and a leap second too, is null.
 */
export function parseInstantUtc(text: string): UtcMillis | null {
  const dateOnly = midnightOf(text);
  if (dateOnly !== null) return utcMillis(dateOnly);
  const match = instantPattern.exec(text);
  if (match === null) return null;
  const midnight = midnightOf(match[1]!);
  const [hour, minute, second] = [match[2], match[3], match[4] ?? '0'].map(Number) as [
    number,
    number,
    number,
  ];
  const [offsetHours, offsetMinutes] = [match[7] ?? '0', match[8] ?? '0'].map(Number) as [number, number];
  if (midnight === null || hour > 23 || minute > 59 || second > 59) return null;
  if (offsetHours > 23 || offsetMinutes > 59) return null;
  const east = match[6] === '-' ? -1 : 1;
  const minutes = hour * 60 + minute - east * (offsetHours * 60 + offsetMinutes);
  const millis = Math.round(Number(`0${match[5] ?? ''}`) * 1000);
  return utcMillis(midnight + minutes * 60_000 + second * 1000 + millis);
}

/** Reads a civil date `YYYY-MM-DD`; null if it is written otherwise or the calendar has no such day. */
export const parseLocalDate = (text: string): LocalDate | null =>
  midnightOf(text) === null ? null : localDate(text);
