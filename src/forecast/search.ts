import { cyclesOverlapping, stretchOf } from '../cycles/index.js';
import { ttDays } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import type { Reckoning } from './event.js';
import type { Kind, Limits, Subject } from './kinds.js';
import { nearest, refineTurn, refineZero } from './refine.js';
import type { SkyModel } from './signal.js';
import { joinTraces, trace } from './trace.js';
import type { Trace } from './trace.js';
import type { TrackedSky } from './tracked-sky.js';

/** What the searches of one forecast share. */
export interface SearchContext {
  readonly sky: TrackedSky;
  readonly kepler: SkyModel;
  readonly limits: Limits;
}

/** From `from` (included) to `to` (not included). */
export interface Span {
  readonly from: TtDays;
  readonly to: TtDays;
}

/** One event found, before anything is said about it. */
export interface Finding {
  readonly kind: Kind;
  readonly subject: Subject;
  readonly reckoning: Reckoning;
  readonly cycle: number;
  /** Which of the cycle's branches (a zero) or turns (an extremum) it is, from 0: stable, whatever its neighbours do. */
  readonly ordinal: number;
  /** Its place among the zeros that its cycle has, from 1, and their number: for display. */
  readonly index: number;
  readonly of: number;
  readonly tt: TtDays;
  readonly mean: TtDays | null;
  readonly kepler: TtDays | null;
  /** Further turns of the same sense, of an extreme distance that wobbles about it. */
  readonly localTurns: readonly TtDays[];
}

/** The part of its cycle within which an event lies from its mean instant. */
const MEAN_REACH_CYCLES = 0.25;
/** The part of its revolution within which the extreme distance lies from the Kepler one. */
const APSIS_REACH_CYCLES = 0.1;
/** How far a zero or turn of the Kepler orbits may lie from the refined one and still be its estimate. */
export const KEPLER_REACH_DAYS = 60;

/** One subject of one kind, reckoned in one coordinate. */
export interface Question {
  readonly kind: Kind;
  readonly subject: Subject;
  readonly reckoning: Reckoning;
}

/** Every event that answers a question within a span, in order of time. */
export function search(question: Question, span: Span, context: SearchContext): Finding[] {
  const { find, edgeDays } = methods[question.kind.search];
  const wide = { from: ttDays(span.from - edgeDays), to: ttDays(span.to + edgeDays) };
  return find(question, wide, context)
    .filter(({ tt }) => tt >= span.from && tt < span.to)
    .sort((a, b) => a.tt - b.tt);
}

interface Method {
  readonly find: (question: Question, wide: Span, context: SearchContext) => Finding[];
  /** How far beyond a span it looks, so that an event near the edge is judged by its refined instant. */
  readonly edgeDays: number;
}

/** A Kepler estimate is days off for the giants; what is traced moves by minutes when it is decided. */
const methods: Readonly<Record<Kind['search'], Method>> = {
  'one-a-cycle': { find: oneACycle, edgeDays: 30 },
  'one-turn-a-cycle': { find: allInCycle, edgeDays: 1 },
  'all-in-cycle': { find: allInCycle, edgeDays: 1 },
  'extreme-of-cycle': { find: extremeOfCycle, edgeDays: 0 },
};

/** Monotone through the cycle: mean instant, Kepler orbits, ephemeris, each found from the one before. */
function oneACycle(question: Question, wide: Span, { sky, kepler }: SearchContext): Finding[] {
  const { kind, subject, reckoning } = question;
  const { cycle, meanEstimate } = kind.numbering(subject);
  const reach = MEAN_REACH_CYCLES * cycle.periodDays;
  const onKepler = kind.signal(kepler, subject, reckoning);
  const onSky = kind.signal(sky, subject, reckoning);
  const exact = kind.exactValue?.(sky, subject, reckoning);
  const cycles = cyclesOverlapping(cycle, ttDays(wide.from - reach), ttDays(wide.to + reach));
  return cycles.flatMap((n): Finding[] => {
    const mean = meanEstimate(n, wide.from)!;
    const estimate = nearest('zero', onKepler, mean, reach);
    if (estimate === null || estimate < wide.from || estimate >= wide.to) return [];
    const tt =
      exact === undefined
        ? nearest('zero', onSky, estimate, reach)
        : refineZero(estimate, onKepler(estimate).rate, exact, reach);
    return tt === null ? [] : [{ ...question, ...lone, cycle: n, tt, mean, kepler: estimate }];
  });
}

function allInCycle(question: Question, wide: Span, context: SearchContext): Finding[] {
  const { kind, subject } = question;
  const { cycle } = kind.numbering(subject);
  return cyclesOverlapping(cycle, wide.from, wide.to).flatMap((n) =>
    cycleFindings(question, n, wide, context),
  );
}

