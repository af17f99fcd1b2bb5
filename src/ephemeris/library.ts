import { AstroTime, Body as LibraryBody, HelioVector } from 'astronomy-engine';
import type { Planet } from '../bodies/index.js';
import { scale } from '../math/index.js';
import type { Vector } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import { libraryAccuracy } from './library-accuracy.js';
import type { EphemerisSource } from './source.js';

const libraryBodies: Readonly<Record<Planet, LibraryBody>> = {
  mercury: LibraryBody.Mercury,
  venus: LibraryBody.Venus,
  earth: LibraryBody.Earth,
  mars: LibraryBody.Mars,
  jupiter: LibraryBody.Jupiter,
  saturn: LibraryBody.Saturn,
  uranus: LibraryBody.Uranus,
  neptune: LibraryBody.Neptune,
  pluto: LibraryBody.Pluto,
};

/**
 * The library's time object for an instant of TT. The library derives TT from UT by a ΔT of its own, which differs
 * from ours by seconds, and its inverse of that does not end for some instants; so TT is set outright. Give such a
 * time only to functions that read TT alone (positions, precession, nutation): shifting it by days, as the library
 * does for light-time, would fall back to its own ΔT.
 */
export function libraryTime(tt: TtDays): AstroTime {
  const time = new AstroTime(tt);
  time.tt = tt;
  return time;
}

/** astronomy-engine: truncated VSOP87 for the planets, an integration for Pluto. */
export const librarySource: EphemerisSource = {
  name: 'library',
  description: 'astronomy-engine 2.1.19 (truncated VSOP87; Pluto by numerical integration)',
  heliocentric(planet: Planet, tt: TtDays): Vector {
    return HelioVector(libraryBodies[planet], libraryTime(tt));
  },
  sunFromBarycentre(tt: TtDays): Vector {
    return scale(HelioVector(LibraryBody.SSB, libraryTime(tt)), -1);
  },
  accuracy: (body) => libraryAccuracy[body],
};
