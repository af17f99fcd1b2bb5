import { ApparentPlaces, Tracks, geometryOf, rotateMotion, rotationTo } from '../ephemeris/index.js';
import type { EphemerisSource, Frame, Geometry } from '../ephemeris/index.js';
import type { Body } from '../bodies/index.js';
import { rotate } from '../math/index.js';
import type { Rotation, Vector } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import type { SkyModel } from './signal.js';

/** The sky of an ephemeris source: tracks to search on, exact places to decide on. */
export interface TrackedSky extends SkyModel {
  readonly source: EphemerisSource;
  readonly geometry: Geometry;
  readonly places: ApparentPlaces;
  readonly tracks: Tracks;
  /** The exact apparent place in a frame, au. */
  apparent(body: Body, frame: Frame, tt: TtDays): Vector;
}

export function trackedSky(source: EphemerisSource): TrackedSky {
  const geometry = geometryOf(source);
  const places = new ApparentPlaces(geometry);
  const tracks = new Tracks(places);
  const rotation = rememberLast(rotationTo);
  return {
    source,
    geometry,
    places,
    tracks,
    apparent: (body, frame, tt) => rotate(rotation(frame, tt), places.apparent(body, tt)),
    geocentric: (body, frame, tt) => tracks.motion(body, frame, tt),
    heliocentric: (planet, tt) => geometry.heliocentricMotion(planet, tt),
    heliocentricOfDate: (planet, tt) =>
      rotateMotion(rotation('ecliptic-of-date', tt), geometry.heliocentricMotion(planet, tt)),
  };
}

/** Two bodies at one instant ask for the same turn of the axes, one after the other. */
function rememberLast(make: (frame: Frame, tt: TtDays) => Rotation): (frame: Frame, tt: TtDays) => Rotation {
  const last = new Map<Frame, { tt: TtDays; rotation: Rotation }>();
  return (frame, tt) => {
    const known = last.get(frame);
    if (known?.tt === tt) return known.rotation;
    const rotation = make(frame, tt);
    last.set(frame, { tt, rotation });
    return rotation;
  };
}
