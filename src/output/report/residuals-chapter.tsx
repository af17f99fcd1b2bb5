import { cycleLabel } from '../../forecast/index.js';
import type { ResidualRow, ResidualSeries } from '../../forecast/index.js';
import { localDateTime } from '../../time/index.js';
import { OcStems } from '../charts/index.js';
import { signed } from '../numbers.js';
import type { ReportInput } from './report-input.js';
import { findingOf, residualTitle, spreadWords, subjectOf } from './residual-words.js';
import { Table } from './table.js';

export function ResidualsChapter({ residuals }: ReportInput) {
  return (
    <>
      <p>
        The mean cycle is the back of the envelope: every event a whole number of synodic periods after the
        last. The Kepler orbits let the planets run faster near the Sun. The ephemeris has the last word;
        these pictures show what it adds.
      </p>
      <Spreads residuals={residuals} />
      {residuals.map((series) => (
        <Series key={idOf(series)} series={series} />
      ))}
    </>
  );
}

const idOf = ({ kind, bodies }: ResidualSeries): string => `oc-${kind}-${bodies.join('-')}`;

/** How far each first estimate falls from the refined instants, all series side by side. */
function Spreads({ residuals }: Pick<ReportInput, 'residuals'>) {
  return (
    <Table<ResidualSeries>
      caption="Misses of the first estimates: root mean square, and the worst"
      columns={[
        { title: 'Series', cell: (series) => subjectOf(series) },
        { title: 'Events', class: 'number', cell: ({ rows }) => rows.length },
        { title: 'Mean cycle', class: 'number', cell: ({ mean }) => spreadWords(mean) },
        { title: 'Kepler, Table 1', class: 'number', cell: ({ keplerTable1 }) => spreadWords(keplerTable1) },
        { title: 'Kepler, Table 2', class: 'number', cell: ({ keplerTable2 }) => spreadWords(keplerTable2) },
      ]}
      rows={residuals}
      keyOf={idOf}
    />
  );
}

function Series({ series }: { series: ResidualSeries }) {
  const id = idOf(series);
  const subject = subjectOf(series);
  const finding = findingOf(series);
  return (
    <>
      <OcStems
        id={id}
        series={series}
        title={residualTitle(series)}
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
            {
              title: 'Refined, UTC',
              cell: ({ event }) => localDateTime(event.utc, 'UTC').toFormat('yyyy-MM-dd HH:mm'),
            },
            { title: 'Cycle', class: 'number', cell: ({ event }) => cycleLabel(event.cycle) },
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
