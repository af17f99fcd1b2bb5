import { titleOf } from '../bodies/index.js';
import type { ForecastEvent } from '../forecast/index.js';
import type { BestLook } from '../sky/index.js';
import { localDateTime } from '../time/index.js';
import { bodyCircumstancesOf } from './event-words.js';

/** Which part of which night: `on the evening of Wednesday 24 November 2027`. */
export function nightWords({ utc }: BestLook, zone: string): string {
  const local = localDateTime(utc, zone);
  const part = local.hour < 4 ? 'in the small hours' : local.hour < 12 ? 'on the morning' : 'on the evening';
  return `${part} of ${local.toFormat('cccc d LLLL yyyy')}`;
}

/** Below this a body stands low, above the other it stands high. */
const LOW_DEG = 15;
const HIGH_DEG = 45;

/** `look low in the south-west at 16:43`, for a night that has been named. */
export function lookWords({ utc, altitudeDeg, direction, inBrightTwilight }: BestLook, zone: string): string {
  const height = altitudeDeg < LOW_DEG ? 'low in' : altitudeDeg < HIGH_DEG ? 'in' : 'high in';
  const light = inBrightTwilight ? ', in bright twilight' : '';
  return `look ${height} the ${direction} at ${localDateTime(utc, zone).toFormat('HH:mm')}${light}`;
}

/** The faintest that untrained eyes find in an ordinary sky, and binoculars; common practice. */
const EYE_MAGNITUDE = 5.5;
const BINOCULARS_MAGNITUDE = 9.5;

/** What those need who want to see it all: `Uranus needs binoculars.`; null where eyes are enough. */
export function aidWords(event: ForecastEvent): string | null {
  const faint = bodyCircumstancesOf(event).filter(
    ({ magnitude }) => magnitude !== null && magnitude > EYE_MAGNITUDE,
  );
  if (faint.length === 0) return null;
  const faintest = Math.max(...faint.map(({ magnitude }) => magnitude!));
  return `${faint.map(({ body }) => titleOf(body)).join(' and ')} ${faint.length === 1 ? 'needs' : 'need'} ${
    faintest > BINOCULARS_MAGNITUDE ? 'a large telescope' : 'binoculars'
  }.`;
}
