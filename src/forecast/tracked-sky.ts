import { ApparentPlaces, Tracks, geometryOf, longitudeOfMotion } from '../ephemeris/index.js';
import type { EphemerisSource, Frame, Geometry } from '../ephemeris/index.js';
import type { Body } from '../bodies/index.js';
import { rotate } from '../math/index.js';
import type { Vector } from '../math/index.js';
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
  return {
    source,
    geometry,
    places,
    tracks,
    apparent: (body, frame, tt) => rotate(tracks.rotation(frame, tt), places.apparent(body, tt)),
    geocentric: (body, frame, tt) => tracks.motion(body, frame, tt),
    longitude: (body, frame, tt) => tracks.longitude(body, frame, tt),
    heliocentric: (planet, tt) => geometry.heliocentricMotion(planet, tt),
    heliocentricLongitude: (planet, tt) =>
      longitudeOfMotion(geometry.heliocentricMotion(planet, tt), tracks.rotation('ecliptic-of-date', tt)),
  };
}
