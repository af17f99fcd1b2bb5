import type { Body } from '../bodies/index.js';
import { TWO_PI, bracketedRoot, wrapPi } from '../math/index.js';
import { ttDays } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import type { SkyOverSite } from './horizontal.js';
import { SIDEREAL_TURNS_PER_DAY } from './sidereal.js';

/** Refraction on the horizon; with the Sun's mean semidiameter of 16′ for its upper limb. U.S. Naval Observatory practice. */
export const PLANET_RISE_ALTITUDE_DEG = -34 / 60;
export const SUN_RISE_ALTITUDE_DEG = -50 / 60;

/** 0.1 s. */
const TOLERANCE_DAYS = 1e-6;
const MERIDIAN_PASSES = 4;

export interface Crossing {
  readonly tt: TtDays;
  readonly is: 'rise' | 'set';
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
  const step = 1 / SIDEREAL_TURNS_PER_DAY;
  let guess = from + ((ahead < 0 ? ahead + TWO_PI : ahead) / TWO_PI) * step;
  while (guess < to + step / 2) {
    let tt = ttDays(guess);
    for (let pass = 0; pass < MERIDIAN_PASSES; pass++) {
      tt = ttDays(tt + (wrapPi(target - sky.horizontal(body, tt).hourAngle) / TWO_PI) * step);
    }
    if (tt >= from && tt < to) transits.push(tt);
    guess += step;
  }
  return transits;
}

/**
 * The instants in [from, to) at which a body's true altitude crosses a threshold, in order. Between two passages of
 * the meridian the altitude only rises or only falls, so every crossing, also one of minutes, has a bracket of its own.
 */
export function altitudeCrossings(
  sky: SkyOverSite,
  body: Body,
  from: TtDays,
  to: TtDays,
  thresholdDeg: number,
): Crossing[] {
  const above = (tt: number): number => sky.horizontal(body, ttDays(tt)).altitudeDeg - thresholdDeg;
  const marks = [
    from,
    ...meridianTransits(sky, body, from, to, 'upper'),
    ...meridianTransits(sky, body, from, to, 'lower'),
    to,
  ].sort((a, b) => a - b);
  return marks.slice(1).flatMap((end, i): Crossing[] => {
    const start = marks[i]!;
    const [low, high] = [above(start), above(end)];
    if (low > 0 === high > 0) return [];
    return [
      {
        tt: ttDays(bracketedRoot(above, start, end, TOLERANCE_DAYS, low, high)),
        is: high > low ? 'rise' : 'set',
      },
    ];
  });
}
