import type { ScaleLinear } from 'd3-scale';
import { localDateTime, utcMillis } from '../../time/index.js';
import type { UtcMillis } from '../../time/index.js';
import { px } from './px.js';

export type TimeScale = ScaleLinear<number, number>;

export interface Tick {
  readonly utc: UtcMillis;
  readonly label: string;
  readonly major: boolean;
}

const WANTED_TICKS = 9;
const MONTH_STEPS = [1, 2, 3, 6, 12, 24, 60, 120, 240, 600, 1200] as const;

/** Ticks at the beginnings of months, quarters or years: about nine with a label, whatever the span. */
export function timeTicks(from: UtcMillis, to: UtcMillis): Tick[] {
  const first = localDateTime(from, 'UTC').startOf('month');
  const months = localDateTime(to, 'UTC').diff(first, 'months').months;
  const step = MONTH_STEPS.find((candidate) => months / candidate <= WANTED_TICKS) ?? 1200;
  const years = step / 12;
  const start =
    step >= 12
      ? first.set({ year: Math.ceil(first.year / years) * years, month: 1 })
      : first.startOf('quarter');
  return Array.from({ length: Math.ceil(months / step) + 2 }, (_, i) => start.plus({ months: i * step }))
    .map((date) => ({
      utc: utcMillis(date.toMillis()),
      label: step >= 12 ? date.toFormat('yyyy') : date.toFormat(date.month === 1 ? 'LLL yyyy' : 'LLL'),
      major: step >= 12 || date.month === 1,
    }))
    .filter(({ utc }) => utc >= from && utc <= to);
}

/** A label needs this much to its right, px. */
const LABEL_ROOM = 44;

interface TimeAxisProps {
  readonly ticks: readonly Tick[];
  readonly x: TimeScale;
  readonly top: number;
  readonly bottom: number;
}

/** Month lines through a picture, with their names along the top. */
export function TimeAxis({ ticks, x, top, bottom }: TimeAxisProps) {
  const right = x.range()[1]!;
  return (
    <g class="axis">
      {ticks.map(({ utc, label, major }) => (
        <g key={utc}>
          <path d={`M${px(x(utc))} ${top}V${bottom}`} class={major ? 'rule strong' : 'rule'} />
          {x(utc) > right - LABEL_ROOM ? null : (
            <text x={px(x(utc) + 4)} y={top + 10}>
              {label}
            </text>
          )}
        </g>
      ))}
    </g>
  );
}
