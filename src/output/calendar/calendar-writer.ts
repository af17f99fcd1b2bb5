import { DateTime } from 'luxon';
import { ICalCalendar, ICalEvent, ICalEventStatus, ICalEventTransparency } from 'ical-generator';
import type { UtcMillis } from '../../time/index.js';

/** What a calendar says of itself. */
export interface CalendarWords {
  readonly name: string;
  readonly description: string;
}

/** One entry. Its uid never changes; its sequence rises when what it says does. */
export interface CalendarEntry {
  readonly uid: string;
  readonly sequence: number;
  readonly start: UtcMillis;
  /** After `start`. */
  readonly end: UtcMillis;
  readonly summary: string;
  readonly description: string;
  readonly categories: readonly string[];
  readonly status: 'confirmed' | 'tentative' | 'cancelled';
  readonly place: CalendarPlace | null;
  /** Entries that belong together with this one. */
  readonly relatedUids: readonly string[];
}

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
 * Writes an iCalendar object (RFC 5545, with NAME of RFC 7986), lines folded and ended by CRLF.
 *
 * The only module that knows the calendar library, and what to keep from it: it takes the host's zone from plain
 * dates, cuts seconds, swaps ends, makes up missing starts and ids, drops a GEO at zero, leaves NAME and UID unescaped,
 * and forgets the last line's end.
 * @param stamp DTSTAMP of every entry: data of the plan, not the clock
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
        id: entry.uid,
        sequence: entry.sequence,
        stamp: utc(stamp),
        start: utc(entry.start),
        end: utc(entry.end),
        summary: oneLine(entry.summary),
        description: cleaned(entry.description),
        categories: entry.categories.map((name) => ({ name })),
        status: statuses[entry.status],
        transparency: ICalEventTransparency.TRANSPARENT,
        ...(entry.place === null ? {} : { location: oneLine(entry.place.name) }),
      },
      calendar,
    );
    this.rawLines = [
      ...(entry.place === null ? [] : [`GEO:${entry.place.latitudeDeg};${entry.place.longitudeDeg}`]),
      ...entry.relatedUids.map((uid) => `RELATED-TO;RELTYPE=SIBLING:${uid}`),
    ];
  }

  override toString(): string {
    const added = this.rawLines.map((line) => `${line}\r\n`).join('');
    return super.toString().replace(/END:VEVENT\r\n$/, `${added}END:VEVENT\r\n`);
  }
}

/** To the whole second, in UTC and in no one's locale. */
const utc = (at: UtcMillis): DateTime =>
  DateTime.fromMillis(Math.round(at / 1000) * 1000, { zone: 'utc', locale: 'en' });

function checkEntry({ uid, start, end, sequence }: CalendarEntry): void {
  const fault = !/^[\x21-\x7e]+$/.test(uid)
    ? 'its uid must be printable ASCII without spaces'
    : !Number.isFinite(start) || !(end > start)
      ? 'it must start at an instant and end after it'
      : !Number.isInteger(sequence) || sequence < 0
        ? 'its sequence must be a whole number from 0'
        : null;
  if (fault !== null) throw new CalendarEntryError(`calendar entry ${JSON.stringify(uid)}: ${fault}`);
}

/** Control characters have no place in a calendar; a line break stays one. */
const cleaned = (text: string): string =>
  text.replace(/\r\n?/g, '\n').replace(/[\u0000-\u0009\u000b-\u001f\u007f\u0085\u2028\u2029]/g, ' ');

const oneLine = (text: string): string => cleaned(text).replace(/\s*\n\s*/g, ' ');

/** RFC 5545 §3.3.11, for the properties that the library writes as they come. */
const escapedText = (text: string): string => oneLine(text).replace(/[\\;,]/g, '\\$&');
