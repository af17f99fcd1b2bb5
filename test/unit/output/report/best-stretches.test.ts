import { describe, expect, it } from 'vitest';
import { bestStretches } from '../../../../src/output/report/best-stretches.js';
import { seasonTitle, stretchWords } from '../../../../src/output/report/season-words.js';
import { at } from '../../../fixtures/events.js';
import { aSeason } from '../../../fixtures/report.js';

const told = (hours: Parameters<typeof aSeason>[0]): string[] =>
  bestStretches(aSeason(hours)).map((best) => stretchWords(best, 'UTC'));

describe('when a planet is at its best', () => {
  it('is while it shows for four fifths of its longest', () => {
    // 10 h at most, so 8 h and more: the second sample (5 January) to the fourth (13 January).
    expect(
      told([
        ['dawn', 0, 7.9],
        ['full', 4, 4],
        ['full', 5, 5],
        ['full', 5, 3.1],
        ['dusk', 6, 0],
        ['sun', 0, 0],
      ]),
    ).toEqual(['from 5 Jan to 13 Jan 2027']);
  });

  it('is told for each apparition that comes near the best of the span', () => {
    expect(
      told([
        ['sun', 0, 0],
        ['dusk', 3, 0],
        ['sun', 0, 0],
        ['dawn', 0, 1.7],
        ['none', 0, 0],
        ['dawn', 0, 1.9],
        ['sun', 0, 0],
      ]),
    ).toEqual(['around 5 Jan 2027', 'around 21 Jan 2027']);
  });

  it('says where it began before the span or lasts beyond it', () => {
    expect(
      told([
        ['full', 5, 5],
        ['dusk', 3, 0],
        ['sun', 0, 0],
        ['dawn', 0, 9],
      ]),
    ).toEqual(['until 1 Jan 2027', 'from 13 Jan 2027 on']);
    expect(
      told([
        ['full', 5, 5],
        ['full', 5, 5],
      ]),
    ).toEqual(['all the time']);
  });

  it('is never for a planet that does not show', () => {
    expect(
      told([
        ['sun', 2, 0],
        ['none', 0, 0],
      ]),
    ).toEqual([]);
    expect(told([])).toEqual([]);
  });

  it('names both years of a stretch over New Year', () => {
    const [best] = bestStretches(
      aSeason([
        ['sun', 0, 0],
        ['full', 5, 5],
        ['full', 5, 5],
        ['sun', 0, 0],
      ]),
    );
    const earlier = { ...best!, from: { ...best!.from, utc: at('2026-12-20T00:00:00Z') } };
    expect(stretchWords(earlier, 'UTC')).toBe('from 20 Dec 2026 to 9 Jan 2027');
  });
});

describe('the title of the season', () => {
  const late = Array.from({ length: 12 }, () => ['sun', 0, 0] as const);
  const mars = aSeason([
    ['sun', 0, 0],
    ['full', 5, 5],
    ['sun', 0, 0],
  ]);
  const jupiter = { ...mars, body: 'jupiter' as const };
  const saturn = aSeason([...late, ['full', 5, 5], ['sun', 0, 0]], { body: 'saturn' });
  const mercury = { ...mars, body: 'mercury' as const };

  it('says the finding, months together, years once', () => {
    const bests = [mercury, mars, jupiter, saturn].flatMap(bestStretches);
    expect(seasonTitle(bests, 'UTC')).toBe(
      'Mars and Jupiter are at their best in January 2027, Saturn in February',
    );
    expect(seasonTitle(bestStretches(saturn), 'UTC')).toBe('Saturn is at its best in February 2027');
  });

  it('names what is to come before what had begun', () => {
    const venus = aSeason([['dawn', 0, 3], ...late, ['dusk', 3, 0], ['sun', 0, 0]], { body: 'venus' });
    expect(seasonTitle(bestStretches(venus), 'UTC')).toBe('Venus is at its best in February 2027');
  });

  it('has words where there is no finding', () => {
    expect(seasonTitle([], 'UTC')).toBe('The season of each planet');
  });
});
