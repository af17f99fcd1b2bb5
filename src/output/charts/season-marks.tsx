import type { ForecastEvent, KindName } from '../../forecast/index.js';
import { utcFromTt } from '../../time/index.js';
import { px } from './px.js';
import type { Reach } from './ribbon.js';
import type { TimeScale } from './time-axis.js';

/** How an event is cut into its planet's ribbon. Kinds without an entry do not change what can be seen. */
type Mark = 'opposition' | 'evening' | 'morning' | 'sun' | 'station' | 'brightest';

const marks: Partial<Record<KindName, Mark>> = {
  opposition: 'opposition',
  'greatest-elongation-east': 'evening',
  'greatest-elongation-west': 'morning',
  conjunction: 'sun',
  'inferior-conjunction': 'sun',
  'superior-conjunction': 'sun',
  'stationary-retrograde': 'station',
  'stationary-direct': 'station',
  'greatest-brilliancy': 'brightest',
};

/** Mercury's stations come every two months and would bury its elongations. */
export const isMarked = ({ kind, bodies }: ForecastEvent): boolean =>
  marks[kind] !== undefined && !(marks[kind] === 'station' && bodies[0] === 'mercury');

interface SeasonMarkProps {
  readonly event: ForecastEvent;
  readonly x: TimeScale;
  readonly middle: number;
  readonly reach: Reach;
}

/** The sign of an event on its ribbon, with a bar beneath as wide as its date is unsure, where that can be seen. */
export function SeasonMark({ event, x, middle, reach }: SeasonMarkProps) {
  const at = px(x(event.utc));
  const above = px(middle - reach.above - 8);
  const below = px(middle + reach.below + 8);
  switch (marks[event.kind]) {
    case 'opposition':
      return <Diamond x={at} y={middle} />;
    case 'evening':
      return <path class="mark" d={`M${at} ${px(above - 4)}l4.5 8h-9z`} />;
    case 'morning':
      return <path class="mark" d={`M${at} ${px(below + 4)}l4.5 -8h-9z`} />;
    case 'sun':
      return <path class="mark line" d={`M${px(at - 4)} ${px(middle - 4)}l8 8m0 -8l-8 8`} />;
    case 'station':
      return (
        <path
          class="mark line"
          d={`M${at} ${px(middle - reach.above - 4)}V${px(middle + reach.below + 4)}`}
        />
      );
    case 'brightest':
      return (
        <g>
          <path
            class="mark"
            d={`M${at} ${px(below - 6)}l1.7 4.3l4.3 1.7l-4.3 1.7l-1.7 4.3l-1.7 -4.3l-4.3 -1.7l4.3 -1.7z`}
          />
          <path class="mark line" d={`M${px(x(startOf(event)))} ${px(below + 9)}H${px(x(endOf(event)))}`} />
        </g>
      );
    case undefined:
      return null;
  }
}

export const Diamond = ({ x, y }: { x: number; y: number }) => (
  <path class="mark" d={`M${x} ${px(y - 5.5)}l5 5.5l-5 5.5l-5 -5.5z`} />
);

const startOf = ({ interval, utc, uncertaintySeconds }: ForecastEvent): number =>
  interval === null ? utc - uncertaintySeconds.utc * 1000 : utcFromTt(interval.from);
const endOf = ({ interval, utc, uncertaintySeconds }: ForecastEvent): number =>
  interval === null ? utc + uncertaintySeconds.utc * 1000 : utcFromTt(interval.to);
