import type { ResidualSeries } from '../forecast/index.js';
import { isoUtc, utcFromTt } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import { csv } from './csv.js';
import type { Cell } from './csv.js';
import { round, rounded } from './round.js';

const header = [
  'kind',
  'bodies',
  'cycle',
  'id',
  'refined_utc',
  'uncertainty_tt_s',
  'mean_utc',
  'kepler_table1_utc',
  'kepler_table2_utc',
  'mean_residual_d',
  'kepler_table1_residual_d',
  'kepler_table2_residual_d',
];

const iso = (tt: TtDays | null): Cell => (tt === null ? null : isoUtc(utcFromTt(tt)));
const days = (value: number | null): Cell => (value === null ? null : rounded(value, 5));

/** Refined instants beside their first estimates, a row an event, the series one after the other. */
export function residualsCsv(series: readonly ResidualSeries[]): string {
  return csv(
    header,
    series.flatMap(({ kind, bodies, rows }) =>
      rows.map((row) => [
        kind,
        bodies.join(' '),
        row.event.cycle,
        row.event.id,
        isoUtc(row.event.utc),
        round.seconds(row.event.uncertaintySeconds.tt),
        iso(row.mean),
        iso(row.keplerTable1),
        iso(row.keplerTable2),
        days(row.meanDays),
        days(row.keplerTable1Days),
        days(row.keplerTable2Days),
      ]),
    ),
  );
}
