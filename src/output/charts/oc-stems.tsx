import { scaleLinear } from 'd3-scale';
import type { ResidualRow, ResidualSeries } from '../../forecast/index.js';
import { fixed, signed } from '../numbers.js';
import { COLUMN_WIDTH, Figure } from './figure.js';
import { TimeAxis, timeTicks } from './time-axis.js';

const LEFT = 52;
const TOP = 46;
const PANEL = 92;
const GAP = 30;
const HEIGHT = TOP + 2 * PANEL + GAP + 12;

interface OcStemsProps {
  readonly id: string;
  readonly series: ResidualSeries;
  readonly title: string;
  readonly finding: string;
  readonly tableId: string;
}

/** One stem an event from the zero line: days from the mean cycle above, hours from the Kepler orbits on their own scale below. */
export function OcStems({ id, series, title, finding, tableId }: OcStemsProps) {
  const x = scaleLinear()
    .domain([series.from, series.to])
    .range([LEFT, COLUMN_WIDTH - 8]);
  const perihelia = nearestToTheSun(series.rows);
  return (
    <Figure
      id={id}
      title={title}
      finding={finding}
      height={HEIGHT}
      tableId={tableId}
      legend={
        perihelia.size > 0
          ? 'A ring marks the event nearest to the planet’s perihelion: there it runs fastest, and the curve turns.'
          : undefined
      }
    >
      <TimeAxis ticks={timeTicks(series.from, series.to)} x={x} top={8} bottom={HEIGHT - 8} />
      <Panel
        rows={series.rows}
        x={x}
        top={TOP}
        unit="days"
        label="mean cycle"
        valueOf={({ meanDays }) => meanDays}
        ringed={perihelia}
        className="mean"
      />
      <Panel
        rows={series.rows}
        x={x}
        top={TOP + PANEL + GAP}
        unit="hours"
        label="Kepler orbits"
        valueOf={({ keplerTable1Days }) => (keplerTable1Days === null ? null : keplerTable1Days * 24)}
        ringed={perihelia}
        className="kepler"
      />
    </Figure>
  );
}

interface PanelProps {
  readonly rows: readonly ResidualRow[];
  readonly x: (utc: number) => number;
  readonly top: number;
  readonly unit: string;
  readonly label: string;
  readonly valueOf: (row: ResidualRow) => number | null;
  readonly ringed: ReadonlySet<string>;
  readonly className: string;
}

function Panel({ rows, x, top, unit, label, valueOf, ringed, className }: PanelProps) {
  const values = rows.map(valueOf).filter((value) => value !== null);
  const largest = Math.max(0, ...values.map(Math.abs));
  const middle = top + PANEL / 2;
  if (largest === 0) {
    return (
      <text x={LEFT} y={middle + 4} class="quiet">
        {label}: these events have no such estimate
      </text>
    );
  }
  const y = scaleLinear()
    .domain([-largest, largest])
    .range([top + PANEL - 8, top + 8]);
  const digits = largest < 10 ? 1 : 0;
  return (
    <g class={`stems ${className}`}>
      <line x1={LEFT} x2={COLUMN_WIDTH - 8} y1={middle} y2={middle} class="zero" />
      <text x={LEFT - 6} y={y(largest) + 5} class="end">
        {signed(largest, digits)}
      </text>
      <text x={LEFT - 6} y={middle + 4} class="end">
        {unit}
      </text>
      <text x={LEFT - 6} y={y(-largest) + 3} class="end">
        {fixed(-largest, digits)}
      </text>
      <text x={LEFT + 6} y={top - 4} class="quiet">
        refined − {label}, {unit}
      </text>
      {rows.map((row) => {
        const value = valueOf(row);
        if (value === null) return null;
        const [at, height] = [round(x(row.event.utc)), round(y(value))];
        return (
          <g key={row.event.id}>
            <line x1={at} x2={at} y1={middle} y2={height} class="stem" />
            <circle cx={at} cy={height} r={rows.length > 60 ? 1.6 : 2.6} />
            {ringed.has(row.event.id) ? <circle cx={at} cy={height} r={6} class="ring" /> : null}
          </g>
        );
      })}
    </g>
  );
}

const round = (value: number): number => Math.round(value * 10) / 10;

/** The events at which the planet is nearer to the Sun than at those before and after. */
function nearestToTheSun(rows: readonly ResidualRow[]): Set<string> {
  const distanceAu = ({ event: { circumstances } }: ResidualRow): number | null =>
    circumstances.about === 'one-body' ? circumstances.heliocentricDistanceAu : null;
  return new Set(
    rows
      .filter((row, i) => {
        const [before, here, after] = [rows[i - 1], row, rows[i + 1]].map((r) =>
          r === undefined ? null : distanceAu(r),
        );
        return before != null && here != null && after != null && here < before && here <= after;
      })
      .map(({ event }) => event.id),
  );
}
