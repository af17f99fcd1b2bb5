import type { ForecastEvent } from '../forecast/index.js';
import { leastElongationDeg } from './event-words.js';

/** A body nearer to the Sun than this carries the caution. */
export const CAUTION_ELONGATION_DEG = 20;

export const cautions = {
  besideTheSun:
    'Beside the Sun: do not look or sweep with any optics while any part of the Sun is above the true horizon. A filter does not help there.',
  onTheDisc:
    'On the Sun’s disc: a certified filter over the front of every aperture, finders and cameras too, and a trained operator. Eclipse glasses are never used with optics.',
  localRules: 'Lasers, ladders, roads, crowds and ice: follow local rules and licensed practice.',
} as const;

/** Whether an event brings anyone's optics near the Sun. */
export function needsSunCaution(event: ForecastEvent): boolean {
  const elongationDeg = leastElongationDeg(event);
  return elongationDeg !== null && elongationDeg < CAUTION_ELONGATION_DEG;
}
