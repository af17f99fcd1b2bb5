import { describe, expect, it } from 'vitest';
import { kindNames } from '../../../src/forecast/index.js';
import {
  bodiesWords,
  circumstancesLine,
  kindTitles,
  leastElongationDeg,
  seriesWords,
  summaryOf,
} from '../../../src/output/index.js';
import { heliocentricEvent, pairEvent, soloEvent } from '../../fixtures/events.js';

describe('the name of an event', () => {
  it('has a title for every kind, each its own', () => {
    expect(new Set(kindNames.map((kind) => kindTitles[kind])).size).toBe(kindNames.length);
  });

  it('says one planet’s event in one line', () => {
    expect(summaryOf(soloEvent())).toBe('Mars at opposition');
    expect(
      summaryOf(soloEvent({ kind: 'greatest-elongation-east' }, { body: 'mercury', elongationDeg: 18.149 })),
    ).toBe('Mercury at greatest elongation east, 18.1°');
    expect(summaryOf(soloEvent({ kind: 'closest-approach' }))).toBe('Mars closest to the Earth, 0.678 au');
    expect(summaryOf(soloEvent({ kind: 'stationary-direct' }))).toBe('Mars stationary, direct motion begins');
  });

  it('says where the first of two stands as seen from the second', () => {
    // The position angle is of the second from the first: south of Venus is Jupiter, so Venus is north of it.
    expect(summaryOf(pairEvent({}, { positionAngleDeg: 180 }))).toBe(
      'Venus 24′ north of Jupiter, conjunction in right ascension',
    );
    expect(summaryOf(pairEvent({ kind: 'appulse' }, { positionAngleDeg: 90, separationDeg: 1.23 }))).toBe(
      'Venus 1.2° west of Jupiter, least separation',
    );
  });

  it('names both bodies of a heliocentric event', () => {
    expect(summaryOf(heliocentricEvent())).toBe('Earth and Mars, heliocentric conjunction');
    expect(bodiesWords(heliocentricEvent())).toBe('Earth and Mars');
  });

  it('tells what is true of it in one line', () => {
    expect(circumstancesLine(soloEvent())).toBe('Leo, 13.8″, mag −1.2, 0.678 au');
    expect(circumstancesLine(soloEvent({}, { magnitude: null }))).toBe('Leo, 13.8″, 0.678 au');
    expect(circumstancesLine(pairEvent())).toBe('Leo, 24′ apart, 30° from the Sun');
    expect(circumstancesLine(heliocentricEvent())).toBe('heliocentric longitude 150.8°');
  });

  it('counts only where a cycle has several', () => {
    expect(seriesWords(soloEvent())).toBeNull();
    expect(seriesWords(pairEvent({ series: { index: 1, of: 3 } }))).toBe('1 of 3');
  });

  it('takes the nearer of two to the Sun, and none for what the Earth does not see', () => {
    expect(leastElongationDeg(pairEvent({}, { elongationDeg: 12 }))).toBe(12);
    expect(leastElongationDeg(heliocentricEvent())).toBeNull();
  });
});
