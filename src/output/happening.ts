import { titleOf } from '../bodies/index.js';
import type { ForecastEvent, KindName, SingleCircumstances } from '../forecast/index.js';
import { angleWords, fixed } from './numbers.js';

/** What one planet does, as the rest of a sentence that begins with a date and its name. */
type Doing = (circumstances: SingleCircumstances) => string;

const sky = ({ elongationSide }: SingleCircumstances): string =>
  elongationSide === 'east' ? 'evening sky' : 'morning sky';
const millionKm = ({ distanceKm }: SingleCircumstances): string => `${fixed(distanceKm / 1e6, 0)} million km`;
const fromSunAu = ({ heliocentricDistanceAu }: SingleCircumstances): string =>
  `${fixed(heliocentricDistanceAu, 3)} au`;

type PairKind =
  | 'conjunction-ra'
  | 'conjunction-longitude'
  | 'appulse'
  | 'heliocentric-conjunction'
  | 'heliocentric-opposition';

const doings: Readonly<Record<Exclude<KindName, PairKind>, Doing>> = {
  opposition: (c) => `stands opposite the Sun, ${fixed(c.diameterArcsec, 1)}″ across`,
  conjunction: () => 'passes on the far side of the Sun',
  'inferior-conjunction': () => 'passes between the Earth and the Sun',
  'superior-conjunction': () => 'passes on the far side of the Sun',
  'east-quadrature': () => 'stands at a right angle to the Sun in the evening sky',
  'west-quadrature': () => 'stands at a right angle to the Sun in the morning sky',
  'greatest-elongation-east': (c) =>
    `stands farthest from the Sun in the evening sky, ${fixed(c.elongationDeg, 0)}° from it`,
  'greatest-elongation-west': (c) =>
    `stands farthest from the Sun in the morning sky, ${fixed(c.elongationDeg, 0)}° from it`,
  'stationary-retrograde': () => 'stands still among the stars before it moves westward',
  'stationary-direct': () => 'stands still among the stars before it moves eastward again',
  'closest-approach': (c) => `is closest to the Earth, ${millionKm(c)} away`,
  farthest: (c) => `is farthest from the Earth, ${millionKm(c)} away`,
  perihelion: (c) => `is at the point of its orbit nearest to the Sun, ${fromSunAu(c)} from it`,
  aphelion: (c) => `is at the point of its orbit farthest from the Sun, ${fromSunAu(c)} from it`,
  'greatest-brilliancy': (c) =>
    `is at its brightest in the ${sky(c)}${c.magnitude === null ? '' : `, magnitude ${fixed(c.magnitude, 1)}`}`,
};

/** What happens, as a sentence without its date: `Mars stands opposite the Sun, 13.8″ across`. */
export function happeningOf({ kind, bodies, circumstances }: ForecastEvent): string {
  const names = bodies.map(titleOf).join(' and ');
  switch (circumstances.about) {
    case 'one-body':
      return `${names} ${doings[kind as keyof typeof doings](circumstances)}`;
    case 'two-bodies':
      return `${names} stand ${angleWords(circumstances.separationDeg)} apart`;
    case 'heliocentric':
      return `${names} stand on ${kind === 'heliocentric-conjunction' ? 'one side' : 'opposite sides'} of the Sun`;
  }
}
