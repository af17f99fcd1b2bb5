import { majorPlanets, planets } from '../bodies/index.js';
import type { Planet } from '../bodies/index.js';
import { librarySource } from '../ephemeris/index.js';
import type { EphemerisSource } from '../ephemeris/index.js';
import type { Site } from '../sky/index.js';
import { DAYS_PER_JULIAN_CENTURY, ttDays, ttFromUtc } from '../time/index.js';
import type { UtcMillis } from '../time/index.js';
import type { Forecast, ForecastEvent, Reckoning } from './event.js';
import { eventTeller, nameOf } from './tell-event.js';
import { keplerSky } from './kepler-sky.js';
import { kindNames } from './kind-names.js';
import type { KindName } from './kind-names.js';
import { kinds } from './kinds.js';
import type { Kind } from './kinds.js';
import { isMomentKind, meetingsOf, momentKinds, momentsOf } from './meetings.js';
import { search } from './search.js';
import type { Question, SearchContext, Span } from './search.js';
import { trackedSky } from './tracked-sky.js';

export interface ForecastRequest {
  /** Included. */
  readonly from: UtcMillis;
  /** Not included. */
  readonly to: UtcMillis;
  /** All of them by default. */
  readonly kinds?: readonly KindName[];
  /** Events that concern any of these, with whichever partner; the eight planets by default, Pluto on request. */
  readonly bodies?: readonly Planet[];
  /** For kinds that have a choice; by default each is reckoned as the almanacs do. */
  readonly reckoning?: Reckoning;
  /** Appulses up to this separation; 5° by default. */
  readonly withinDeg?: number;
  /** Each event is also told as seen from these. */
  readonly sites?: readonly Site[];
  readonly source?: EphemerisSource;
  /** Called now and then with the part of the search that is done, 0 … 1. */
  readonly onProgress?: (fraction: number) => void;
}

export const DEFAULT_WITHIN_DEG = 5;

/** A long span is searched piece by piece, so that its tracks can be let go. */
const PIECE_DAYS = DAYS_PER_JULIAN_CENTURY;

/** Every event of the kinds and bodies asked for in a span, in order of time, with its meetings. */
export function forecast(request: ForecastRequest): Forecast {
  const source = request.source ?? librarySource;
  const sky = trackedSky(source);
  const context: SearchContext = {
    sky,
    kepler: keplerSky('by-date'),
    limits: { withinDeg: request.withinDeg ?? DEFAULT_WITHIN_DEG },
  };
  const named = request.bodies ?? majorPlanets;
  const wanted = new Set(request.kinds ?? kindNames);
  const questions = questionsOf(wanted, named, request.reckoning);
  const pieces = piecesOf({ from: ttFromUtc(request.from), to: ttFromUtc(request.to) });
  const progress = (stage: number, done: number, of: number): void => {
    request.onProgress?.((stage + done / of) / 2);
  };
  const searches = pieces.flatMap((piece) => questions.map((question) => ({ question, piece })));
  const findings = searches.flatMap(({ question, piece }, i) => {
    const found = search(question, piece, context);
    progress(0, i + 1, searches.length);
    return found;
  });

  const meetings = meetingsOf(findings.map(nameOf), sky);
  const meetingOf = new Map(meetings.flatMap((meeting) => momentsOf(meeting).map((id) => [id, meeting.id])));
  const tell = eventTeller(sky, request.sites ?? []);
  const reported = findings.filter(({ kind }) => wanted.has(kind.name));
  const events = reported
    .map((finding, i) => {
      progress(1, i + 1, reported.length);
      return tell(finding, meetingOf.get(nameOf(finding).id) ?? null);
    })
    .sort(inOrder);
  const toldOf = new Set(events.map(({ meeting }) => meeting));
  return {
    from: request.from,
    to: request.to,
    source: { name: source.name, description: source.description },
    bodies: planets.filter((planet) => named.includes(planet)),
    events,
    meetings: meetings.filter(({ id }) => toldOf.has(id)),
  };
}

/** The questions that the kinds wanted ask of the bodies named. All the moments of a meeting are asked for together. */
function questionsOf(
  wanted: ReadonlySet<KindName>,
  named: readonly Planet[],
  reckoning: Reckoning | undefined,
): Question[] {
  const universe = planets.filter((planet) => planet !== 'pluto' || named.includes(planet));
  const asked = kinds.filter(
    ({ name }) =>
      wanted.has(name) || (isMomentKind(name) && momentKinds.some((moment) => wanted.has(moment))),
  );
  return asked.flatMap((kind) =>
    kind
      .subjects(universe)
      .filter((subject) => subject.some((planet) => named.includes(planet)))
      .map((subject): Question => ({ kind, subject, reckoning: reckoningOf(kind, reckoning) })),
  );
}

/** Kinds without a coordinate of their own keep longitude, which they never read. */
export function reckoningOf({ reckoning }: Kind, asked: Reckoning | undefined): Reckoning {
  if (reckoning === null) return 'longitude';
  return reckoning.choice ? (asked ?? reckoning.byDefault) : reckoning.byDefault;
}

function piecesOf({ from, to }: Span): Span[] {
  const count = Math.max(1, Math.ceil((to - from) / PIECE_DAYS));
  const edge = (i: number) => (i === count ? to : ttDays(from + i * PIECE_DAYS));
  return Array.from({ length: count }, (_, i) => ({ from: edge(i), to: edge(i + 1) }));
}

/** By time; at one instant by the order of the kinds, then by name. */
function inOrder(a: ForecastEvent, b: ForecastEvent): number {
  return a.tt - b.tt || kindNames.indexOf(a.kind) - kindNames.indexOf(b.kind) || (a.id < b.id ? -1 : 1);
}
