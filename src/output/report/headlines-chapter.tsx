import { titleOf } from '../../bodies/index.js';
import type { ForecastEvent } from '../../forecast/index.js';
import { isoUtc, localDateTime } from '../../time/index.js';
import { bodiesWords, bodyCircumstancesOf, kindTitles } from '../event-words.js';
import { headlineOf } from '../headline.js';
import { angleWords } from '../numbers.js';
import { uncertaintyWords } from '../uncertainty-words.js';
import { headlineEvents } from './choose.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';

export function HeadlinesChapter(input: ReportInput) {
  const zone = zoneOf(input);
  const events = headlineEvents(input.forecast);
  if (events.length === 0) return <p>Nothing in this span can be shown to the public from here.</p>;
  return (
    <>
      <p>Each sentence may be printed as it stands. What cannot be seen from here is in the full table alone.</p>
      <ol class="headlines">
        {events.map((event) => (
          <li key={event.id}>
            <DateAndSky event={event} zone={zone} />
            <div>
              <h3>{titleFor(event)}</h3>
              <p>{headlineOf(event, zone)}</p>
              <p class="note">{capitalised(uncertaintyWords(event.uncertaintySeconds.utc))}.</p>
            </div>
          </li>
        ))}
      </ol>
    </>
  );
}

function DateAndSky({ event, zone }: { event: ForecastEvent; zone: string }) {
  const local = localDateTime(event.utc, zone);
  const sky = skyOf(event);
  return (
    <p class="date">
      <time dateTime={isoUtc(event.utc)}>
        {local.toFormat('d LLLL')} <span>{local.toFormat('yyyy')}</span>
      </time>
      {sky === null ? null : <span class={`sky ${sky}`}>{skyWords[sky]}</span>}
    </p>
  );
}

type Sky = 'dusk' | 'dawn' | 'full';
const skyWords: Readonly<Record<Sky, string>> = {
  dusk: 'evening sky',
  dawn: 'morning sky',
  full: 'all night',
};

/** Farther from the Sun than this, a planet is up for most of the night. */
const ALL_NIGHT_DEG = 135;

function skyOf(event: ForecastEvent): Sky | null {
  const [body] = bodyCircumstancesOf(event);
  if (body === undefined) return null;
  if (body.elongationDeg > ALL_NIGHT_DEG) return 'full';
  return body.elongationSide === 'east' ? 'dusk' : 'dawn';
}

function titleFor(event: ForecastEvent): string {
  const { circumstances } = event;
  if (circumstances.about === 'two-bodies')
    return `${bodiesWords(event)} within ${angleWords(circumstances.separationDeg)}`;
  return `${event.bodies.map(titleOf).join('')} at ${kindTitles[event.kind]}`;
}

const capitalised = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);
