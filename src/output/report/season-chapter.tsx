import { titleOf } from '../../bodies/index.js';
import type { Season, SeasonSample, SeasonState } from '../../forecast/index.js';
import { localDateTime } from '../../time/index.js';
import { SeasonRibbons } from '../charts/index.js';
import { fixed } from '../numbers.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';
import { Table } from './table.js';

/** A planet is at its best while it can be shown for at least this part of its longest. */
const BEST_PART = 0.8;

const stateWords: Readonly<Record<SeasonState, string>> = {
  dusk: 'evening',
  dawn: 'morning',
  full: 'most of the night',
  sun: 'too near the Sun',
  none: 'not to be seen',
};

interface Best {
  readonly body: Season['body'];
  readonly from: SeasonSample;
  readonly to: SeasonSample;
  readonly peak: SeasonSample;
}

export function SeasonChapter(input: ReportInput) {
  const { seasons, forecast, sites } = input;
  const zone = zoneOf(input);
  const day = ({ utc }: SeasonSample): string => localDateTime(utc, zone).toFormat('d LLL yyyy');
  const bests = seasons.flatMap(bestOf);
  const finding = bests
    .map(({ body, from, to }) => `${titleOf(body)} is at its best from ${day(from)} to ${day(to)}.`)
    .join(' ');
  const where = sites[0] === undefined ? 'by elongation from the Sun' : `from ${sites[0].name}`;
  return (
    <>
      <SeasonRibbons
        seasons={seasons}
        forecast={forecast}
        title={titleFor(bests, zone)}
        finding={finding}
        tableId="season-table"
      />
      <Table
        id="season-table"
        caption={`The longest nights with each planet, ${where}`}
        columns={[
          { title: 'Planet', cell: ({ body }) => titleOf(body) },
          {
            title: 'At its best',
            cell: ({ from, to }) => (from === to ? `around ${day(from)}` : `${day(from)} to ${day(to)}`),
          },
          { title: 'Then', cell: ({ peak }) => stateWords[peak.state] },
          {
            title: sites[0] === undefined ? 'From the Sun' : 'Dark hours a night',
            class: 'number',
            cell: ({ peak }) =>
              peak.darkHours === null
                ? `${fixed(Math.abs(peak.elongationDeg), 0)}°`
                : fixed(peak.darkHours, 1),
          },
        ]}
        rows={bests}
        keyOf={({ body }) => body}
      />
    </>
  );
}

/** The bright planets that have a season, in its order: the finding of the picture. */
const LEADING: readonly Season['body'][] = ['venus', 'mars', 'jupiter', 'saturn'];

function titleFor(bests: readonly Best[], zone: string): string {
  const leading = bests
    .filter(({ body }) => LEADING.includes(body))
    .sort((a, b) => a.peak.utc - b.peak.utc)
    .map(({ body, peak }) => ({
      name: titleOf(body),
      month: localDateTime(peak.utc, zone).toFormat('LLLL yyyy'),
    }));
  if (leading.length === 0) return 'The season of each planet';
  const [first, ...rest] = leading.map(({ name, month }) => `${name} around ${month}`);
  return ['At its best: ' + first!, ...rest].join(', ');
}

/** The longest-lasting stretch around the night in which a planet can be shown for longest; none where it never can. */
function bestOf({ body, samples }: Season): Best[] {
  const weight = ({ darkHours, elongationDeg }: SeasonSample): number => darkHours ?? Math.abs(elongationDeg);
  const most = Math.max(...samples.map(weight));
  const top = samples.findIndex((sample) => weight(sample) === most);
  if (top < 0 || most === 0) return [];
  const good = (sample: SeasonSample | undefined): boolean =>
    sample !== undefined && weight(sample) >= BEST_PART * most;
  let [first, last] = [top, top];
  while (good(samples[first - 1])) first--;
  while (good(samples[last + 1])) last++;
  return [{ body, from: samples[first]!, to: samples[last]!, peak: samples[top]! }];
}
