import { HelioDistance } from 'astronomy-engine';
import { columnOf, coordinateOf, pairsOf, reckonings } from './alignments.js';
import { angleBetween, libraryBody, Sky, timeAt } from './apparent-place.js';
import { angularDerivative, derivative, sampledDerivative, wrapped } from './derivative.js';
import { bisect, grazesLikeAParabola, rootsOnGrid } from './roots-on-grid.js';
import type { Grid, Root } from './roots-on-grid.js';
import { sampled as sample } from './sampled-sky.js';
import type { SampledSky } from './sampled-sky.js';
import { skyNames } from './scan-row.js';
import type { ScanRow } from './scan-row.js';
import { venusMagnitude, venusPhaseAngle } from './venus-magnitude.js';

/** Kinds at which a rate is zero: stations and extrema. A root that rises is a minimum, one that falls a maximum. */

const DEGREE = Math.PI / 180;
/** The distance of an outer planet from the Sun bends so slowly that a wide difference is needed against roundoff. */
const SLOW_STRIDE = 8;
const APPULSE_LIMIT = 5 * DEGREE;
/** Half-widths with which an appulse is found again, and how near to the first finding. */
const SHARP_DAYS = 0.01;
const SHARPENED_WITHIN_DAYS = 0.02;
/** Where appulses are looked for: the limit and a margin for the width of the differences. */
const APPULSE_REGION = 8 * DEGREE;

interface Extremum extends Root {
  /** Second derivative, in the unit of the function a day². */
  readonly curvature: number;
}

interface Curve {
  /** NaN where no extremum is to be sought. */
  readonly samples: Float64Array;
  readonly direct: (tt: number) => number;
  /** Half-width of the differences, in steps of the grid. */
  readonly stride?: number;
  /** The values are angles within −π … π. */
  readonly angular?: boolean;
}

function extrema(grid: Grid, { samples, direct, stride = 1, angular = false }: Curve): Extremum[] {
  const hDays = stride * grid.step;
  const rate = (angular ? angularDerivative : derivative)(direct, hDays);
  const curvature = derivative(rate, hDays);
  const rates = sampledDerivative(grid, samples, { stride, angular });
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
 * The deepest and the highest heliocentric distance of each revolution: Neptune's and Uranus's have further local
 * extrema near them, which are no events. The grid is widened by a revolution at either end, so that no extremum
 * inside is preferred to a better one outside.
 */
export function apsides({ start, step, count }: Grid): ScanRow[] {
  return skyNames.flatMap((planet) => {
    const periodDays = anomalisticPeriodDays[planet];
    const margin = Math.ceil(periodDays / step);
    const wide = { start: start - margin * step, step, count: count + 2 * margin };
    const direct = (tt: number): number => HelioDistance(libraryBody[planet], timeAt(tt));
    const stride = periodDays > 1000 ? SLOW_STRIDE : 1;
    const roots = extrema(wide, { samples: sample(wide, direct), direct, stride }).map(
      ({ tt, rising, curvature }) => ({ tt, rising, curvature, distanceAu: direct(tt) }),
    );
    return roots
      .filter((root) => !roots.some((other) => isOutdone(root, other, periodDays)))
      .map(({ tt, rising, curvature, distanceAu }) => ({
        kind: rising ? 'perihelion' : 'aphelion',
        reckoning: null,
        bodies: [planet],
        tt,
        slope: curvature,
        value: distanceAu,
      }));
  });
}

interface Apsis {
  readonly tt: number;
  readonly rising: boolean;
  readonly distanceAu: number;
}

/** Whether another extremum of the same revolution and sense lies deeper, or higher. */
function isOutdone(root: Apsis, other: Apsis, periodDays: number): boolean {
  if (other.rising !== root.rising || Math.abs(other.tt - root.tt) > 0.75 * periodDays) return false;
  return root.rising ? other.distanceAu < root.distanceAu : other.distanceAu > root.distanceAu;
}

/**
 * Venus at her brightest before and after inferior conjunction, phase angles 90°–150°. The samples outside 80°–160°
 * are left blank: the phase angle turns sharply at superior conjunction, and the formula ends at 163.7°.
 */
export function greatestBrilliancies({ grid }: SampledSky): ScanRow[] {
  const magnitude = (tt: number): number => venusMagnitude(new Sky(tt));
  const phaseAngleDeg = (tt: number): number => venusPhaseAngle(new Sky(tt)) / DEGREE;
  const between = (tt: number, low: number, high: number): boolean =>
    phaseAngleDeg(tt) > low && phaseAngleDeg(tt) < high;
  const samples = sample(grid, (tt) => (between(tt, 80, 160) ? magnitude(tt) : NaN));
  return extrema(grid, { samples, direct: magnitude })
    .filter((root) => root.rising && between(root.tt, 90, 150))
    .map((root) => ({
      kind: 'greatest-brilliancy',
      reckoning: null,
      bodies: ['venus'],
      tt: root.tt,
      slope: root.curvature,
      value: magnitude(root.tt),
    }));
}

/**
 * Least separations of two planets. The squared chord between the unit vectors is smooth through the closest ones,
 * where the angle itself has a kink. Mercury, Venus and Mars are fast enough for a much finer difference, and need it:
 * the relative motion of two of them can turn within days, and the deflection of light behind the Sun within the hour.
 */
export function appulses({ grid, direction }: SampledSky): ScanRow[] {
  return pairsOf(skyNames).flatMap(([first, second]) => {
    const separation = (tt: number): number => {
      const sky = new Sky(tt);
      return angleBetween(sky.place(first).direction, sky.place(second).direction);
    };
    const squaredChord = (tt: number): number => (2 * Math.sin(separation(tt) / 2)) ** 2;
    const [x, y, z] = direction;
    const samples = x[first].map((firstX, i) => {
      const squared =
        (firstX - x[second][i]!) ** 2 +
        (y[first][i]! - y[second][i]!) ** 2 +
        (z[first][i]! - z[second][i]!) ** 2;
      return squared < APPULSE_REGION ** 2 ? squared : NaN;
    });
    const isFast = first === 'mercury' || first === 'venus' || first === 'mars';
    const sharpRate = derivative(squaredChord, SHARP_DAYS);
    return extrema(grid, { samples, direct: squaredChord })
      .filter((root) => root.rising && separation(root.tt) < APPULSE_LIMIT)
      .map(({ tt: found, curvature }) => {
        const [from, to] = [found - SHARPENED_WITHIN_DAYS, found + SHARPENED_WITHIN_DAYS];
        const tt = isFast ? bisect(sharpRate, from, to, -1) : found;
        return {
          kind: 'appulse',
          reckoning: null,
          bodies: [first, second],
          tt,
          slope: curvature / 2 / DEGREE ** 2,
          value: separation(tt) / DEGREE,
        };
      });
  });
}
