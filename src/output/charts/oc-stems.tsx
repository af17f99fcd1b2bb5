import { scaleLinear } from 'd3-scale';
import type { ResidualRow, ResidualSeries } from '../../forecast/index.js';
import { Figure, PLOT_WIDTH } from './figure.js';
import { OcPanel, OcPanelScale, panelScale } from './oc-panel.js';
import type { Panel } from './oc-panel.js';
import { TimeAxis, timeTicks } from './time-axis.js';

const TOP = 52;
const PANEL_HEIGHT = 96;
const GAP = 40;
const HEIGHT = TOP + 2 * PANEL_HEIGHT + GAP + 12;

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
    .range([6, PLOT_WIDTH - 6]);
  const ringed = nearestToTheSun(series.rows);
  const panels: Panel[] = [
    {
      name: 'mean',
      words: 'refined − mean cycle, days',
      unit: 'd',
      top: TOP,
      valueOf: ({ meanDays }) => meanDays,
      halfWidthOf: () => 0,
    },
    {
      name: 'kepler',
      words: 'refined − Kepler orbits, hours; bars: how sure the refined instant is',
      unit: 'h',
      top: TOP + PANEL_HEIGHT + GAP,
      valueOf: ({ keplerTable1Days }) => (keplerTable1Days === null ? null : keplerTable1Days * 24),
      halfWidthOf: ({ event }) => event.uncertaintySeconds.tt / 3600,
    },
  ];
  return (
    <Figure
      {...{ id, title, finding, tableId }}
      width={PLOT_WIDTH}
      height={HEIGHT}
      gutter={panels.map((panel) => (
        <OcPanelScale key={panel.name} panel={panel} y={panelScale(panel, series.rows, PANEL_HEIGHT)} />
      ))}
      legend={
        ringed.size === 0 ? undefined : (
          <p class="note">
            A ring marks the event nearest to the planet’s perihelion: there it runs fastest, and the curve
            turns.
          </p>
        )
      }
    >
      <TimeAxis ticks={timeTicks(series.from, series.to)} x={x} top={8} bottom={HEIGHT} />
      {panels.map((panel) => (
        <OcPanel
          key={panel.name}
          panel={panel}
          rows={series.rows}
          x={x}
          y={panelScale(panel, series.rows, PANEL_HEIGHT)}
          ringed={panel.name === 'mean' ? ringed : NONE}
        />
      ))}
    </Figure>
  );
}

const NONE: ReadonlySet<string> = new Set();

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
