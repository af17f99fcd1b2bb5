import { HelioDistance } from 'astronomy-engine';
import { columnOf, coordinateOf, pairsOf, reckonings } from './alignments.js';
import { angleBetween, libraryBody, Sky, timeAt } from './apparent-place.js';
import { angularDerivative, derivative, sampledDerivative, wrapped } from './derivative.js';
import { grazesLikeAParabola, rootsOnGrid } from './roots-on-grid.js';
import type { Grid, Root } from './roots-on-grid.js';
import { sampled as sample } from './sampled-sky.js';
import type { SampledSky } from './sampled-sky.js';
import { skyNames } from './scan-row.js';
import type { PlanetName, ScanRow } from './scan-row.js';
import { venusMagnitude, venusPhaseAngle } from './venus-magnitude.js';

/** Kinds at which a rate is zero: stations and extrema. A root that rises is a minimum, one that falls a maximum. */

const DEGREE = Math.PI / 180;
const STEP_DAYS = 0.1;
/** The distance of an outer planet from the Sun bends so slowly that a wider difference is needed against roundoff. */
const SLOW_STEP_DAYS = 2;
const APPULSE_LIMIT = 5 * DEGREE;

interface Extremum extends Root {
  /** Second derivative, in the unit of the function a day². */
  readonly curvature: number;
}

interface Curve {
  readonly samples: Float64Array;
  readonly direct: (tt: number) => number;
  readonly stepDays?: number;
  readonly angular?: boolean;
}

function extrema(grid: Grid, { samples, direct, stepDays = STEP_DAYS, angular = false }: Curve): Extremum[] {
  const rate = (angular ? angularDerivative : derivative)(direct, stepDays);
  const curvature = derivative(rate, stepDays);
  const rates = sampledDerivative(grid, samples, angular);
  return rootsOnGrid(grid, {
    samples: rates,
    direct: rate,
    limit: Infinity,
    grazes: grazesLikeAParabola,
  }).map((root) => ({ ...root, curvature: curvature(root.tt) }));
}

/** Stations in both reckonings. */
export function stations(sampled: SampledSky): ScanRow[] {
  return skyNames.flatMap((planet) =>
    reckonings.flatMap((reckoning) => {
      const coordinate = coordinateOf(reckoning, planet);
      const samples = columnOf(sampled, reckoning, planet);
      const direct = (tt: number): number => coordinate(new Sky(tt));
      return extrema(sampled.grid, { samples, direct, angular: true }).map((root) => ({
        kind: root.rising ? 'stationary-direct' : 'stationary-retrograde',
        reckoning,
        bodies: [planet],
        tt: root.tt,
        slope: root.curvature / DEGREE,
        value: null,
      }));
    }),
  );
}

/** Maxima of the true angle from the Sun; the side is that of the longitude. */
export function greatestElongations(sampled: SampledSky): ScanRow[] {
  return (['mercury', 'venus'] as const).flatMap((planet) => {
    const direct = (tt: number): number => new Sky(tt).elongation(planet);
    return extrema(sampled.grid, { samples: sampled.elongation[planet], direct })
      .filter((root) => !root.rising)
      .map((root) => {
        const sky = new Sky(root.tt);
        const east = wrapped(sky.longitude(planet) - sky.longitude('sun')) > 0;
        return {
          kind: east ? 'greatest-elongation-east' : 'greatest-elongation-west',
          reckoning: null,
          bodies: [planet],
          tt: root.tt,
          slope: root.curvature / DEGREE,
          value: direct(root.tt) / DEGREE,
        };
      });
  });
}

/** Least and greatest true distance from the Earth. */
export function nearestAndFarthest(sampled: SampledSky): ScanRow[] {
  return skyNames.flatMap((planet) => {
    const direct = (tt: number): number => new Sky(tt).geometricDistanceAu(planet);
    return extrema(sampled.grid, { samples: sampled.geometricDistanceAu[planet], direct }).map((root) => ({
      kind: root.rising ? 'closest-approach' : 'farthest',
      reckoning: null,
      bodies: [planet],
      tt: root.tt,
      slope: root.curvature,
      value: direct(root.tt),
    }));
  });
}

