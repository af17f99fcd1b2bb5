import { scaleLog } from 'd3-scale';
import { COLUMN_WIDTH, Figure } from './figure.js';
import { px } from './px.js';

/** How sure the dates of one kind are. */
export interface Sureness {
  readonly title: string;
  readonly bestSeconds: number;
  readonly middleSeconds: number;
  readonly worstSeconds: number;
}

interface SurenessStripProps {
  readonly kinds: readonly Sureness[];
  readonly title: string;
  readonly finding: string;
  readonly tableId: string;
}

const LABELS = 248;
const WIDTH = COLUMN_WIDTH;
const TOP = 26;
const ROW_HEIGHT = 22;
const TICKS = [
  [1, '1 s'],
  [60, '1 min'],
  [600, '10 min'],
  [3600, '1 h'],
  [86_400, '1 day'],
  [864_000, '10 days'],
  [8_640_000, '100 days'],
] as const;

/** A bar a kind from its surest date to its least sure one, on a scale of powers; a dot at the middle one. */
export function SurenessStrip({ kinds, title, finding, tableId }: SurenessStripProps) {
  const least = Math.min(...kinds.map(({ bestSeconds }) => bestSeconds));
  const most = Math.max(...kinds.map(({ worstSeconds }) => worstSeconds));
  const x = scaleLog()
    .domain([least / 1.6, most * 1.6])
    .range([LABELS, WIDTH - 8]);
  const height = TOP + kinds.length * ROW_HEIGHT + 6;
  return (
    <Figure id="sureness" width={WIDTH} height={height} {...{ title, finding, tableId }}>
      <g class="axis">
        {TICKS.filter(([seconds]) => seconds > x.domain()[0]! && seconds < x.domain()[1]!).map(
          ([seconds, words]) => (
            <g key={words}>
              <line x1={px(x(seconds))} x2={px(x(seconds))} y1={18} y2={height} class="rule strong" />
              <text x={px(x(seconds))} y={12} class="middle">
                {words}
              </text>
            </g>
          ),
        )}
      </g>
      {kinds.map(({ title: name, bestSeconds, middleSeconds, worstSeconds }, i) => {
        const y = TOP + (i + 0.5) * ROW_HEIGHT;
        return (
          <g key={name}>
            <text x={0} y={y + 4}>
              {name}
            </text>
            <path d={`M${px(x(bestSeconds))} ${y}H${px(x(worstSeconds))}`} class="range" />
            <circle cx={px(x(middleSeconds))} cy={y} r={4} class="tip" />
          </g>
        );
      })}
    </Figure>
  );
}
