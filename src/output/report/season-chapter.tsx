import { titleOf } from '../../bodies/index.js';
import { SeasonRibbons } from '../charts/index.js';
import { bestStretches } from './best-stretches.js';
import { HEADLINE_MEETING_DEG, headlineMeetings } from './choose.js';
import type { ReportInput } from './report-input.js';
import { Lines } from './lines.js';
import { zoneOf } from './report-input.js';
import { seasonTitle, stretchAndPeakWords, stretchWords } from './season-words.js';
import { Table } from './table.js';

export function SeasonChapter(input: ReportInput) {
  const { seasons, forecast, sites } = input;
  const [home] = sites;
  const zone = zoneOf(input);
  const bests = seasons.flatMap(bestStretches);
  const finding = bests
    .map((best) => `${titleOf(best.body)} is at its best ${stretchWords(best, zone)}.`)
    .join(' ');
  return (
    <>
      <SeasonRibbons
        seasons={seasons}
        forecast={forecast}
        meetings={headlineMeetings(forecast).map(({ meeting }) => meeting)}
        title={seasonTitle(bests, zone)}
        finding={finding}
        tableId="season-table"
        tiedWithin={`two planets within ${HEADLINE_MEETING_DEG}° of each other`}
        thickness={
          home === undefined
            ? 'Each thread is the middle of the nights. Above it the ribbon is as thick as the hours that a planet is up before midnight, below it as those after, in a night of twelve hours.'
            : `Each thread is the middle of the nights at ${home.name}. Above it the ribbon is as thick as the hours that a planet can be shown there in the dark before that time, below it as those after.`
        }
      />
      <Table
        id="season-table"
        caption={
          home === undefined
            ? 'When each planet is at its best'
            : `When each planet is at its best from ${home.name}`
        }
        columns={[
          { title: 'Planet', cell: ({ body }) => titleOf(body) },
          {
            title: 'At its best',
            cell: ({ stretches }) => (
              <Lines lines={stretches.map((best) => stretchAndPeakWords(best, zone))} />
            ),
          },
        ]}
        rows={seasons.map((season) => ({ body: season.body, stretches: bestStretches(season) }))}
        keyOf={({ body }) => body}
      />
    </>
  );
}
