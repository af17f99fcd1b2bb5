import type { ForecastEvent } from '../../forecast/index.js';
import { bodyCircumstancesOf } from '../event-words.js';

type Sky = 'dusk' | 'dawn' | 'full';
const skyWords: Readonly<Record<Sky, string>> = {
  dusk: 'evening sky',
  dawn: 'morning sky',
  full: 'all night',
};
/** Farther from the Sun than this, a planet is up for most of the night. */
const ALL_NIGHT_DEG = 135;

/** In which part of the night an event's bodies stand, as a shape and a word; nothing for what is not in the Earth's sky. */
export function SkySign({ event }: { event: ForecastEvent }) {
  const [body] = bodyCircumstancesOf(event);
  if (body === undefined) return null;
  const side = body.elongationSide === 'east' ? 'dusk' : 'dawn';
  const sky = body.elongationDeg > ALL_NIGHT_DEG ? 'full' : side;
  return <span class={`sky ${sky}`}>{skyWords[sky]}</span>;
}
