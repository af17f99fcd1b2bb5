import { bracketedRoot } from '../math/index.js';
import type { Jet } from '../math/index.js';
import { ttDays } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import type { Signal } from './signal.js';

/** A zero of a signal, and the number of the monotone branch on which it lies, counted from the trace's start. */
export interface Root {
  readonly tt: TtDays;
  readonly branch: number;
}

/** A turning point of a signal. */
export interface Turn {
  readonly tt: TtDays;
  readonly is: 'maximum' | 'minimum';
  readonly value: number;
}

/** All that a stretch of a signal holds. */
export interface Trace {
  readonly roots: readonly Root[];
  readonly turns: readonly Turn[];
}

/** 0.01 s: far below what any source knows. */
const TOLERANCE_DAYS = 1e-7;
/** An angle's difference jumps by a turn on its far side; a sign change there is no zero. */
const NEAR_ZERO = Math.PI / 2;

/**
 * Follows a signal from `from` (included) to `to` (not included) and finds every zero and every turning point.
 *
 * The turning points cut the stretch into monotone branches, each with at most one zero, so a pair of zeros however
 * close cannot hide between two samples: it has a turning point between them. A turning point cannot hide either,
 * unless the rate changes its own trend twice within a step.
 *
 * @param stepDays a quarter of the shortest time in which the signal's rate can rise and fall again, or less
 */
export function trace(signal: Signal, from: TtDays, to: TtDays, stepDays: number): Trace {
  const roots: Root[] = [];
  const turns: Turn[] = [];
  if (!(to > from)) return { roots, turns };
  const steps = Math.max(1, Math.ceil((to - from) / stepDays));
  const rateAt = (tt: number): number => signal(ttDays(tt)).rate;

  let left = from;
  let leftJet = signal(left);
  const advance = (right: TtDays, rightJet: Jet): void => {
    const root = zeroBetween(signal, left, leftJet, right, rightJet);
    if (root !== null) roots.push({ tt: root, branch: turns.length });
    left = right;
    leftJet = rightJet;
  };
  const turnAt = (tt: TtDays, trendBefore: number): void => {
    const jet = signal(tt);
    advance(tt, jet);
    turns.push({ tt, is: trendBefore > 0 ? 'maximum' : 'minimum', value: jet.value });
  };

  for (let step = 1; step <= steps; step++) {
    const start = left;
    const startJet = leftJet;
    const end = step === steps ? to : ttDays(from + step * stepDays);
    const endJet = signal(end);
    const trend = trendBefore(startJet);
    if (trend !== trendBefore(endJet)) {
      turnAt(rateZero(rateAt, start, startJet.rate, end, endJet.rate), trend);
    } else {
      const dip = hiddenRateDip(signal, start, startJet, end, endJet);
      if (dip !== null) {
        turnAt(rateZero(rateAt, start, startJet.rate, dip.tt, dip.rate), trend);
        turnAt(rateZero(rateAt, dip.tt, dip.rate, end, endJet.rate), -trend);
      }
    }
    advance(end, endJet);
  }
  return { roots, turns };
}

/** Rising or falling just before a point; a turn exactly at the point is still to come. */
const trendBefore = ({ rate, acceleration }: Jet): number => Math.sign(rate) || -Math.sign(acceleration);

/** Traces of adjoining stretches as the one trace of all of them. */
export function joinTraces(traces: readonly Trace[]): Trace {
  const turns = traces.flatMap((part) => part.turns);
  let before = 0;
  const roots = traces.flatMap((part) => {
    const shifted = part.roots.map(({ tt, branch }) => ({ tt, branch: branch + before }));
    before += part.turns.length;
    return shifted;
  });
  return { roots, turns };
}

function rateZero(
  rateAt: (tt: number) => number,
  low: number,
  rateLow: number,
  high: number,
  rateHigh: number,
): TtDays {
  return ttDays(bracketedRoot(rateAt, low, high, TOLERANCE_DAYS, rateLow, rateHigh));
}

function zeroBetween(signal: Signal, low: TtDays, lowJet: Jet, high: TtDays, highJet: Jet): TtDays | null {
  const a = lowJet.value;
  const b = highJet.value;
  if (a === 0) return low;
  if (b === 0 || a > 0 === b > 0 || Math.abs(a) > NEAR_ZERO || Math.abs(b) > NEAR_ZERO) return null;
  return ttDays(bracketedRoot((tt) => signal(ttDays(tt)).value, low, high, TOLERANCE_DAYS, a, b));
}

/** The rate has one sign at both ends but heads for zero and comes back: does it cross in between? */
function hiddenRateDip(
  signal: Signal,
  start: TtDays,
  startJet: Jet,
  end: TtDays,
  endJet: Jet,
): { tt: TtDays; rate: number } | null {
  const sign = trendBefore(startJet);
  if (sign * startJet.acceleration >= 0 || sign * endJet.acceleration <= 0) return null;
  const tt = ttDays(
    bracketedRoot(
      (at) => signal(ttDays(at)).acceleration,
      start,
      end,
      TOLERANCE_DAYS,
      startJet.acceleration,
      endJet.acceleration,
    ),
  );
  const { rate } = signal(tt);
  return sign * rate >= 0 ? null : { tt, rate };
}
