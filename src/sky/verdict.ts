import { titleOf } from '../bodies/index.js';
import type { SkyPlanet } from '../bodies/index.js';
import { angleBetween, degreesFromRadians } from '../math/index.js';
import { localDateTime, ttDays } from '../time/index.js';
import type { BestLook } from './best-look.js';
import type { SkyOverSite } from './horizontal.js';
import { darkHours, safeHours } from './looking-hours.js';
import type { Night } from './night.js';
import { PLANET_RISE_ALTITUDE_DEG } from './rise-set.js';
import type { Stretch } from './stretch.js';

/** Nearer to the Sun than this, the Sun is the reason why nothing is seen. */
const OBSERVABLE_ELONGATION_DEG = 15;
const LOW_DEG = 15;
const HIGH_DEG = 45;
const SAMPLE_DAYS = 1 / 144;

/** What to do about an event at a site, in one sentence that a newspaper could print. */
export function verdictOf(
  sky: SkyOverSite,
  bodies: readonly SkyPlanet[],
  night: Night,
  look: BestLook | null,
): string {
  if (look !== null) return whereToLook(sky, look);
  const elongationDeg = leastElongationDeg(sky, bodies, night);
  if (elongationDeg < 1) return 'Not observable: less than 1° from the Sun.';
  if (elongationDeg < OBSERVABLE_ELONGATION_DEG) {
    return `Not observable: only ${Math.floor(elongationDeg)}° from the Sun.`;
  }
  return `Not visible from here: ${whyNot(sky, bodies, night)}.`;
}

function whereToLook(sky: SkyOverSite, look: BestLook): string {
  const local = localDateTime(look.utc, sky.site.zone);
  const height = look.altitudeDeg < LOW_DEG ? 'low in' : look.altitudeDeg < HIGH_DEG ? 'in' : 'high in';
  const light = look.inBrightTwilight ? ', in bright twilight' : '';
  return `Look ${height} the ${look.direction} at ${local.toFormat('HH:mm')} on ${local.toFormat('cccc d MMMM')}${light}.`;
}

/** In the middle of the night. */
function leastElongationDeg(sky: SkyOverSite, bodies: readonly SkyPlanet[], { from, to }: Night): number {
  const middle = ttDays((from + to) / 2);
  const sun = sky.horizontal('sun', middle).direction;
  return Math.min(
    ...bodies.map((body) => degreesFromRadians(angleBetween(sky.horizontal(body, middle).direction, sun))),
  );
}

function whyNot(sky: SkyOverSite, bodies: readonly SkyPlanet[], night: Night): string {
  if (safeHours(sky.site, night).length === 0) {
    return night.sunset === null ? 'the Sun does not set' : 'the night is too short';
  }
  const hours = darkHours(sky.site, night, bodies);
  if (hours.length === 0) return 'the sky does not get dark enough';
  const below = bodies.filter((body) => !comesUp(sky, body, hours));
  if (below.length === 2) return 'both are below the horizon while the sky is dark';
  if (below.length === 1) return `${titleOf(below[0]!)} is below the horizon while the sky is dark`;
  const [first, second] = bodies.map(titleOf);
  return second === undefined
    ? `${first!} is too low while the sky is dark`
    : `${first!} and ${second} are not both high enough while the sky is dark`;
}

/** Whether a body is above a flat horizon at any time of some hours, to ten minutes. */
function comesUp(sky: SkyOverSite, body: SkyPlanet, hours: readonly Stretch[]): boolean {
  return hours.some(({ from, to }) => {
    const steps = Math.ceil((to - from) / SAMPLE_DAYS);
    return Array.from({ length: steps + 1 }, (_, i) => ttDays(Math.min(to, from + i * SAMPLE_DAYS))).some(
      (tt) => sky.horizontal(body, tt).altitudeDeg > PLANET_RISE_ALTITUDE_DEG,
    );
  });
}
