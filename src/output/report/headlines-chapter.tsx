import { titleOf } from '../../bodies/index.js';
import type { ForecastEvent } from '../../forecast/index.js';
import { isoUtc, localDateTime, zoneAbbreviation } from '../../time/index.js';
import { bodiesWords, kindTitles } from '../event-words.js';
import { headlineOf } from '../headline.js';
import { angleWords } from '../numbers.js';
import { tellInstant, uncertaintyWords } from '../uncertainty-words.js';
import { headlineEvents } from './choose.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';
import { SkySign } from './sky-sign.js';

export function HeadlinesChapter(input: ReportInput) {
  const zone = zoneOf(input);
  const events = headlineEvents(input.forecast);
  if (events.length === 0) return <p>Nothing in this span can be shown to the public from here.</p>;
  return (
    <>
      <p>
        Each sentence may be printed as it stands. What cannot be seen from here is in the full table alone.
      </p>
      <ol class="headlines">
        {events.map((event) => (
          <li key={event.id}>
            <DateAndSky event={event} zone={zone} />
            <div>
              <h3>{titleFor(event)}</h3>
              <p>{headlineOf(event, zone)}</p>
              <p class="note">{instantWords(event, zone)}.</p>
            </div>
          </li>
        ))}
      </ol>
    </>
  );
}

function DateAndSky({ event, zone }: { event: ForecastEvent; zone: string }) {
  const local = localDateTime(event.utc, zone);
  return (
    <p class="date">
      <time dateTime={isoUtc(event.utc)}>
        {local.toFormat('d LLL')} <span>{local.toFormat('yyyy')}</span>
      </time>
      <SkySign event={event} />
    </p>
  );
}

function titleFor(event: ForecastEvent): string {
  const { circumstances } = event;
  if (circumstances.about === 'two-bodies')
    return `${bodiesWords(event)} within ${angleWords(circumstances.separationDeg)}`;
  return `${event.bodies.map(titleOf).join('')} at ${kindTitles[event.kind]}`;
}

/** `Instant: 16:52 CET, ± 4 min`; where not even the hour is known, how many days the date may be off. */
function instantWords({ utc, uncertaintySeconds }: ForecastEvent, zone: string): string {
  const { time } = tellInstant(utc, uncertaintySeconds.utc, zone);
  const sure = uncertaintyWords(uncertaintySeconds.utc);
  return time === '' ? `Date: ${sure}` : `Instant: ${time} ${zoneAbbreviation(utc, zone)}, ${sure}`;
}
