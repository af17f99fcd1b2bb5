import { Sky } from './apparent-place.js';
import type { Grid } from './roots-on-grid.js';
import { planetNames, skyNames } from './scan-row.js';
import type { PlanetName, SkyName } from './scan-row.js';

/** What the kinds need at every step of the grid, computed once and shared between them. Angles in radians. */
export interface SampledSky {
  readonly grid: Grid;
  readonly longitude: Columns<SkyName | 'sun'>;
  readonly rightAscension: Columns<SkyName | 'sun'>;
  /** Apparent directions as unit vectors on J2000 axes: x, y and z. */
  readonly direction: readonly [Columns<SkyName>, Columns<SkyName>, Columns<SkyName>];
  readonly elongation: Columns<SkyName>;
  readonly geometricDistanceAu: Columns<SkyName>;
  readonly heliocentricLongitude: Columns<PlanetName>;
}

type Columns<Name extends string> = Readonly<Record<Name, Float64Array>>;

export function sampleSky(grid: Grid): SampledSky {
  const columns = <Name extends string>(names: readonly Name[]): Columns<Name> =>
    Object.fromEntries(names.map((name) => [name, new Float64Array(grid.count)])) as Columns<Name>;
  const seen = ['sun', ...skyNames] as const;
  const sampled: SampledSky = {
    grid,
    longitude: columns(seen),
    rightAscension: columns(seen),
    direction: [columns(skyNames), columns(skyNames), columns(skyNames)],
    elongation: columns(skyNames),
    geometricDistanceAu: columns(skyNames),
    heliocentricLongitude: columns(planetNames),
  };
  for (let i = 0; i < grid.count; i++) {
    const sky = new Sky(grid.start + i * grid.step);
    for (const body of seen) {
      sampled.longitude[body][i] = sky.longitude(body);
      sampled.rightAscension[body][i] = sky.rightAscension(body);
    }
    for (const planet of skyNames) {
      sky.place(planet).direction.forEach((component, axis) => {
        sampled.direction[axis]![planet][i] = component;
      });
      sampled.elongation[planet][i] = sky.elongation(planet);
      sampled.geometricDistanceAu[planet][i] = sky.geometricDistanceAu(planet);
    }
    for (const planet of planetNames) {
      sampled.heliocentricLongitude[planet][i] = sky.heliocentricLongitude(planet);
    }
  }
  return sampled;
}

/** A column of its own, for what only one kind needs. */
export const sampled = (grid: Grid, f: (tt: number) => number): Float64Array =>
  Float64Array.from({ length: grid.count }, (_, i) => f(grid.start + i * grid.step));
