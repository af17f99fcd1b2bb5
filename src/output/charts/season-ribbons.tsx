import { scaleLinear } from 'd3-scale';
import { area } from 'd3-shape';
import { titleOf } from '../../bodies/index.js';
import type { SkyPlanet } from '../../bodies/index.js';
import type {
  Forecast,
  ForecastEvent,
  Meeting,
  Season,
  SeasonSample,
  SeasonState,
} from '../../forecast/index.js';
import { utcFromTt } from '../../time/index.js';
import { COLUMN_WIDTH, Figure } from './figure.js';
import { TimeAxis, timeTicks } from './time-axis.js';
import type { TimeScale } from './time-axis.js';

const ROW_HEIGHT = 58;
const TOP = 26;
const LABEL_WIDTH = 68;
const THICKEST = 26;
const THINNEST = 3;
/** A meeting this close ties two ribbons. */
const TIED_WITHIN_DEG = 2;

/** What is notched into a ribbon, and with which sign. */
const notches: Partial<Record<ForecastEvent['kind'], Notch>> = {
  opposition: 'diamond',
  'greatest-elongation-east': 'triangle',
  'greatest-elongation-west': 'triangle',
  conjunction: 'cross',
  'inferior-conjunction': 'cross',
  'superior-conjunction': 'cross',
  'stationary-retrograde': 'tick',
  'stationary-direct': 'tick',
};
type Notch = 'diamond' | 'triangle' | 'cross' | 'tick';

interface SeasonRibbonsProps {
  readonly seasons: readonly Season[];
  readonly forecast: Forecast;
  readonly title: string;
  readonly finding: string;
  readonly tableId: string;
}

/** One ribbon a planet: as thick as the hours for which it can be shown that night, in the colour of its side of the night. */
export function SeasonRibbons({ seasons, forecast, title, finding, tableId }: SeasonRibbonsProps) {
  const { from, to } = forecast;
  const x = scaleLinear()
    .domain([from, to])
    .range([LABEL_WIDTH, COLUMN_WIDTH - 6]);
  const height = TOP + seasons.length * ROW_HEIGHT + 8;
  const middleOf = (body: SkyPlanet): number =>
    TOP + (seasons.findIndex((season) => season.body === body) + 0.5) * ROW_HEIGHT + 6;
  const shown = new Set(seasons.map(({ body }) => body));
  const ties = forecast.meetings.filter(
    ({ bodies, leastSeparationDeg, observable }) =>
      observable && leastSeparationDeg < TIED_WITHIN_DEG && bodies.every((body) => shown.has(body)),
  );
  return (
    <Figure
      id="season"
      title={title}
      finding={finding}
      height={height}
      tableId={tableId}
      legend={
        <>
          Thick where it can be shown for long. <Swatch state="dusk" /> evening, <Swatch state="dawn" />{' '}
          morning, <Swatch state="full" /> most of the night, <Swatch state="sun" /> too near the Sun, blank
          where it never stands high enough in the dark. ◆ opposition, ▲ greatest elongation, ✕ conjunction
          with the Sun, ❘ stationary; an arc ties two planets that meet within {TIED_WITHIN_DEG}°.
        </>
      }
    >
      <Patterns />
      <TimeAxis ticks={timeTicks(from, to)} x={x} top={8} bottom={height - 6} />
      {seasons.map((season) => (
        <Ribbon
          key={season.body}
          season={season}
          x={x}
          middle={middleOf(season.body)}
          events={forecast.events}
        />
      ))}
      {ties.map((meeting) => (
        <Tie key={meeting.id} meeting={meeting} x={x} middleOf={middleOf} />
      ))}
    </Figure>
  );
}

interface RibbonProps {
  readonly season: Season;
  readonly x: TimeScale;
  readonly middle: number;
  readonly events: readonly ForecastEvent[];
}

