import { titleOf } from '../bodies/index.js';
import type { ForecastEvent } from '../forecast/index.js';
import { localDateTime } from '../time/index.js';
import { leastElongationDeg } from './event-words.js';
import { angleWords, fixed } from './numbers.js';
import { tellInstant } from './uncertainty-words.js';

/** Nearer to the Sun than this nothing is a sight. */
export const OBSERVABLE_ELONGATION_DEG = 15;
/** An opposition is worth watching for about this long on either side; common practice. */
const SEASON_WEEKS = 4;
const WEEK_MILLIS = 7 * 86_400_000;

/** Whether the bodies of an event can be seen at all: from the first site, or, without one, far enough from the Sun. */
export function isObservable(event: ForecastEvent): boolean {
  const [home] = event.local;
  if (home !== undefined) return home.bestLook !== null;
  const elongationDeg = leastElongationDeg(event);
  return elongationDeg !== null && elongationDeg >= OBSERVABLE_ELONGATION_DEG;
}

/** What a newspaper could print of an event: first what to do, then why. */
export function headlineOf(event: ForecastEvent): string {
  const { circumstances } = event;
  const [first, second] = event.bodies.map(titleOf);
  const [home] = event.local;
  const zone = home?.zone ?? 'UTC';
  const on = tellInstant(event.utc, event.uncertaintySeconds.utc, zone).longDate;
  const look = home === undefined ? '' : ` ${home.verdict}`;
  if (circumstances.about === 'heliocentric') {
    const sides = event.kind === 'heliocentric-conjunction' ? 'on one side of' : 'on opposite sides of';
    return `${first!} and ${second!} stand ${sides} the Sun on ${on}.`;
  }
  if (!isObservable(event)) {
    const elongationDeg = leastElongationDeg(event);
    const why =
      home !== undefined ? home.verdict : `Not observable, ${fixed(elongationDeg ?? 0, 0)}° from the Sun.`;
    return `${first!}${second === undefined ? '' : ` and ${second}`}, ${on}. ${why}`;
  }
  if (circumstances.about === 'two-bodies') {
    const then = home?.bestLook?.separationDeg ?? circumstances.separationDeg;
    const when =
      home?.bestLook == null
        ? `on ${on}`
        : `on ${localDateTime(home.bestLook.utc, zone).toFormat('cccc d LLLL yyyy')}`;
    return `${first!} and ${second!} stand ${angleWords(then)} apart ${when}.${look}`;
  }
  if (circumstances.about === 'heliocentric')
    return `${first!} and ${second!} line up with the Sun on ${on}.`;
  switch (event.kind) {
    case 'opposition': {
      const day = (weeks: number): string =>
        localDateTime(event.utc, zone)
          .plus({ milliseconds: weeks * WEEK_MILLIS })
          .toFormat('d LLLL');
      const near = circumstances.closeness === undefined ? '' : `, ${circumstances.closeness.phrase}`;
      return `${first!} is up all night from about ${day(-SEASON_WEEKS)} to ${day(SEASON_WEEKS)}: it stands opposite the Sun on ${on}, ${fixed(circumstances.diameterArcsec, 1)}″ across${near}.${look}`;
    }
    case 'greatest-elongation-east':
      return `${first!} is at its best in the evening sky around ${on}, ${fixed(circumstances.elongationDeg, 0)}° from the Sun.${look}`;
    case 'greatest-elongation-west':
      return `${first!} is at its best in the morning sky around ${on}, ${fixed(circumstances.elongationDeg, 0)}° from the Sun.${look}`;
    case 'greatest-brilliancy': {
      const side = circumstances.elongationSide === 'east' ? 'evening' : 'morning';
      return `${first!} is at its brightest in the ${side} sky for some days around ${on}.${look}`;
    }
    case 'closest-approach':
      return `${first!} is closest to the Earth on ${on}, ${fixed(circumstances.distanceKm / 1e6, 0)} million km away.${look}`;
    default:
      return `${first!}: ${event.kind.replaceAll('-', ' ')} on ${on}.${look}`;
  }
}
