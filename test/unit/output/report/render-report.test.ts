import { describe, expect, it } from 'vitest';
import { renderReport } from '../../../../src/output/report/index.js';
import { aForecast, aSite, pairEvent, seenFrom, soloEvent } from '../../../fixtures/events.js';
import { aMeeting, aReport, aSiteForecast } from '../../../fixtures/report.js';

const all = (html: string, pattern: RegExp): string[] =>
  [...html.matchAll(pattern)].map((match) => match[1]!);
const textOf = (html: string): string =>
  html
    .replace(/<style>.*?<\/style>/s, '')
    .replace(/<br\/?>|<\/(?:p|li|td|th|h\d)>/g, '\n')
    .replace(/<[^>]+>/g, '');

describe('the report as a page', () => {
  const html = renderReport(aReport());

  it('holds its chapters in the order in which people decide', () => {
    expect(all(html, /<h2[^>]*>([^<]+)/g)).toEqual([
      'The season at a glance',
      'Worth telling',
      'Close-ups',
      'Every event',
      'What the ephemeris adds',
      'How sure each date is',
      'Method and limits',
    ]);
  });

  it('never skips a level of headings', () => {
    const levels = all(html, /<h(\d)/g).map(Number);
    expect(levels[0]).toBe(1);
    levels.slice(1).forEach((level, i) => {
      expect(level - levels[i]!).toBeLessThanOrEqual(1);
      expect(level).toBeGreaterThan(1);
    });
  });

  it('gives an id once, and links to nothing that is not there', () => {
    const ids = all(html, / id="([^"]+)"/g);
    expect(new Set(ids).size).toBe(ids.length);
    const links = all(html, / href="([^"]+)"/g);
    expect(links.length).toBeGreaterThan(8);
    expect(links.filter((link) => !link.startsWith('#') || !ids.includes(link.slice(1)))).toEqual([]);
    const labels = all(html, / aria-labelledby="([^"]+)"/g).flatMap((label) => label.split(' '));
    expect(labels.filter((label) => !ids.includes(label))).toEqual([]);
  });

  it('neither runs nor fetches anything, and says so to the browser', () => {
    expect(html).toContain(
      "<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; style-src 'unsafe-inline';",
    );
    expect(html).not.toMatch(/<script|<link|<img|<iframe|url\(|@import|https?:|\son[a-z]+=/i);
  });

  it('names the scope of every heading of a table', () => {
    expect(all(html, /<th( [^>]*)>/g).filter((attributes) => !attributes.includes('scope='))).toEqual([]);
  });

  it('is the same text every time', () => {
    expect(renderReport(aReport())).toBe(html);
  });

  it('lets hostile names mean nothing', () => {
    const name = `</title><script>alert(1)</script>"'&`;
    const hostile = renderReport(aReport({ title: name, sites: [aSite({ name })] }));
    expect(hostile).not.toContain('<script');
    expect(hostile).toContain('&lt;script>');
    expect(all(hostile, /<title>([^<]*)/g)[0]).toContain('&lt;/title>');
  });

  it('tells an opposition, a meeting and a line-up where each belongs', () => {
    const [before, after] = html.split('id="from-the-sun"').map(textOf) as [string, string];
    expect(before).toContain('Mars is at its best from about 22 January to 19 March 2027');
    expect(before).toContain('Venus and Jupiter stand 57′ apart on the evening of Wednesday 9 June 2027');
    expect(before).toContain('Venus 24′ north of Jupiter');
    expect(before).not.toContain('Earth and Mars');
    expect(after).toContain('Earth and Mars, heliocentric conjunction');
  });

  it('keeps to the clocks of the home site', () => {
    expect(html).toContain('2027-02-19 Fri');
    expect(textOf(html)).toContain('16:45 CET, ± 2 min');
    expect(html).toContain('datetime="2027-02-19T15:45:12Z"');
  });
});

describe('what cannot be seen', () => {
  const site = aSite();
  const hidden = { bestLook: null, verdict: 'Not observable: only 9° from the Sun.' };
  const events = [
    seenFrom(soloEvent(), site, hidden),
    seenFrom(pairEvent({}, { elongationDeg: 9.4 }), site, hidden),
  ];

  it('stands in the table alone', () => {
    const html = renderReport(
      aReport({ forecast: aForecast(events, [aMeeting({ observable: false })]), seasons: [], residuals: [] }),
    );
    expect(html).toContain('Nothing in this span can be shown to the public from here.');
    expect(html).toContain('No two planets come within 2° of each other where they can be seen.');
    expect(html.match(/Not observable: only 9° from the Sun\./g)).toHaveLength(2);
    expect(html).not.toContain('class="word middle"');
  });

  it('is told as its distance from the Sun where there is no site', () => {
    const html = renderReport(
      aReport({ sites: [], forecast: aForecast([pairEvent({}, { elongationDeg: 9.4 })], []) }),
    );
    expect(html).toContain('Not observable, 9° from the Sun');
    expect(html).toContain('as seen from the Earth’s centre');
    expect(html).toContain('19:13 UTC');
  });

  it('brings the caution once', () => {
    const near = renderReport(aReport({ forecast: aForecast(events, []) }));
    expect(near.match(/do not look or sweep/g)).toHaveLength(1);
    expect(near).toContain('One of these events happens within 20° of the Sun.');
    expect(renderReport(aReport({ forecast: aForecast([soloEvent()], []) }))).not.toContain(
      'do not look or sweep',
    );
  });
});

describe('a report with little in it', () => {
  it('still stands', () => {
    const html = renderReport(
      aReport({ forecast: aForecast([], []), sites: [], residuals: [], seasons: [] }),
    );
    expect(html).toContain('Source: invented for tests.');
    expect(html).not.toContain('What the ephemeris adds');
    expect(html).not.toMatch(/NaN|undefined|null|Infinity/);
  });

  it('shows a meeting that only a partner sees, with the partner’s name', () => {
    const [home, partner] = [aSite(), aSite({ id: 'south', name: 'South Station' })];
    const unseen = seenFrom(pairEvent(), home, { bestLook: null, verdict: 'Not visible from here: why.' });
    const forecast = aForecast([seenFrom(unseen, partner)], [aMeeting()]);
    const html = renderReport(aReport({ forecast, sites: [home, partner] }));
    expect(html).toContain('From South Station: look low in the west-north-west at 22:10');
    expect(html).toContain('Nothing in this span can be shown to the public from here.');
  });

  it('carries no word of the machine', () => {
    expect(renderReport(aReport({ forecast: aSiteForecast() }))).not.toMatch(
      /NaN|undefined|Infinity|\[object/,
    );
  });
});