/** Anomalistic periods, days, to tell one revolution's extrema from the next one's. */
const anomalisticPeriodDays = {
  mercury: 87.97,
  venus: 224.7,
  mars: 687,
  jupiter: 4333,
  saturn: 10_760,
  uranus: 30_690,
  neptune: 60_190,
} as const;

/**
 * The deepest and the highest heliocentric distance of each revolution. The grid is widened by a revolution at either
 * end, so that no extremum inside is preferred to a better one outside.
 */
export function apsides({ start, step, count }: Grid): ScanRow[] {
  return skyNames.flatMap((planet) => {
    const periodDays = anomalisticPeriodDays[planet];
    const margin = Math.ceil(periodDays / step);
    const wide = { start: start - margin * step, step, count: count + 2 * margin };
    const direct = (tt: number): number => HelioDistance(libraryBody[planet], timeAt(tt));
    const stepDays = periodDays > 1000 ? SLOW_STEP_DAYS : STEP_DAYS;
    const all = extrema(wide, { samples: sample(wide, direct), direct, stepDays });
    const kinds = [
      ['perihelion', all.filter((root) => root.rising), 1],
      ['aphelion', all.filter((root) => !root.rising), -1],
    ] as const;
    return kinds.flatMap(([kind, roots, sign]) =>
      revolutions(roots, periodDays).map((local) => {
        const best = local.reduce((a, b) => (sign * direct(b.tt) < sign * direct(a.tt) ? b : a));
        return apsis(kind, planet, best, direct(best.tt));
      }),
    );
  });
}

const apsis = (kind: string, planet: PlanetName, root: Extremum, distanceAu: number): ScanRow => ({
  kind,
  reckoning: null,
  bodies: [planet],
  tt: root.tt,
  slope: root.curvature,
  value: distanceAu,
});

/** Extrema of one sense in groups that lie less than half a period apart. */
function revolutions(roots: readonly Extremum[], periodDays: number): Extremum[][] {
  const groups: Extremum[][] = [];
  for (const root of roots) {
    const last = groups.at(-1);
    if (last && root.tt - last[0]!.tt < periodDays / 2) last.push(root);
    else groups.push([root]);
  }
  return groups;
}

/** Venus at her brightest before and after inferior conjunction. */
export function greatestBrilliancies({ grid }: SampledSky): ScanRow[] {
  const direct = (tt: number): number => venusMagnitude(new Sky(tt));
  return extrema(grid, { samples: sample(grid, direct), direct })
    .filter((root) => root.rising)
    .filter((root) => {
      const phaseAngle = venusPhaseAngle(new Sky(root.tt));
      return phaseAngle > 90 * DEGREE && phaseAngle < 150 * DEGREE;
    })
    .map((root) => ({
      kind: 'greatest-brilliancy',
      reckoning: null,
      bodies: ['venus'],
      tt: root.tt,
      slope: root.curvature,
      value: direct(root.tt),
    }));
}

/**
 * Least separations of two planets. The squared chord between the unit vectors is smooth through the closest ones,
 * where the angle itself has a kink.
 */
export function appulses({ grid, direction }: SampledSky): ScanRow[] {
  return pairsOf(skyNames).flatMap(([first, second]) => {
    const squaredChord = (tt: number): number => {
      const sky = new Sky(tt);
      const [a, b] = [sky.place(first).direction, sky.place(second).direction];
      return (a[0] - b[0]) ** 2 + (a[1] - b[1]) ** 2 + (a[2] - b[2]) ** 2;
    };
    const [x, y, z] = direction;
    const samples = new Float64Array(grid.count);
    for (let i = 0; i < grid.count; i++) {
      samples[i] =
        (x[first][i]! - x[second][i]!) ** 2 +
        (y[first][i]! - y[second][i]!) ** 2 +
        (z[first][i]! - z[second][i]!) ** 2;
    }
    return extrema(grid, { samples, direct: squaredChord })
      .filter((root) => root.rising)
      .flatMap((root) => {
        const sky = new Sky(root.tt);
        const separation = angleBetween(sky.place(first).direction, sky.place(second).direction);
        if (separation >= APPULSE_LIMIT) return [];
        return {
          kind: 'appulse',
          reckoning: null,
          bodies: [first, second],
          tt: root.tt,
          slope: root.curvature / 2 / DEGREE ** 2,
          value: separation / DEGREE,
        };
      });
  });
}
