import type { Forecast, ForecastEvent } from '../../forecast/index.js';
import { localDateTime } from '../../time/index.js';

/** A row of the full table: one event, or all the moments of one meeting. */
export interface EventRow {
  /** The event that gives the row its date: of a meeting the least separation where there is one. */
  readonly event: ForecastEvent;
  /** The other moments of its meeting, in order of time. */
  readonly moments: readonly ForecastEvent[];
}

/** Every event of a forecast once, in order of time; the moments of a meeting in one row. */
export function eventRows({ events, meetings }: Forecast): EventRow[] {
  const speakers = new Map<string, ForecastEvent>();
  for (const meeting of meetings) {
    const moments = events.filter((event) => event.meeting === meeting.id);
    const speaker = moments.find(({ id }) => id === meeting.appulse) ?? moments[0];
    if (speaker !== undefined) speakers.set(meeting.id, speaker);
  }
  return events.flatMap((event): EventRow[] => {
    const speaker = event.meeting === null ? undefined : speakers.get(event.meeting);
    if (speaker === undefined) return [{ event, moments: [] }];
    if (speaker !== event) return [];
    return [{ event, moments: events.filter((other) => other.meeting === event.meeting && other !== event) }];
  });
}

export interface Month {
  /** `2027-02`. */
  readonly id: string;
  /** `February 2027`. */
  readonly title: string;
  readonly rows: readonly EventRow[];
}

/** Rows by the month of a zone's calendar in which they fall. */
export function byMonth(rows: readonly EventRow[], zone: string): Month[] {
  const months = new Map<string, { id: string; title: string; rows: EventRow[] }>();
  for (const row of rows) {
    const date = localDateTime(row.event.utc, zone);
    const id = date.toFormat('yyyy-MM');
    const month = months.get(id) ?? { id, title: date.toFormat('LLLL yyyy'), rows: [] };
    month.rows.push(row);
    months.set(id, month);
  }
  return [...months.values()];
}
