import { titleOf } from '../../bodies/index.js';
import { cautions } from '../cautions.js';
import { kindTitles } from '../event-words.js';
import { headlineOf } from '../headline.js';
import { eventsMarkdown, markdownTable, markdownText } from '../markdown.js';
import { uncertaintyWords } from '../uncertainty-words.js';
import { bestStretches } from './best-stretches.js';
import { certaintyTitle } from './certainty-chapter.js';
import { closeUpMeetings, headlineEvents } from './choose.js';
import { closeUpTitle, closestWords, sightWords } from './close-up-words.js';
import { byMonth } from './event-rows.js';
import { leadOf } from './lead.js';
import { methodWords } from './method-words.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';
import { spreadWords, subjectOf } from './residual-words.js';
import { seasonTitle, stretchAndPeakWords } from './season-words.js';
import { surenessByKind } from './sureness.js';

/** The same report as Markdown: the tables and the sentences of its pictures. */
export function renderReportMarkdown(input: ReportInput): string {
  const chapters: readonly (readonly [title: string, text: string])[] = [
    ['The season at a glance', seasonText(input)],
    ['Worth telling', headlinesText(input)],
    ['Close-ups', closeUpsText(input)],
    ['Every event', eventsText(input)],
    ['What the ephemeris adds', residualsText(input)],
    ['How sure each date is', certaintyText(input)],
    ['Method and limits', methodText(input)],
  ];
  return [
    `# ${markdownText(input.title)}`,
    markdownText(leadOf(input)),
    ...chapters.flatMap(([title, text]) => (text === '' ? [] : [`## ${title}`, text.trimEnd()])),
  ]
    .join('\n\n')
    .concat('\n');
}

const list = (lines: readonly string[]): string => lines.map((line) => `- ${markdownText(line)}`).join('\n');

function seasonText(input: ReportInput): string {
  const zone = zoneOf(input);
  const bests = input.seasons.flatMap(bestStretches);
  const lines = bests.map((best) => `${titleOf(best.body)}: ${stretchAndPeakWords(best, zone)}`);
  return lines.length === 0 ? '' : `${markdownText(seasonTitle(bests, zone))}.\n\n${list(lines)}`;
}

const headlinesText = (input: ReportInput): string =>
  list(headlineEvents(input.forecast).map((event) => headlineOf(event, zoneOf(input))));

const closeUpsText = (input: ReportInput): string =>
  list(
    closeUpMeetings(input.forecast).map(
      (moment) => `${closeUpTitle(moment)}. ${closestWords(moment, input)} ${sightWords(moment, input)}`,
    ),
  );

function eventsText(input: ReportInput): string {
  const rows = input.forecast.events.map((event) => ({ event, moments: [] }));
  const months = byMonth(rows, zoneOf(input)).map(
    ({ title, rows: ofMonth }) =>
      `### ${title}\n\n${eventsMarkdown({ events: ofMonth.map(({ event }) => event) }, input.sites)}`,
  );
  return [Object.values(cautions).map(markdownText).join(' '), ...months].join('\n\n');
}

const residualsText = ({ residuals }: ReportInput): string =>
  residuals.length === 0
    ? ''
    : markdownTable(
        ['series', 'events', 'mean cycle: rms, worst', 'Kepler, Table 1', 'Kepler, Table 2'],
        residuals.map((series) => [
          subjectOf(series),
          String(series.rows.length),
          spreadWords(series.mean),
          spreadWords(series.keplerTable1),
          spreadWords(series.keplerTable2),
        ]),
      );

function certaintyText({ forecast: { events } }: ReportInput): string {
  const kinds = surenessByKind(events);
  if (kinds.length === 0) return '';
  const table = markdownTable(
    ['kind', 'events', 'typically', 'at worst'],
    kinds.map(({ kind, count, middleSeconds, worstSeconds }) => [
      kindTitles[kind],
      String(count),
      uncertaintyWords(middleSeconds),
      uncertaintyWords(worstSeconds),
    ]),
  );
  return `${markdownText(certaintyTitle(events))}.\n\n${table}`;
}

const methodText = ({ forecast }: ReportInput): string =>
  [
    methodWords.map(([term, words]) => `- **${markdownText(term)}.** ${markdownText(words)}`).join('\n'),
    `Source: ${markdownText(forecast.source.description)}.`,
  ].join('\n\n');
