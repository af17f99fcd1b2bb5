import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { eventsCalendar, writeCalendar } from '../../src/output/calendar/index.js';
import { csv, eventsCsv, eventsJson, eventsMarkdown, markdownTable } from '../../src/output/index.js';
import { utcMillis } from '../../src/time/index.js';
import { aForecast, aSite, at, seenFrom, soloEvent } from '../fixtures/events.js';
import { readLeniently, readStrictly, strictCalendar } from '../fixtures/read-calendar.js';
import { readCsv } from '../fixtures/read-csv.js';

/** What people or programs may call a place: anything at all, and what is known to hurt more often. */
const hostile = fc.oneof(
  fc.string({ unit: 'binary', maxLength: 200 }),
  fc.string({
    unit: fc.constantFrom('\r', '\n', '"', ',', ';', '\\', ':', '|', '<', '🪐', '\u2028', '\ud800', ' ', 'x'),
  }),
  fc
    .array(
      fc.constantFrom(
        '<script>alert(1)</script>',
        '=HYPERLINK("http://x","y")',
        '\r\nEND:VEVENT\r\nBEGIN:VEVENT\r\nUID:x',
        'BEGIN:VEVENT',
        '"; DROP',
        '| --- |',
        '[x](javascript:y)',
        '\\n\\,',
        '@SUM(A1)',
        '🪐🔭',
        '../../x',
        '\u0000\u0007',
      ),
      { maxLength: 6 },
    )
    .map((parts) => parts.join(' ')),
);
const STAMP = at('2027-01-01T00:00:00Z');
const START = at('2027-02-19T15:45:00Z');

describe('hostile text', () => {
  it('leaves a calendar with one whole entry, on short lines, that says what was meant', () => {
    fc.assert(
      fc.property(hostile, hostile, hostile, (name, summary, description) => {
        const text = writeCalendar(
          { name, description },
          [
            {
              uid: 'a.b.+1.a@synodos',
              sequence: 0,
              when: { from: START, to: utcMillis(START + 60_000) },
              summary,
              description,
              categories: [name],
              status: 'confirmed',
              place: { name: summary, latitudeDeg: 1, longitudeDeg: 2 },
              relatedUids: [],
            },
          ],
          STAMP,
        );
        expect(text.replaceAll('\r\n', '')).not.toMatch(/[\r\n\u0000-\u0008\u000b-\u001f]/);
        expect(text).not.toMatch(/\p{Surrogate}/u);
        for (const line of text.split('\r\n')) expect(Buffer.byteLength(line)).toBeLessThanOrEqual(75);
        const [entry, ...more] = readStrictly(text);
        expect(more).toEqual([]);
        expect(entry).toMatchObject({ uid: 'a.b.+1.a@synodos', startMillis: START });
        // Words survive; only control characters, line ends and broken characters may change.
        const letters = (words: string) =>
          words.replace(/[^\p{L}\p{N}\p{P}\p{S}]/gu, '').replaceAll('\ufffd', '');
        expect(letters(entry!.summary)).toBe(letters(summary.replace(/\p{Surrogate}/gu, '')));
        expect(letters(entry!.description)).toBe(letters(description.replace(/\p{Surrogate}/gu, '')));
        expect(readLeniently(text)).toHaveLength(1);
        expect(strictCalendar(text).getAllSubcomponents()).toHaveLength(1);
      }),
      { numRuns: 300 },
    );
  });

  it('comes back from CSV as it was, or behind an apostrophe where a spreadsheet would run it', () => {
    fc.assert(
      fc.property(fc.array(fc.array(hostile, { minLength: 2, maxLength: 2 }), { maxLength: 4 }), (rows) => {
        const [, ...read] = readCsv(csv(['a', 'b'], rows));
        expect(read).toEqual(
          rows.map((row) => row.map((cell) => (/^[=+\-@\t\r\n＝＋－＠]/.test(cell) ? `'${cell}` : cell))),
        );
        for (const cell of read.flat()) expect(cell).not.toMatch(/^[=+\-@\t\r\n]/);
      }),
    );
  });

  it('stays in its cell of a Markdown table, and brings no HTML', () => {
    fc.assert(
      fc.property(hostile, hostile, (header, cell) => {
        const lines = markdownTable([header, 'b'], [[cell, 'c']]).split('\n');
        expect(lines).toHaveLength(4);
        for (const line of lines.slice(0, 3)) {
          // A pipe counts unless an odd run of backslashes stands before it.
          const bars = line.replace(/\\[\s\S]/g, '').match(/\|/g);
          expect(bars).toHaveLength(3);
          expect(line).not.toMatch(/[<>]/);
        }
      }),
    );
  });

  it('in a site’s name breaks none of the outputs', () => {
    fc.assert(
      fc.property(hostile, hostile, (name, verdict) => {
        const site = aSite({ name });
        const forecast = aForecast([seenFrom(soloEvent(), site, { verdict })]);
        expect(
          readStrictly(eventsCalendar({ name, description: name }, forecast, [site], STAMP)),
        ).toHaveLength(1);
        expect(JSON.parse(eventsJson(forecast, [site]))).toMatchObject({ sites: [{ name }] });
        expect(readCsv(eventsCsv(forecast, [site]))).toHaveLength(2);
        expect(eventsMarkdown(forecast, [site]).trimEnd().split('\n')).toHaveLength(3);
      }),
      { numRuns: 60 },
    );
  });
});
