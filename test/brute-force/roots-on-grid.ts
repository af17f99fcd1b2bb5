/**
 * Every root of a function that was sampled at a fixed step, and between the samples can be computed directly.
 * Besides the changes of sign, every least |value| without one is refined too, because two roots may hide inside
 * a single step.
 */

/** Instants `start + i step`, TT days since J2000.0. */
export interface Grid {
  readonly start: number;
  readonly step: number;
  readonly count: number;
}

export interface Root {
  readonly tt: number;
  /** The function passes from negative to positive. */
  readonly rising: boolean;
}

export interface Sought {
  readonly samples: Float64Array;
  readonly direct: (tt: number) => number;
  /** Samples at or beyond this size are no neighbours of a root (the seam of a wrapped angle, or another region). */
  readonly limit: number;
  /** Whether a least |value| of one sign, with these neighbours, is small enough to be refined. */
  readonly grazes: (before: number, least: number, after: number) => boolean;
}

/** 0.009 s. */
const ROOT_TOLERANCE_DAYS = 1e-7;
const BISECTIONS = 40;
const EXTREMUM_TOLERANCE_DAYS = 1e-5;
const GOLDEN_STEPS = 40;
const GOLDEN = (Math.sqrt(5) - 1) / 2;

const signOf = (value: number): 1 | -1 => (value < 0 ? -1 : 1);

/** Differences of angles: look closely wherever the difference comes below one degree. */
export const grazesWithinOneDegree = (_before: number, least: number): boolean =>
  Math.abs(least) < Math.PI / 180;

/** Rates: look closely wherever a parabola through the samples could come near zero. */
export const grazesLikeAParabola = (before: number, least: number, after: number): boolean =>
  Math.abs(least) < 2 * Math.max(Math.abs(before - least), Math.abs(after - least));

export function rootsOnGrid(grid: Grid, { samples, direct, limit, grazes }: Sought): Root[] {
  const roots: Root[] = [];
  for (let i = 1; i < grid.count - 1; i++) {
    const before = samples[i - 1]!;
    const here = samples[i]!;
    const after = samples[i + 1]!;
    if (!(Math.abs(here) < limit)) continue;
    const tt = grid.start + i * grid.step;
    if (Math.abs(after) < limit && signOf(here) !== signOf(after)) {
      roots.push({
        tt: bisect(direct, tt, tt + grid.step, signOf(here)),
        rising: here < 0,
      });
    }
    const sign = signOf(here);
    const isLeast = sign * before >= sign * here && sign * here < sign * after && sign * before < limit;
    if (isLeast && sign * after < limit && grazes(before, here, after)) {
      roots.push(...hiddenPair(direct, tt - grid.step, tt + grid.step, sign));
    }
  }
  return roots.sort((a, b) => a.tt - b.tt);
}

/** The root between two instants, `f` having the given sign at the first and the other one at the second. */
export function bisect(f: (tt: number) => number, from: number, to: number, signFrom: 1 | -1): number {
  let [low, high] = [from, to];
  for (let step = 0; step < BISECTIONS && high - low > ROOT_TOLERANCE_DAYS; step++) {
    const middle = (low + high) / 2;
    if (signOf(f(middle)) === signFrom) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

/** Golden section for the least `sign * f`; where it crosses zero on the way, the two roots beside it. */
function hiddenPair(f: (tt: number) => number, from: number, to: number, sign: 1 | -1): Root[] {
  const height = (tt: number): number => sign * f(tt);
  let [low, high] = [from, to];
  let left = high - GOLDEN * (high - low);
  let right = low + GOLDEN * (high - low);
  let [heightLeft, heightRight] = [height(left), height(right)];
  for (let step = 0; step < GOLDEN_STEPS && high - low > EXTREMUM_TOLERANCE_DAYS; step++) {
    const least = Math.min(heightLeft, heightRight);
    if (least < 0) {
      const inside = heightLeft < heightRight ? left : right;
      return [
        { tt: bisect(f, from, inside, sign), rising: sign < 0 },
        { tt: bisect(f, inside, to, sign < 0 ? 1 : -1), rising: sign > 0 },
      ];
    }
    if (heightLeft < heightRight) {
      [high, right, heightRight] = [right, left, heightLeft];
      left = high - GOLDEN * (high - low);
      heightLeft = height(left);
    } else {
      [low, left, heightLeft] = [left, right, heightRight];
      right = low + GOLDEN * (high - low);
      heightRight = height(right);
    }
  }
  return [];
}
