import type { Body } from '../bodies/index.js';
import { TWO_PI, bracketedRoot, wrapPi } from '../math/index.js';
import { ttDays } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import type { SkyOverSite } from './horizontal.js';
import { SIDEREAL_TURNS_PER_DAY } from './sidereal.js';
import type { Stretch } from './stretch.js';

/**
 * The true altitude of a planet, and of the Sun's centre, as it rises and sets on a flat horizon at sea level: 34′ of
 * refraction, and for the Sun's upper limb 16′ more. U.S. Naval Observatory practice, which published times follow; a
 * site's own horizon and height only decide what can be seen.
 */
export const PLANET_RISE_ALTITUDE_DEG = -34 / 60;
export const SUN_RISE_ALTITUDE_DEG = -50 / 60;

/** 0.1 s. */
const TOLERANCE_DAYS = 1e-6;
const SIDEREAL_DAY_DAYS = 1 / SIDEREAL_TURNS_PER_DAY;
/** Each pass brings the transit a hundred times nearer, so the one after a correction of 8 s is good to 0.1 s. */
const MERIDIAN_PASSES = 4;
const PASS_ENOUGH_DAYS = 1e-4;

export interface Crossing {
  readonly tt: TtDays;
  readonly is: 'rise' | 'set';
}

/** How a body moves up and down over a site from one instant to another, the last not included. */
export interface DayArc {
  /** Upper transits of the meridian, in order: none, one or two in a day. */
  readonly transits: readonly TtDays[];
  /** The instants at which the body's true altitude passes a threshold, in order. */
  crossings(thresholdDeg: number): Crossing[];
  /** The stretches in which its true altitude is below a threshold, in order. */
  stretchesBelow(thresholdDeg: number): Stretch[];
}

/**
 * The arc of a body over a site in [from, to). Between two passages of the meridian the altitude only rises or only
 * falls, so every crossing, also one of minutes, has a bracket of its own. The body's own motion shifts the turning
 * point a little off the meridian: a crossing and its return are missed where the body stays within 25″ of the
 * threshold between them (within minutes of arc nearer than 1° to a pole).
 */
export function dayArc(sky: SkyOverSite, body: Body, from: TtDays, to: TtDays): DayArc {
  const altitudeDeg = (tt: number): number => sky.horizontal(body, ttDays(tt)).altitudeDeg;
  const transits = meridianTransits(sky, body, from, to, 'upper');
  const marks = [from, ...transits, ...meridianTransits(sky, body, from, to, 'lower'), to]
    .sort((a, b) => a - b)
    .map((tt) => ({ tt, altitudeDeg: altitudeDeg(tt) }));

  const crossings = (thresholdDeg: number): Crossing[] =>
    marks.slice(1).flatMap((end, i): Crossing[] => {
      const start = marks[i]!;
      const [low, high] = [start.altitudeDeg - thresholdDeg, end.altitudeDeg - thresholdDeg];
      if (low > 0 === high > 0) return [];
      const above = (tt: number): number => altitudeDeg(tt) - thresholdDeg;
      return [
        {
          tt: ttDays(bracketedRoot(above, start.tt, end.tt, TOLERANCE_DAYS, low, high)),
          is: high > low ? 'rise' : 'set',
        },
      ];
    });

  const stretchesBelow = (thresholdDeg: number): Stretch[] => {
    const startsBelow = marks[0]!.altitudeDeg <= thresholdDeg;
    const edges = [...(startsBelow ? [from] : []), ...crossings(thresholdDeg).map(({ tt }) => tt), to];
    return edges.slice(1).flatMap((end, i) => (i % 2 === 0 ? [{ from: edges[i]!, to: end }] : []));
  };

  return { transits, crossings, stretchesBelow };
}

/** The instants in [from, to) at which a body crosses the meridian, above the pole (`upper`) or below it. */
export function meridianTransits(
  sky: SkyOverSite,
  body: Body,
  from: TtDays,
  to: TtDays,
  which: 'upper' | 'lower',
): TtDays[] {
  const target = which === 'upper' ? 0 : Math.PI;
  const transits: TtDays[] = [];
  const ahead = wrapPi(target - sky.horizontal(body, from).hourAngle);
  let guess = from + ((ahead < 0 ? ahead + TWO_PI : ahead) / TWO_PI) * SIDEREAL_DAY_DAYS;
  while (guess < to + SIDEREAL_DAY_DAYS / 2) {
    let tt = ttDays(guess);
    for (let pass = 0; pass < MERIDIAN_PASSES; pass++) {
      const offDays = (wrapPi(target - sky.horizontal(body, tt).hourAngle) / TWO_PI) * SIDEREAL_DAY_DAYS;
      tt = ttDays(tt + offDays);
      if (Math.abs(offDays) < PASS_ENOUGH_DAYS) break;
    }
    if (tt >= from && tt < to) transits.push(tt);
    guess += SIDEREAL_DAY_DAYS;
  }
  return transits;
}
