import type { ForecastEvent } from '../../forecast/index.js';
import type { Site } from '../../sky/index.js';
import { isoUtc, localDateTime, zoneAbbreviation } from '../../time/index.js';
import { bodiesWords, circumstancesLine, kindTitles, seriesWords } from '../event-words.js';
import { tellInstant, uncertaintyShort } from '../uncertainty-words.js';
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
    { title: 'When, how sure', class: 'when', cell: (event) => <When event={event} zone={zone} /> },
    { title: 'What', class: 'what', cell: (event) => <What event={event} /> },
    ...(sites.length === 0
      ? []
      : [{ title: 'From here', cell: (event: ForecastEvent) => <FromSites event={event} sites={sites} /> }]),
  ];
}

function When({ event, zone }: { event: ForecastEvent; zone: string }) {
  const { utc, uncertaintySeconds } = event;
  const { isoDate, weekday, time } = tellInstant(utc, uncertaintySeconds.utc, zone);
  return (
    <>
      <time dateTime={isoUtc(utc)}>
        {isoDate} {weekday}
      </time>
      <br />
      {time === '' ? '' : `${time} ${zoneAbbreviation(utc, zone)} `}
      <span class="place">{uncertaintyShort(uncertaintySeconds.utc)}</span>
    </>
  );
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

/** The home site in full; the partners that see it in a line each, those that do not in one together. */
function FromSites({ event, sites }: { event: ForecastEvent; sites: readonly Site[] }) {
  const [home, ...partners] = event.local.map((view, i) => ({ view, name: sites[i]!.name }));
  const blind = partners.filter(({ view }) => view.bestLook === null);
  return (
    <ul>
      <li>{home?.view.verdict}</li>
      {partners
        .filter(({ view }) => view.bestLook !== null)
        .map(({ view, name }) => (
          <li key={view.site}>
            <span class="place">
              {name}, {clockAt(event, view.zone)}:
            </span>{' '}
            {view.verdict}
          </li>
        ))}
      {blind.length === 0 || home?.view.bestLook === null ? null : (
        <li class="place">Not visible from {blind.map(({ name }) => name).join(' or ')}.</li>
      )}
    </ul>
  );
}

function clockAt(event: ForecastEvent, zone: string): string {
  const { time } = tellInstant(event.utc, event.uncertaintySeconds.utc, zone);
  const date = localDateTime(event.utc, zone).toFormat('d LLL');
  return time === '' ? date : `${date} ${time}`;
}
