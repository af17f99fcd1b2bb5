import type { ForecastEvent } from '../../forecast/index.js';
import type { Site } from '../../sky/index.js';
import { bodiesWords, kindTitles } from '../event-words.js';
import { fixed } from '../numbers.js';
import { dateAndClock, uncertaintyShort } from '../uncertainty-words.js';
import { Cautions } from './cautions.js';
import { EventCell } from './event-cell.js';
import { byMonth, eventRows } from './event-rows.js';
import type { EventRow } from './event-rows.js';
import { GeocentricCell, SitesCell } from './place-cells.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';
import { Table } from './table.js';
import type { Column } from './table.js';
import { WhenCell } from './when-cell.js';

/** Every event, a table a month; those that no one on the Earth can see stand apart. */
export function EventsChapter(input: ReportInput) {
  const zone = zoneOf(input);
  const [home] = input.sites;
  const rows = eventRows(input.forecast);
  const months = byMonth(
    rows.filter(({ event }) => !isFromTheSun(event)),
    zone,
  );
  const fromTheSun = input.forecast.events.filter(isFromTheSun);
  return (
    <>
      <p>
        Dates and times are {home === undefined ? 'in UTC' : `those of the clocks at ${home.name}`}. The
        interval behind each holds the true instant in 95 of 100 cases. The moments of one meeting of two
        planets share a row.
      </p>
      <Cautions {...input} />
      <nav class="months" aria-label="Months">
        <ul>
          {months.map(({ id, title }) => (
            <li key={id}>
              <a href={`#month-${id}`}>{title}</a>
            </li>
          ))}
        </ul>
      </nav>
      {months.map(({ id, title, rows: ofMonth }) => (
        <section key={id} aria-labelledby={`month-${id}`}>
          <h3 id={`month-${id}`}>{title}</h3>
          <Table
            class="events"
            labelledBy={`month-${id}`}
            columns={columnsFor(zone, input.sites)}
            rows={ofMonth}
            keyOf={({ event }) => event.id}
          />
        </section>
      ))}
      {fromTheSun.length === 0 ? null : <FromTheSun events={fromTheSun} zone={zone} />}
    </>
  );
}

const isFromTheSun = ({ circumstances }: ForecastEvent): boolean => circumstances.about === 'heliocentric';

const columnsFor = (zone: string, sites: readonly Site[]): Column<EventRow>[] => [
  { title: 'When, how sure', class: 'when', cell: ({ event }) => <WhenCell event={event} zone={zone} /> },
  { title: 'What', class: 'what bare', cell: (row) => <EventCell row={row} zone={zone} /> },
  sites.length === 0
    ? { title: 'In the sky', cell: ({ event }) => <GeocentricCell event={event} /> }
    : {
        title: `From ${sites[0]!.name}`,
        class: 'bare',
        cell: ({ event }) => <SitesCell event={event} sites={sites} />,
      },
];

function FromTheSun({ events, zone }: { events: readonly ForecastEvent[]; zone: string }) {
  return (
    <section aria-labelledby="from-the-sun">
      <h3 id="from-the-sun">Line-ups as seen from the Sun</h3>
      <Table
        labelledBy="from-the-sun"
        columns={[
          {
            title: 'When, how sure',
            cell: (event) =>
              `${dateAndClock(event, zone)}, ${uncertaintyShort(event.uncertaintySeconds.utc)}`,
          },
          {
            title: 'What',
            class: 'bare',
            cell: (event) => `${bodiesWords(event)}, ${kindTitles[event.kind]}`,
          },
          {
            title: 'Heliocentric longitudes',
            class: 'number',
            cell: ({ circumstances }) =>
              circumstances.about === 'heliocentric'
                ? circumstances.bodies
                    .map(({ heliocentricLongitudeDeg }) => `${fixed(heliocentricLongitudeDeg, 1)}°`)
                    .join(', ')
                : '',
          },
        ]}
        rows={events}
        keyOf={({ id }) => id}
      />
    </section>
  );
}
