import { Rotation_EQJ_EQD, e_tilt } from 'astronomy-engine';
import type { RotationMatrix } from 'astronomy-engine';
import { RADIANS_PER_DEGREE, add, scale } from '../math/index.js';
import type { Rotation } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import { libraryTime } from './library.js';
import type { Frame } from './paths.js';

/**
 * The rotation from the axes of J2000.0 to a frame at an instant.
 * Precession: Capitaine et al. 2003 (IAU 2006). Nutation: the five largest terms of IAU 2000B, good to 0.1″, which
 * turns all bodies together and so hardly touches a difference between two of them.
 */
export function rotationTo(frame: Frame, tt: TtDays): Rotation {
  switch (frame) {
    case 'equator-of-date':
      return rowsOf(Rotation_EQJ_EQD(libraryTime(tt)));
    case 'ecliptic-of-date':
      return eclipticFromEquator(rotationTo('equator-of-date', tt), tt);
  }
}

/** Tilts the axes of the true equator of date, given by their rotation, by the true obliquity. */
export function eclipticFromEquator([x, y, z]: Rotation, tt: TtDays): Rotation {
  const obliquity = e_tilt(libraryTime(tt)).tobl * RADIANS_PER_DEGREE;
  const cosine = Math.cos(obliquity);
  const sine = Math.sin(obliquity);
  return [x, add(scale(y, cosine), scale(z, sine)), add(scale(z, cosine), scale(y, -sine))];
}

/** The library keeps `rot[i][j]` so that target component j is the sum over source components i. */
function rowsOf({ rot }: RotationMatrix): Rotation {
  const row = (j: number) => ({ x: rot[0]![j]!, y: rot[1]![j]!, z: rot[2]![j]! });
  return [row(0), row(1), row(2)];
}
