import { titleOf } from '../../bodies/index.js';
import { localDateTime, utcMillis } from '../../time/index.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';
import { listed } from './season-words.js';

/** What the report covers: `Mercury to Neptune from 1 January 2027 to 31 December 2028, as seen from …`. */
export function leadOf(input: ReportInput): string {
  const { forecast, sites } = input;
  const zone = zoneOf(input);
  const first = localDateTime(forecast.from, zone).toFormat('d LLLL yyyy');
  // The span's end is not in it: midnight belongs to the day before.
  const last = localDateTime(utcMillis(forecast.to - 1), zone).toFormat('d LLLL yyyy');
  const [home, ...partners] = sites.map(({ name }) => name);
  const where = home === undefined ? 'as seen from the Earth’s centre' : `as seen from ${home}`;
  const beside = partners.length === 0 ? '' : `, with ${listed(partners)} beside it`;
  const who = listed(forecast.bodies.filter((body) => body !== 'earth').map(titleOf));
  const meetings = forecast.meetings.length;
  const among = meetings === 0 ? '' : `, the moments of ${counted(meetings, 'meeting')} among them`;
  return `${who} from ${first} to ${last}, ${where}${beside}: ${counted(forecast.events.length, 'event')}${among}.`;
}

const counted = (count: number, what: string): string => `${count} ${what}${count === 1 ? '' : 's'}`;
