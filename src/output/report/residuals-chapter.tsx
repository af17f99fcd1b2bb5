import { titleOf } from '../../bodies/index.js';
import type { ResidualRow, ResidualSeries, Spread } from '../../forecast/index.js';
import { localDateTime } from '../../time/index.js';
import { OcStems } from '../charts/index.js';
import { kindTitles } from '../event-words.js';
import { fixed, signed } from '../numbers.js';
import type { ReportInput } from './report-input.js';
import { Table } from './table.js';

export function ResidualsChapter({ residuals }: ReportInput) {
  return (
    <>
      <p>
        The mean cycle is the back of the envelope: every event a whole number of synodic periods after the
        last. The Kepler orbits let the planets run faster near the Sun. The ephemeris has the last word;
        these pictures show what it adds.
      </p>
      {residuals.map((series) => (
        <Series key={idOf(series)} series={series} />
      ))}
    </>
  );
}

const idOf = ({ kind, bodies }: ResidualSeries): string => `oc-${kind}-${bodies.join('-')}`;

function Series({ series }: { series: ResidualSeries }) {
  const id = idOf(series);
  const subject = `${series.bodies.map(titleOf).join(' and ')}, ${kindTitles[series.kind]}`;
  const finding = `${subject}: ${missWords('the mean cycle', series.mean)}; ${missWords('the Kepler orbits', series.keplerTable1)}.`;
  return (
    <>
      <OcStems
        id={id}
        series={series}
        title={titleFor(series, subject)}
        finding={finding}
        tableId={`${id}-table`}
      />
      <details>
        <summary>
          {subject}: {series.rows.length} events
        </summary>
        <Table<ResidualRow>
          id={`${id}-table`}
          caption={`${finding}${series.beyondTable1 ? ' Some lie outside 1800–2050, for which Table 1 was made.' : ''}`}
          columns={[
            { title: 'Cycle', class: 'number', cell: ({ event }) => signed(event.cycle, 0) },
            {
              title: 'Refined, UTC',
              cell: ({ event }) => localDateTime(event.utc, 'UTC').toFormat('yyyy-MM-dd HH:mm'),
            },
            { title: 'Mean, d', class: 'number', cell: ({ meanDays }) => daysWords(meanDays, 2) },
            {
              title: 'Kepler Table 1, d',
              class: 'number',
              cell: ({ keplerTable1Days }) => daysWords(keplerTable1Days, 3),
            },
            {
              title: 'Kepler Table 2, d',
              class: 'number',
              cell: ({ keplerTable2Days }) => daysWords(keplerTable2Days, 3),
            },
          ]}
          rows={series.rows}
          keyOf={({ event }) => event.id}
        />
      </details>
    </>
  );
}

const daysWords = (days: number | null, digits: number): string =>
  days === null ? '–' : signed(days, digits);

function titleFor(series: ResidualSeries, subject: string): string {
  const [mean, kepler] = [series.mean, series.keplerTable1];
  if (mean === null || kepler === null) return subject;
  return `${subject}: the mean cycle is off by up to ${spanWords(mean.worstDays)}, the Kepler orbits by ${spanWords(kepler.worstDays)}`;
}

const missWords = (what: string, spread: Spread | null): string =>
  spread === null
    ? `${what} gives no date`
    : `${what} misses by ${spanWords(spread.rmsDays)} rms and ${spanWords(spread.worstDays)} at worst`;

function spanWords(days: number): string {
  if (days >= 2) return `${fixed(days, days < 10 ? 1 : 0)} days`;
  if (days * 24 >= 2) return `${fixed(days * 24, 0)} hours`;
  return `${fixed(days * 1440, 0)} minutes`;
}
