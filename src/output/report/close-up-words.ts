import { titleOf } from '../../bodies/index.js';
import type { PairCircumstances } from '../../forecast/index.js';
import { compassWords } from '../../sky/index.js';
import { localDateTime } from '../../time/index.js';
import { lookWords, nightWords } from '../look-words.js';
import { angleWords, fixed } from '../numbers.js';
import { dateAndClock, uncertaintyShort } from '../uncertainty-words.js';
import type { MeetingMoment } from './choose.js';
import type { ReportInput } from './report-input.js';
import { zoneOf } from './report-input.js';

/** Moments of a meeting are told of two bodies. */
export function pairOf({ event: { circumstances, id } }: MeetingMoment): PairCircumstances {
  if (circumstances.about !== 'two-bodies') throw new TypeError(`${id} is not about two bodies`);
  return circumstances;
}

/** `Venus 14′ north of Neptune`. */
export function closeUpTitle(moment: MeetingMoment): string {
  const { bodies, separationDeg, positionAngleDeg } = pairOf(moment);
  const side = compassWords(positionAngleDeg + 180);
  return `${titleOf(bodies[0].body)} ${angleWords(separationDeg)} ${side} of ${titleOf(bodies[1].body)}`;
}

/** `Closest 2027-04-24 Sat 12:56 CEST, ± 8 min.` */
export const closestWords = ({ event }: MeetingMoment, input: ReportInput): string =>
  `Closest ${dateAndClock(event, zoneOf(input))}, ${uncertaintyShort(event.uncertaintySeconds.utc)}.`;

/** When and where to see it, at the first site that can. */
export function sightWords({ event, seenFrom }: MeetingMoment, { sites }: ReportInput): string {
  const site = sites.find(({ id }) => id === seenFrom?.site);
  const look = seenFrom?.bestLook ?? null;
  if (site === undefined || look === null)
    return `On ${localDateTime(event.utc, 'UTC').toFormat('cccc d LLLL yyyy')}, ${fixed(pairElongation(event), 0)}° from the Sun.`;
  const apart = look.separationDeg === null ? '' : `, ${angleWords(look.separationDeg)} apart then`;
  return `From ${site.name}: ${lookWords(look, site.zone)} ${nightWords(look, site.zone)}${apart}.`;
}

const pairElongation = ({ circumstances }: MeetingMoment['event']): number =>
  circumstances.about === 'two-bodies' ? circumstances.leastElongationDeg : 0;
