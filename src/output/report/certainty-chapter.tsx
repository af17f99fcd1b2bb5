import type { ForecastEvent, KindName } from '../../forecast/index.js';
import { kindNames } from '../../forecast/index.js';
import { kindTitles } from '../event-words.js';
import { uncertaintyWords } from '../uncertainty-words.js';
import type { ReportInput } from './report-input.js';
import { Table } from './table.js';

interface Sureness {
  readonly kind: KindName;
  readonly count: number;
  readonly middleSeconds: number;
  readonly worstSeconds: number;
}

export function CertaintyChapter({ forecast: { events, source } }: ReportInput) {
  const rows = kindNames.flatMap((kind) => surenessOf(kind, events));
  const grazing = events.filter(({ certain }) => !certain);
  return (
    <>
      <p>
        Each instant carries its own interval: how far the ephemeris may be off, divided by how fast the
        bodies move against each other. An opposition passes at a degree a day, so arcseconds become minutes;
        near a station, or where two slow planets meet, they become hours. What is flat, such as the greatest
        brilliancy, has days.
      </p>
      <Table
        caption="95 % half-widths of the instants in this report, in UTC"
        columns={[
          { title: 'Kind', cell: ({ kind }) => kindTitles[kind] },
          { title: 'Events', class: 'number', cell: ({ count }) => count },
          { title: 'Typically', cell: ({ middleSeconds }) => uncertaintyWords(middleSeconds) },
          { title: 'At worst', cell: ({ worstSeconds }) => uncertaintyWords(worstSeconds) },
        ]}
        rows={rows}
        keyOf={({ kind }) => kind}
      />
      <p class="note">
        Source: {source.description}.{' '}
        {grazing.length === 0 ? '' : `${grazing.length} events graze and may be missing elsewhere.`}
      </p>
    </>
  );
}

function surenessOf(kind: KindName, events: readonly ForecastEvent[]): Sureness[] {
  const seconds = events
    .filter((event) => event.kind === kind)
    .map(({ uncertaintySeconds }) => uncertaintySeconds.utc)
    .sort((a, b) => a - b);
  if (seconds.length === 0) return [];
  return [
    {
      kind,
      count: seconds.length,
      middleSeconds: seconds[Math.floor(seconds.length / 2)]!,
      worstSeconds: seconds.at(-1)!,
    },
  ];
}
