import { isInner } from '../bodies/index.js';
import type { Body, Planet, SkyPlanet } from '../bodies/index.js';
import {
  anomalisticCycle,
  cycleNumberAt,
  heliocentricCycle,
  meanInstant,
  pairCycle,
  sunCycle,
} from '../cycles/index.js';
import type { MeanCycle, SunConfiguration } from '../cycles/index.js';
import { subtractMotions } from '../ephemeris/index.js';
import type { Frame } from '../ephemeris/index.js';
import { angleBetween, sphericalOf, wrapPi } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import type { Reckoning } from './event.js';
import type { KindName } from './kind-names.js';
import { brilliancyErrors, magnitudeSignal, phaseAngleOfVenusDeg } from './brilliancy.js';
import { distanceJet, longitudeDifference, separationJet, separationOf } from './signal.js';
import type { Signal, SkyModel } from './signal.js';
import {
  differenceErrors,
  distanceErrors,
  heliocentricDifferenceErrors,
  heliocentricDistanceErrors,
  ownLongitudeErrors,
  separationErrors,
} from './uncertainty.js';
import type { TrackedSky } from './tracked-sky.js';
import type { SignalErrors } from './uncertainty.js';

export type Subject = readonly [Planet] | readonly [Planet, Planet];

/** How an event's cycles are numbered, and whether their mean instants are estimates of its date. */
export interface Numbering {
  readonly cycle: MeanCycle;
  /** The mean estimate of cycle n, or null where the mean cycle numbers the event but does not date it. */
  readonly meanEstimate: (n: number, near: TtDays) => TtDays | null;
}

/**
 * A kind of event, as data: whom it is about, the signal that it is a zero or a turn of, and the cycle that numbers
 * it. One searcher serves all. To add a kind, add its name to `kind-names.ts` and an entry here.
 */
export interface Kind {
  readonly name: KindName;
  /** The subjects among the bodies asked for. */
  subjects(bodies: readonly Planet[]): Subject[];
  /** The coordinate it is reckoned in by default, and whether the user may ask for the other; null where it has none. */
  readonly reckoning: { readonly byDefault: Reckoning; readonly choice: boolean } | null;
  numbering(subject: Subject): Numbering;
  signal(sky: SkyModel, subject: Subject, reckoning: Reckoning): Signal;
  readonly sought: 'zero' | 'maximum' | 'minimum';
  /**
   * `one-a-cycle`: the signal is monotone, so go straight from the Kepler estimate. `one-turn-a-cycle`: it turns that
   * way once in each stretch (tried on every cycle of 1600–2600), so the turn needs no count. `all-in-cycle`: every
   * one of the cycle's stretch. `extreme-of-cycle`: the highest or deepest near the Kepler estimate, local ones being
   * wobble.
   */
  readonly search: 'one-a-cycle' | 'one-turn-a-cycle' | 'all-in-cycle' | 'extreme-of-cycle';
  /**
   * The signal's value on exact places, the Sun's deflection of light included, which has the last word on the
   * instant; null where the signal itself is exact or the difference does not matter.
   */
  readonly exactValue:
    ((sky: TrackedSky, subject: Subject, reckoning: Reckoning) => (tt: TtDays) => number) | null;
  /** Sampling step of a search. */
  stepDays(subject: Subject): number;
  /** Whether a zero or turn found is one of this kind. */
  accepts(sky: SkyModel, subject: Subject, tt: TtDays): boolean;
  /** Whether it is worth reporting; it keeps its place among its neighbours either way. */
  reports(sky: SkyModel, subject: Subject, tt: TtDays, limits: Limits): boolean;
  readonly errors: SignalErrors;
  readonly circumstances: 'one-body' | 'two-bodies' | 'heliocentric';
}

/** What the user may set. */
export interface Limits {
  /** Appulses: the largest separation reported, degrees. */
  readonly withinDeg: number;
}

const frameOf = (reckoning: Reckoning): Frame =>
  reckoning === 'longitude' ? 'ecliptic-of-date' : 'equator-of-date';

