import { describe, expect, it } from 'vitest';
import { timeTicks } from '../../../../src/output/charts/time-axis.js';
import { at } from '../../../fixtures/events.js';

const labels = (from: string, to: string): string[] =>
  timeTicks(at(`${from}T00:00:00Z`), at(`${to}T00:00:00Z`)).map(({ label }) => label);

describe('the ticks of a time axis', () => {
  it('are quarters through two years, with the year where it begins', () => {
    expect(labels('2027-01-01', '2029-01-01')).toEqual([
      'Jan 2027',
      'Apr',
      'Jul',
      'Oct',
      'Jan 2028',
      'Apr',
      'Jul',
      'Oct',
      'Jan 2029',
    ]);
  });

  it('are round years through decades, wherever the span begins', () => {
    expect(labels('1999-12-31', '2051-01-01')).toEqual(['2000', '2010', '2020', '2030', '2040', '2050']);
    expect(labels('1987-03-01', '2011-01-01')).toEqual(['1990', '1995', '2000', '2005', '2010']);
  });

  it.each([
    ['2027-02-10', '2027-03-20'],
    ['2027-01-01', '2027-07-01'],
    ['1600-01-01', '2600-01-01'],
    ['1900-01-01', '2101-01-01'],
  ])('are few and inside from %s to %s', (from, to) => {
    const ticks = timeTicks(at(`${from}T00:00:00Z`), at(`${to}T00:00:00Z`));
    expect(ticks.length).toBeGreaterThan(0);
    expect(ticks.length).toBeLessThanOrEqual(11);
    for (const { utc } of ticks) {
      expect(utc).toBeGreaterThanOrEqual(Date.parse(from));
      expect(utc).toBeLessThanOrEqual(Date.parse(to));
    }
  });
});
