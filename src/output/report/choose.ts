import type { Forecast, ForecastEvent, KindName, Meeting } from '../../forecast/index.js';
import type { LocalView } from '../../sky/index.js';
import { isObservable } from '../headline.js';

/** The kinds of one planet that a newspaper would print. */
const HEADLINE_KINDS: readonly KindName[] = [
  'opposition',
  'greatest-elongation-east',
  'greatest-elongation-west',
  'greatest-brilliancy',
];
/** Two planets this near to each other are a sight; nearer than the other, they are worth a picture. */
export const HEADLINE_MEETING_DEG = 3;
export const CLOSE_UP_DEG = 2;

/** The events worth telling, in order of time: those that can be seen. */
export function headlineEvents(forecast: Forecast): ForecastEvent[] {
  const meetings = headlineMeetings(forecast).map(({ event }) => event);
  return forecast.events.filter(
    (event) => (HEADLINE_KINDS.includes(event.kind) && isObservable(event)) || meetings.includes(event),
  );
}

/** The meetings that are worth telling at the home site. */
export const headlineMeetings = (forecast: Forecast): MeetingMoment[] =>
  meetingMoments(forecast).filter(
    ({ meeting, event }) => meeting.leastSeparationDeg < HEADLINE_MEETING_DEG && isObservable(event),
  );

/** The meetings worth a picture: those that one of the sites sees, or, without a site, anyone. */
export const closeUpMeetings = (forecast: Forecast): MeetingMoment[] =>
  meetingMoments(forecast).filter(
    ({ meeting, event, seenFrom }) =>
      meeting.leastSeparationDeg < CLOSE_UP_DEG && (seenFrom !== null || isObservable(event)),
  );

export interface MeetingMoment {
  readonly meeting: Meeting;
  /** The moment that speaks for it: the least separation where there is one. */
  readonly event: ForecastEvent;
  /** The first of the sites from which it can be seen. */
  readonly seenFrom: LocalView | null;
}

/** The meetings away from the Sun, each with the moment that speaks for it. */
function meetingMoments({ meetings, events }: Forecast): MeetingMoment[] {
  const byId = new Map(events.map((event) => [event.id, event]));
  return meetings.flatMap((meeting): MeetingMoment[] => {
    const moments = [meeting.appulse, ...meeting.conjunctionsLongitude, ...meeting.conjunctionsRa];
    const event = moments
      .map((id) => (id === null ? undefined : byId.get(id)))
      .find((found) => found !== undefined);
    if (event === undefined || !meeting.observable) return [];
    return [{ meeting, event, seenFrom: event.local.find(({ bestLook }) => bestLook !== null) ?? null }];
  });
}
