import { mkdtempSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import ICAL from 'ical.js';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ensureBuilt, synodos } from './command.js';

/** What people (and worse) write into a name. */
const NAMES = [
  '<script>alert(1)</script>',
  '"quoted", \'twice\' & <b>bold</b>',
  'two\nlines\r\nBEGIN:VEVENT\nUID:x',
  '=HYPERLINK("http://example.invalid","open")',
  '+1-1|cmd',
  '../../../etc/passwd',
  '`code` | [link](javascript:alert(1)) ![x](y)',
  '--></style></svg><img src=x onerror=alert(1)>',
  'right-to-left \u202e and a tab\t',
];

let folder: string;
const outputOf = (i: number, name: string): string => readFileSync(join(folder, `out-${i}`, name), 'utf8');

beforeAll(() => {
  ensureBuilt();
  folder = mkdtempSync(join(tmpdir(), 'synodos-'));
  NAMES.forEach((name, i) => {
    const plan = join(folder, `plan-${i}.yaml`);
    // Every JSON text is YAML too.
    writeFileSync(
      plan,
      JSON.stringify({
        title: name,
        span: { from: '2027-02-01', to: '2027-03-01' },
        sites: [{ id: 'hill', name, latitude: 48, longitude: 11 }],
        forecast: { bodies: ['mars'] },
      }),
    );
    expect(synodos(['run', plan, '--into', join(folder, `out-${i}`), '--quiet'])).toEqual({
      status: 0,
      stdout: '',
      stderr: '',
    });
  });
});
afterAll(() => {
  rmSync(folder, { recursive: true });
});

describe.each(NAMES.map((name, i) => [name, i] as const))('the name %j', (name, i) => {
  it('opens no element and no attribute in the report', () => {
    const html = outputOf(i, 'report.html');
    expect(html).not.toMatch(/<script>alert|<b>bold|<img src=x/);
    // The same elements as with a plain name: nothing was opened, nothing closed early.
    const tags = (text: string) => text.match(/<\/?[a-z][a-z0-9-]*/gi)?.length;
    expect(tags(html)).toBe(tags(outputOf(4, 'report.html')));
  });

  it('opens no HTML in the Markdown', () => {
    expect(outputOf(i, 'report.md')).not.toMatch(/<(script|b|img|style|svg)\b/);
  });

  it('adds no entry and no line to the calendar, and comes back whole', () => {
    const text = outputOf(i, 'events.ics');
    const calendar = new ICAL.Component(ICAL.parse(text) as unknown[]);
    const entries = calendar.getAllSubcomponents('vevent');
    expect(entries.length).toBe(text.match(/^BEGIN:VEVENT\r$/gm)?.length);
    const plain = new ICAL.Component(ICAL.parse(outputOf(0, 'events.ics')) as unknown[]);
    expect(entries.length).toBe(plain.getAllSubcomponents('vevent').length);
    expect(text.split('\r\n').some((line) => /^UID:x$/.test(line))).toBe(false);
  });

  it('begins no formula in the CSV', () => {
    for (const cell of outputOf(i, 'events.csv').split(/,|\r\n/)) {
      expect(cell).not.toMatch(/^"?[=@]/);
      expect(cell).not.toMatch(/^"?\+1-1/);
    }
  });

  it('names no file', () => {
    expect(readdirSync(join(folder, `out-${i}`)).sort()).toEqual([
      'events.csv',
      'events.ics',
      'events.json',
      'manifest.json',
      'report.html',
      'report.md',
      'residuals.csv',
    ]);
    expect(JSON.parse(outputOf(i, 'manifest.json'))).toMatchObject({
      title: name.replace(/\s+/g, ' ').trim(),
    });
  });
});
