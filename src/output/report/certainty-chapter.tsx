import type { ForecastEvent } from '../../forecast/index.js';
import { SurenessStrip } from '../charts/index.js';
import { kindTitles } from '../event-words.js';
import { uncertaintyWords } from '../uncertainty-words.js';
import type { ReportInput } from './report-input.js';
import { surenessByKind } from './sureness.js';
import { Table } from './table.js';

export function CertaintyChapter({ forecast: { events, source } }: ReportInput) {
  const kinds = surenessByKind(events);
  if (kinds.length === 0) return <p>Source: {source.description}.</p>;
  const surest = kinds[0]!;
  const vaguest = kinds.at(-1)!;
  const title = certaintyTitle(events);
  return (
    <>
      <p>
        Each instant carries its own interval: how far the ephemeris may be off, divided by how fast the
        bodies move against each other. An opposition passes at a degree a day, so arcseconds become minutes;
        near a station, or where two slow planets meet, they become hours. What is flat, such as the greatest
        brilliancy, has days.
      </p>
      <SurenessStrip
        title={title}
        finding={`${title}. Surest: ${kindTitles[surest.kind]}, ${uncertaintyWords(surest.middleSeconds)}; least sure: ${kindTitles[vaguest.kind]}, ${uncertaintyWords(vaguest.middleSeconds)}.`}
        tableId="sureness-table"
        kinds={kinds.map((kind) => ({ ...kind, title: kindTitles[kind.kind] }))}
      />
      <Table
        id="sureness-table"
        caption="Half-widths of the intervals that hold the instants in 95 of 100 cases, in UTC"
        columns={[
          { title: 'Kind', cell: ({ kind }) => kindTitles[kind] },
          { title: 'Events', class: 'number', cell: ({ count }) => count },
          { title: 'Typically', cell: ({ middleSeconds }) => uncertaintyWords(middleSeconds) },
          { title: 'At worst', cell: ({ worstSeconds }) => uncertaintyWords(worstSeconds) },
        ]}
        rows={kinds}
        keyOf={({ kind }) => kind}
      />
      <p class="note">
        Source: {source.description}. {grazingWords(events)}
      </p>
    </>
  );
}

const SURE_SECONDS = 900;

/** `339 of 426 instants are known to a quarter of an hour or better`. */
export function certaintyTitle(events: readonly ForecastEvent[]): string {
  const sure = events.filter(({ uncertaintySeconds }) => uncertaintySeconds.utc <= SURE_SECONDS).length;
  const known = sure === events.length ? 'Every instant is' : `${sure} of ${events.length} instants are`;
  return `${known} known to a quarter of an hour or better`;
}

function grazingWords(events: readonly ForecastEvent[]): string {
  const grazing = events.filter(({ certain }) => !certain).length;
  if (grazing === 0) return '';
  return grazing === 1
    ? 'One event grazes, and another ephemeris may lack it.'
    : `${grazing} events graze, and another ephemeris may lack them.`;
}
