import { cautions } from '../cautions.js';
import { headlineOf } from '../headline.js';
import { eventsMarkdown, markdownText } from '../markdown.js';
import { headlineEvents } from './choose.js';
import { methodWords } from './method-words.js';
import { leadOf } from './lead.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';

/** The same report as Markdown, without its pictures. */
export function renderReportMarkdown(input: ReportInput): string {
  const zone = zoneOf(input);
  return (
    [
      `# ${markdownText(input.title)}`,
      markdownText(leadOf(input)),
      '## Worth telling',
      headlineEvents(input.forecast)
        .map((event) => `- ${markdownText(headlineOf(event, zone))}`)
        .join('\n'),
      '## Safety',
      Object.values(cautions).map(markdownText).join(' '),
      '## Every event',
      eventsMarkdown(input.forecast, input.sites).trimEnd(),
      '## Method and limits',
      methodWords.map(([term, words]) => `- **${markdownText(term)}.** ${markdownText(words)}`).join('\n'),
      `Source: ${markdownText(input.forecast.source.description)}.`,
    ].join('\n\n') + '\n'
  );
}
