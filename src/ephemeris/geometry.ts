import { planets } from '../bodies/index.js';
import type { Planet } from '../bodies/index.js';
import type { Vector } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import type { Motion } from './paths.js';
import type { EphemerisSource } from './source.js';
import { trackOf } from './vector-track.js';
import type { BlockShape, VectorTrack } from './vector-track.js';

/**
 * Blocks short enough that sixteen nodes give geocentric directions to 0.00004″ (Pluto, whose library positions are
 * not quite smooth: 0.002″). The Earth's are shorter than its year asks for, because the Moon swings it every month.
 */
const shapes: Readonly<Record<Planet, BlockShape>> = {
  mercury: { blockDays: 22, nodes: 16 },
  venus: { blockDays: 96, nodes: 16 },
  earth: { blockDays: 32, nodes: 16 },
  mars: { blockDays: 192, nodes: 16 },
  jupiter: { blockDays: 1024, nodes: 16 },
  saturn: { blockDays: 1024, nodes: 16 },
  uranus: { blockDays: 1024, nodes: 16 },
  neptune: { blockDays: 1024, nodes: 16 },
  pluto: { blockDays: 512, nodes: 16 },
};
const sunShape: BlockShape = { blockDays: 1024, nodes: 16 };

/**
 * An ephemeris source seen through tracks: the same geometric positions, with their derivatives, at a small part of
 * the cost. It is a source itself, so everything that works on one works on it.
 */
export interface Geometry extends EphemerisSource {
  heliocentricMotion(planet: Planet, tt: TtDays): Motion;
  sunMotion(tt: TtDays): Motion;
}

export function geometryOf(source: EphemerisSource): Geometry {
  const orbits = new Map<Planet, VectorTrack>(
    planets.map((planet) => [planet, trackOf(shapes[planet], (tt) => source.heliocentric(planet, tt))]),
  );
  const sun = trackOf(sunShape, (tt) => source.sunFromBarycentre(tt));
  return {
    name: source.name,
    description: source.description,
    heliocentric: (planet, tt): Vector => orbits.get(planet)!.position(tt),
    heliocentricMotion: (planet, tt): Motion => orbits.get(planet)!.motion(tt),
    sunFromBarycentre: (tt): Vector => sun.position(tt),
    sunMotion: (tt): Motion => sun.motion(tt),
    accuracy: (body) => source.accuracy(body),
  };
}
