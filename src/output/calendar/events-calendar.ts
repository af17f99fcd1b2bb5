import type { Forecast, ForecastEvent } from '../../forecast/index.js';
import { cycleLabel } from '../../forecast/index.js';
import type { LocalView, Site } from '../../sky/index.js';
import { utcFromTt, utcMillis } from '../../time/index.js';
import type { TtDays, UtcMillis } from '../../time/index.js';
import { cautions, needsSunCaution } from '../cautions.js';
import { circumstancesLine, kindTitles, seriesWords, summaryOf } from '../event-words.js';
import { headlineOf } from '../headline.js';
import { signed } from '../numbers.js';
import { tellInstant, uncertaintyWords } from '../uncertainty-words.js';
import { writeCalendar } from './calendar-writer.js';
import type { CalendarEntry } from './calendar-writer.js';

const MINUTE_MILLIS = 60_000;

export interface CalendarTitle {
  readonly name: string;
  readonly description: string;
}

/**
 * The events of a forecast as a calendar: an entry of a minute each, in UTC, with the local times in its words. Entries
 * keep their uid from one forecast to the next, so importing again updates and never doubles.
 * @param stamp the plan's own date, written as DTSTAMP
 */
export function eventsCalendar(
  title: CalendarTitle,
  forecast: Forecast,
  sites: readonly Site[],
  stamp: UtcMillis,
): string {
  const meetingMates = matesByEvent(forecast);
  return writeCalendar(
    title,
    forecast.events.map((event) => entryOf(event, sites, meetingMates.get(event.id) ?? [])),
    stamp,
  );
}

export const uidOf = (eventId: string): string => `${eventId}@synodos`;

function entryOf(event: ForecastEvent, sites: readonly Site[], mates: readonly string[]): CalendarEntry {
  const start = utcMillis(Math.round(event.utc / MINUTE_MILLIS) * MINUTE_MILLIS);
  const home = sites[0];
  return {
    uid: uidOf(event.id),
    sequence: 0,
    start,
    end: utcMillis(start + MINUTE_MILLIS),
    summary: summaryOf(event),
    description: descriptionOf(event, sites),
    categories: [kindTitles[event.kind]],
    status: event.certain ? 'confirmed' : 'tentative',
    place: home !== undefined && event.local[0]?.bestLook != null ? home : null,
    relatedUids: mates.map(uidOf),
  };
}

/** First what to do, then why, then how sure. */
function descriptionOf(event: ForecastEvent, sites: readonly Site[]): string {
  const series = seriesWords(event);
  return [
    headlineOf(event),
    circumstancesLine(event),
    instantLine(event, 'UTC', 'UTC'),
    ...event.local.map((view, i) => localLine(event, view, sites[i]!)),
    event.interval === null
      ? null
      : `From ${dateOf(event.interval.from)} to ${dateOf(event.interval.to)}: ${event.interval.meaning}.`,
    event.certain ? null : 'Another ephemeris of the same quality could lack this event.',
    residualLine(event),
    `Cycle ${cycleLabel(event.cycle)}${series === null ? '' : `, ${series}`}; ${event.id}`,
    needsSunCaution(event) ? `Caution. ${cautions.besideTheSun}` : null,
  ]
    .filter((line) => line !== null)
    .join('\n');
}

function instantLine({ utc, uncertaintySeconds }: ForecastEvent, zone: string, clock: string): string {
  const { longDate, time } = tellInstant(utc, uncertaintySeconds.utc, zone);
  return `${clock}: ${[longDate, time].filter((word) => word !== '').join(', ')} (${uncertaintyWords(uncertaintySeconds.utc)})`;
}

const localLine = (event: ForecastEvent, view: LocalView, site: Site): string =>
  `${instantLine(event, view.zone, site.name)}. ${view.verdict}`;

const dateOf = (tt: TtDays): string => tellInstant(utcFromTt(tt), 0, 'UTC').longDate;

function residualLine({ residualDays: { mean, kepler } }: ForecastEvent): string | null {
  const parts = [
    ...(mean === null ? [] : [`mean cycle ${signed(mean, 1)} d`]),
    ...(kepler === null ? [] : [`Kepler orbits ${signed(kepler * 24, 1)} h`]),
  ];
  return parts.length === 0 ? null : `Refined minus first estimate: ${parts.join(', ')}.`;
}

/** For each event, the other moments of its meeting. */
function matesByEvent({ events }: Forecast): Map<string, string[]> {
  const byMeeting = new Map<string, string[]>();
  for (const { id, meeting } of events) {
    if (meeting !== null) byMeeting.set(meeting, [...(byMeeting.get(meeting) ?? []), id]);
  }
  return new Map(
    [...byMeeting.values()].flatMap((ids) =>
      ids.map((id) => [id, ids.filter((other) => other !== id)] as const),
    ),
  );
}
