import { titleOf } from '../bodies/index.js';
import type { ForecastEvent } from '../forecast/index.js';
import type { BestLook } from '../sky/index.js';
import { localDateTime, utcFromTt, utcMillis } from '../time/index.js';
import type { UtcMillis } from '../time/index.js';
import { bodiesWords, leastElongationDeg } from './event-words.js';
import { happeningOf } from './happening.js';
import { aidWords, lookWords, nightWords } from './look-words.js';
import { angleWords, fixed } from './numbers.js';
import { grainOf, tellInstant } from './uncertainty-words.js';

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

/**
 * What a newspaper could print of an event: what happens and when, then what to do about it at the first site.
 * @param zone whose dates are told; the first site's by default, else UTC
 */
export function headlineOf(event: ForecastEvent, zone = event.local[0]?.zone ?? 'UTC'): string {
  return sentencesOf(event, zone)
    .filter((sentence) => sentence !== null)
    .join(' ');
}

function sentencesOf(event: ForecastEvent, zone: string): (string | null)[] {
  const look = event.local[0]?.bestLook ?? null;
  if (!isObservable(event)) return [plainSentence(event, zone), reasonOf(event)];
  return look?.separationDeg == null
    ? [seasonSentence(event, zone), event.local[0]?.verdict ?? null, aidWords(event)]
    : [meetingSentence(event, look, look.separationDeg, zone), aidWords(event)];
}

/** Two bodies on their best evening here, as far apart as they are then. */
function meetingSentence(event: ForecastEvent, look: BestLook, separationDeg: number, zone: string): string {
  const pair = `${bodiesWords(event)} stand ${angleWords(separationDeg)} apart`;
  return `${pair} ${nightWords(look, zone)}; ${lookWords(look, zone)}.`;
}

const plainSentence = (event: ForecastEvent, zone: string): string =>
  `${capitalised(dateWords(event, zone))} ${happeningOf(event)}.`;

const capitalised = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

function dateWords({ utc, uncertaintySeconds }: ForecastEvent, zone: string): string {
  const around = grainOf(uncertaintySeconds.utc) === 'day' ? 'around' : 'on';
  return `${around} ${tellInstant(utc, uncertaintySeconds.utc, zone).longDate}`;
}

/** Sights that last are told as the time for which they do. */
function seasonSentence(event: ForecastEvent, zone: string): string {
  const { circumstances, interval, utc } = event;
  if (circumstances.about !== 'one-body') return plainSentence(event, zone);
  if (event.kind === 'opposition') {
    const near = circumstances.closeness === undefined ? '' : `, ${circumstances.closeness.phrase}`;
    const season = spanWords(
      utcMillis(utc - SEASON_WEEKS * WEEK_MILLIS),
      utcMillis(utc + SEASON_WEEKS * WEEK_MILLIS),
      zone,
    );
    return `${titleOf(circumstances.body)} is at its best from about ${season}: it stands opposite the Sun ${dateWords(event, zone)}, ${fixed(circumstances.diameterArcsec, 1)}″ across${near}.`;
  }
  if (event.kind === 'greatest-brilliancy' && interval !== null) {
    return `${happeningOf(event)}, from ${spanWords(utcFromTt(interval.from), utcFromTt(interval.to), zone)}.`;
  }
  return plainSentence(event, zone);
}

/** `22 January to 19 March 2027`; the first year too where there are two. */
function spanWords(from: UtcMillis, to: UtcMillis, zone: string): string {
  const [first, last] = [localDateTime(from, zone), localDateTime(to, zone)];
  const firstDay = first.toFormat(first.year === last.year ? 'd LLLL' : 'd LLLL yyyy');
  return `${firstDay} to ${last.toFormat('d LLLL yyyy')}`;
}

/** Why there is nothing to see: the first site's verdict, or how near the Sun; nothing for what is not in the sky. */
function reasonOf(event: ForecastEvent): string | null {
  const [home] = event.local;
  if (home !== undefined) return home.verdict;
  const elongationDeg = leastElongationDeg(event);
  return elongationDeg === null ? null : `Not observable, ${fixed(elongationDeg, 0)}° from the Sun.`;
}
