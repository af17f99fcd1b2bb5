import { Sky } from './apparent-place.js';
import { derivative, wrapped } from './derivative.js';
import { grazesWithinOneDegree, rootsOnGrid } from './roots-on-grid.js';
import type { Grid, Root } from './roots-on-grid.js';
import type { SampledSky } from './sampled-sky.js';
import { planetNames, skyNames } from './scan-row.js';
import type { PlanetName, ScanReckoning, ScanRow, SkyName } from './scan-row.js';

/** Kinds at which a difference of two coordinates reaches a given value. */

const DEGREE = Math.PI / 180;
/** Rates of differences are reported only: half a unit of the last printed digit is enough. */
const RATE_STEP_DAYS = 0.1;
export const reckonings = ['longitude', 'right-ascension'] as const;

export const pairsOf = <Name>(names: readonly Name[]): (readonly [Name, Name])[] =>
  names.flatMap((a, i) => names.slice(i + 1).map((b) => [a, b] as const));

const isInner = (planet: PlanetName): boolean => planet === 'mercury' || planet === 'venus';

/** Apparent coordinate of a body in a sky. */
export const coordinateOf =
  (reckoning: ScanReckoning, body: SkyName | 'sun') =>
  (sky: Sky): number =>
    reckoning === 'longitude' ? sky.longitude(body) : sky.rightAscension(body);

export const columnOf = (
  sampled: SampledSky,
  reckoning: ScanReckoning,
  body: SkyName | 'sun',
): Float64Array => (reckoning === 'longitude' ? sampled.longitude : sampled.rightAscension)[body];

interface Alignment extends Root {
  readonly rateDegPerDay: number;
}

/** All instants at which `first − second` equals `target`. */
function alignments(
  grid: Grid,
  [first, second]: readonly [Float64Array, Float64Array],
  difference: (sky: Sky) => number,
  target: number,
): Alignment[] {
  const direct = (tt: number): number => wrapped(difference(new Sky(tt)) - target);
  const samples = first.map((angle, i) => wrapped(angle - second[i]! - target));
  const rate = derivative(direct, RATE_STEP_DAYS);
  return rootsOnGrid(grid, { samples, direct, limit: Math.PI / 2, grazes: grazesWithinOneDegree }).map(
    (root) => ({ ...root, rateDegPerDay: rate(root.tt) / DEGREE }),
  );
}

/** Oppositions, conjunctions with the Sun and quadratures, in both reckonings. */
export function sunAlignments(sampled: SampledSky): ScanRow[] {
  return skyNames.flatMap((planet) =>
    reckonings.flatMap((reckoning) => {
      const columns = [columnOf(sampled, reckoning, planet), columnOf(sampled, reckoning, 'sun')] as const;
      const [ofPlanet, ofSun] = [coordinateOf(reckoning, planet), coordinateOf(reckoning, 'sun')];
      return sunKinds(planet).flatMap(([target, kindAt]) =>
        alignments(sampled.grid, columns, (sky) => ofPlanet(sky) - ofSun(sky), target).map((root) => ({
          kind: kindAt(root.tt),
          reckoning,
          bodies: [planet],
          tt: root.tt,
          slope: root.rateDegPerDay,
          value: null,
        })),
      );
    }),
  );
}

function sunKinds(planet: SkyName): (readonly [target: number, kindAt: (tt: number) => string])[] {
  if (isInner(planet)) return [[0, (tt) => innerConjunction(planet, tt)]];
  return [
    [0, () => 'conjunction'],
    [Math.PI, () => 'opposition'],
    [Math.PI / 2, () => 'east-quadrature'],
    [-Math.PI / 2, () => 'west-quadrature'],
  ];
}

function innerConjunction(planet: SkyName, tt: number): string {
  const sky = new Sky(tt);
  const nearer = sky.geometricDistanceAu(planet) < Math.hypot(...sky.earthFromSun);
  return nearer ? 'inferior-conjunction' : 'superior-conjunction';
}

/** Conjunctions of two planets as seen from the Earth. */
export function conjunctions(sampled: SampledSky): ScanRow[] {
  return pairsOf(skyNames).flatMap(([first, second]) =>
    reckonings.flatMap((reckoning) => {
      const columns = [columnOf(sampled, reckoning, first), columnOf(sampled, reckoning, second)] as const;
      const [ofFirst, ofSecond] = [coordinateOf(reckoning, first), coordinateOf(reckoning, second)];
      return alignments(sampled.grid, columns, (sky) => ofFirst(sky) - ofSecond(sky), 0).map((root) => ({
        kind: reckoning === 'longitude' ? 'conjunction-longitude' : 'conjunction-ra',
        reckoning,
        bodies: [first, second],
        tt: root.tt,
        slope: root.rateDegPerDay,
        value: null,
      }));
    }),
  );
}

/** Heliocentric conjunctions and oppositions of two planets. */
export function heliocentricAlignments(sampled: SampledSky): ScanRow[] {
  return pairsOf(planetNames).flatMap(([first, second]) => {
    const columns = [sampled.heliocentricLongitude[first], sampled.heliocentricLongitude[second]] as const;
    const difference = (sky: Sky): number =>
      sky.heliocentricLongitude(first) - sky.heliocentricLongitude(second);
    const kinds = [
      ['heliocentric-conjunction', 0],
      ['heliocentric-opposition', Math.PI],
    ] as const;
    return kinds.flatMap(([kind, target]) =>
      alignments(sampled.grid, columns, difference, target).map((root) => ({
        kind,
        reckoning: null,
        bodies: [first, second],
        tt: root.tt,
        slope: root.rateDegPerDay,
        value: null,
      })),
    );
  });
}
