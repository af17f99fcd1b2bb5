import type { SkyPlanet } from '../../bodies/index.js';
import type { Vector } from '../../math/index.js';
import { DAYS_PER_JULIAN_YEAR } from '../../time/index.js';
import type { TtDays } from '../../time/index.js';
import {
  jupiterMagnitude,
  marsMagnitude,
  mercuryMagnitude,
  neptuneMagnitude,
  saturnMagnitude,
  uranusMagnitude,
  venusMagnitude,
} from './magnitude.js';
import type { Illumination, Tilt } from './magnitude.js';
import { marsSolarLongitudeDeg } from './mars-season.js';
import { uranusGraphicLatitudeDeg, viewerLatitudeDeg } from './poles.js';

/** Phase angles up to which the two inner planets have been observed: nearer to the Sun a number would be a guess. */
const MERCURY_OBSERVED_TO_DEG = 170;
const VENUS_OBSERVED_TO_DEG = 179;

/**
 * The apparent visual magnitude as seen from the Earth, or null where the published formula does not reach. Below
 * 2° of phase, at superior conjunctions, the fits of Mercury and Venus are followed to 0° as their authors do.
 * Pluto has no formula of that standing: null.
 * @param fromSun from the Sun to the planet when its light left it, au, axes of J2000.0
 * @param fromEarth from the Earth now to the planet then, likewise
 */
export function magnitudeOf(
  body: SkyPlanet,
  light: Illumination,
  fromSun: Vector,
  fromEarth: Vector,
  tt: TtDays,
): number | null {
  switch (body) {
    case 'mercury':
      return light.phaseDeg <= MERCURY_OBSERVED_TO_DEG ? mercuryMagnitude(light) : null;
    case 'venus':
      return light.phaseDeg <= VENUS_OBSERVED_TO_DEG ? venusMagnitude(light) : null;
    case 'mars':
      return marsMagnitude(light, marsSolarLongitudeDeg(fromSun));
    case 'jupiter':
      return jupiterMagnitude(light);
    case 'saturn':
      return saturnMagnitude(light, tiltOf('saturn', fromSun, fromEarth, tt));
    case 'uranus':
      return uranusMagnitude(light, graphic(tiltOf('uranus', fromSun, fromEarth, tt)));
    case 'neptune':
      return neptuneMagnitude(light, 2000 + tt / DAYS_PER_JULIAN_YEAR);
    case 'pluto':
      return null;
  }
}

const tiltOf = (planet: 'saturn' | 'uranus', fromSun: Vector, fromEarth: Vector, tt: TtDays): Tilt => ({
  sunLatitudeDeg: viewerLatitudeDeg(planet, fromSun, tt),
  earthLatitudeDeg: viewerLatitudeDeg(planet, fromEarth, tt),
});

const graphic = ({ sunLatitudeDeg, earthLatitudeDeg }: Tilt): Tilt => ({
  sunLatitudeDeg: uranusGraphicLatitudeDeg(sunLatitudeDeg),
  earthLatitudeDeg: uranusGraphicLatitudeDeg(earthLatitudeDeg),
});
