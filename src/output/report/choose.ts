import type { Forecast, ForecastEvent, KindName, Meeting } from '../../forecast/index.js';
import { isObservable } from '../headline.js';

/** The kinds of one planet that a newspaper would print. */
const HEADLINE_KINDS: readonly KindName[] = [
  'opposition',
  'greatest-elongation-east',
  'greatest-elongation-west',
  'greatest-brilliancy',
];
/** Two planets this near to each other are a sight; nearer than the other, they are worth a picture. */
const HEADLINE_MEETING_DEG = 3;
const CLOSE_UP_DEG = 2;

/** The events worth telling, in order of time: those that can be seen. */
export function headlineEvents(forecast: Forecast): ForecastEvent[] {
  const meetings = meetingEvents(forecast, HEADLINE_MEETING_DEG).map(({ event }) => event);
  return forecast.events.filter(
    (event) => (HEADLINE_KINDS.includes(event.kind) && isObservable(event)) || meetings.includes(event),
  );
}

/** The meetings worth a picture, with the moment that speaks for each. */
export const closeUpMeetings = (forecast: Forecast): MeetingMoment[] => meetingEvents(forecast, CLOSE_UP_DEG);

export interface MeetingMoment {
  readonly meeting: Meeting;
  readonly event: ForecastEvent;
}

function meetingEvents({ meetings, events }: Forecast, withinDeg: number): MeetingMoment[] {
  const byId = new Map(events.map((event) => [event.id, event]));
  return meetings.flatMap((meeting): MeetingMoment[] => {
    const moments = [meeting.appulse, ...meeting.conjunctionsLongitude, ...meeting.conjunctionsRa];
    const event = moments
      .map((id) => (id === null ? undefined : byId.get(id)))
      .find((found) => found !== undefined);
    const sight = event !== undefined && meeting.observable && isObservable(event);
    return sight && meeting.leastSeparationDeg < withinDeg ? [{ meeting, event }] : [];
  });
}
