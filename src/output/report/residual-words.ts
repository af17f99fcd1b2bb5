import { titleOf } from '../../bodies/index.js';
import type { ResidualSeries, Spread } from '../../forecast/index.js';
import { kindTitles } from '../event-words.js';
import { fixed } from '../numbers.js';

/** `Mars, opposition`. */
export const subjectOf = ({ bodies, kind }: ResidualSeries): string =>
  `${bodies.map(titleOf).join(' and ')}, ${kindTitles[kind]}`;

/** The finding as a title: `Mars, opposition: the mean cycle is off by up to 26 days, the Kepler orbits by 79 minutes`. */
export function residualTitle(series: ResidualSeries): string {
  const { mean, keplerTable1: kepler } = series;
  const parts = [
    ...(mean === null ? [] : [`the mean cycle is off by up to ${spanWords(mean.worstDays)}`]),
    ...(kepler === null
      ? []
      : [`the Kepler orbits ${mean === null ? 'are off by up to' : 'by'} ${spanWords(kepler.worstDays)}`]),
  ];
  return parts.length === 0 ? subjectOf(series) : `${subjectOf(series)}: ${parts.join(', ')}`;
}

/** The same with the usual miss beside the worst, as a sentence. */
export function findingOf(series: ResidualSeries): string {
  const { mean, keplerTable1: kepler } = series;
  const parts = [
    mean === null ? 'there is no mean cycle' : missWords('the mean cycle misses', mean),
    ...(kepler === null ? [] : [missWords('the Kepler orbits miss', kepler)]),
  ];
  return `${subjectOf(series)}: ${parts.join('; ')}.`;
}

const missWords = (whatMisses: string, { rmsDays, worstDays }: Spread): string =>
  `${whatMisses} by ${spanWords(rmsDays)} rms and ${spanWords(worstDays)} at worst`;

/** `18 d, 26 d`: root mean square and worst. */
export const spreadWords = (spread: Spread | null): string =>
  spread === null ? '–' : `${shortSpan(spread.rmsDays)}, ${shortSpan(spread.worstDays)}`;

const shortSpan = (days: number): string =>
  spanWords(days).replace(' days', ' d').replace(' hours', ' h').replace(' minutes', ' min');

/** A miss in the unit that fits it. */
function spanWords(days: number): string {
  if (days >= 2) return `${fixed(days, days < 10 ? 1 : 0)} days`;
  if (days * 24 >= 2) return `${fixed(days * 24, 0)} hours`;
  return `${fixed(days * 1440, 0)} minutes`;
}
