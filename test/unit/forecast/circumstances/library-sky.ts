import {
  Body as LibraryBody,
  GeoVector,
  HelioVector,
  RotateVector,
  Rotation_EQJ_ECT,
  Rotation_EQJ_EQD,
} from 'astronomy-engine';
import type { AstroTime } from 'astronomy-engine';
import type { Body } from '../../../../src/bodies/index.js';
import { libraryTime } from '../../../../src/ephemeris/index.js';
import type { Frame } from '../../../../src/ephemeris/index.js';
import type { SkyGeometry } from '../../../../src/forecast/circumstances/index.js';
import { length, scale } from '../../../../src/math/index.js';
import type { Vector } from '../../../../src/math/index.js';
import type { TtDays } from '../../../../src/time/index.js';

const libraryBodies: Readonly<Record<Body, LibraryBody>> = {
  sun: LibraryBody.Sun,
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

const plain = ({ x, y, z }: Vector): Vector => ({ x, y, z });

/** The library's own vectors and rotations, with none of our tracks, aberration or frames between. */
export const librarySky: SkyGeometry = {
  apparent(body, frame, tt) {
    const time = libraryTime(tt);
    const place = GeoVector(libraryBodies[body], time, true);
    const lightTimeAu = length(GeoVector(libraryBodies[body], time, false));
    return scale(RotateVector(rotationOf(frame, time), place), lightTimeAu / length(place));
  },
  astrometric: (body, tt) => plain(GeoVector(libraryBodies[body], libraryTime(tt), false)),
  heliocentric: (planet, tt) => plain(HelioVector(libraryBodies[planet], libraryTime(tt))),
  heliocentricEclipticOfDate(planet, tt) {
    const time = libraryTime(tt);
    return plain(
      RotateVector(rotationOf('ecliptic-of-date', time), HelioVector(libraryBodies[planet], time)),
    );
  },
};

const rotationOf = (frame: Frame, time: AstroTime) =>
  frame === 'equator-of-date' ? Rotation_EQJ_EQD(time) : Rotation_EQJ_ECT(time);

/** The instant of TT, days from J2000.0, of a Julian Date of TT. */
export const ttOfJd = (jd: number): TtDays => (jd - 2_451_545) as TtDays;
