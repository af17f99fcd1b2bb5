import { scaleLinear } from 'd3-scale';
import type { ScaleLinear } from 'd3-scale';
import type { ResidualRow } from '../../forecast/index.js';
import { fixed, signed } from '../numbers.js';
import { GUTTER_WIDTH, PLOT_WIDTH } from './figure.js';
import { px } from './px.js';
import type { TimeScale } from './time-axis.js';

/** One of the two comparisons of the O−C stems. */
export interface Panel {
  readonly name: 'mean' | 'kepler';
  readonly words: string;
  readonly unit: string;
  readonly top: number;
  readonly valueOf: (row: ResidualRow) => number | null;
  /** Half-width of the bar at the stem's foot, in the panel's unit. */
  readonly halfWidthOf: (row: ResidualRow) => number;
}

/** From the panel's unit to px; null where no event has a value. */
export function panelScale(
  { top, valueOf, halfWidthOf }: Panel,
  rows: readonly ResidualRow[],
  height: number,
): ScaleLinear<number, number> | null {
  const known = rows.filter((row) => valueOf(row) !== null);
  const largest = Math.max(0, ...known.flatMap((row) => [Math.abs(valueOf(row)!), halfWidthOf(row)]));
  return largest === 0
    ? null
    : scaleLinear()
        .domain([-largest, largest])
        .range([top + height, top]);
}

/** The ends and the middle of a panel's scale, to stand beside the picture. */
export function OcPanelScale({ panel, y }: { panel: Panel; y: ScaleLinear<number, number> | null }) {
  if (y === null) return null;
  const largest = y.domain()[1]!;
  const digits = largest < 10 ? 1 : 0;
  const at = GUTTER_WIDTH - 10;
  return (
    <g>
      {[largest, 0, -largest].map((value) => (
        <text key={value} x={at} y={px(y(value) + 5)} class="end quiet">
          {value === 0 ? '0' : value > 0 ? signed(value, digits) : fixed(value, digits)} {panel.unit}
        </text>
      ))}
    </g>
  );
}

interface OcPanelProps {
  readonly panel: Panel;
  readonly rows: readonly ResidualRow[];
  readonly x: TimeScale;
  readonly y: ScaleLinear<number, number> | null;
  readonly ringed: ReadonlySet<string>;
}

export function OcPanel({ panel, rows, x, y, ringed }: OcPanelProps) {
  const caption = (
    <text x={6} y={panel.top - 12} class="quiet word">
      {y === null ? `${panel.words}: these events have no such estimate` : panel.words}
    </text>
  );
  if (y === null) return caption;
  const crowded = rows.length > 60;
  return (
    <g class={panel.name}>
      <path d={`M0 ${px(y(0))}H${PLOT_WIDTH}`} class="zero" />
      {rows.map((row) => {
        const value = panel.valueOf(row);
        if (value === null) return null;
        const at = px(x(row.event.utc));
        const half = panel.halfWidthOf(row);
        return (
          <g key={row.event.id}>
            {half === 0 ? null : (
              <path class="bar" d={`M${px(at - 3)} ${px(y(half))}h6m-3 0V${px(y(-half))}m-3 0h6`} />
            )}
            <path d={`M${at} ${px(y(0))}V${px(y(value))}`} class="stem" />
            <circle cx={at} cy={px(y(value))} r={crowded ? 1.6 : 3} class="tip" />
            {ringed.has(row.event.id) ? <circle cx={at} cy={px(y(value))} r={6.5} class="ring" /> : null}
          </g>
        );
      })}
      {caption}
    </g>
  );
}