const always = (): boolean => true;

/** A zero of the difference of a planet's and the Sun's longitude or right ascension. */
function sunAlignment(
  name: KindName & SunConfiguration,
  applies: (p: Planet) => boolean,
  angleDeg: number,
): Kind {
  const target = (angleDeg * Math.PI) / 180;
  return {
    name,
    subjects: singles((planet) => planet !== 'earth' && applies(planet)),
    reckoning: { byDefault: 'longitude', choice: true },
    numbering: ([planet]) => datedBy(sunCycle(planet as SkyPlanet, name)),
    signal:
      (sky, [planet], reckoning) =>
      (tt) =>
        longitudeDifference(
          sky.longitude(planet, frameOf(reckoning), tt),
          sky.longitude('sun', frameOf(reckoning), tt),
          target,
        ),
    exactValue: exactDifference(target),
    sought: 'zero',
    search: 'one-a-cycle',
    stepDays: () => 4,
    accepts: always,
    reports: always,
    errors: differenceErrors,
    circumstances: 'one-body',
  };
}

function greatestElongation(side: 'east' | 'west'): Kind {
  const name = `greatest-elongation-${side}` as const;
  return {
    name,
    subjects: singles(isInner),
    reckoning: null,
    numbering: ([planet]) => datedBy(sunCycle(planet as SkyPlanet, name)),
    signal:
      (sky, [planet]) =>
      (tt) =>
        separationJet(
          sky.geocentric(planet, 'equator-of-date', tt),
          sky.geocentric('sun', 'equator-of-date', tt),
        ),
    sought: 'maximum',
    search: 'one-turn-a-cycle',
    exactValue: null,
    stepDays: loopStepDays,
    accepts: (sky, [planet], tt) => isEastOfSun(sky, planet, tt) === (side === 'east'),
    reports: always,
    errors: separationErrors,
    circumstances: 'one-body',
  };
}

function station(name: 'stationary-retrograde' | 'stationary-direct'): Kind {
  return {
    name,
    subjects: singles((planet) => planet !== 'earth'),
    reckoning: { byDefault: 'right-ascension', choice: true },
    numbering: ([planet]) => datedBy(sunCycle(planet as SkyPlanet, name)),
    signal:
      (sky, [planet], reckoning) =>
      (tt) =>
        sky.longitude(planet, frameOf(reckoning), tt),
    sought: name === 'stationary-retrograde' ? 'maximum' : 'minimum',
    search: 'one-turn-a-cycle',
    exactValue: null,
    stepDays: loopStepDays,
    accepts: always,
    reports: always,
    errors: ownLongitudeErrors,
    circumstances: 'one-body',
  };
}

function distanceExtreme(name: 'closest-approach' | 'farthest'): Kind {
  return {
    name,
    subjects: singles((planet) => planet !== 'earth'),
    reckoning: null,
    numbering: ([planet]) => datedBy(sunCycle(planet as SkyPlanet, name)),
    signal:
      (sky, [planet]) =>
      (tt) =>
        distanceJet(subtractMotions(sky.heliocentric(planet, tt), sky.heliocentric('earth', tt))),
    sought: name === 'closest-approach' ? 'minimum' : 'maximum',
    search: 'one-turn-a-cycle',
    exactValue: null,
    stepDays: loopStepDays,
    accepts: always,
    reports: always,
    errors: distanceErrors,
    circumstances: 'one-body',
  };
}

function apsis(name: 'perihelion' | 'aphelion'): Kind {
  return {
    name,
    subjects: singles((planet) => planet !== 'earth'),
    reckoning: null,
    numbering: ([planet]) => datedBy(anomalisticCycle(planet, name)),
    signal:
      (sky, [planet]) =>
      (tt) =>
        distanceJet(sky.heliocentric(planet, tt)),
    sought: name === 'perihelion' ? 'minimum' : 'maximum',
    search: 'extreme-of-cycle',
    exactValue: null,
    stepDays: ([planet]) => anomalisticCycle(planet, name).periodDays / 150,
    accepts: always,
    reports: always,
    errors: heliocentricDistanceErrors,
    circumstances: 'one-body',
  };
}

