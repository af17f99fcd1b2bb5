import { wrapTwoPi } from '../../math/index.js';
import type { Vector } from '../../math/index.js';

/**
 * What the season on Mars adds to its magnitude, every 10° of the solar longitude from 0°.
 * Source: Mallama, Icarus 192 (2007) 404, table 8, as carried by the code published with Mallama & Hilton (2018).
 */
const seasonMagnitudes = [
  -0.029, -0.017, -0.014, -0.006, -0.018, -0.02, -0.014, -0.03, -0.008, -0.04, -0.024, -0.037, -0.036, -0.032,
  0.01, 0.01, -0.001, 0.044, 0.025, -0.004, -0.016, -0.008, 0.029, -0.054, -0.033, 0.055, 0.017, 0.052, 0.006,
  0.087, 0.006, 0.064, 0.03, 0.019, -0.03, -0.017,
] as const;
const STEP_DEG = 10;

/** From the heliocentric longitude of Mars (ecliptic of J2000.0) to its solar longitude: Mallama & Hilton (2018). */
const SOLAR_LONGITUDE_OFFSET_DEG = -85;
/** Mean obliquity of J2000.0, radians (IAU 2006). */
const OBLIQUITY_J2000 = (84_381.406 / 3600) * (Math.PI / 180);

/**
 * The solar longitude of Mars, degrees in [0, 360): 0 is its northern spring equinox. With the
 * pole of Mars held still it drifts by 0.2° a century, which moves the magnitude by 0.01 at most within 1600–2600.
 * @param fromSun from the Sun to Mars, axes of J2000.0
 */
export function marsSolarLongitudeDeg({ x, y, z }: Vector): number {
  const longitude = Math.atan2(y * Math.cos(OBLIQUITY_J2000) + z * Math.sin(OBLIQUITY_J2000), x);
  return (wrapTwoPi(longitude + (SOLAR_LONGITUDE_OFFSET_DEG * Math.PI) / 180) * 180) / Math.PI;
}

/**
 * The season's share of the magnitude of Mars: straight lines between the tabulated points. The published code lays
 * a curve through five of them, which differs by 0.018 magnitude at most (0.005 rms), less than the table's
 * own scatter.
 */
export function marsSeasonMagnitude(solarLongitudeDeg: number): number {
  const steps = solarLongitudeDeg / STEP_DEG;
  const index = Math.floor(steps);
  const at = (i: number): number => seasonMagnitudes[i % seasonMagnitudes.length]!;
  return at(index) + (at(index + 1) - at(index)) * (steps - index);
}
