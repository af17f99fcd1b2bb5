import { titleOf } from '../../bodies/index.js';
import type { SeasonSample, SeasonState } from '../../forecast/index.js';
import { localDateTime } from '../../time/index.js';
import { angleWords, fixed } from '../numbers.js';
import { shownHours } from './best-stretches.js';
import type { BestStretch } from './best-stretches.js';

/** `from 13 Jan to 18 Mar 2027`, `until 6 Mar 2027` where it began before the span, `around 2 Feb 2027`. */
export function stretchWords({ from, to, opensBefore, endsAfter }: BestStretch, zone: string): string {
  const [first, last] = [localDateTime(from.utc, zone), localDateTime(to.utc, zone)];
  const lastDay = last.toFormat('d LLL yyyy');
  if (opensBefore && endsAfter) return 'all the time';
  if (opensBefore) return `until ${lastDay}`;
  if (endsAfter) return `from ${first.toFormat('d LLL yyyy')} on`;
  if (from === to) return `around ${lastDay}`;
  return `from ${first.toFormat(first.year === last.year ? 'd LLL' : 'd LLL yyyy')} to ${lastDay}`;
}

const stateWords: Readonly<Record<SeasonState, string>> = {
  dusk: 'evening sky',
  dawn: 'morning sky',
  full: 'most of the night',
  sun: 'too near the Sun',
  none: 'not to be seen',
};

/** `morning sky, up to 3.0 h in the dark`; without a site how far from the Sun. */
const peakWords = (peak: SeasonSample): string =>
  peak.darkHours === null
    ? `${stateWords[peak.state]}, ${angleWords(Math.abs(peak.elongationDeg))} from the Sun`
    : `${stateWords[peak.state]}, up to ${fixed(shownHours(peak), 1)} h in the dark`;

export const stretchAndPeakWords = (best: BestStretch, zone: string): string =>
  `${stretchWords(best, zone)}, ${peakWords(best.peak)}`;

/** The bright planets that have a season: the finding of the picture. */
const LEADING: readonly BestStretch['body'][] = ['venus', 'mars', 'jupiter', 'saturn'];

/** `Jupiter and Mars are at their best in February 2027, Saturn in October, Venus in March 2028`. */
export function seasonTitle(bests: readonly BestStretch[], zone: string): string {
  const months = new Map<string, { names: string[]; month: string; year: string }>();
  for (const { body, peak } of firstOfEach(bests)) {
    const date = localDateTime(peak.utc, zone);
    const key = date.toFormat('yyyy-MM');
    const entry = months.get(key) ?? { names: [], month: date.toFormat('LLLL'), year: date.toFormat('yyyy') };
    entry.names.push(titleOf(body));
    months.set(key, entry);
  }
  const groups = [...months.values()];
  if (groups.length === 0) return 'The season of each planet';
  return groups
    .map(({ names, month, year }, i) => {
      const is = i > 0 ? '' : names.length === 1 ? ' is at its best' : ' are at their best';
      const said = groups[i - 1]?.year === year ? month : `${month} ${year}`;
      return `${listed(names)}${is} in ${said}`;
    })
    .join(', ');
}

/** What is still to come is news; what had begun before the span is not. */
const firstOfEach = (bests: readonly BestStretch[]): BestStretch[] =>
  LEADING.flatMap((body) => {
    const own = bests.filter((best) => best.body === body);
    return own.find(({ opensBefore }) => !opensBefore) ?? own[0] ?? [];
  }).sort((a, b) => a.peak.utc - b.peak.utc);

/** `Mars`, `Mars and Venus`, `Mars, Venus and Jupiter`. */
export const listed = (names: readonly string[]): string =>
  names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1)!}`;