/** The formula for the magnitude of Venus turns again when the planet is a thread before the Sun; that is no event. */
const BRILLIANCY_PHASE_DEG = { from: 90, to: 150 };

const greatestBrilliancy: Kind = {
  name: 'greatest-brilliancy',
  subjects: singles((planet) => planet === 'venus'),
  reckoning: null,
  numbering: () => {
    const evening = sunCycle('venus', 'greatest-brilliancy-evening');
    const morning = sunCycle('venus', 'greatest-brilliancy-morning');
    return {
      cycle: sunCycle('venus', 'inferior-conjunction'),
      meanEstimate: (_n, near) => nearer(near, nearestMean(evening, near), nearestMean(morning, near)),
    };
  },
  signal: (sky) => magnitudeSignal(sky),
  sought: 'minimum',
  search: 'all-in-cycle',
  exactValue: null,
  stepDays: () => 4,
  accepts: (sky, _subject, tt) => {
    const phaseDeg = phaseAngleOfVenusDeg(sky, tt);
    return phaseDeg >= BRILLIANCY_PHASE_DEG.from && phaseDeg <= BRILLIANCY_PHASE_DEG.to;
  },
  reports: always,
  errors: brilliancyErrors,
  circumstances: 'one-body',
};

function conjunctionOfTwo(name: 'conjunction-ra' | 'conjunction-longitude'): Kind {
  const reckoning = name === 'conjunction-ra' ? 'right-ascension' : 'longitude';
  return {
    name,
    subjects: pairs((planet) => planet !== 'earth'),
    reckoning: { byDefault: reckoning, choice: false },
    numbering: pairNumbering,
    signal:
      (sky, [a, b]) =>
      (tt) =>
        longitudeDifference(
          sky.longitude(a, frameOf(reckoning), tt),
          sky.longitude(b!, frameOf(reckoning), tt),
          0,
        ),
    exactValue: exactDifference(0),
    sought: 'zero',
    search: 'all-in-cycle',
    stepDays: loopStepDays,
    accepts: always,
    reports: always,
    errors: differenceErrors,
    circumstances: 'two-bodies',
  };
}

const appulse: Kind = {
  name: 'appulse',
  subjects: pairs((planet) => planet !== 'earth'),
  reckoning: null,
  numbering: pairNumbering,
  signal:
    (sky, [a, b]) =>
    (tt) =>
      separationJet(sky.geocentric(a, 'equator-of-date', tt), sky.geocentric(b!, 'equator-of-date', tt)),
  exactValue:
    (sky, [a, b]) =>
    (tt) =>
      2 * Math.sin(angleBetween(sky.places.apparent(a, tt), sky.places.apparent(b!, tt)) / 2) ** 2,
  sought: 'minimum',
  search: 'all-in-cycle',
  stepDays: passStepDays,
  accepts: always,
  reports: (sky, [a, b], tt, { withinDeg }) => {
    const jet = separationJet(
      sky.geocentric(a, 'equator-of-date', tt),
      sky.geocentric(b!, 'equator-of-date', tt),
    );
    return (separationOf(jet.value) * 180) / Math.PI < withinDeg;
  },
  errors: separationErrors,
  circumstances: 'two-bodies',
};

function heliocentricAlignment(name: 'heliocentric-conjunction' | 'heliocentric-opposition'): Kind {
  const configuration = name === 'heliocentric-conjunction' ? 'conjunction' : 'opposition';
  const target = configuration === 'conjunction' ? 0 : Math.PI;
  return {
    name,
    subjects: pairs(always),
    reckoning: null,
    numbering: ([a, b]) => datedBy(heliocentricCycle(a, b!, configuration)),
    signal:
      (sky, [a, b]) =>
      (tt) =>
        longitudeDifference(sky.heliocentricLongitude(a, tt), sky.heliocentricLongitude(b!, tt), target),
    sought: 'zero',
    search: 'one-a-cycle',
    exactValue: null,
    stepDays: () => 4,
    accepts: always,
    reports: always,
    errors: heliocentricDifferenceErrors,
    circumstances: 'heliocentric',
  };
}

