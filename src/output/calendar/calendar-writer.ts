import { DateTime } from 'luxon';
import { ICalCalendar, ICalEvent, ICalEventStatus, ICalEventTransparency } from 'ical-generator';
import type { LocalDate, UtcMillis } from '../../time/index.js';

/** What a calendar says of itself. */
export interface CalendarWords {
  readonly name: string;
  readonly description: string;
}

/** One entry. Its uid never changes; its sequence rises when what it says does. */
export interface CalendarEntry {
  readonly uid: string;
  readonly sequence: number;
  readonly when: CalendarSpan;
  readonly summary: string;
  readonly description: string;
  readonly categories: readonly string[];
  readonly status: 'confirmed' | 'tentative' | 'cancelled';
  readonly place: CalendarPlace | null;
  /** Entries that belong together with this one. */
  readonly relatedUids: readonly string[];
}

/** From an instant to a later one, or one whole day that no clock divides. */
export type CalendarSpan = { readonly from: UtcMillis; readonly to: UtcMillis } | { readonly day: LocalDate };

export interface CalendarPlace {
  readonly name: string;
  readonly latitudeDeg: number;
  readonly longitudeDeg: number;
}

/** An entry that no calendar could hold: a fault of the program, not of its user. */
export class CalendarEntryError extends Error {
  override readonly name = 'CalendarEntryError';
}

const statuses = {
  confirmed: ICalEventStatus.CONFIRMED,
  tentative: ICalEventStatus.TENTATIVE,
  cancelled: ICalEventStatus.CANCELLED,
} as const;

/**
 * Writes an iCalendar object (RFC 5545, with NAME of RFC 7986), lines folded and ended by CRLF. It is published, not
 * sent: no METHOD. Entries never make a diary look busy.
 *
 * The only module that knows the calendar library, and what to keep from it: it takes the host's zone from plain
 * dates, cuts seconds, swaps ends, makes up missing starts and ids, strips the Z from stamps where the calendar has a
 * zone, drops a GEO at zero, leaves NAME and UID unescaped, has no RELATED-TO, breaks alarms and the commas of a URL
 * (so there are none), and forgets the last line's end.
 * @param stamp DTSTAMP of every entry: data of the plan, not the clock
 * @throws CalendarEntryError for an entry that the library would silently write as another
 */
export function writeCalendar(
  words: CalendarWords,
  entries: readonly CalendarEntry[],
  stamp: UtcMillis,
): string {
  const calendar = new ICalCalendar({
    prodId: { company: 'synodos', product: 'synodos', language: 'EN' },
    name: escapedText(words.name),
    description: escapedText(words.description),
  });
  checkUnique(entries);
  for (const entry of entries) {
    checkEntry(entry);
    calendar.createEvent(new EntryWithRawLines(entry, stamp, calendar));
  }
  return `${calendar.toString()}\r\n`;
}

/** Adds the properties that the library has no place for; it folds them with the rest. */
class EntryWithRawLines extends ICalEvent {
  private readonly rawLines: readonly string[];

  constructor(entry: CalendarEntry, stamp: UtcMillis, calendar: ICalCalendar) {
    super(
      {
        ...libraryTimes(entry.when),
        id: entry.uid,
        sequence: entry.sequence,
        stamp: utc(stamp),
        summary: oneLine(entry.summary),
        description: cleaned(entry.description),
        categories: entry.categories.filter((name) => name !== '').map((name) => ({ name: oneLine(name) })),
        status: statuses[entry.status],
        transparency: ICalEventTransparency.TRANSPARENT,
        ...(entry.place === null ? {} : { location: oneLine(entry.place.name) }),
      },
      calendar,
    );
    this.rawLines = [
      ...(entry.place === null ? [] : [geoLine(entry.place)]),
      ...entry.relatedUids.map((uid) => `RELATED-TO;RELTYPE=SIBLING:${uid}`),
    ];
  }

  override toString(): string {
    const added = this.rawLines.map((line) => `${line}\r\n`).join('');
    return super.toString().replace(/END:VEVENT\r\n$/, `${added}END:VEVENT\r\n`);
  }
}

/** The last day of an entry is not included, so a whole day ends on the next. */
function libraryTimes(when: CalendarSpan) {
  if (!('day' in when)) return { start: utc(when.from), end: utc(when.to), allDay: false };
  const start = DateTime.fromISO(when.day, { zone: 'utc', locale: 'en' });
  return { start, end: start.plus({ days: 1 }), allDay: true };
}

const wholeSecond = (at: UtcMillis): number => Math.round(at / 1000) * 1000;

/** To the whole second, in UTC and in no one's locale. */
const utc = (at: UtcMillis): DateTime => DateTime.fromMillis(wholeSecond(at), { zone: 'utc', locale: 'en' });

/** RFC 5545 §3.8.1.6: six decimals, never an exponent. */
const geoLine = ({ latitudeDeg, longitudeDeg }: CalendarPlace): string =>
  `GEO:${latitudeDeg.toFixed(6)};${longitudeDeg.toFixed(6)}`;

/** Characters that need no escaping in any property, so that a uid reads the same everywhere. */
const UID = /^[A-Za-z0-9.+_-]+@[a-z0-9.-]+$/;

function checkEntry({ uid, when, sequence, relatedUids }: CalendarEntry): void {
  const fault = ![uid, ...relatedUids].every((id) => UID.test(id))
    ? 'its uid and those it relates to must be letters, digits and . + _ - before one @'
    : !lasts(when)
      ? 'it must be a day, or start at an instant and end at least a second after it'
      : !Number.isInteger(sequence) || sequence < 0
        ? 'its sequence must be a whole number from 0'
        : null;
  if (fault !== null) throw new CalendarEntryError(`calendar entry ${JSON.stringify(uid)}: ${fault}`);
}

const lasts = (when: CalendarSpan): boolean =>
  'day' in when
    ? DateTime.fromISO(when.day, { zone: 'utc' }).isValid
    : wholeSecond(when.to) > wholeSecond(when.from) && Number.isFinite(when.to);

function checkUnique(entries: readonly CalendarEntry[]): void {
  const seen = new Set<string>();
  for (const { uid } of entries) {
    if (seen.has(uid))
      throw new CalendarEntryError(`calendar entry ${JSON.stringify(uid)}: its uid occurs twice`);
    seen.add(uid);
  }
}

/** Control characters and halves of characters have no place in a calendar; a line break stays one. */
const cleaned = (text: string): string =>
  text
    .replace(/\r\n?|[\u0085\u2028\u2029]/g, '\n')
    .replace(/[\u0000-\u0009\u000b-\u001f\u007f]/g, ' ')
    .replace(/\p{Surrogate}/gu, '\ufffd');

const oneLine = (text: string): string => cleaned(text).replace(/\s*\n\s*/g, ' ');

/** RFC 5545 §3.3.11, for the properties that the library writes as they come. */
const escapedText = (text: string): string => oneLine(text).replace(/[\\;,]/g, '\\$&');
