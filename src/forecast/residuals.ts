import { isInner, planets } from '../bodies/index.js';
import type { Body, Planet } from '../bodies/index.js';
import { keplerTableFor } from '../cycles/index.js';
import type { ElementTable } from '../cycles/index.js';
import { librarySource } from '../ephemeris/index.js';
import type { EphemerisSource } from '../ephemeris/index.js';
import { ttDays, ttFromUtc } from '../time/index.js';
import type { TtDays, UtcMillis } from '../time/index.js';
import type { ForecastEvent, Reckoning, SourceNote } from './event.js';
import { DEFAULT_WITHIN_DEG, reckoningOf } from './forecast.js';
import { keplerSky } from './kepler-sky.js';
import type { KindName } from './kind-names.js';
import { kindNamed } from './kinds.js';
import type { Kind, Subject } from './kinds.js';
import { nearest } from './refine.js';
import { KEPLER_REACH_DAYS, search } from './search.js';
import { eventTeller } from './tell-event.js';
import { trackedSky } from './tracked-sky.js';

export interface ResidualRequest {
  /** Two planets, or a planet and the Earth (or the Sun, which means the same cycle). */
  readonly pair: readonly [Body, Body];
  /** By default opposition, inferior conjunction or conjunction in longitude, as the pair has it. */
  readonly kind?: KindName;
  readonly from: UtcMillis;
  readonly to: UtcMillis;
  readonly reckoning?: Reckoning;
  readonly source?: EphemerisSource;
}

export interface ResidualRow {
  readonly event: ForecastEvent;
  /** First estimates, null where the kind has none. */
  readonly mean: TtDays | null;
  readonly keplerTable1: TtDays | null;
  readonly keplerTable2: TtDays | null;
  /** refined − estimate, days. */
  readonly meanDays: number | null;
  readonly keplerTable1Days: number | null;
  readonly keplerTable2Days: number | null;
}

export interface Spread {
  readonly count: number;
  readonly rmsDays: number;
  readonly worstDays: number;
}

export interface ResidualSeries {
  readonly kind: KindName;
  readonly bodies: readonly Planet[];
  readonly from: UtcMillis;
  readonly to: UtcMillis;
  readonly source: SourceNote;
  readonly rows: readonly ResidualRow[];
  /** Null where no event of the span has that estimate. */
  readonly mean: Spread | null;
  readonly keplerTable1: Spread | null;
  readonly keplerTable2: Spread | null;
  /** Some events lie outside 1800–2050, for which Table 1 was made. */
  readonly beyondTable1: boolean;
}

/** A request that names no such events. */
export class NoSuchPairError extends Error {
  override readonly name = 'NoSuchPairError';
}

/** O−C: how far the first estimates of a pair's events fall from the refined instants. */
export function residuals(request: ResidualRequest): ResidualSeries {
  const source = request.source ?? librarySource;
  const { kind, subject } = questionOf(request.pair, request.kind);
  const reckoning = reckoningOf(kind, request.reckoning);
  const sky = trackedSky(source);
  const tell = eventTeller(sky, []);
  const estimateBy = (table: ElementTable) => {
    const signal = kind.signal(keplerSky(table), subject, reckoning);
    return (tt: TtDays) => nearest(kind.sought, signal, tt, KEPLER_REACH_DAYS);
  };
  const byTable1 = estimateBy('table-1');
  const byTable2 = estimateBy('table-2');
  const rows = search(
    { kind, subject, reckoning },
    { from: ttFromUtc(request.from), to: ttFromUtc(request.to) },
    { sky, kepler: keplerSky('by-date'), limits: { withinDeg: DEFAULT_WITHIN_DEG } },
  ).map((finding): ResidualRow => {
    const { tt, mean } = finding;
    const keplerTable1 = byTable1(tt);
    const keplerTable2 = byTable2(tt);
    return {
      event: tell(finding, null),
      ...{ mean, keplerTable1, keplerTable2 },
      meanDays: since(mean, tt),
      keplerTable1Days: since(keplerTable1, tt),
      keplerTable2Days: since(keplerTable2, tt),
    };
  });
  return {
    kind: kind.name,
    bodies: subject,
    from: request.from,
    to: request.to,
    source: { name: source.name, description: source.description },
    rows,
    mean: spreadOf(rows.map(({ meanDays }) => meanDays)),
    keplerTable1: spreadOf(rows.map(({ keplerTable1Days }) => keplerTable1Days)),
    keplerTable2: spreadOf(rows.map(({ keplerTable2Days }) => keplerTable2Days)),
    beyondTable1: rows.some(({ event }) => keplerTableFor(event.tt) !== 'table-1'),
  };
}

const since = (estimate: TtDays | null, tt: TtDays): number | null =>
  estimate === null ? null : ttDays(tt - estimate);

function spreadOf(residualDays: readonly (number | null)[]): Spread | null {
  const known = residualDays.filter((days) => days !== null);
  if (known.length === 0) return null;
  return {
    count: known.length,
    rmsDays: Math.sqrt(known.reduce((sum, days) => sum + days * days, 0) / known.length),
    worstDays: Math.max(...known.map(Math.abs)),
  };
}

/** Which kind, of which subject, a pair of bodies means. */
function questionOf(
  pair: readonly [Body, Body],
  asked: KindName | undefined,
): { kind: Kind; subject: Subject } {
  const own = planets.filter((planet) => planet !== 'earth' && pair.includes(planet));
  const named = planets.filter((planet) => pair.includes(planet));
  const kind = kindNamed(asked ?? usualKind(own));
  const subjects = kind.subjects(planets);
  const subject = [own, named].flatMap((bodies) =>
    subjects.filter((candidate) => candidate.join() === bodies.join()),
  )[0];
  if (subject === undefined) {
    throw new NoSuchPairError(
      `${pair.join(' and ')} have no ${kind.name}: it is told of ${kind
        .subjects(planets)
        .map((s) => s.join('–'))
        .slice(0, 12)
        .join(', ')}`,
    );
  }
  return { kind, subject };
}

function usualKind(own: readonly Planet[]): KindName {
  if (own.length === 2) return 'conjunction-longitude';
  return own.every(isInner) ? 'inferior-conjunction' : 'opposition';
}
