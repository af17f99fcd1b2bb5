import { titleOf } from '../bodies/index.js';
import type { BodyCircumstances, ForecastEvent, KindName } from '../forecast/index.js';
import { compassWords } from '../sky/index.js';
import { angleWords, fixed } from './numbers.js';

export const kindTitles: Readonly<Record<KindName, string>> = {
  opposition: 'opposition',
  conjunction: 'conjunction with the Sun',
  'inferior-conjunction': 'inferior conjunction',
  'superior-conjunction': 'superior conjunction',
  'east-quadrature': 'east quadrature',
  'west-quadrature': 'west quadrature',
  'greatest-elongation-east': 'greatest elongation east',
  'greatest-elongation-west': 'greatest elongation west',
  'stationary-retrograde': 'stationary, retrograde motion begins',
  'stationary-direct': 'stationary, direct motion begins',
  'closest-approach': 'closest to the Earth',
  farthest: 'farthest from the Earth',
  perihelion: 'perihelion',
  aphelion: 'aphelion',
  'greatest-brilliancy': 'greatest brilliancy',
  'conjunction-ra': 'conjunction in right ascension',
  'conjunction-longitude': 'conjunction in longitude',
  appulse: 'least separation',
  'heliocentric-conjunction': 'heliocentric conjunction',
  'heliocentric-opposition': 'heliocentric opposition',
};

export const bodiesWords = ({ bodies }: ForecastEvent): string => bodies.map(titleOf).join(' and ');

/** The circumstances of each body that the Earth sees in an event. */
export function bodyCircumstancesOf({ circumstances }: ForecastEvent): readonly BodyCircumstances[] {
  switch (circumstances.about) {
    case 'one-body':
      return [circumstances];
    case 'two-bodies':
      return circumstances.bodies;
    case 'heliocentric':
      return [];
  }
}

/** The smallest elongation of an event's bodies, degrees; null for what is not in the Earth's sky. */
export function leastElongationDeg(event: ForecastEvent): number | null {
  const elongations = bodyCircumstancesOf(event).map(({ elongationDeg }) => elongationDeg);
  return elongations.length === 0 ? null : Math.min(...elongations);
}

/** One line that names an event: `Mars at opposition`, `Venus 24′ north of Jupiter`. */
export function summaryOf(event: ForecastEvent): string {
  const [first, second] = event.bodies.map(titleOf);
  const { circumstances } = event;
  if (circumstances.about === 'two-bodies') {
    const apart = `${angleWords(circumstances.separationDeg)} ${compassWords(circumstances.positionAngleDeg + 180)} of`;
    return `${first!} ${apart} ${second!}, ${kindTitles[event.kind]}`;
  }
  if (circumstances.about === 'heliocentric') return `${bodiesWords(event)}, ${kindTitles[event.kind]}`;
  switch (event.kind) {
    case 'closest-approach':
    case 'farthest':
      return `${first!} ${kindTitles[event.kind]}, ${fixed(circumstances.distanceAu, 3)} au`;
    case 'greatest-elongation-east':
    case 'greatest-elongation-west':
      return `${first!} at ${kindTitles[event.kind]}, ${fixed(circumstances.elongationDeg, 1)}°`;
    case 'stationary-retrograde':
    case 'stationary-direct':
      return `${first!} ${kindTitles[event.kind]}`;
    default:
      return `${first!} at ${kindTitles[event.kind]}`;
  }
}

/** What matters of a body at an event, for a line of a table: `Leo, 13.8″, mag −1.3, 0.678 au`. */
export function circumstancesLine(event: ForecastEvent): string {
  const { circumstances } = event;
  switch (circumstances.about) {
    case 'one-body':
      return [
        circumstances.constellation,
        `${fixed(circumstances.diameterArcsec, 1)}″`,
        ...(circumstances.magnitude === null ? [] : [`mag ${fixed(circumstances.magnitude, 1)}`]),
        `${fixed(circumstances.distanceAu, 3)} au`,
      ].join(', ');
    case 'two-bodies':
      return [
        circumstances.bodies[0].constellation,
        `${angleWords(circumstances.separationDeg)} apart`,
        `${fixed(circumstances.leastElongationDeg, 0)}° from the Sun`,
      ].join(', ');
    case 'heliocentric':
      return `heliocentric longitude ${fixed(circumstances.bodies[0].heliocentricLongitudeDeg, 1)}°`;
  }
}

/** `1 of 3` where the cycle has several; null where it has one. */
export const seriesWords = ({ series }: ForecastEvent): string | null =>
  series === null ? null : `${series.index} of ${series.of}`;
