import { isInner } from '../bodies/index.js';
import type { Planet, SkyPlanet } from '../bodies/index.js';
import { degreesFromRadians } from '../math/index.js';
import { centuryRatePerDay, meanElements } from './elements.js';
import { meanCycleOf } from './mean-cycle.js';
import type { MeanCycle } from './mean-cycle.js';

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

/** Cycles are numbered by Table 1 at every date, whatever else is used: its linear mean longitudes never change. */
const numbering = meanElements['table-1'];

/**
 * How far, in degrees, the faster of Earth and planet is ahead of the slower at a configuration, for circular and
 * coplanar orbits. At 0 the planet is nearest: in opposition, or in inferior conjunction.
 * Sources: quadrature cos θ = 1/a and greatest elongation cos θ = a by plane trigonometry; stations
 * cos θ = √a / (a − √a + 1), Smart, Textbook on Spherical Astronomy, 6th ed. (1977), ch. V; greatest brilliancy from
 * the distance √(3R² + r²) − 2r, Halley, Phil. Trans. 29 (1716) 466.
 */
const phaseDeg: Readonly<Record<SunConfiguration, (a: number) => number>> = {
  opposition: () => 0,
  conjunction: () => 180,
  'inferior-conjunction': () => 0,
  'superior-conjunction': () => 180,
  'east-quadrature': (a) => degreesFromRadians(Math.acos(1 / a)),
  'west-quadrature': (a) => -degreesFromRadians(Math.acos(1 / a)),
  'greatest-elongation-east': (a) => -degreesFromRadians(Math.acos(a)),
  'greatest-elongation-west': (a) => degreesFromRadians(Math.acos(a)),
  'stationary-retrograde': (a) => -stationDeg(a),
  'stationary-direct': (a) => stationDeg(a),
  'closest-approach': () => 0,
  farthest: () => 180,
  'greatest-brilliancy-evening': (a) => -brilliancyDeg(a),
  'greatest-brilliancy-morning': (a) => brilliancyDeg(a),
};

function stationDeg(a: number): number {
  return degreesFromRadians(Math.acos(Math.sqrt(a) / (a - Math.sqrt(a) + 1)));
}

function brilliancyDeg(a: number): number {
  const distance = Math.sqrt(3 + a * a) - 2 * a;
  return degreesFromRadians(Math.acos((1 + a * a - distance * distance) / (2 * a)));
}

/** The mean cycle of a planet's configurations with the Sun. */
export function sunCycle(planet: SkyPlanet, configuration: SunConfiguration): MeanCycle {
  const [faster, slower]: [Planet, Planet] = isInner(planet) ? [planet, 'earth'] : ['earth', planet];
  return leadCycle(faster, slower, phaseDeg[configuration](numbering[planet].a[0]));
}

/** The mean cycle of a planet's perihelia or aphelia, by its mean anomaly. */
export function anomalisticCycle(planet: Planet, apsis: 'perihelion' | 'aphelion'): MeanCycle {
  const { meanLongitudeDeg: longitude, perihelionLongitudeDeg: perihelion } = numbering[planet];
  return meanCycleOf(
    longitude[0] - perihelion[0],
    centuryRatePerDay(longitude[1] - perihelion[1]),
    apsis === 'perihelion' ? 0 : 180,
  );
}

/** The mean cycle in which two planets line up as seen from the Sun, on one side or on opposite ones. */
export function heliocentricCycle(
  a: Planet,
  b: Planet,
  configuration: 'conjunction' | 'opposition',
): MeanCycle {
  const [faster, slower] = rateOf(a) > rateOf(b) ? [a, b] : [b, a];
  return leadCycle(faster, slower, configuration === 'conjunction' ? 0 : 180);
}

/** The cycle that numbers the meetings of two planets in the Earth's sky. */
export interface PairCycle {
  readonly cycle: MeanCycle;
  readonly follows: 'own' | 'sun-outer' | 'sun-mercury';
  /** Whether the mean instant is an estimate of the date, or only a name for the cycle. */
  readonly meanIsEstimate: boolean;
}

/**
 * Two outer planets meet once or thrice in each of their own synodic cycles. An inner planet never leaves the Sun, so
 * it meets an outer one about when the Sun does, months early or late: the Sun's cycle numbers the meeting but does
 * not date it. Mercury and Venus have no cycle of their own; Mercury's with the Sun numbers them.
 */
export function pairCycle(a: SkyPlanet, b: SkyPlanet): PairCycle {
  const outer = [a, b].filter((planet) => !isInner(planet));
  if (outer.length === 2) {
    return { cycle: heliocentricCycle(a, b, 'conjunction'), follows: 'own', meanIsEstimate: true };
  }
  const [met] = outer;
  return met === undefined
    ? { cycle: sunCycle('mercury', 'inferior-conjunction'), follows: 'sun-mercury', meanIsEstimate: false }
    : { cycle: sunCycle(met, 'conjunction'), follows: 'sun-outer', meanIsEstimate: false };
}

const rateOf = (planet: Planet): number => numbering[planet].meanLongitudeDeg[1];

function leadCycle(faster: Planet, slower: Planet, targetDeg: number): MeanCycle {
  const [fast, slow] = [numbering[faster].meanLongitudeDeg, numbering[slower].meanLongitudeDeg];
  return meanCycleOf(fast[0] - slow[0], centuryRatePerDay(fast[1] - slow[1]), targetDeg);
}
