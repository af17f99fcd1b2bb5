import { describe, expect, it } from 'vitest';
import { planets, skyPlanets } from '../../../src/bodies/index.js';
import type { SkyPlanet } from '../../../src/bodies/index.js';
import {
  PeriodError,
  anomalisticCycle,
  heliocentricCycle,
  meanElements,
  pairCycle,
  sunCycle,
} from '../../../src/cycles/index.js';
import type { MeanCycle, SunConfiguration } from '../../../src/cycles/index.js';
import { anomalisticCycles, heliocentricCycles, sunCycles } from './frozen-cycles.js';

/** Half a unit of the sixth digit: 0.04 s. */
const DIGITS = 6;

function expectFrozen({ epoch, periodDays }: MeanCycle, frozenEpoch: number, frozenPeriod: number): void {
  expect(epoch).toBeCloseTo(frozenEpoch, DIGITS);
  expect(periodDays).toBeCloseTo(frozenPeriod, DIGITS);
}

describe('frozen cycles', () => {
  it.each(skyPlanets)('%s with the Sun', (planet) => {
    const { epochs, periodDays } = sunCycles[planet];
    const entries = Object.entries(epochs) as [SunConfiguration, number][];
    expect(entries).toHaveLength(planet === 'mercury' || planet === 'venus' ? 10 : 8);
    for (const [configuration, epoch] of entries) {
      expectFrozen(sunCycle(planet, configuration), epoch, periodDays);
    }
  });

  it.each(planets)('%s at perihelion and aphelion', (planet) => {
    const [perihelion, aphelion, periodDays] = anomalisticCycles[planet];
    expectFrozen(anomalisticCycle(planet, 'perihelion'), perihelion, periodDays);
    expectFrozen(anomalisticCycle(planet, 'aphelion'), aphelion, periodDays);
  });

  it('every pair as seen from the Sun, in whichever order it is named', () => {
    expect(heliocentricCycles).toHaveLength((planets.length * (planets.length - 1)) / 2);
    for (const [a, b, conjunction, opposition, periodDays] of heliocentricCycles) {
      expectFrozen(heliocentricCycle(a, b, 'conjunction'), conjunction, periodDays);
      expectFrozen(heliocentricCycle(a, b, 'opposition'), opposition, periodDays);
      expect(heliocentricCycle(b, a, 'conjunction')).toEqual(heliocentricCycle(a, b, 'conjunction'));
    }
  });

  it('cycle 0 is the one nearest J2000.0', () => {
    for (const planet of skyPlanets) {
      for (const epoch of Object.values(sunCycles[planet].epochs)) {
        expect(Math.abs(epoch)).toBeLessThanOrEqual(sunCycles[planet].periodDays / 2);
      }
    }
  });
});

/**
 * Where the Sun and a planet stand as seen from the Earth at a mean instant, on circular and coplanar orbits of the
 * planet's and the Earth's semi-major axis: worked out on vectors, without the formulae under test.
 */
function circularSky(planet: SkyPlanet, configuration: SunConfiguration, laterDays = 0) {
  const at = (name: SkyPlanet | 'earth') => {
    const { meanLongitudeDeg, a } = meanElements['table-1'][name];
    const days = sunCycle(planet, configuration).epoch + laterDays;
    const angle = ((meanLongitudeDeg[0] + (meanLongitudeDeg[1] / 36525) * days) * Math.PI) / 180;
    const radius = name === 'earth' ? 1 : a[0];
    return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
  };
  const [body, earth] = [at(planet), at('earth')];
  const [x, y] = [body.x - earth.x, body.y - earth.y];
  const distance = Math.hypot(x, y);
  const sine = (-earth.x * y - -earth.y * x) / distance;
  const cosine = (-earth.x * x - earth.y * y) / distance;
  return {
    elongationEastDeg: (Math.atan2(sine, cosine) * 180) / Math.PI,
    longitude: Math.atan2(y, x),
    distance,
  };
}

