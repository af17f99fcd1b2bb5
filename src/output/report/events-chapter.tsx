import type { ForecastEvent } from '../../forecast/index.js';
import type { Site } from '../../sky/index.js';
import { isoUtc, localDateTime } from '../../time/index.js';
import { bodiesWords, circumstancesLine, kindTitles, seriesWords } from '../event-words.js';
import { dateAndClock, tellInstant, uncertaintyShort } from '../uncertainty-words.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';
import { Table } from './table.js';
import type { Column } from './table.js';

/** Every event, a table a month; those that no one on the Earth can see stand apart. */
export function EventsChapter(input: ReportInput) {
  const zone = zoneOf(input);
  const { events } = input.forecast;
  const inTheSky = events.filter(({ circumstances }) => circumstances.about !== 'heliocentric');
  const fromTheSun = events.filter(({ circumstances }) => circumstances.about === 'heliocentric');
  return (
    <>
      <p class="note" id="events-table">
        Times are those of {input.sites[0]?.name ?? 'UTC'}; “how sure” is the interval that holds the instant
        in 95 of 100 cases.
      </p>
      {byMonth(inTheSky, zone).map(([month, ofMonth]) => (
        <Table
          key={month}
          caption={month}
          columns={columnsFor(zone, input.sites)}
          rows={ofMonth}
          keyOf={({ id }) => id}
        />
      ))}
      {fromTheSun.length === 0 ? null : (
        <>
          <h3>Line-ups as seen from the Sun</h3>
          <Table
            caption="Two planets at one heliocentric longitude, or opposite each other"
            columns={columnsFor(zone, [])}
            rows={fromTheSun}
            keyOf={({ id }) => id}
          />
        </>
      )}
    </>
  );
}

function byMonth(events: readonly ForecastEvent[], zone: string): [string, ForecastEvent[]][] {
  const months = new Map<string, ForecastEvent[]>();
  for (const event of events) {
    const month = localDateTime(event.utc, zone).toFormat('LLLL yyyy');
    months.set(month, [...(months.get(month) ?? []), event]);
  }
  return [...months];
}

function columnsFor(zone: string, sites: readonly Site[]): Column<ForecastEvent>[] {
  return [
    {
      title: 'When',
      class: 'when',
      cell: (event) => <time dateTime={isoUtc(event.utc)}>{dateAndClock(event, zone)}</time>,
    },
    {
      title: 'How sure',
      class: 'sure',
      cell: ({ uncertaintySeconds }) => uncertaintyShort(uncertaintySeconds.utc),
    },
    { title: 'What', cell: (event) => <What event={event} /> },
    ...(sites.length === 0
      ? []
      : [{ title: 'From here', cell: (event: ForecastEvent) => <FromSites event={event} sites={sites} /> }]),
  ];
}

function What({ event }: { event: ForecastEvent }) {
  const series = seriesWords(event);
  return (
    <>
      <strong>{bodiesWords(event)}</strong>, {kindTitles[event.kind]}
      {series === null ? '' : `, ${series}`}
      {event.certain ? '' : ' (grazing: another ephemeris may lack it)'}
      <br />
      <span class="place">{circumstancesLine(event)}</span>
    </>
  );
}

/** The home site in full, the partners in a line each. */
function FromSites({ event, sites }: { event: ForecastEvent; sites: readonly Site[] }) {
  return (
    <ul>
      {event.local.map((view, i) => (
        <li key={view.site}>
          {i === 0 ? null : (
            <span class="place">
              {sites[i]!.name}, {clockAt(event, view.zone)}:{' '}
            </span>
          )}
          {view.verdict}
        </li>
      ))}
    </ul>
  );
}

function clockAt(event: ForecastEvent, zone: string): string {
  const { time } = tellInstant(event.utc, event.uncertaintySeconds.utc, zone);
  const date = localDateTime(event.utc, zone).toFormat('d LLL');
  return time === '' ? date : `${date} ${time}`;
}
