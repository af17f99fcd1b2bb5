import { AstroTime, Body } from 'astronomy-engine';
import { Snapshot } from './snapshot.js';

/**
 * The bench's baseline: what a capable user would write by hand on the ephemeris library to find every kind of event
 * for every pair of planets, in one reckoning. A step of half a day, the places of a step shared between all kinds and
 * pairs, bisection to a second with only the places that the function in hand needs. No tracks, no first estimates.
 */

const STEP_DAYS = 0.5;
const ONE_SECOND_DAYS = 1 / 86_400;
/** Half-width of the difference whose sign tells on which side of an extremum an instant lies. */
const SLOPE_DAYS = 0.02;
const DEGREE = Math.PI / 180;

const inner = [Body.Mercury, Body.Venus];
const outer = [Body.Mars, Body.Jupiter, Body.Saturn, Body.Uranus, Body.Neptune];
const seen = [...inner, ...outer];
const all = [Body.Mercury, Body.Venus, Body.Earth, ...outer];

type Quantity = (at: Snapshot) => number;
const pairsOf = (bodies: Body[]): [Body, Body][] =>
  bodies.flatMap((a, i) => bodies.slice(i + 1).map((b): [Body, Body] => [a, b]));
const wrapped = (angle: number): number => angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI));

/** Differences that are sought at zero. */
const differences: Quantity[] = [
  ...seen.flatMap((body) =>
    (inner.includes(body) ? [0] : [0, 90, 180, 270]).map(
      (target): Quantity =>
        (at) =>
          wrapped(at.longitude(body) - at.longitude(Body.Sun) - target * DEGREE),
    ),
  ),
  ...pairsOf(seen).flatMap(([a, b]): Quantity[] => [
    (at) => wrapped(at.longitude(a) - at.longitude(b)),
    (at) => wrapped(at.rightAscension(a) - at.rightAscension(b)),
  ]),
  ...pairsOf(all).flatMap(([a, b]) =>
    [0, 180].map(
      (target): Quantity =>
        (at) =>
          wrapped(at.heliocentricLongitude(a) - at.heliocentricLongitude(b) - target * DEGREE),
    ),
  ),
];

/** Quantities that are sought at their extrema, where the event asked for is one. */
interface Extreme {
  readonly quantity: Quantity;
  readonly isEvent: (at: Snapshot, isMinimum: boolean) => boolean;
}

const always = (): boolean => true;
const extremes: Extreme[] = [
  ...seen.flatMap((body): Extreme[] => [
    { quantity: (at) => at.rightAscension(body), isEvent: always },
    { quantity: (at) => at.trueDistanceAu(body), isEvent: always },
    { quantity: (at) => at.heliocentric(body).Length(), isEvent: always },
  ]),
  ...inner.map((body): Extreme => ({
    quantity: (at) => at.separation(body, Body.Sun),
    isEvent: (_at, isMinimum) => !isMinimum,
  })),
  ...pairsOf(seen).map(([a, b]): Extreme => ({
    quantity: (at) => at.separation(a, b),
    isEvent: (at, isMinimum) => isMinimum && at.separation(a, b) < 5 * DEGREE,
  })),
  {
    quantity: (at) => at.venusMagnitude(),
    isEvent: (at, isMinimum) =>
      isMinimum && at.venusPhaseAngle() > 90 * DEGREE && at.venusPhaseAngle() < 150 * DEGREE,
  },
];

/** The number of events between two instants, TT days since J2000.0. */
export function handWrittenScan(fromTt: number, toTt: number): number {
  const deltaTDays = new AstroTime(fromTt).tt - fromTt;
  const [from, to] = [fromTt - deltaTDays, toTt - deltaTDays];
  const instants: number[] = [];
  const difference: (number | undefined)[] = [];
  const before: (number | undefined)[] = [];
  const middle: (number | undefined)[] = [];
  let middleAt = new Snapshot(from);
  const keep = (ut: number): void => {
    if (ut >= from && ut < to) instants.push(ut);
  };

  for (let ut = from - STEP_DAYS; ut <= to + STEP_DAYS; ut += STEP_DAYS) {
    const at = new Snapshot(ut);
    differences.forEach((quantity, i) => {
      const [old, now] = [difference[i], quantity(at)];
      difference[i] = now;
      if (old === undefined || old < 0 === now < 0 || Math.abs(now - old) > Math.PI) return;
      keep(bisect((x) => quantity(new Snapshot(x)), ut - STEP_DAYS, ut, old < 0));
    });
    extremes.forEach(({ quantity, isEvent }, i) => {
      const [a, b, c] = [before[i], middle[i], quantity(at)];
      [before[i], middle[i]] = [b, c];
      if (a === undefined || b === undefined) return;
      const falling = wrappedStep(a, b) < 0;
      if (falling === wrappedStep(b, c) < 0 || !isEvent(middleAt, falling)) return;
      const slope = (x: number): number =>
        wrappedStep(quantity(new Snapshot(x - SLOPE_DAYS)), quantity(new Snapshot(x + SLOPE_DAYS)));
      keep(bisect(slope, ut - 2 * STEP_DAYS, ut, falling));
    });
    middleAt = at;
  }
  return instants.length;
}

/** A step of a right ascension may cross 360°; the other quantities are never that far apart. */
const wrappedStep = (from: number, to: number): number =>
  Math.abs(to - from) > Math.PI ? wrapped(to - from) : to - from;

function bisect(f: (ut: number) => number, from: number, to: number, negativeAtFrom: boolean): number {
  let [low, high] = [from, to];
  while (high - low > ONE_SECOND_DAYS) {
    const half = (low + high) / 2;
    if (f(half) < 0 === negativeAtFrom) low = half;
    else high = half;
  }
  return (low + high) / 2;
}
