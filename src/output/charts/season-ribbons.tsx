import { scaleLinear } from 'd3-scale';
import { titleOf } from '../../bodies/index.js';
import type { SkyPlanet } from '../../bodies/index.js';
import type { Forecast, Meeting, Season } from '../../forecast/index.js';
import { utcFromTt } from '../../time/index.js';
import { angleWords } from '../numbers.js';
import { Figure, GUTTER_WIDTH, PLOT_WIDTH } from './figure.js';
import { MeetingTie } from './meeting-tie.js';
import { Ribbon, reachAt } from './ribbon.js';
import { SeasonKey } from './season-key.js';
import { SeasonMark, isMarked } from './season-marks.js';
import { placesOfWords } from './tie-words.js';
import { TimeAxis, timeTicks } from './time-axis.js';

const TOP = 34;
const ROW_HEIGHT = 56;
/** The longest half of a night reaches this far from its thread. */
const FARTHEST_REACH = 21;
/** The length of the scale's bar. */
const SCALE_HOURS = 6;

interface SeasonRibbonsProps {
  readonly seasons: readonly Season[];
  readonly forecast: Forecast;
  /** The meetings that tie two ribbons. */
  readonly meetings: readonly Meeting[];
  readonly title: string;
  readonly finding: string;
  readonly tableId: string;
  /** What the thickness tells. */
  readonly thickness: string;
  readonly tiedWithin: string;
}

/** One ribbon a planet: as thick as the hours for which it can be shown, in the colour and on the side of its part of the night. */
export function SeasonRibbons(props: SeasonRibbonsProps) {
  const { seasons, forecast, meetings, title, finding, tableId, thickness, tiedWithin } = props;
  const { from, to } = forecast;
  const x = scaleLinear()
    .domain([from, to])
    .range([1, PLOT_WIDTH - 1]);
  const longest = Math.max(
    1,
    ...seasons.flatMap(({ samples }) => samples.flatMap((s) => [s.eveningHours, s.morningHours])),
  );
  const scale = { x, pixelsPerHour: FARTHEST_REACH / longest };
  const height = TOP + seasons.length * ROW_HEIGHT + 4;
  const threadOf = (body: SkyPlanet): number =>
    TOP + (seasons.findIndex((season) => season.body === body) + 0.5) * ROW_HEIGHT;
  const shown = new Set(seasons.map(({ body }) => body));
  const right = PLOT_WIDTH - 1;
  const ties = meetings.filter(({ bodies }) => bodies.every((body) => shown.has(body)));
  const tied = ties.map(({ bodies, closestTt }) => {
    const threads = bodies.map(threadOf);
    return { at: x(utcFromTt(closestTt)), upper: Math.min(...threads), lower: Math.max(...threads) };
  });
  const wordsAt = placesOfWords(tied, right);
  return (
    <Figure
      id="season"
      width={PLOT_WIDTH}
      height={height}
      {...{ title, finding, tableId }}
      gutter={
        <>
          {seasons.map(({ body }) => (
            <text key={body} x={0} y={threadOf(body) + 5} class="planet">
              {titleOf(body)}
            </text>
          ))}
          <HoursBar length={SCALE_HOURS * scale.pixelsPerHour} />
        </>
      }
      legend={<SeasonKey thickness={thickness} tiedWithin={tiedWithin} />}
    >
      <TimeAxis ticks={timeTicks(from, to)} x={x} top={8} bottom={height - 2} />
      {seasons.map((season) => (
        <Ribbon key={season.body} season={season} scale={scale} middle={threadOf(season.body)} />
      ))}
      {ties.map((meeting, i) => (
        <MeetingTie
          key={meeting.id}
          tied={tied[i]!}
          words={angleWords(meeting.leastSeparationDeg)}
          wordsAt={wordsAt[i]!}
          right={right}
        />
      ))}
      {seasons.flatMap((season) =>
        forecast.events
          .filter((event) => event.bodies.length === 1 && event.bodies[0] === season.body && isMarked(event))
          .map((event) => (
            <SeasonMark
              key={event.id}
              event={event}
              x={x}
              middle={threadOf(season.body)}
              reach={reachAt(season, event.utc, scale)}
            />
          )),
      )}
    </Figure>
  );
}

/** How thick some hours are. */
const HoursBar = ({ length }: { length: number }) => (
  <g class="scale">
    <path d={`M${GUTTER_WIDTH - 10} 6v${length}m-3 0h6m-3 ${-length}h-3h6`} />
    <text x={GUTTER_WIDTH - 17} y={6 + length / 2 + 4} class="end quiet">
      {SCALE_HOURS} h
    </text>
  </g>
);
