import { angleBetween, length } from './apparent-place.js';
import type { Sky, Triple } from './apparent-place.js';

const DEGREE = Math.PI / 180;
const opposite = ([x, y, z]: Triple): Triple => [-x, -y, -z];

/** The angle Sun–Venus–Earth in the light that arrives now, radians. */
export function venusPhaseAngle(sky: Sky): number {
  const { astrometric, heliocentric } = sky.place('venus');
  return angleBetween(opposite(heliocentric), opposite(astrometric));
}

/**
 * Visual magnitude of Venus, Mallama & Hilton (2018), Astronomy and Computing 25, 10, eq. 3, for phase angles up to
 * 163.7°. The distances are those travelled by the light: Sun to Venus when it left, Venus then to the Earth now.
 */
export function venusMagnitude(sky: Sky): number {
  const { astrometric, heliocentric } = sky.place('venus');
  const a = venusPhaseAngle(sky) / DEGREE;
  const phase = a * (-1.044e-3 + a * (3.687e-4 + a * (-2.814e-6 + a * 8.938e-9)));
  return 5 * Math.log10(length(heliocentric) * length(astrometric)) - 4.384 + phase;
}
