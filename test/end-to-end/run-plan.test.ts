import { createHash } from 'node:crypto';
import { mkdtempSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ensureBuilt, synodos } from './command.js';

const FILES = [
  'events.csv',
  'events.ics',
  'events.json',
  'manifest.json',
  'report.html',
  'report.md',
  'residuals.csv',
];

let folder: string;
const bytesOf = (run: string): Record<string, string> =>
  Object.fromEntries(
    readdirSync(join(folder, run))
      .sort()
      .map((name) => [name, readFileSync(join(folder, run, name), 'latin1')]),
  );

beforeAll(() => {
  ensureBuilt();
  folder = mkdtempSync(join(tmpdir(), 'synodos-'));
  expect(synodos(['run', 'data/demo/plan.yaml', '--into', join(folder, 'first')])).toEqual({
    status: 0,
    stdout: '',
    stderr: `written into ${join(folder, 'first')}: events.ics, events.csv, events.json, residuals.csv, report.html, report.md, manifest.json\n`,
  });
});
afterAll(() => {
  rmSync(folder, { recursive: true });
});

describe('the demo plan', () => {
  it('is written into its files, and nothing else is left beside them', () => {
    expect(readdirSync(join(folder, 'first')).sort()).toEqual(FILES);
  });

  it('is listed in a manifest with true sizes and checksums, without clock or path', () => {
    const text = readFileSync(join(folder, 'first', 'manifest.json'), 'utf8');
    const { files } = JSON.parse(text) as { files: { name: string; bytes: number; sha256: string }[] };
    expect(files.map(({ name }) => name).sort()).toEqual(FILES.filter((name) => name !== 'manifest.json'));
    for (const { name, bytes, sha256 } of files) {
      const written = readFileSync(join(folder, 'first', name));
      expect([name, bytes, sha256]).toEqual([
        name,
        written.length,
        createHash('sha256').update(written).digest('hex'),
      ]);
    }
    expect(text).not.toContain(folder);
  });

  it('gives the same bytes under another zone, language, clock and width, and over what was there before', () => {
    const clock = join(folder, 'clock.mjs');
    writeFileSync(
      clock,
      `const shift = 40 * 365 * 86_400_000;
const Real = Date;
globalThis.Date = class extends Real {
  constructor(...given) { if (given.length === 0) super(Real.now() + shift); else super(...given); }
  static now() { return Real.now() + shift; }
};
Math.random = () => 0.42;
`,
    );
    const args = ['run', 'data/demo/plan.yaml', '--into', join(folder, 'second'), '--quiet'];
    const env = {
      TZ: 'Pacific/Apia',
      LANG: 'ar_EG.UTF-8',
      LC_ALL: 'ar_EG.UTF-8',
      COLUMNS: '40',
      FORCE_COLOR: '1',
    };
    for (let time = 0; time < 2; time++) {
      expect(synodos(args, { env, node: ['--import', clock] })).toEqual({
        status: 0,
        stdout: '',
        stderr: '',
      });
    }
    expect(bytesOf('second')).toEqual(bytesOf('first'));
  });

  it('opens with its own title and speaks for its own sites', () => {
    const report = readFileSync(join(folder, 'first', 'report.html'), 'utf8');
    expect(report).toContain('Amselgrat Observatory, 2027 and 2028');
    for (const name of ['Amselgrat Public Observatory', 'Estación Quillamora', 'Marlagong Field Station']) {
      expect(report).toContain(name);
    }
  });

  it('carries its own stamp in the calendar', () => {
    const stamps = readFileSync(join(folder, 'first', 'events.ics'), 'utf8').match(/^DTSTAMP:.*$/gm) ?? [];
    expect(new Set(stamps.map((stamp) => stamp.trim()))).toEqual(new Set(['DTSTAMP:20261201T000000Z']));
  });
});

describe('a plan without sites', () => {
  it('runs, geocentric and in UTC', () => {
    const plan = join(folder, 'bare.yaml');
    writeFileSync(plan, 'title: Bare\nspan: { from: 2027-01-01, to: 2027-02-01 }\n');
    const run = synodos(['run', plan, '--into', join(folder, 'bare'), '--quiet']);
    expect(run).toEqual({ status: 0, stdout: '', stderr: '' });
    const { span, events } = JSON.parse(readFileSync(join(folder, 'bare', 'events.json'), 'utf8')) as {
      span: { from: string };
      events: unknown[];
    };
    expect(span.from).toBe('2027-01-01T00:00:00Z');
    expect(events.length).toBeGreaterThan(5);
  });
});
