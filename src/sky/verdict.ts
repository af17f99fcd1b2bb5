import { titleOf } from '../bodies/index.js';
import type { SkyPlanet } from '../bodies/index.js';
import { angleBetween, degreesFromRadians } from '../math/index.js';
import { localDateTime, ttDays } from '../time/index.js';
import { LOWEST_LOOK_DEG } from './best-look.js';
import type { BestLook } from './best-look.js';
import type { SkyOverSite } from './horizontal.js';
import type { Night } from './night.js';

/** Nearer to the Sun than this, nothing is shown to the public. */
const OBSERVABLE_ELONGATION_DEG = 15;
const LOW_DEG = 15;
const HIGH_DEG = 45;

/** What to do about an event at a site, in one sentence that a newspaper could print. */
export function verdictOf(
  sky: SkyOverSite,
  bodies: readonly SkyPlanet[],
  night: Night,
  look: BestLook | null,
): string {
  if (look !== null) return whereToLook(sky, look);
  const midnight = ttDays((night.from + night.to) / 2);
  const sun = sky.horizontal('sun', midnight).direction;
  const elongationDeg = Math.min(
    ...bodies.map((body) => degreesFromRadians(angleBetween(sky.horizontal(body, midnight).direction, sun))),
  );
  if (elongationDeg < OBSERVABLE_ELONGATION_DEG) {
    return elongationDeg < 1
      ? 'Not observable: less than 1° from the Sun.'
      : `Not observable: only ${Math.round(elongationDeg)}° from the Sun.`;
  }
  if (night.sunset === null && night.sunrise === null && sky.horizontal('sun', midnight).altitudeDeg > 0) {
    return 'Not visible from here: the Sun does not set.';
  }
  const [first, second] = bodies.map(titleOf);
  const who =
    second === undefined ? `${first!} does not stand` : `${first!} and ${second} do not stand together`;
  return `Not visible from here: ${who} ${LOWEST_LOOK_DEG}° above the horizon while the sky is dark.`;
}

function whereToLook(sky: SkyOverSite, look: BestLook): string {
  const local = localDateTime(look.utc, sky.site.zone);
  const height = look.altitudeDeg < LOW_DEG ? 'low in' : look.altitudeDeg < HIGH_DEG ? 'in' : 'high in';
  const light = look.inBrightTwilight ? ', in bright twilight' : '';
  return `Look ${height} the ${look.direction} at ${local.toFormat('HH:mm')} on ${local.toFormat('cccc d MMMM')}${light}.`;
}
