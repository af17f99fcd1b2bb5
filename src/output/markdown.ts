import type { Forecast, ForecastEvent } from '../forecast/index.js';
import { tellInstant, uncertaintyShort } from './uncertainty-words.js';
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

/** Every event of a forecast as a table; times on the first site's clocks, or in UTC. */
export function eventsMarkdown({ events }: Pick<Forecast, 'events'>): string {
  const atSite = events.some(({ local }) => local.length > 0);
  return markdownTable(
    ['when', 'how sure', 'event', 'what is true of it', ...(atSite ? ['from here'] : [])],
    events.map((event) => [
      whenWords(event),
      uncertaintyShort(event.uncertaintySeconds.utc),
      [bodiesWords(event), kindTitles[event.kind], seriesWords(event)]
        .filter((word) => word !== null)
        .join(', '),
      circumstancesLine(event),
      ...(atSite ? [event.local[0]?.verdict ?? 'Not in the Earth’s sky.'] : []),
    ]),
  );
}

function whenWords({ utc, uncertaintySeconds, local }: ForecastEvent): string {
  const { isoDate, weekday, time } = tellInstant(utc, uncertaintySeconds.utc, local[0]?.zone ?? 'UTC');
  return [isoDate, weekday, time].join(' ').trim();
}
