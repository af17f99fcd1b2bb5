import type { ForecastEvent } from '../../forecast/index.js';
import { isoUtc, localDateTime } from '../../time/index.js';
import { headlineOf } from '../headline.js';
import { uncertaintyWords } from '../uncertainty-words.js';
import { headlineEvents } from './choose.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';

export function HeadlinesChapter(input: ReportInput) {
  const zone = zoneOf(input);
  const events = headlineEvents(input.forecast);
  if (events.length === 0) return <p>Nothing in this span can be shown to the public from here.</p>;
  return (
    <ol class="headlines">
      {events.map((event) => (
        <li key={event.id}>
          <time dateTime={isoUtc(event.utc)}>{dayOf(event, zone)}</time>
          <p>
            {headlineOf(event, zone)} <span class="place">The instant is known to {sureness(event)}.</span>
          </p>
        </li>
      ))}
    </ol>
  );
}

function dayOf(event: ForecastEvent, zone: string): string {
  return localDateTime(event.utc, zone).toFormat('d LLL yyyy');
}

const sureness = ({ uncertaintySeconds }: ForecastEvent): string =>
  uncertaintyWords(uncertaintySeconds.utc).replace('about ', '');
