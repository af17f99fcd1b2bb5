import { describe, expect, it } from 'vitest';
import { seasonsOf } from '../../../src/forecast/index.js';
import type { SeasonSample } from '../../../src/forecast/index.js';
import { aSite, at } from '../../fixtures/events.js';

const span = { from: at('2027-01-01T00:00:00Z'), to: at('2028-01-01T00:00:00Z') };
const nearest = (samples: readonly SeasonSample[], iso: string): SeasonSample =>
  samples.reduce((best, sample) =>
    Math.abs(sample.utc - at(iso)) < Math.abs(best.utc - at(iso)) ? sample : best,
  );

describe('seasons without a site', () => {
  const [venus, mars] = seasonsOf({ ...span, bodies: ['venus', 'mars'] });

  it('are sampled every four days, both ends included', () => {
    expect(mars!.samples[0]!.utc).toBe(span.from);
    // A day of TT is a day of UTC here but for the rounding of milliseconds.
    expect(mars!.samples.at(-1)!.utc).toBeCloseTo(span.to, -1);
    expect(mars!.samples).toHaveLength(93);
    expect(mars!.samples[1]!.utc - mars!.samples[0]!.utc).toBeCloseTo(4 * 86_400_000, -1);
  });

  it('have Mars up all night at its opposition of 19 February 2027, half of it on either side', () => {
    const { state, eveningHours, morningHours, elongationDeg, darkHours } = nearest(
      mars!.samples,
      '2027-02-19T16:00:00Z',
    );
    expect(state).toBe('full');
    expect(Math.abs(elongationDeg)).toBeGreaterThan(170);
    // Mars stands some 4.5° off the ecliptic and the sample up to two days off, so not quite twelve hours.
    expect(eveningHours + morningHours).toBeGreaterThan(11.3);
    expect(Math.min(eveningHours, morningHours)).toBeGreaterThan(5.3);
    expect(darkHours).toBeNull();
  });

  it('have Venus in the morning sky, then too near the Sun, then in the evening sky', () => {
    const states = ['2027-01-03', '2027-08-12', '2027-12-20'].map(
      (date) => nearest(venus!.samples, `${date}T00:00:00Z`).state,
    );
    expect(states).toEqual(['dawn', 'sun', 'dusk']);
    const january = nearest(venus!.samples, '2027-01-03T00:00:00Z');
    expect(january.elongationDeg).toBeLessThan(-46);
    expect([january.eveningHours, january.morningHours]).toEqual([0, -january.elongationDeg / 15]);
  });
});

describe('seasons at a site', () => {
  const site = aSite();
  const bodies = ['venus', 'mars', 'neptune'] as const;
  const seasons = seasonsOf({ ...span, bodies, site });

  it('count the hours of both halves of the night, never more than the night has', () => {
    for (const { samples } of seasons) {
      for (const { darkHours, eveningHours, morningHours } of samples) {
        expect(darkHours).toBe(eveningHours + morningHours);
        // The longest night of 48.2° N, from the end of civil twilight to its beginning, has less than 15 hours.
        expect(darkHours).toBeLessThan(15);
      }
    }
  });

  it('see less of a planet behind a hill', () => {
    const hill = aSite({ horizon: [{ azimuthDeg: 0, altitudeDeg: 40 }] });
    const behind = seasonsOf({ ...span, bodies, site: hill });
    const sum = (samples: readonly SeasonSample[]) => samples.reduce((hours, s) => hours + s.darkHours!, 0);
    seasons.forEach(({ samples }, i) => {
      expect(sum(behind[i]!.samples)).toBeLessThan(sum(samples) / 2);
    });
  });

  it('have no dark hours where the Sun does not set', () => {
    const [mars] = seasonsOf({
      from: at('2027-06-10T00:00:00Z'),
      to: at('2027-07-01T00:00:00Z'),
      bodies: ['mars'],
      site: aSite({ latitudeDeg: 78 }),
    });
    expect(mars!.samples.map(({ state, darkHours }) => [state, darkHours])).toEqual(
      mars!.samples.map(() => ['none', 0]),
    );
  });
});
