import type { Forecast, ForecastEvent } from '../../forecast/index.js';
import { cycleLabel } from '../../forecast/index.js';
import type { Site } from '../../sky/index.js';
import { localDate, utcFromTt, utcMillis, zoneAbbreviation } from '../../time/index.js';
import type { TtDays, UtcMillis } from '../../time/index.js';
import { cautionsOf } from '../cautions.js';
import { circumstancesLine, kindTitles, seriesWords, summaryOf } from '../event-words.js';
import { headlineOf } from '../headline.js';
import { signed } from '../numbers.js';
import { grainOf, tellInstant, uncertaintyWords } from '../uncertainty-words.js';
import { writeCalendar } from './calendar-writer.js';
import type { CalendarEntry, CalendarSpan, CalendarWords } from './calendar-writer.js';

const MINUTE_MILLIS = 60_000;

/**
 * The events of a forecast as a calendar. An instant is an entry of a minute, in UTC, with the local times in its words;
 * one that is not known to hours is a whole day of the first site. Entries keep their uid from one forecast to the next,
 * so importing again updates and never doubles.
 * @param stamp the plan's own date, written as DTSTAMP
 */
export function eventsCalendar(
  words: CalendarWords,
  forecast: Forecast,
  sites: readonly Site[],
  stamp: UtcMillis,
): string {
  const siblings = siblingsOf(forecast);
  return writeCalendar(
    words,
    forecast.events.map((event) => entryOf(event, sites, siblings.get(event.id) ?? [])),
    stamp,
  );
}

export const uidOf = (eventId: string): string => `${eventId}@synodos`;

/** The sequence is 0: clients that get a newer DTSTAMP with the same uid and sequence replace the entry. */
function entryOf(event: ForecastEvent, sites: readonly Site[], siblings: readonly string[]): CalendarEntry {
  const [home] = sites;
  return {
    uid: uidOf(event.id),
    sequence: 0,
    when: whenOf(event, home?.zone ?? 'UTC'),
    summary: summaryOf(event),
    description: descriptionOf(event, sites),
    categories: [kindTitles[event.kind]],
    status: event.certain ? 'confirmed' : 'tentative',
    place: home !== undefined && event.local[0]?.bestLook != null ? home : null,
    relatedUids: siblings.map(uidOf),
  };
}

function whenOf({ utc, uncertaintySeconds }: ForecastEvent, zone: string): CalendarSpan {
  if (grainOf(uncertaintySeconds.utc) === 'day') {
    return { day: localDate(tellInstant(utc, uncertaintySeconds.utc, zone).isoDate) };
  }
  const from = utcMillis(Math.round(utc / MINUTE_MILLIS) * MINUTE_MILLIS);
  return { from, to: utcMillis(from + MINUTE_MILLIS) };
}

/** First what to do, and what not to; then why; then how sure. */
function descriptionOf(event: ForecastEvent, sites: readonly Site[]): string {
  const [home, ...others] = sites;
  const series = seriesWords(event);
  return [
    headlineOf(event, home?.zone),
    ...others.flatMap(({ name }, i) => {
      const view = event.local[i + 1];
      return view === undefined ? [] : [`${name}: ${view.verdict}`];
    }),
    ...cautionsOf(event).map((caution) => `Caution. ${caution}`),
    circumstancesLine(event),
    `UTC: ${clockWords(event, 'UTC')}, ${uncertaintyWords(event.uncertaintySeconds.utc)}`,
    ...sites.map((site) => `${site.name}: ${clockWords(event, site.zone)}`),
    ...(event.interval === null
      ? []
      : [
          `From ${dayWords(event.interval.from)} to ${dayWords(event.interval.to)}: ${event.interval.meaning}.`,
        ]),
    ...(event.certain ? [] : ['Another ephemeris of the same quality could lack this event.']),
    ...residualLines(event),
    `Cycle ${cycleLabel(event.cycle)}${series === null ? '' : `, ${series}`}; ${event.id}`,
  ].join('\n');
}

function clockWords({ utc, uncertaintySeconds }: ForecastEvent, zone: string): string {
  const { longDate, time } = tellInstant(utc, uncertaintySeconds.utc, zone);
  const clock = zone === 'UTC' ? '' : ` ${zoneAbbreviation(utc, zone)}`;
  return time === '' ? longDate : `${longDate}, ${time}${clock}`;
}

/** Intervals are told in days. */
const dayWords = (tt: TtDays): string => tellInstant(utcFromTt(tt), 0, 'UTC').longDate;

function residualLines({ residualDays: { mean, kepler } }: ForecastEvent): string[] {
  const parts = [
    ...(mean === null ? [] : [`mean cycle ${signed(mean, 1)} d`]),
    ...(kepler === null ? [] : [`Kepler orbits ${signed(kepler * 24, 1)} h`]),
  ];
  return parts.length === 0 ? [] : [`Refined minus first estimate: ${parts.join(', ')}.`];
}

/** For each event, the other moments of its meeting. */
function siblingsOf({ events }: Forecast): Map<string, string[]> {
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