const isOuter = (planet: Planet): boolean => !isInner(planet);

export const kinds: readonly Kind[] = [
  sunAlignment('opposition', isOuter, 180),
  sunAlignment('conjunction', isOuter, 0),
  sunAlignment('inferior-conjunction', isInner, 0),
  sunAlignment('superior-conjunction', isInner, 0),
  sunAlignment('east-quadrature', isOuter, 90),
  sunAlignment('west-quadrature', isOuter, -90),
  greatestElongation('east'),
  greatestElongation('west'),
  station('stationary-retrograde'),
  station('stationary-direct'),
  distanceExtreme('closest-approach'),
  distanceExtreme('farthest'),
  apsis('perihelion'),
  apsis('aphelion'),
  greatestBrilliancy,
  conjunctionOfTwo('conjunction-ra'),
  conjunctionOfTwo('conjunction-longitude'),
  appulse,
  heliocentricAlignment('heliocentric-conjunction'),
  heliocentricAlignment('heliocentric-opposition'),
];

export const kindNamed = (name: KindName): Kind => kinds.find((kind) => kind.name === name)!;

/** The difference of two bodies' exact apparent longitudes (or a planet's and the Sun's) from a target, radians. */
function exactDifference(target: number): Kind['exactValue'] {
  return (sky, [a, b], reckoning) => {
    const frame = frameOf(reckoning);
    const longitude = (body: Body, tt: TtDays) => sphericalOf(sky.apparent(body, frame, tt)).longitude;
    return (tt) => wrapPi(longitude(a, tt) - longitude(b ?? 'sun', tt) - target);
  };
}

function singles(applies: (planet: Planet) => boolean): (bodies: readonly Planet[]) => Subject[] {
  return (bodies) => bodies.filter(applies).map((planet): Subject => [planet]);
}

function pairs(applies: (planet: Planet) => boolean): (bodies: readonly Planet[]) => Subject[] {
  return (bodies) => {
    const eligible = bodies.filter(applies);
    return eligible.flatMap((a, i) => eligible.slice(i + 1).map((b): Subject => [a, b]));
  };
}

function datedBy(cycle: MeanCycle): Numbering {
  return { cycle, meanEstimate: (n) => meanInstant(cycle, n) };
}

function pairNumbering([a, b]: Subject): Numbering {
  const { cycle, meanIsEstimate } = pairCycle(a as SkyPlanet, b as SkyPlanet);
  return { cycle, meanEstimate: (n) => (meanIsEstimate ? meanInstant(cycle, n) : null) };
}

/**
 * A fifth of the shortest loop that the subject makes in the sky: Mercury turns back for 20 days, Venus for 41, Mars
 * for 60, the rest for longer.
 */
function loopStepDays(subject: Subject): number {
  if (subject.includes('mercury')) return 4;
  return subject.includes('venus') ? 8 : 12;
}

/** A separation can rise and fall within half a loop. */
function passStepDays(subject: Subject): number {
  return subject.includes('mercury') ? 3 : loopStepDays(subject);
}

const nearestMean = (cycle: MeanCycle, tt: TtDays): TtDays => meanInstant(cycle, cycleNumberAt(cycle, tt));

function nearer(to: TtDays, a: TtDays, b: TtDays): TtDays {
  return Math.abs(a - to) <= Math.abs(b - to) ? a : b;
}

/** East: the body follows the Sun across the sky and stands in the evening. */
function isEastOfSun(sky: SkyModel, body: Body, tt: TtDays): boolean {
  const frame = 'ecliptic-of-date';
  return longitudeDifference(sky.longitude(body, frame, tt), sky.longitude('sun', frame, tt), 0).value > 0;
}
