import { forecast } from '../../forecast/index.js';
import type { Forecast } from '../../forecast/index.js';
import { MOST_WITHIN_DEG, readKind, readPlanet } from '../../plan/words/index.js';
import type { Site } from '../../sky/index.js';
import { deliver } from '../deliver.js';
import type { DeliveryOptions } from '../deliver.js';
import { Faults } from '../faults.js';
import { withProgress } from '../progress.js';
import { readChoice } from '../read-choice.js';
import { readList } from '../read-list.js';
import { readNumber } from '../read-number.js';
import { readSite } from '../read-site.js';
import type { SiteOptions } from '../read-site.js';
import { readSpan } from '../read-span.js';
import type { SpanWords } from '../read-span.js';
import { terminalStyle, terminalWidth } from '../terminal.js';
import { zoneNotes } from '../zone-notes.js';

export interface EventsOptions extends SpanWords, SiteOptions, DeliveryOptions {
  readonly kind?: string;
  readonly body?: string;
  readonly reckoning?: string;
  readonly within?: string;
  readonly format?: string;
}

type Format = 'table' | 'json' | 'csv' | 'md' | 'ics';
const formats: readonly [Format, ...Format[]] = ['table', 'json', 'csv', 'md', 'ics'];

export async function events(options: EventsOptions): Promise<void> {
  const faults = new Faults();
  const site = await readSite(options, faults);
  const span = readSpan(options, site?.zone ?? null, faults);
  const kinds = readList('--kind', options.kind, readKind, faults);
  const bodies = readList('--body', options.body, readPlanet, faults);
  const reckoning =
    options.reckoning === undefined
      ? undefined
      : readChoice('--reckoning', options.reckoning, ['longitude', 'right-ascension'], faults);
  const withinDeg = readWithin(options.within, faults);
  const format = readChoice('--format', options.format, formats, faults);
  faults.throwIfAny();

  const sites = site === undefined ? [] : [site];
  const found = withProgress('searching', options.quiet ?? false, (onProgress) =>
    forecast({
      ...span!,
      ...(kinds && { kinds }),
      ...(bodies && { bodies }),
      ...(reckoning && { reckoning }),
      ...(withinDeg !== undefined && { withinDeg }),
      sites,
      onProgress,
    }),
  );
  const count = found.events.length;
  deliver(
    await written(found, sites, format, options.out !== undefined),
    [
      count === 0 ? 'no events in this span' : `${count} ${count === 1 ? 'event' : 'events'}`,
      ...zoneNotes(sites),
    ],
    options,
  );
}

function readWithin(word: string | undefined, faults: Faults): number | undefined {
  if (word === undefined) return undefined;
  const degrees = faults.take('--within', readNumber(word));
  if (degrees === undefined || (degrees > 0 && degrees <= MOST_WITHIN_DEG)) return degrees;
  faults.add(
    '--within',
    `${degrees} is out of range: write degrees, more than 0 and at most ${MOST_WITHIN_DEG}`,
  );
  return undefined;
}

/** Each format loads only what it needs. */
async function written(
  found: Forecast,
  sites: readonly Site[],
  format: Format,
  toFile: boolean,
): Promise<string | Iterable<string>> {
  if (format === 'ics') {
    const { eventsCalendar } = await import('../../output/calendar/index.js');
    const title = { name: 'Synodos', description: 'Configurations of the planets' };
    // The calendar's stamp is data: without a plan to give it, the start of the span.
    return eventsCalendar(title, found, sites, found.from);
  }
  const output = await import('../../output/index.js');
  switch (format) {
    case 'table':
      return output
        .terminalLines(found.events, sites[0], terminalWidth(), terminalStyle(toFile))
        .map((line) => `${line}\n`)
        .join('');
    case 'json':
      return output.eventsJsonLines(found, sites);
    case 'csv':
      return output.eventsCsv(found, sites);
    case 'md':
      return output.eventsMarkdown(found, sites);
  }
}
