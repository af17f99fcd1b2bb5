import { describe, expect, it } from 'vitest';
import { renderReportMarkdown } from '../../../../src/output/report/index.js';
import { aForecast, aSite } from '../../../fixtures/events.js';
import { aReport } from '../../../fixtures/report.js';

describe('the report as Markdown', () => {
  const markdown = renderReportMarkdown(aReport());

  it('has the chapters of the page, in its order', () => {
    expect([...markdown.matchAll(/^## (.+)$/gm)].map(([, title]) => title)).toEqual([
      'The season at a glance',
      'Worth telling',
      'Close-ups',
      'Every event',
      'What the ephemeris adds',
      'How sure each date is',
      'Method and limits',
    ]);
  });

  it('tells every event in its month', () => {
    const months = markdown.split(/^### /m).slice(1);
    expect(months.map((month) => month.split('\n')[0])).toEqual(['February 2027', 'June 2027']);
    expect(months[0]).toContain('| 2027-02-19 Fri 16:45 CET | ± 2 min | Mars, opposition |');
    expect(months[0]).toContain('Earth and Mars, heliocentric conjunction');
    expect(months[1]).toContain('Venus and Jupiter, conjunction in right ascension');
  });

  it('says in words what the pictures show', () => {
    expect(markdown).toContain('Mars is at its best in January 2027.');
    expect(markdown).toContain('- Venus 24′ north of Jupiter. Closest 2027-06-09 Wed 21:13 CEST, ± 2 min.');
    expect(markdown).toContain('| Mars, opposition | 3 | 12 d, 20 d |');
    expect(markdown).toContain('Every instant is known to a quarter of an hour or better.');
  });

  it('leaves out the chapters that would be empty', () => {
    const bare = renderReportMarkdown(
      aReport({ forecast: aForecast([], []), sites: [], residuals: [], seasons: [] }),
    );
    expect([...bare.matchAll(/^## (.+)$/gm)].map(([, title]) => title)).toEqual([
      'Every event',
      'Method and limits',
    ]);
    expect(bare).not.toMatch(/NaN|undefined|null/);
  });

  it('lets hostile names mean nothing', () => {
    const name = '<script>x</script> | `a` [b](c)';
    const hostile = renderReportMarkdown(aReport({ title: name, sites: [aSite({ name })] }));
    expect(hostile).not.toMatch(/<script|[^\\]\|\s`a`|[^\\]\[b/);
  });
});
