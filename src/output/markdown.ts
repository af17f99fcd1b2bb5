import type { Forecast } from '../forecast/index.js';
import type { Site } from '../sky/index.js';
import { dateAndClock, uncertaintyShort } from './uncertainty-words.js';
import { bodiesWords, circumstancesLine, kindTitles, seriesWords } from './event-words.js';

/** Text that Markdown and the HTML inside it leave alone. */
export const markdownText = (text: string): string =>
  text
    .replace(/\s+/g, ' ')
    .replace(/[\\`*_[\]|#]/g, '\\$&')
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;');

/** A table with its header; cells are escaped here. */
export function markdownTable(header: readonly string[], rows: readonly (readonly string[])[]): string {
  const line = (cells: readonly string[]) => `| ${cells.map(markdownText).join(' | ')} |\n`;
  return line(header) + `|${' --- |'.repeat(header.length)}\n` + rows.map(line).join('');
}

/** Every event of a forecast as a table, on the first site's clocks, or in UTC where there is no site. */
export function eventsMarkdown({ events }: Pick<Forecast, 'events'>, sites: readonly Site[]): string {
  const [home] = sites;
  return markdownTable(
    ['when', 'how sure', 'event', 'what is true of it', ...(home === undefined ? [] : [`from ${home.name}`])],
    events.map((event) => [
      dateAndClock(event, home?.zone ?? 'UTC'),
      uncertaintyShort(event.uncertaintySeconds.utc),
      [bodiesWords(event), kindTitles[event.kind], seriesWords(event)]
        .filter((word) => word !== null)
        .join(', '),
      circumstancesLine(event),
      ...(home === undefined ? [] : [event.local[0]?.verdict ?? 'Not in the Earth’s sky.']),
    ]),
  );
}
