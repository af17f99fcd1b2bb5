import { describe, expect, it } from 'vitest';
import { certaintyTitle } from '../../../../src/output/report/certainty-chapter.js';
import { leadOf } from '../../../../src/output/report/lead.js';
import { findingOf, residualTitle, spreadWords } from '../../../../src/output/report/residual-words.js';
import { listed } from '../../../../src/output/report/season-words.js';
import { surenessByKind } from '../../../../src/output/report/sureness.js';
import { aForecast, aSite, soloEvent } from '../../../fixtures/events.js';
import { aReport, aResidualSeries } from '../../../fixtures/report.js';

const known = (seconds: number) => ({ uncertaintySeconds: { tt: seconds, utc: seconds } });

describe('the words of the report', () => {
  it('list names', () => {
    expect([[], ['a'], ['a', 'b'], ['a', 'b', 'c']].map(listed)).toEqual(['', 'a', 'a and b', 'a, b and c']);
  });

  it('say what the report covers, to the last day that is in it', () => {
    const sites = [aSite(), aSite({ id: 'b', name: 'B' }), aSite({ id: 'c', name: 'C' })];
    expect(leadOf(aReport({ sites }))).toBe(
      'Mars, Venus and Jupiter from 1 January 2027 to 1 January 2029, as seen from Hill Observatory, with B and C beside it: 3 events, the moments of 1 meeting among them.',
    );
    expect(leadOf(aReport({ sites: [], forecast: aForecast([soloEvent()]) }))).toBe(
      'Mars, Venus and Jupiter from 1 January 2027 to 31 December 2028, as seen from the Earth’s centre: 1 event.',
    );
  });

  it('tell the misses of the first estimates in the unit that fits', () => {
    const series = aResidualSeries([
      [26, 1.5],
      [-3, 0.01],
    ]);
    expect(residualTitle(series)).toBe(
      'Mars, opposition: the mean cycle is off by up to 26 days, the Kepler orbits by 36 hours',
    );
    expect(findingOf(series)).toBe(
      'Mars, opposition: the mean cycle misses by 19 days rms and 26 days at worst; the Kepler orbits miss by 25 hours rms and 36 hours at worst.',
    );
    expect(spreadWords(aResidualSeries([[0.05, 0]]).mean)).toBe('72 min, 72 min');
    expect(spreadWords(null)).toBe('–');
  });

  it('say where there is no mean cycle', () => {
    const series = aResidualSeries([[null, 0.2]]);
    expect(residualTitle(series)).toBe('Mars, opposition: the Kepler orbits are off by up to 5 hours');
    expect(findingOf(series)).toContain('there is no mean cycle; the Kepler orbits miss by 5 hours rms');
  });

  it('count the dates that are sure', () => {
    expect(certaintyTitle([soloEvent(known(900)), soloEvent(known(901))])).toBe(
      '1 of 2 instants are known to a quarter of an hour or better',
    );
    expect(certaintyTitle([soloEvent(known(60))])).toBe(
      'Every instant is known to a quarter of an hour or better',
    );
  });

  it('put the surest kinds first, with their range', () => {
    const events = [30, 10, 20].map((seconds) => soloEvent(known(seconds)));
    expect(surenessByKind([soloEvent({ kind: 'aphelion', ...known(5) }), ...events])).toEqual([
      { kind: 'aphelion', count: 1, bestSeconds: 5, middleSeconds: 5, worstSeconds: 5 },
      { kind: 'opposition', count: 3, bestSeconds: 10, middleSeconds: 20, worstSeconds: 30 },
    ]);
  });
});
