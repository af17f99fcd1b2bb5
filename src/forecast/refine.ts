import { ttDays } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import type { Signal } from './signal.js';

const MAX_STEPS = 12;
/** A secant's step this small leaves an error of a millisecond, a Newton step ten times as large one of a microsecond. */
const SECANT_SETTLED_DAYS = 1e-5;
const NEWTON_SETTLED_DAYS = 1e-4;

/**
 * The zero of a function near an estimate, by secants that start from a known rate.
 * @param rate the function's rate at the estimate, good to a few per cent (the Kepler orbits give it)
 * @returns null where the steps do not settle, or run more than `reachDays` from the estimate
 */
export function refineZero(
  estimate: TtDays,
  rate: number,
  value: (tt: TtDays) => number,
  reachDays: number,
): TtDays | null {
  let tt = estimate;
  let slope = rate;
  let before: { tt: TtDays; value: number } | null = null;
  for (let step = 0; step < MAX_STEPS; step++) {
    const here = value(tt);
    if (before !== null && tt !== before.tt && here !== before.value) {
      slope = (here - before.value) / (tt - before.tt);
    }
    const next = ttDays(tt - here / slope);
    if (!(Math.abs(next - estimate) <= reachDays)) return null;
    if (Math.abs(next - tt) < SECANT_SETTLED_DAYS) return next;
    before = { tt, value: here };
    tt = next;
  }
  return null;
}

/**
 * The zero, or the turning point of the wanted sense, of a signal near an estimate, by Newton's method on the
 * signal's own derivatives.
 * @returns null where there is none within `reachDays`
 */
export function nearest(
  sought: 'zero' | 'maximum' | 'minimum',
  signal: Signal,
  estimate: TtDays,
  reachDays: number,
): TtDays | null {
  const largestStep = reachDays / 4;
  let tt = estimate;
  for (let step = 0; step < 4 * MAX_STEPS; step++) {
    const jet = signal(tt);
    const height = sought === 'zero' ? jet.value : jet.rate;
    const slope = sought === 'zero' ? jet.rate : jet.acceleration;
    // On the wrong side of an inflection Newton's step leads away from a turning point of the wanted sense: climb instead.
    const wrongWay = sought !== 'zero' && slope > 0 === (sought === 'maximum');
    const wanted = wrongWay
      ? Math.sign(height) * largestStep * (sought === 'maximum' ? 1 : -1)
      : -height / slope;
    const shift = Math.max(-largestStep, Math.min(largestStep, wanted));
    tt = ttDays(tt + shift);
    if (!(Math.abs(tt - estimate) <= reachDays)) return null;
    if (Math.abs(shift) < NEWTON_SETTLED_DAYS) return tt;
  }
  return null;
}

/** Between the five points of a derivative: long against rounding, short against the curve's own change. */
const DERIVATIVE_STEP_DAYS = 0.05;
/** One pass is enough but where a body passes behind the Sun, whose deflection the estimate has not heard of. */
const TURN_PASSES = 3;
const TURN_SETTLED_DAYS = 1e-3;

/**
 * The turning point of a smooth function near one that is already good to minutes, by Newton's method on five-point
 * derivatives.
 * Source: Abramowitz & Stegun (1964), table 25.2.
 */
export function refineTurn(near: TtDays, value: (tt: TtDays) => number): TtDays {
  const h = DERIVATIVE_STEP_DAYS;
  let tt = near;
  for (let pass = 0; pass < TURN_PASSES; pass++) {
    const at = (k: number): number => value(ttDays(tt + k * h));
    const [b2, b1, here, a1, a2] = [at(-2), at(-1), at(0), at(1), at(2)];
    const rate = (8 * (a1 - b1) - (a2 - b2)) / (12 * h);
    const acceleration = (16 * (a1 + b1) - (a2 + b2) - 30 * here) / (12 * h * h);
    const shift = -rate / acceleration;
    tt = ttDays(tt + shift);
    if (Math.abs(shift) < TURN_SETTLED_DAYS) break;
  }
  return tt;
}
