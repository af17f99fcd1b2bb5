import { titleOf } from '../../bodies/index.js';
import type { PairCircumstances } from '../../forecast/index.js';
import { CloseUp } from '../charts/index.js';
import { angleWords, fixed } from '../numbers.js';
import { dateAndClock } from '../uncertainty-words.js';
import { CLOSE_UP_DEG, closeUpMeetings } from './choose.js';
import type { MeetingMoment } from './choose.js';
import { closeUpTitle, closestWords, pairOf, sightWords } from './close-up-words.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';
import { Table } from './table.js';

export function CloseUpsChapter(input: ReportInput) {
  const moments = closeUpMeetings(input.forecast);
  if (moments.length === 0)
    return <p>No two planets come within {CLOSE_UP_DEG}° of each other where they can be seen.</p>;
  return (
    <>
      <p>
        Each meeting is drawn for its least separation, to scale, as it stands in the sky: north up, east
        left. Beneath are the two discs at one scale, with their phases, as a telescope shows them.
      </p>
      <div class="closeups">
        {moments.map((moment) => (
          <CloseUp
            key={moment.meeting.id}
            id={`close-up-${moment.event.id.replaceAll(/[^a-z0-9]+/g, '-')}`}
            pair={pairOf(moment)}
            title={closeUpTitle(moment)}
            finding={`${closeUpTitle(moment)}. ${sightWords(moment, input)}`}
            legend={`${closestWords(moment, input)} ${sightWords(moment, input)}`}
            tableId="close-ups-table"
          />
        ))}
      </div>
      <NumbersOfAll moments={moments} input={input} />
    </>
  );
}

function NumbersOfAll({ moments, input }: { moments: readonly MeetingMoment[]; input: ReportInput }) {
  const ofBoth = (moment: MeetingMoment, tell: (body: PairCircumstances['bodies'][0]) => string) =>
    pairOf(moment).bodies.map(tell).join(', ');
  return (
    <Table
      id="close-ups-table"
      caption="The close-ups in numbers"
      columns={[
        {
          title: 'Least separation',
          cell: (moment) => (
            <>
              {pairOf(moment)
                .bodies.map(({ body }) => titleOf(body))
                .join(' and ')}
              <br />
              <span class="place">{dateAndClock(moment.event, zoneOf(input))}</span>
            </>
          ),
        },
        { title: 'Apart', cell: (moment) => angleWords(pairOf(moment).separationDeg) },
        { title: 'Position angle', cell: (moment) => `${fixed(pairOf(moment).positionAngleDeg, 0)}°` },
        {
          title: 'Magnitudes',
          cell: (moment) =>
            ofBoth(moment, ({ magnitude }) => (magnitude === null ? '–' : fixed(magnitude, 1))),
        },
        {
          title: 'Diameters',
          cell: (moment) => ofBoth(moment, (body) => `${fixed(body.diameterArcsec, 1)}″`),
        },
        {
          title: 'Lit',
          cell: (moment) => ofBoth(moment, (body) => `${fixed(body.illuminatedFraction * 100, 0)} %`),
        },
        { title: 'From the Sun', cell: (moment) => `${fixed(pairOf(moment).leastElongationDeg, 0)}°` },
      ]}
      rows={moments}
      keyOf={({ meeting }) => meeting.id}
    />
  );
}
