import { renderToString } from 'preact-render-to-string';
import { CertaintyChapter } from './certainty-chapter.js';
import { CloseUpsChapter } from './close-ups-chapter.js';
import { EventsChapter } from './events-chapter.js';
import { HeadlinesChapter } from './headlines-chapter.js';
import { leadOf } from './lead.js';
import { methodWords } from './method-words.js';
import { Page } from './page.js';
import type { ReportInput } from './report-input.js';
import { ResidualsChapter } from './residuals-chapter.js';
import { SeasonChapter } from './season-chapter.js';

/** The report as one self-contained HTML page: no script, nothing fetched, for screen, phone and paper. */
export function renderReport(input: ReportInput): string {
  const chapters = [
    { id: 'season-chapter', title: 'The season at a glance', body: <SeasonChapter {...input} /> },
    { id: 'headlines', title: 'Worth telling', body: <HeadlinesChapter {...input} /> },
    { id: 'close-ups', title: 'Close-ups', body: <CloseUpsChapter {...input} /> },
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
