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
  { seconds: 1, words: '1 s' },
  { seconds: 10, words: '10 s' },
  { seconds: 60, words: '1 min' },
  { seconds: 600, words: '10 min' },
  { seconds: 3600, words: '1 h' },
  { seconds: 86_400, words: '1 day' },
  { seconds: 864_000, words: '10 days' },
  { seconds: 8_640_000, words: '100 days' },
] as const;

/** A bar a kind from its surest date to its least sure one, on a scale of powers; a dot at the middle one. */
export function SurenessStrip({ kinds, title, finding, tableId }: SurenessStripProps) {
  const least = Math.min(...kinds.map(({ bestSeconds }) => bestSeconds));
  const most = Math.max(...kinds.map(({ worstSeconds }) => worstSeconds));
  const first = TICKS.findLast(({ seconds }) => seconds <= least) ?? TICKS[0];
  const last = TICKS.find(({ seconds }) => seconds > most) ?? TICKS.at(-1)!;
  const x = scaleLog()
    .domain([first.seconds, last.seconds])
    .range([LABELS, WIDTH - 30])
    .clamp(true);
  const height = TOP + kinds.length * ROW_HEIGHT + 6;
  return (
    <Figure id="sureness" width={WIDTH} height={height} {...{ title, finding, tableId }}>
      <g class="axis">
        {TICKS.filter(({ seconds }) => seconds >= first.seconds && seconds <= last.seconds).map(
          ({ seconds, words }) => (
            <g key={words}>
              <path d={`M${px(x(seconds))} 18V${height}`} class="rule strong" />
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
