import { renderToString } from 'preact-render-to-string';
import { titleOf } from '../../bodies/index.js';
import { localDateTime } from '../../time/index.js';
import { cautions, needsSunCaution } from '../cautions.js';
import { CertaintyChapter } from './certainty-chapter.js';
import { CloseUpsChapter } from './close-ups-chapter.js';
import { EventsChapter } from './events-chapter.js';
import { HeadlinesChapter } from './headlines-chapter.js';
import { methodWords } from './method-words.js';
import { Page } from './page.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';
import { ResidualsChapter } from './residuals-chapter.js';
import { SeasonChapter } from './season-chapter.js';

/** The report as one self-contained HTML page: no script, nothing fetched, for screen, phone and paper. */
export function renderReport(input: ReportInput): string {
  const chapters = [
    { id: 'season-chapter', title: 'The season at a glance', body: <SeasonChapter {...input} /> },
    { id: 'headlines', title: 'Worth telling', body: <HeadlinesChapter {...input} /> },
    { id: 'close-ups', title: 'Close-ups', body: <CloseUpsChapter {...input} /> },
    { id: 'cautions', title: 'Safety', body: <Cautions {...input} /> },
    { id: 'events', title: 'Every event', body: <EventsChapter {...input} />, sheet: true },
    ...(input.residuals.length === 0
      ? []
      : [
          {
            id: 'residuals',
            title: 'What the ephemeris adds',
            body: <ResidualsChapter {...input} />,
            sheet: true,
          },
        ]),
    { id: 'certainty', title: 'How sure each date is', body: <CertaintyChapter {...input} /> },
    { id: 'method', title: 'Method and limits', body: <Method /> },
  ];
  return `<!doctype html>\n${renderToString(<Page title={input.title} lead={leadOf(input)} chapters={chapters} />)}\n`;
}

function Cautions({ forecast }: ReportInput) {
  const near = forecast.events.filter(needsSunCaution).length;
  return (
    <div class="caution">
      {near === 0 ? null : (
        <p>
          {near} events of this report happen within 20° of the Sun. {cautions.besideTheSun}{' '}
          {cautions.onTheDisc}
        </p>
      )}
      <p>{cautions.localRules}</p>
    </div>
  );
}

function Method() {
  return (
    <dl>
      {methodWords.map(([term, words]) => (
        <>
          <dt key={`${term} term`}>{term}</dt>
          <dd key={term}>{words}</dd>
        </>
      ))}
    </dl>
  );
}

/** What the report covers, in a sentence. */
export function leadOf(input: ReportInput): string {
  const { forecast, sites } = input;
  const day = (utc: typeof forecast.from): string =>
    localDateTime(utc, zoneOf(input)).toFormat('d LLLL yyyy');
  const where =
    sites[0] === undefined ? 'for the Earth’s centre' : `for ${sites.map(({ name }) => name).join(', ')}`;
  const who = forecast.bodies.map(titleOf).join(', ');
  return `${forecast.events.length} configurations of ${who}, from ${day(forecast.from)} to before ${day(forecast.to)}, ${where}.`;
}
