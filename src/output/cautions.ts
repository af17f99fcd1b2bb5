import type { ForecastEvent } from '../forecast/index.js';
import { leastElongationDeg } from './event-words.js';

/** A body nearer to the Sun than this carries the caution. */
export const CAUTION_ELONGATION_DEG = 20;
/** The Sun's semi-diameter at perihelion, 0.271°, and a little for a planet that is still on its way. */
const DISC_DEG = 0.3;

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

/** The cautions that an event carries: none away from the Sun, two for a planet that may be seen against its disc. */
export function cautionsOf(event: ForecastEvent): readonly string[] {
  if (!needsSunCaution(event)) return [];
  const crossesDisc = event.kind === 'inferior-conjunction' && leastElongationDeg(event)! < DISC_DEG;
  return crossesDisc ? [cautions.onTheDisc, cautions.besideTheSun] : [cautions.besideTheSun];
}
