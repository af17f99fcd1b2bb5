import { DateTime, FixedOffsetZone, IANAZone } from 'luxon';
import type { Zone } from 'luxon';
import { utcMillis } from './instants.js';
import type { LocalDate, UtcMillis } from './instants.js';

const HOUR_MILLIS = 3_600_000;
const DAY_MILLIS = 24 * HOUR_MILLIS;

/** Whether the name is one of the IANA time zone database, such as `Europe/Vienna` or `UTC`. */
export const isZone = (name: string): boolean => IANAZone.isValidZone(name);

/** Asking the host's data whether a zone exists costs a millisecond, and reports ask thousands of times. */
const known = new Map<string, Zone>([['UTC', FixedOffsetZone.utcInstance]]);

function zoneOf(name: string): Zone {
  const zone = known.get(name);
  if (zone !== undefined) return zone;
  if (!isZone(name))
    throw new RangeError(`Time zone "${name}" is unknown; write an IANA name such as "Europe/Vienna".`);
  const made = IANAZone.create(name);
  known.set(name, made);
  return made;
}

/** Wall-clock time at a zone, in English and Latin digits whatever the host speaks. */
export function localDateTime(utc: UtcMillis, zone: string): DateTime {
  return DateTime.fromMillis(utc, {
    zone: zoneOf(zone),
    locale: 'en',
    numberingSystem: 'latn',
    outputCalendar: 'gregory',
  });
}

const two = (value: number): string => String(value).padStart(2, '0');

/** An offset as `+01:00`, with seconds only where local mean time had them: `+00:53:28`. */
function isoOffset(minutes: number): string {
  const seconds = Math.round(Math.abs(minutes) * 60);
  const parts = [Math.floor(seconds / 3600), Math.floor(seconds / 60) % 60, seconds % 60];
  return (
    (minutes < 0 ? '-' : '+') +
    parts
      .slice(0, parts[2] === 0 ? 2 : 3)
      .map(two)
      .join(':')
  );
}

/** Local time as `2027-02-19T16:45:12+01:00`, to the nearest second, halves upwards. */
export function localIso(utc: UtcMillis, zone: string): string {
  const local = localDateTime(utcMillis(Math.floor(utc / 1000 + 0.5) * 1000), zone);
  return local.toFormat("yyyy-MM-dd'T'HH:mm:ss") + isoOffset(local.offset);
}

/**
 * The instant at which a site's clocks show a time of day on a date. Where clocks go back and show it twice, the first;
 * where they go forward and skip it, the time as the old offset counts it (02:30 in a spring night is 03:30).
 */
export function utcOfLocal(date: LocalDate, hour: number, minute: number, zone: string): UtcMillis {
  const rules = zoneOf(zone);
  const asIfUtc = Date.parse(`${date}T00:00:00Z`) + hour * HOUR_MILLIS + minute * 60_000;
  const offsetMillis = (utc: number): number => Math.round(rules.offset(utc) * 60) * 1000;
  // Offsets stay within 16 h of UTC, so a day to either side lies before and after any change that matters.
  const [before, after] = [asIfUtc - DAY_MILLIS, asIfUtc + DAY_MILLIS].map(offsetMillis) as [number, number];
  const fits = [before, after].find((offset) => offsetMillis(asIfUtc - offset) === offset);
  return utcMillis(asIfUtc - (fits ?? before));
}

/** The zone's short name at an instant, as English readers in Britain know it: `CET`, `BST`, elsewhere `GMT-5`. */
export const zoneAbbreviation = (utc: UtcMillis, zone: string): string =>
  zone === 'UTC' ? 'UTC' : localDateTime(utc, zone).setLocale('en-GB').toFormat('ZZZZ');