describe('circular first estimates', () => {
  const outer = skyPlanets.filter((planet) => planet !== 'mercury' && planet !== 'venus');
  const east = (planet: SkyPlanet, configuration: SunConfiguration) =>
    circularSky(planet, configuration).elongationEastDeg;

  it('an outer planet in quadrature stands 90° from the Sun, on its own side', () => {
    for (const planet of outer) {
      expect(east(planet, 'east-quadrature')).toBeCloseTo(90, 6);
      expect(east(planet, 'west-quadrature')).toBeCloseTo(-90, 6);
    }
  });

  it('opposition is 180° from the Sun, conjunctions 0°', () => {
    for (const planet of outer) {
      expect(Math.abs(east(planet, 'opposition'))).toBeCloseTo(180, 6);
      expect(east(planet, 'conjunction')).toBeCloseTo(0, 6);
    }
    for (const planet of ['mercury', 'venus'] as const) {
      expect(east(planet, 'inferior-conjunction')).toBeCloseTo(0, 6);
      expect(east(planet, 'superior-conjunction')).toBeCloseTo(0, 6);
      expect(circularSky(planet, 'inferior-conjunction').distance).toBeLessThan(1);
      expect(circularSky(planet, 'superior-conjunction').distance).toBeGreaterThan(1);
    }
  });

  it.each([
    ['mercury', 22.8],
    ['venus', 46.3],
  ] as const)('%s goes no farther from the Sun than %f° (common practice)', (planet, deg) => {
    for (const side of ['east', 'west'] as const) {
      const greatest = east(planet, `greatest-elongation-${side}`);
      expect(Math.sign(greatest)).toBe(side === 'east' ? 1 : -1);
      expect(Math.abs(greatest)).toBeCloseTo(deg, 1);
      for (const days of [-1, 1]) {
        const beside = circularSky(planet, `greatest-elongation-${side}`, days).elongationEastDeg;
        expect(Math.abs(beside)).toBeLessThan(Math.abs(greatest));
      }
    }
  });

  it('a planet stands still at its stations, and turns in the sense that they are named for', () => {
    for (const planet of skyPlanets) {
      for (const [configuration, sense] of [
        ['stationary-retrograde', -1],
        ['stationary-direct', 1],
      ] as const) {
        const [before, at, after] = [-1, 0, 1].map(
          (days) => circularSky(planet, configuration, days).longitude,
        );
        const [moved, moves] = [wrap(at! - before!), wrap(after! - at!)];
        expect(Math.sign(moved)).toBe(-sense);
        expect(Math.sign(moves)).toBe(sense);
        // What the day before and the day after do not cancel is twice the days by which the turn is off. It may be off
        // by 0.05 d: the formula takes Kepler's third law for exact, the printed elements keep it to 1e-3 (Uranus).
        expect(Math.abs(moved + moves)).toBeLessThan(2 * 0.05 * (Math.abs(moved) + Math.abs(moves)));
      }
    }
  });

  it('Venus is brightest at an elongation of 39.7°, a quarter lit, 36 days from inferior conjunction (common practice)', () => {
    const inferior = sunCycle('venus', 'inferior-conjunction').epoch;
    expect(east('venus', 'greatest-brilliancy-evening')).toBeCloseTo(39.7, 1);
    expect(east('venus', 'greatest-brilliancy-morning')).toBeCloseTo(-39.7, 1);
    expect(inferior - sunCycle('venus', 'greatest-brilliancy-evening').epoch).toBeCloseTo(36.2, 1);
    const { distance } = circularSky('venus', 'greatest-brilliancy-evening');
    const lit = ((distance + 0.72333566) ** 2 - 1) / (4 * distance * 0.72333566);
    expect(lit).toBeCloseTo(0.266, 2);
  });

  it.each([
    [
      'venus',
      'opposition',
      /venus never comes to opposition: only planets on outer orbits do, and its is inner/,
    ],
    ['mercury', 'west-quadrature', /mercury never comes to west-quadrature/],
    [
      'mars',
      'greatest-elongation-east',
      /mars never comes to greatest-elongation-east: only planets on inner orbits/,
    ],
    ['jupiter', 'greatest-brilliancy-evening', /jupiter never comes to greatest-brilliancy-evening/],
  ] as const)('%s never comes to %s', (planet, configuration, message) => {
    expect(() => sunCycle(planet, configuration)).toThrow(PeriodError);
    expect(() => sunCycle(planet, configuration)).toThrow(message);
  });
});

const wrap = (angle: number): number => angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI));

describe('cycles of pairs in the sky', () => {
  it('two outer planets follow their own', () => {
    expect(pairCycle('jupiter', 'saturn')).toEqual({
      cycle: heliocentricCycle('jupiter', 'saturn', 'conjunction'),
      follows: 'own',
      meanIsEstimate: true,
    });
  });

  it('an inner planet with an outer one follows the outer one and the Sun, opposition to opposition', () => {
    expect(pairCycle('venus', 'mars')).toEqual({
      cycle: sunCycle('mars', 'conjunction'),
      follows: 'sun-outer',
      meanIsEstimate: false,
    });
  });

  it('Mercury with Venus follows Mercury and the Sun', () => {
    expect(pairCycle('mercury', 'venus')).toEqual({
      cycle: sunCycle('mercury', 'inferior-conjunction'),
      follows: 'sun-mercury',
      meanIsEstimate: false,
    });
  });

  it('does not care which is named first', () => {
    for (const a of skyPlanets) {
      for (const b of skyPlanets.filter((planet) => planet !== a)) {
        expect(pairCycle(a, b)).toEqual(pairCycle(b, a));
      }
    }
  });

  it('needs two', () => {
    expect(() => pairCycle('mars', 'mars')).toThrow(/mars twice: a meeting is between two different planets/);
    expect(() => heliocentricCycle('earth', 'earth', 'conjunction')).toThrow(/earth twice/);
  });
});
