import { afterEach, describe, expect, it, vi } from 'vitest';
import { CalendarEntryError, writeCalendar } from '../../../../src/output/calendar/index.js';
import type { CalendarEntry } from '../../../../src/output/calendar/index.js';
import { localDate, utcMillis } from '../../../../src/time/index.js';
import { at } from '../../../fixtures/events.js';
import {
  readLeniently,
  readStrictly,
  strictCalendar,
  strictEntries,
} from '../../../fixtures/read-calendar.js';

const STAMP = at('2027-01-01T00:00:00Z');
const words = { name: 'Sky', description: 'What happens' };
const START = at('2027-02-19T15:45:00Z');

const anEntry = (over: Partial<CalendarEntry> = {}): CalendarEntry => ({
  uid: 'opposition.mars.+13.a@synodos',
  sequence: 0,
  when: { from: START, to: utcMillis(START + 60_000) },
  summary: 'Mars at opposition',
  description: 'Look south.',
  categories: ['opposition'],
  status: 'confirmed',
  place: null,
  relatedUids: [],
  ...over,
});
const write = (over: Partial<CalendarEntry> = {}): string => writeCalendar(words, [anEntry(over)], STAMP);
/** Content lines with their folds undone (RFC 5545 §3.1). */
const linesOf = (text: string): string[] => text.replace(/\r\n[ \t]/g, '').split('\r\n');

afterEach(() => vi.useRealTimers());

describe('the traps of the calendar library', () => {
  it('1: a place on the equator or the Greenwich meridian keeps its GEO', () => {
    const geo = (latitudeDeg: number, longitudeDeg: number) =>
      linesOf(write({ place: { name: 'P', latitudeDeg, longitudeDeg } })).filter((line) =>
        line.startsWith('GEO'),
      );
    expect(geo(0, 9.45)).toEqual(['GEO:0.000000;9.450000']);
    expect(geo(51.4779, 0)).toEqual(['GEO:51.477900;0.000000']);
    expect(geo(0, 0)).toEqual(['GEO:0.000000;0.000000']);
    // Written plainly, 1e-7 would be no FLOAT of RFC 5545.
    expect(geo(1e-7, -1e-7)).toEqual(['GEO:0.000000;-0.000000']);
  });

  it('2: every stamp keeps its Z, because no zone is set on the calendar', () => {
    const lines = linesOf(write());
    expect(lines).toContain('DTSTAMP:20270101T000000Z');
    expect(
      lines.filter((line) => /^(DTSTAMP|DTSTART|DTEND)/.test(line)).every((line) => line.endsWith('Z')),
    ).toBe(true);
    expect(lines.join()).not.toMatch(/TZID|X-WR-TIMEZONE|TIMEZONE-ID|VTIMEZONE/);
  });

  it('3 and 4: there are no alarms, absolute or of the wrong sign', () => {
    expect(write()).not.toMatch(/VALARM|TRIGGER/);
  });

  it('5: the host’s clock is never asked, nor its zone', () => {
    const before = write();
    vi.useFakeTimers({ now: at('2031-05-05T05:05:05Z') });
    expect(write()).toBe(before);
    expect(linesOf(before)).toContain('DTSTART:20270219T154500Z');
  });

  it('6: the calendar’s name and description cannot break its lines or smuggle one in', () => {
    const hostile = 'Sky;\r\nBEGIN:VEVENT\nUID:x, "y" \\ z';
    const text = writeCalendar({ name: hostile, description: hostile }, [anEntry()], STAMP);
    expect(text.match(/^BEGIN:VEVENT/gm)).toHaveLength(1);
    const calendar = strictCalendar(text);
    const flat = 'Sky; BEGIN:VEVENT UID:x, "y" \\ z';
    for (const property of ['name', 'x-wr-calname', 'x-wr-caldesc']) {
      // The reader knows none of these to be TEXT, so it leaves their escapes.
      const value = String(calendar.getFirstPropertyValue(property));
      expect(value.replace(/\\(.)/g, '$1')).toBe(flat);
    }
  });

  it.each(['a b@synodos', 'a\r\nX:1@synodos', 'a;b@synodos', 'a', '', 'ä@synodos'])(
    '6: a uid that would have to be escaped is refused: %j',
    (uid) => {
      expect(() => write({ uid })).toThrow(CalendarEntryError);
      expect(() => write({ relatedUids: [uid] })).toThrow(/letters, digits/);
    },
  );

  it('7: no URL is written, whose commas would get backslashes', () => {
    expect(
      linesOf(write({ description: 'https://example.org/a,b' })).filter((line) => line.startsWith('URL')),
    ).toEqual([]);
  });

  it('8: a missing start or swapped ends are an error, not another entry', () => {
    const nowhere = utcMillis(Number.NaN);
    expect(() => write({ when: { from: nowhere, to: START } })).toThrow(/start at an instant and end/);
    expect(() => write({ when: { from: START, to: nowhere } })).toThrow(CalendarEntryError);
    expect(() => write({ when: { from: START, to: utcMillis(START - 1000) } })).toThrow(CalendarEntryError);
    expect(() => write({ when: { from: START, to: utcMillis(START + 400) } })).toThrow(/at least a second/);
    expect(() => write({ when: { day: localDate('2027-02-30') } })).toThrow(CalendarEntryError);
    expect(() => write({ sequence: -1 })).toThrow(/whole number/);
  });

  it('9: entries that belong together say so, on lines that are folded like the rest', () => {
    const siblings = ['a', 'b'].map(
      (letter) => `conjunction-longitude.venus-jupiter.+27.${letter.repeat(60)}@synodos`,
    );
    const text = write({ relatedUids: siblings });
    const related = strictEntries(text)[0]!.getAllProperties('related-to');
    expect(related.map((property) => property.getFirstValue())).toEqual(siblings);
    expect(related.map((property) => property.getFirstParameter('reltype'))).toEqual(['SIBLING', 'SIBLING']);
    for (const line of text.split('\r\n')) expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);
  });

  it('10: the last line ends too', () => {
    expect(write().endsWith('END:VCALENDAR\r\n')).toBe(true);
    expect(write()).not.toMatch(/\r\n\r\n/);
  });

  it('11: the uid is the one given, and no two entries share it', () => {
    expect(readStrictly(write()).map(({ uid }) => uid)).toEqual(['opposition.mars.+13.a@synodos']);
    expect(() => writeCalendar(words, [anEntry(), anEntry()], STAMP)).toThrow(/its uid occurs twice/);
  });

  it('12: seconds are rounded, not cut', () => {
    const when = { from: utcMillis(START + 29_600), to: utcMillis(START + 59_900) };
    expect(linesOf(write({ when }))).toEqual(
      expect.arrayContaining(['DTSTART:20270219T154530Z', 'DTEND:20270219T154600Z']),
    );
  });
});

