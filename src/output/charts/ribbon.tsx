import { area } from 'd3-shape';
import type { Season, SeasonSample, SeasonState } from '../../forecast/index.js';
import type { UtcMillis } from '../../time/index.js';
import { px } from './px.js';
import type { TimeScale } from './time-axis.js';

/** A planet that can be shown at all is drawn at least this thick. */
const THINNEST = 1.6;

export interface RibbonScale {
  readonly x: TimeScale;
  readonly pixelsPerHour: number;
}

interface RibbonProps {
  readonly season: Season;
  readonly scale: RibbonScale;
  /** The height of its thread: the middle of every night. */
  readonly middle: number;
}

/** One planet's ribbon on its thread: above it the hours before the middle of the night, below it those after. */
export function Ribbon({ season: { samples }, scale, middle }: RibbonProps) {
  const shape = area<SeasonSample>()
    .x(({ utc }) => px(scale.x(utc)))
    .y0((sample) => px(middle + reach(sample, scale).below))
    .y1((sample) => px(middle - reach(sample, scale).above));
  return (
    <g>
      <line x1={scale.x.range()[0]} x2={scale.x.range()[1]} y1={middle} y2={middle} class="thread" />
      {runsOf(samples).map(({ state, samples: run }) =>
        state === 'sun' ? (
          <path
            key={run[0]!.utc}
            d={`M${px(scale.x(run[0]!.utc))} ${middle}H${px(scale.x(run.at(-1)!.utc))}`}
            class="glare"
          />
        ) : (
          <path key={run[0]!.utc} d={shape([...run]) ?? ''} class={`ribbon fill-${state}`} />
        ),
      )}
    </g>
  );
}

export interface Reach {
  readonly above: number;
  readonly below: number;
}

/** How far a ribbon reaches from its thread, px; the side of the night to which a thin one belongs is kept. */
function reach({ state, eveningHours, morningHours }: SeasonSample, { pixelsPerHour }: RibbonScale): Reach {
  if (state === 'none' || state === 'sun') return { above: 0, below: 0 };
  const [above, below] = [eveningHours * pixelsPerHour, morningHours * pixelsPerHour];
  return {
    above: state === 'dawn' ? above : Math.max(THINNEST, above),
    below: state === 'dusk' ? below : Math.max(THINNEST, below),
  };
}

/** The reach at any instant of the span. */
export function reachAt({ samples }: Season, utc: UtcMillis, scale: RibbonScale): Reach {
  const nearest = samples.reduce((best, sample) =>
    Math.abs(sample.utc - utc) < Math.abs(best.utc - utc) ? sample : best,
  );
  return reach(nearest, scale);
}

/** Stretches of one state, each reaching to the first sample of the next so that the ribbon has no gaps. */
function runsOf(samples: readonly SeasonSample[]): { state: SeasonState; samples: SeasonSample[] }[] {
  const runs: { state: SeasonState; samples: SeasonSample[] }[] = [];
  for (const sample of samples) {
    const last = runs.at(-1);
    last?.samples.push(sample);
    if (last?.state !== sample.state) runs.push({ state: sample.state, samples: [sample] });
  }
  return runs.filter(({ state, samples: run }) => state !== 'none' && run.length > 1);
}
