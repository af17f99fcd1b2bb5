import { describe, expect, it } from 'vitest';
import { closenessOf } from '../../../../src/forecast/circumstances/index.js';
import type { Approach } from '../../../../src/forecast/circumstances/index.js';
import { ttFromUtc, utcMillis } from '../../../../src/time/index.js';

const on = (date: string): Approach['tt'] => ttFromUtc(utcMillis(Date.parse(`${date}T00:00:00Z`)));

/** Closest approaches of Mars, date and au. Source: the JPL ephemerides as quoted everywhere, *from memory*. */
const mars: readonly Approach[] = (
  [
    ['2001-06-21', 0.45017],
    ['2003-08-27', 0.37272],
    ['2005-10-30', 0.46406],
    ['2007-12-18', 0.58935],
    ['2010-01-27', 0.66398],
    ['2012-03-05', 0.67368],
    ['2014-04-14', 0.61756],
    ['2016-05-30', 0.50321],
    ['2018-07-31', 0.38496],
    ['2020-10-06', 0.41492],
    ['2022-12-01', 0.54447],
    ['2025-01-12', 0.64228],
    ['2027-02-20', 0.67792],
    ['2029-03-29', 0.64722],
    ['2031-05-12', 0.55336],
    ['2033-07-05', 0.42302],
    ['2035-09-11', 0.38041],
    ['2037-11-11', 0.49358],
  ] as const
).map(([date, distanceAu]) => ({ tt: on(date), distanceAu }));
const of = (year: number): Approach =>
  mars.find(({ tt }) => Math.floor(2000 + tt / 365.2425) === year) ?? mars[0]!;

describe('how near an approach comes among its neighbours', () => {
  it.each([
    // Nearer ones on both sides.
    [2018, 'the closest since 2003 and until 2035'],
    [2020, 'the closest since 2018 and until 2035'],
    [2033, 'the closest since 2020 and until 2035'],
    [2016, 'the closest since 2005 and until 2018'],
    // The record of the list.
    [2003, 'the closest of all from 2001 to 2037'],
    [2027, 'the most distant of all from 2001 to 2037'],
    // Unbeaten on one side of the list.
    [2035, 'the closest since 2003 and until at least 2037'],
    [2012, 'the most distant since at least 2001 and until 2027'],
    // Neither near nor far: what outdoes more neighbours is told.
    [2025, 'the most distant since 2012 and until 2027'],
    [2029, 'the most distant since 2027 and until at least 2037'],
  ])('%i: %s', (year, phrase) => {
    expect(closenessOf(of(year), mars).phrase).toBe(phrase);
  });

  it('ranks from the nearest, and says over which years', () => {
    expect(closenessOf(of(2003), mars)).toMatchObject({ rank: 1, of: 18, yearFrom: 2001, yearTo: 2037 });
    expect(closenessOf(of(2035), mars).rank).toBe(2);
    expect(closenessOf(of(2027), mars).rank).toBe(18);
  });

  it('says the same of a target that is not in the list', () => {
    const others = mars.filter((approach) => approach !== of(2018));
    expect(closenessOf(of(2018), others)).toEqual(closenessOf(of(2018), mars));
  });

  it('takes the calendar year of an approach at the turn of the year', () => {
    const list = ['1998-01-01', '2000-01-01', '2001-12-31'].map((date, i) => ({
      tt: on(date),
      distanceAu: [0.4, 0.5, 0.4][i]!,
    }));
    expect(closenessOf(list[1]!, list)).toMatchObject({ yearFrom: 1998, yearTo: 2001, rank: 3 });
  });

  it('does not call the middle of three the closest when both others are nearer', () => {
    const list = ['1998-06-01', '2000-06-01', '2002-06-01'].map((date, i) => ({
      tt: on(date),
      distanceAu: [0.4, 0.5, 0.4][i]!,
    }));
    expect(closenessOf(list[1]!, list).phrase).toBe('the most distant of all from 1998 to 2002');
  });

  it('compares one alone with itself', () => {
    expect(closenessOf(of(2018), [])).toMatchObject({ rank: 1, of: 1, yearFrom: 2018, yearTo: 2018 });
  });
});
