import type { PairCircumstances } from '../../forecast/index.js';
import { localDateTime } from '../../time/index.js';
import { CloseUp } from '../charts/index.js';
import { bodiesWords } from '../event-words.js';
import { headlineOf } from '../headline.js';
import { angleWords } from '../numbers.js';
import { closeUpMeetings } from './choose.js';
import type { MeetingMoment } from './choose.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';

export function CloseUpsChapter(input: ReportInput) {
  const zone = zoneOf(input);
  const moments = closeUpMeetings(input.forecast);
  if (moments.length === 0)
    return <p>No two planets come within 2° of each other where they can be seen from here.</p>;
  return (
    <div class="closeups">
      {moments.map(({ meeting, event }) => (
        <CloseUp
          key={meeting.id}
          id={`close-up-${event.id.replaceAll(/[^a-z0-9]+/g, '-')}`}
          pair={pairOf({ meeting, event })}
          title={`${bodiesWords(event)}, ${angleWords(meeting.leastSeparationDeg)} apart, ${localDateTime(event.utc, zone).toFormat('d LLLL yyyy')}`}
          finding={headlineOf(event, zone)}
          tableId="events-table"
        />
      ))}
    </div>
  );
}

/** Moments of a meeting are told of two bodies. */
function pairOf({ event: { circumstances, id } }: MeetingMoment): PairCircumstances {
  if (circumstances.about !== 'two-bodies') throw new TypeError(`${id} is not about two bodies`);
  return circumstances;
}