function Ribbon({ season: { body, samples }, x, middle, events }: RibbonProps) {
  const most = Math.max(1, ...samples.map(weightOf));
  const thickness = (sample: SeasonSample): number =>
    sample.state === 'none' || sample.state === 'sun'
      ? THINNEST
      : THINNEST + ((THICKEST - THINNEST) * weightOf(sample)) / most;
  const shape = area<SeasonSample>()
    .x(({ utc }) => x(utc))
    .y0((sample) => middle + thickness(sample) / 2)
    .y1((sample) => middle - thickness(sample) / 2);
  return (
    <g>
      <text x={0} y={middle + 5} class="name">
        {titleOf(body)}
      </text>
      {runsOf(samples).map(({ state, samples: run }) => (
        <path key={run[0]!.utc} d={shape([...run]) ?? ''} class={`ribbon ${state}`} />
      ))}
      {events
        .filter(({ bodies }) => bodies.length === 1 && bodies[0] === body)
        .map((event) => {
          const notch = notches[event.kind];
          // Mercury's stations come every two months and would bury its elongations.
          return notch === undefined || (notch === 'tick' && body === 'mercury') ? null : (
            <NotchMark key={event.id} notch={notch} x={x(event.utc)} y={middle} />
          );
        })}
    </g>
  );
}

/** Hours in the dark at the site; without a site the elongation stands for them. */
const weightOf = ({ darkHours, elongationDeg }: SeasonSample): number =>
  darkHours ?? Math.abs(elongationDeg) / 15;

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

function NotchMark({ notch, x, y }: { notch: Notch; x: number; y: number }) {
  const top = y - THICKEST / 2 - 9;
  switch (notch) {
    case 'diamond':
      return <path class="mark" d={`M${at(x)} ${at(top - 5)}l5 5l-5 5l-5 -5z`} />;
    case 'triangle':
      return <path class="mark" d={`M${at(x)} ${at(top - 4)}l5 8h-10z`} />;
    case 'cross':
      return <path class="mark line" d={`M${at(x - 4)} ${at(top - 4)}l8 8m0 -8l-8 8`} />;
    case 'tick':
      return <path class="mark line" d={`M${at(x)} ${at(top - 4)}v8`} />;
  }
}

interface TieProps {
  readonly meeting: Meeting;
  readonly x: TimeScale;
  readonly middleOf: (body: SkyPlanet) => number;
}

function Tie({ meeting: { bodies, closestTt }, x, middleOf }: TieProps) {
  const at = x(utcFromTt(closestTt));
  const [upper, lower] = bodies.map(middleOf).sort((a, b) => a - b) as [number, number];
  const bulge = 10 + (lower - upper) * 0.12;
  return (
    <g class="tie">
      <path
        d={`M${round(at)} ${round(upper)}Q${round(at + bulge)} ${round((upper + lower) / 2)} ${round(at)} ${round(lower)}`}
      />
      <circle cx={round(at)} cy={round(upper)} r={3} />
      <circle cx={round(at)} cy={round(lower)} r={3} />
    </g>
  );
}

const round = (value: number): number => Math.round(value * 10) / 10;
const at = round;

/** Hatches, so that the four states part without colour. */
function Patterns() {
  return (
    <defs>
      {(['dusk', 'dawn'] as const).map((state) => (
        <pattern
          key={state}
          id={`hatch-${state}`}
          width={6}
          height={6}
          patternUnits="userSpaceOnUse"
          patternTransform={state === 'dusk' ? 'rotate(45)' : 'rotate(-45)'}
        >
          <rect width={6} height={6} class={`fill-${state}`} />
          <rect width={1.6} height={6} class="fill-paper" />
        </pattern>
      ))}
    </defs>
  );
}

function Swatch({ state }: { state: Exclude<SeasonState, 'none'> }) {
  return (
    <svg class="swatch" width={22} height={12} aria-hidden="true">
      <rect
        y={state === 'sun' ? 5 : 0}
        width={22}
        height={state === 'sun' ? 3 : 12}
        class={`ribbon ${state}`}
      />
    </svg>
  );
}
