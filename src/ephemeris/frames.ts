import { Rotation_EQJ_ECT, Rotation_EQJ_EQD } from 'astronomy-engine';
import type { RotationMatrix } from 'astronomy-engine';
import type { Rotation } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import { libraryTime } from './library.js';
import type { Frame } from './paths.js';

const identity: Rotation = [
  { x: 1, y: 0, z: 0 },
  { x: 0, y: 1, z: 0 },
  { x: 0, y: 0, z: 1 },
];

/**
 * The rotation from the axes of J2000.0 to a frame at an instant.
 * Precession: Capitaine et al. 2003 (IAU 2006). Nutation: the five largest terms of IAU 2000B, good to 0.1″, which
 * turns all bodies together and so hardly touches a difference between two of them.
 */
export function rotationTo(frame: Frame, tt: TtDays): Rotation {
  switch (frame) {
    case 'j2000':
      return identity;
    case 'equator-of-date':
      return rowsOf(Rotation_EQJ_EQD(libraryTime(tt)));
    case 'ecliptic-of-date':
      return rowsOf(Rotation_EQJ_ECT(libraryTime(tt)));
  }
}

/** The library keeps `rot[i][j]` so that target component j is the sum over source components i. */
function rowsOf({ rot }: RotationMatrix): Rotation {
  const row = (j: number) => ({ x: rot[0]![j]!, y: rot[1]![j]!, z: rot[2]![j]! });
  return [row(0), row(1), row(2)];
}
