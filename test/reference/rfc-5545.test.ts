import { describe, expect, it } from 'vitest';
import { forecast } from '../../src/forecast/index.js';
import { eventsCalendar, uidOf } from '../../src/output/calendar/index.js';
import { isoUtc } from '../../src/time/index.js';
import { aSite, at } from '../fixtures/events.js';
import { readLeniently, readStrictly, strictCalendar, strictEntries } from '../fixtures/read-calendar.js';
import type { ReadEntry } from '../fixtures/read-calendar.js';

/**
 * A real year of all kinds as a calendar, judged by RFC 5545 (Desruisseaux, 2009) through two readers that share no
 * code: ical.js, strict, and node-ical, lenient. Sections are named beside the checks.
 */
const sites = [
  aSite({ name: 'Hill; "the old", one\\two' }),
  aSite({ id: 'south', name: 'Süd ☾ 南', latitudeDeg: -33.4, longitudeDeg: -70.6, zone: 'America/Santiago' }),
];
const year = forecast({ from: at('2028-01-01T00:00:00Z'), to: at('2029-01-01T00:00:00Z'), sites });
const words = { name: 'Sky, 2028', description: 'Events of the planets' };
const text = eventsCalendar(words, year, sites, at('2027-01-01T00:00:00Z'));

describe('a calendar by RFC 5545', () => {
  it('§3.1: lines end with CRLF, hold at most 75 octets, and are folded between characters', () => {
    expect(text.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/);
    const lines = text.split('\r\n');
    expect(lines.pop()).toBe('');
    for (const line of lines) expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);
    for (const line of lines) expect(line).not.toMatch(/\p{Surrogate}/u);
  });

  it('§3.6: has VERSION and PRODID once, and in every event UID and DTSTAMP once', () => {
    const calendar = strictCalendar(text);
    expect(calendar.getFirstPropertyValue('version')).toBe('2.0');
    expect(calendar.getAllProperties('prodid')).toHaveLength(1);
    for (const entry of strictEntries(text)) {
      for (const name of [
        'uid',
        'dtstamp',
        'dtstart',
        'dtend',
        'summary',
        'description',
        'status',
        'sequence',
      ]) {
        expect(entry.getAllProperties(name), name).toHaveLength(1);
      }
    }
  });

  it.each([
    ['ical.js, strict', readStrictly],
    ['node-ical, lenient', readLeniently],
  ] as const)('is read by %s: every event, at its minute, under its own uid', (_, read) => {
    const entries = read(text);
    expect(entries).toHaveLength(year.events.length);
    expect(entries.map(({ uid }) => uid)).toEqual(year.events.map(({ id }) => uidOf(id)));
    expect(new Set(entries.map(({ uid }) => uid)).size).toBe(entries.length);
    entries.forEach(({ startMillis, endMillis, wholeDay }, i) => {
      const { utc } = year.events[i]!;
      // Half a minute of rounding, or somewhere in a day at the home site.
      expect(Math.abs(startMillis - utc)).toBeLessThanOrEqual(wholeDay ? 2 * 86_400_000 : 30_000);
      expect(endMillis - startMillis).toBe(wholeDay ? 86_400_000 : 60_000);
    });
  });

  it('says the same to both readers', () => {
    const trimmed = (entries: ReadEntry[]) =>
      entries.map(({ summary, description, location, ...rest }) => ({
        ...rest,
        summary: summary.trim(),
        description: description.trim(),
        location: (location as string | null) ?? '',
      }));
    expect(trimmed(readLeniently(text))).toEqual(trimmed(readStrictly(text)));
  });

  it('changes nothing when it is imported twice, or when a longer forecast is imported over it', () => {
    const diary = new Map<string, ReadEntry>();
    const importInto = (calendar: string) => {
      for (const entry of readStrictly(calendar)) diary.set(entry.uid, entry);
    };
    importInto(text);
    const once = JSON.stringify([...diary]);
    importInto(text);
    expect(JSON.stringify([...diary])).toBe(once);
    const longer = forecast({ from: at('2027-10-01T00:00:00Z'), to: at('2029-01-01T00:00:00Z'), sites });
    importInto(eventsCalendar(words, longer, sites, at('2027-01-01T00:00:00Z')));
    expect(diary.size).toBe(longer.events.length);
  });

  it('writes each event’s instant in UTC, as the forecast has it to the minute', () => {
    const opposition = year.events.find(({ kind }) => kind === 'opposition')!;
    const minute = isoUtc(opposition.utc).slice(0, 13).replace(/[-:]/g, '');
    const entry = strictEntries(text).find((e) => e.getFirstPropertyValue('uid') === uidOf(opposition.id))!;
    expect(entry.getFirstProperty('dtstart')!.toICALString()).toMatch(
      new RegExp(`^DTSTART:${minute}\\d{4}Z$`),
    );
  });
});
