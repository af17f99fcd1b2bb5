import { describe, expect, it } from 'vitest';
import {
  PLANET_RISE_ALTITUDE_DEG,
  SUN_RISE_ALTITUDE_DEG,
  dayArc,
  meridianTransits,
} from '../../../src/sky/index.js';
import { ttDays } from '../../../src/time/index.js';
import { skyAt, ttOf } from './sky-over.js';

describe('dayArc', () => {
  const noon = ttOf('2027-02-19T12:00:00Z');
  const vienna = skyAt(48.2, 16.3);

  it('has crossings on the threshold itself', () => {
    for (const { tt } of dayArc(vienna, 'mars', noon, ttDays(noon + 1)).crossings(PLANET_RISE_ALTITUDE_DEG)) {
      expect(vienna.horizontal('mars', tt).altitudeDeg).toBeCloseTo(PLANET_RISE_ALTITUDE_DEG, 4);
    }
  });

  it('knows a body that never sets and one that never rises', () => {
    const [tromso, january, june] = [
      skyAt(69.6, 18.9),
      ttOf('2027-01-01T12:00:00Z'),
      ttOf('2027-06-21T12:00:00Z'),
    ];
    const winter = dayArc(tromso, 'sun', january, ttDays(january + 1));
    const summer = dayArc(tromso, 'sun', june, ttDays(june + 1));
    expect(winter.crossings(SUN_RISE_ALTITUDE_DEG)).toEqual([]);
    expect(winter.stretchesBelow(SUN_RISE_ALTITUDE_DEG)).toEqual([{ from: january, to: january + 1 }]);
    expect(summer.crossings(SUN_RISE_ALTITUDE_DEG)).toEqual([]);
    expect(summer.stretchesBelow(SUN_RISE_ALTITUDE_DEG)).toEqual([]);
    expect(summer.transits).toHaveLength(1);
  });

  it('finds both transits of a day that holds two', () => {
    // Four minutes earlier each day: a transit just after the start comes again just before the end.
    const [first] = meridianTransits(vienna, 'neptune', noon, ttDays(noon + 1), 'upper');
    const from = ttDays(first! - 60 / 86_400);
    const { transits } = dayArc(vienna, 'neptune', from, ttDays(from + 1));
    expect(transits).toHaveLength(2);
    expect((transits[1]! - transits[0]!) * 86_400).toBeCloseTo(86_400 - 230, -2);
  });

  it('finds a Sun that is up for minutes only', () => {
    // The last sunrise before the polar night: Tromsø's neighbourhood on days of late November.
    const lengths: number[] = [];
    for (let day = 0; day < 12; day++) {
      const from = ttDays(ttOf('2027-11-20T00:00:00Z') + day);
      const crossings = dayArc(skyAt(69.6, 18.9), 'sun', from, ttDays(from + 1)).crossings(
        SUN_RISE_ALTITUDE_DEG,
      );
      if (crossings.length === 0) break;
      expect(crossings.map(({ is }) => is)).toEqual(['rise', 'set']);
      lengths.push((crossings[1]!.tt - crossings[0]!.tt) * 1440);
    }
    expect(lengths.length).toBeGreaterThan(5);
    expect(lengths.at(-1)).toBeLessThan(60);
    expect([...lengths].sort((a, b) => b - a)).toEqual(lengths);
  });

  it('divides the day into stretches below and above', () => {
    const arc = dayArc(vienna, 'sun', noon, ttDays(noon + 2));
    const below = arc.stretchesBelow(-6);
    expect(below).toHaveLength(2);
    expect(below.flatMap(({ from, to }) => [from, to])).toEqual(arc.crossings(-6).map(({ tt }) => tt));
    const middle = ttDays((below[0]!.from + below[0]!.to) / 2);
    expect(vienna.horizontal('sun', middle).altitudeDeg).toBeLessThan(-6);
  });
});