/** The extreme of a distance that may wobble about it: the highest or deepest turn near the Kepler orbit's. */
function extremeOfCycle(question: Question, wide: Span, { sky, kepler }: SearchContext): Finding[] {
  const { kind, subject, reckoning } = question;
  const { cycle, meanEstimate } = kind.numbering(subject);
  const reach = APSIS_REACH_CYCLES * cycle.periodDays;
  const sense = kind.sought === 'maximum' ? 1 : -1;
  const cycles = cyclesOverlapping(cycle, ttDays(wide.from - 2 * reach), ttDays(wide.to + 2 * reach));
  return cycles.flatMap((n): Finding[] => {
    const mean = meanEstimate(n, wide.from)!;
    const estimate = nearest(kind.sought, kind.signal(kepler, subject, reckoning), mean, reach);
    if (estimate === null || estimate + reach < wide.from || estimate - reach >= wide.to) return [];
    const { turns } = trace(
      kind.signal(sky, subject, reckoning),
      ttDays(estimate - reach),
      ttDays(estimate + reach),
      kind.stepDays(subject),
    );
    const [extreme, ...others] = turns
      .filter(({ is }) => is === kind.sought)
      .sort((a, b) => sense * (b.value - a.value));
    if (extreme === undefined) return [];
    const localTurns = others.map(({ tt }) => tt).sort((a, b) => a - b);
    return [{ ...question, ...lone, cycle: n, tt: extreme.tt, mean, kepler: estimate, localTurns }];
  });
}

const lone = { ordinal: 0, index: 1, of: 1, localTurns: [] };

/**
 * Every event of one cycle within the span. Its stretch is followed from its beginning wherever it holds one, because
 * an event's letter counts from there, unless there is only one; a stretch of a century without an event is not worth
 * following.
 */
function cycleFindings(question: Question, n: number, wide: Span, context: SearchContext): Finding[] {
  const { kind, subject, reckoning } = question;
  const { sky, kepler, limits } = context;
  const { cycle, meanEstimate } = kind.numbering(subject);
  const signal = kind.signal(sky, subject, reckoning);
  const follow = (from: TtDays, to: TtDays): Trace => trace(signal, from, to, kind.stepDays(subject));
  const stretch = stretchOf(cycle, n);
  const from = ttDays(Math.max(stretch.from, wide.from));
  const to = ttDays(Math.min(stretch.to, wide.to));
  const part = follow(from, to);
  if (!candidates(kind, part).some(({ tt }) => kind.reports(sky, subject, tt, limits))) return [];
  const head = kind.search === 'one-turn-a-cycle' ? NOTHING : follow(stretch.from, from);
  // Only zeros are numbered "1 of 3", and so only they need what comes after the span.
  const tail = kind.sought === 'zero' ? follow(to, stretch.to) : NOTHING;
  const whole = joinTraces([head, part, tail]);

  const onKepler = kind.signal(kepler, subject, reckoning);
  const exact = kind.exactValue?.(sky, subject, reckoning);
  const accepted = candidates(kind, whole).filter(({ tt }) => kind.accepts(sky, subject, tt));
  return accepted.flatMap(({ tt: traced, branch }, index, { length: of }): Finding[] => {
    if (traced < wide.from || traced >= wide.to || !kind.reports(sky, subject, traced, limits)) return [];
    const tt = exact === undefined ? traced : decide(kind, traced, signal(traced).rate, exact);
    const estimate = nearest(kind.sought, onKepler, tt, KEPLER_REACH_DAYS);
    const sameSense =
      estimate !== null && (kind.sought !== 'zero' || onKepler(estimate).rate > 0 === signal(tt).rate > 0);
    return [
      {
        ...question,
        cycle: n,
        ordinal: branch ?? index,
        ...{ index: index + 1, of },
        tt,
        mean: meanEstimate(n, tt),
        localTurns: [],
        kepler: sameSense ? estimate : null,
      },
    ];
  });
}

const NOTHING: Trace = { roots: [], turns: [] };

interface Candidate {
  readonly tt: TtDays;
  /** The branch of a zero; turning points are counted among their own instead. */
  readonly branch: number | null;
}

function candidates(kind: Kind, { roots, turns }: Trace): Candidate[] {
  return kind.sought === 'zero'
    ? [...roots]
    : turns.filter(({ is }) => is === kind.sought).map(({ tt }) => ({ tt, branch: null }));
}

/** The last word of the exact places on an instant found on tracks, a few seconds away at most. */
function decide(kind: Kind, traced: TtDays, rate: number, exact: (tt: TtDays) => number): TtDays {
  return kind.sought === 'zero'
    ? (refineZero(traced, rate, exact, KEPLER_REACH_DAYS) ?? traced)
    : refineTurn(traced, exact);
}
