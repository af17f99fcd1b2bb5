import { isInner } from '../bodies/index.js';
import type { SkyPlanet } from '../bodies/index.js';
import { degreesFromRadians } from '../math/index.js';
import { numberingElements } from './elements.js';
import { leadCycle } from './heliocentric-cycle.js';
import type { MeanCycle } from './mean-cycle.js';
import { PeriodError } from './period.js';

/** The configurations of a planet with the Sun that a mean cycle dates. */
export type SunConfiguration =
  | 'opposition'
  | 'conjunction'
  | 'inferior-conjunction'
  | 'superior-conjunction'
  | 'east-quadrature'
  | 'west-quadrature'
  | 'greatest-elongation-east'
  | 'greatest-elongation-west'
  | 'stationary-retrograde'
  | 'stationary-direct'
  | 'closest-approach'
  | 'farthest'
  | 'greatest-brilliancy-evening'
  | 'greatest-brilliancy-morning';

interface Configuration {
  /** The planets that come to it: those inside the Earth's orbit, those outside, or all. */
  readonly of: 'inner' | 'outer' | 'all';
  /**
   * How far, in degrees, the faster of Earth and planet is then ahead of the slower, on circular and coplanar orbits of
   * radius 1 and `a`. At 0 the planet is nearest: in opposition, or in inferior conjunction.
   */
  readonly leadDeg: (a: number) => number;
}

/**
 * Sources: quadrature cos θ = 1/a and greatest elongation cos θ = a (where sin ε = a) by plane trigonometry; stations
 * cos θ = √a / (a − √a + 1), Smart, Textbook on Spherical Astronomy, 6th ed. (1977), ch. V; greatest brilliancy from
 * the distance √(3R² + r²) − 2r, Halley, Phil. Trans. 29 (1716) 466.
 */
const configurations: Readonly<Record<SunConfiguration, Configuration>> = {
  opposition: { of: 'outer', leadDeg: () => 0 },
  conjunction: { of: 'outer', leadDeg: () => 180 },
  'inferior-conjunction': { of: 'inner', leadDeg: () => 0 },
  'superior-conjunction': { of: 'inner', leadDeg: () => 180 },
  'east-quadrature': { of: 'outer', leadDeg: (a) => arcCosineDeg(1 / a) },
  'west-quadrature': { of: 'outer', leadDeg: (a) => -arcCosineDeg(1 / a) },
  'greatest-elongation-east': { of: 'inner', leadDeg: (a) => -arcCosineDeg(a) },
  'greatest-elongation-west': { of: 'inner', leadDeg: (a) => arcCosineDeg(a) },
  'stationary-retrograde': { of: 'all', leadDeg: (a) => -stationDeg(a) },
  'stationary-direct': { of: 'all', leadDeg: (a) => stationDeg(a) },
  'closest-approach': { of: 'all', leadDeg: () => 0 },
  farthest: { of: 'all', leadDeg: () => 180 },
  'greatest-brilliancy-evening': { of: 'inner', leadDeg: (a) => -brilliancyDeg(a) },
  'greatest-brilliancy-morning': { of: 'inner', leadDeg: (a) => brilliancyDeg(a) },
};

const arcCosineDeg = (cosine: number): number => degreesFromRadians(Math.acos(cosine));

const stationDeg = (a: number): number => arcCosineDeg(Math.sqrt(a) / (a - Math.sqrt(a) + 1));

function brilliancyDeg(a: number): number {
  const distance = Math.sqrt(3 + a * a) - 2 * a;
  return arcCosineDeg((1 + a * a - distance * distance) / (2 * a));
}

/**
 * The mean cycle of a planet's configurations with the Sun. Throws PeriodError for one that the planet never comes to.
 */
export function sunCycle(planet: SkyPlanet, name: SunConfiguration): MeanCycle {
  const { of, leadDeg } = configurations[name];
  const orbit = isInner(planet) ? 'inner' : 'outer';
  if (of !== 'all' && of !== orbit) {
    throw new PeriodError(
      `${planet} never comes to ${name}: only planets on ${of} orbits do, and its is ${orbit}`,
    );
  }
  const lead = leadDeg(numberingElements[planet].a[0]);
  return orbit === 'inner' ? leadCycle(planet, 'earth', lead) : leadCycle('earth', planet, lead);
}