describe('an entry', () => {
  it('does not make a diary look busy and asks nobody to answer', () => {
    const lines = linesOf(write());
    expect(lines).toContain('TRANSP:TRANSPARENT');
    expect(lines.filter((line) => /^(METHOD|ATTENDEE|ORGANIZER)/.test(line))).toEqual([]);
    expect(lines).toContain('SEQUENCE:0');
  });

  it('may be a whole day, which ends as the next begins', () => {
    const text = write({ when: { day: localDate('2027-12-31') } });
    expect(linesOf(text)).toEqual(
      expect.arrayContaining(['DTSTART;VALUE=DATE:20271231', 'DTEND;VALUE=DATE:20280101']),
    );
    for (const read of [readStrictly, readLeniently]) {
      expect(read(text)[0]).toMatchObject({
        wholeDay: true,
        startMillis: Date.UTC(2027, 11, 31),
        endMillis: Date.UTC(2028, 0, 1),
      });
    }
  });

  it('may be tentative, or cancelled under its old uid with a higher sequence', () => {
    expect(linesOf(write({ status: 'tentative' }))).toContain('STATUS:TENTATIVE');
    expect(linesOf(write({ status: 'cancelled', sequence: 1 }))).toEqual(
      expect.arrayContaining(['STATUS:CANCELLED', 'SEQUENCE:1', 'UID:opposition.mars.+13.a@synodos']),
    );
  });

  it('keeps commas in a category from making two of it', () => {
    const categories = ['stationary, retrograde motion begins', 'Mars'];
    const property = strictEntries(write({ categories }))[0]!.getFirstProperty('categories')!;
    expect(property.getValues()).toEqual(categories);
  });
});
