import { cycleLabel } from '../forecast/index.js';
import type { ResidualSeries, Spread } from '../forecast/index.js';
import { signed } from '../output/index.js';
import { isoUtc } from '../time/index.js';
import type { Sheet } from './aligned.js';

const days = (value: number | null, digits: number): string =>
  value === null ? 'none' : `${signed(value, digits)} d`;

/** Event by event: refined − first estimate. */
export const residualSheet = ({ rows }: ResidualSeries): Sheet => ({
  header: ['cycle', 'refined (UTC)', 'O−C mean', 'O−C Kepler, Table 1', 'O−C Kepler, Table 2'],
  rows: rows.map(({ event, meanDays, keplerTable1Days, keplerTable2Days }) => [
    cycleLabel(event.cycle),
    isoUtc(event.utc).slice(0, 16).replace('T', ' '),
    days(meanDays, 2),
    days(keplerTable1Days, 4),
    days(keplerTable2Days, 4),
  ]),
});

/** How far each first estimate misses, on the whole and at worst. */
export function spreadSheet({ mean, keplerTable1, keplerTable2 }: ResidualSeries): Sheet {
  const row = (name: string, spread: Spread | null, digits: number): string[] =>
    spread === null
      ? [name, 'none', 'none', 'none']
      : [
          name,
          String(spread.count),
          `${spread.rmsDays.toFixed(digits)} d`,
          `${spread.worstDays.toFixed(digits)} d`,
        ];
  return {
    header: ['first estimate', 'events', 'rms', 'worst'],
    rows: [
      row('mean cycle', mean, 2),
      row('Kepler orbits, Table 1', keplerTable1, 4),
      row('Kepler orbits, Table 2', keplerTable2, 4),
    ],
  };
}
