/**
 * Measures the library ephemeris against the DE440 samples of library-accuracy.py (see there for the two commands) and
 * writes src/ephemeris/library-accuracy.ts.
 */
import { readFileSync, writeFileSync } from 'node:fs';
import { bodies, planets } from '../src/bodies/index.js';
import type { Body, Planet } from '../src/bodies/index.js';
import { librarySource } from '../src/ephemeris/index.js';
import type { Accuracy } from '../src/ephemeris/index.js';
import {
  RADIANS_PER_ARCSEC,
  arcsecFromRadians,
  length,
  sphericalOf,
  subtract,
  wrapPi,
} from '../src/math/index.js';
import type { Vector } from '../src/math/index.js';
import { ttDays } from '../src/time/index.js';

const SPANS = ['1900–2100', '1600–2600'] as const;
const SAMPLES = 4000;
const EPOCHS = 3;
/** An inner planet errs twice its usual where it is nearest, and there it is most looked at: that tenth counts by itself. */
const NEAREST_SHARE = 0.1;
const COLUMNS = 1 + 3 * planets.length;
/** Of the ecliptic of J2000.0, IAU 2006. */
const OBLIQUITY = 84_381.406 * RADIANS_PER_ARCSEC;
const ORIGIN: Vector = { x: 0, y: 0, z: 0 };

const file = readFileSync(process.argv[2] ?? '/tmp/de440-samples.bin');
const values = new Float64Array(file.buffer, file.byteOffset, file.length / 8);
if (values.length !== SPANS.length * SAMPLES * EPOCHS * COLUMNS)
  throw new Error(`unexpected length ${values.length}`);

/** Ours − true. Angles are arcs on the sky: along the circle of latitude or of declination. */
interface Offset {
  readonly longitudeArcsec: number;
  readonly latitudeArcsec: number;
  readonly rightAscensionArcsec: number;
  readonly distanceAu: number;
}
const NONE: Offset = { longitudeArcsec: 0, latitudeArcsec: 0, rightAscensionArcsec: 0, distanceAu: 0 };
type Axis = keyof Offset;
type Centre = 'geocentric' | 'heliocentric';

/** On the axes of the ecliptic of J2000.0. */
const onEcliptic = ({ x, y, z }: Vector): Vector => ({
  x,
  y: y * Math.cos(OBLIQUITY) + z * Math.sin(OBLIQUITY),
  z: z * Math.cos(OBLIQUITY) - y * Math.sin(OBLIQUITY),
});

function arcsApart(ours: Vector, truth: Vector): { readonly along: number; readonly across: number } {
  const [a, b] = [sphericalOf(ours), sphericalOf(truth)];
  return {
    along: arcsecFromRadians(wrapPi(a.longitude - b.longitude) * Math.cos(b.latitude)),
    across: arcsecFromRadians(a.latitude - b.latitude),
  };
}

function offset(ours: Vector, truth: Vector): Offset {
  const ecliptic = arcsApart(onEcliptic(ours), onEcliptic(truth));
  return {
    longitudeArcsec: ecliptic.along,
    latitudeArcsec: ecliptic.across,
    rightAscensionArcsec: arcsApart(ours, truth).along,
    distanceAu: length(ours) - length(truth),
  };
}

interface Offsets {
  readonly geocentric: Offset;
  readonly heliocentric: Offset;
  /** True distance from the Earth. */
  readonly distanceAu: number;
}

/** The errors of all bodies at one epoch of the samples. */
function offsetsAt(row: number): Readonly<Record<Body, Offsets>> {
  const sample = values.subarray(row * COLUMNS, (row + 1) * COLUMNS);
  const tt = ttDays(sample[0]!);
  const truth = (planet: Planet): Vector => {
    const at = 1 + 3 * planets.indexOf(planet);
    return { x: sample[at]!, y: sample[at + 1]!, z: sample[at + 2]! };
  };
  const [ourEarth, trueEarth] = [librarySource.heliocentric('earth', tt), truth('earth')];
  const entries = bodies.map((body): [Body, Offsets] => {
    const [ours, true_] =
      body === 'sun' ? [ORIGIN, ORIGIN] : [librarySource.heliocentric(body, tt), truth(body)];
    const fromEarth = subtract(true_, trueEarth);
    return [
      body,
      {
        geocentric: body === 'earth' ? NONE : offset(subtract(ours, ourEarth), fromEarth),
        heliocentric: body === 'sun' ? NONE : offset(ours, true_),
        distanceAu: length(fromEarth),
      },
    ];
  });
  return Object.fromEntries(entries) as Record<Body, Offsets>;
}

/** The value below which 95 % of the absolute values lie. */
const percentile95 = (numbers: readonly number[]): number =>
  numbers.map(Math.abs).sort((a, b) => a - b)[Math.ceil(0.95 * numbers.length) - 1]!;
const worst = (numbers: readonly number[]): number => Math.max(...numbers.map(Math.abs));

/** The errors of one body around one instant: half a day before, at it, half a day after. */
type Around = readonly [Offsets, Offsets, Offsets];

const errors = (sample: readonly Around[], centre: Centre, axis: Axis): readonly number[] =>
  sample.map(([, at]) => at[centre][axis]);
const rates = (sample: readonly Around[], centre: Centre, axis: Axis): readonly number[] =>
  sample.map(([before, , after]) => after[centre][axis] - before[centre][axis]);

interface Measured extends Accuracy {
  readonly longitudeArcsec: number;
  readonly nearestArcsec: number;
  readonly latitudeArcsec: number;
  readonly worstArcsec: number;
}

function measureBody(all: readonly Around[]): Measured {
  const byDistance = [...all].sort((a, b) => a[1].distanceAu - b[1].distanceAu);
  const nearest = byDistance.slice(0, all.length * NEAREST_SHARE);
  const worse = (sample: readonly Around[], of: typeof errors): number =>
    Math.max(
      percentile95(of(sample, 'geocentric', 'longitudeArcsec')),
      percentile95(of(sample, 'geocentric', 'rightAscensionArcsec')),
    );
  const nearestArcsec = worse(nearest, errors);
  return {
    directionArcsec: Math.max(worse(all, errors), nearestArcsec),
    directionRateArcsecPerDay: Math.max(worse(all, rates), worse(nearest, rates)),
    distanceRateAuPerDay: percentile95(rates(all, 'geocentric', 'distanceAu')),
    heliocentricArcsec: percentile95(errors(all, 'heliocentric', 'longitudeArcsec')),
    heliocentricDistanceRateAuPerDay: percentile95(rates(all, 'heliocentric', 'distanceAu')),
    longitudeArcsec: percentile95(errors(all, 'geocentric', 'longitudeArcsec')),
    nearestArcsec,
    latitudeArcsec: percentile95(errors(all, 'geocentric', 'latitudeArcsec')),
    worstArcsec: worst(errors(all, 'geocentric', 'longitudeArcsec')),
  };
}

function measureSpan(span: number): Readonly<Record<Body, Measured>> {
  const samples = Array.from({ length: SAMPLES }, (_, i) => {
    const row = (span * SAMPLES + i) * EPOCHS;
    return [offsetsAt(row), offsetsAt(row + 1), offsetsAt(row + 2)] as const;
  });
  const entries = bodies.map((body): [Body, Measured] => [
    body,
    measureBody(samples.map(([before, at, after]): Around => [before[body], at[body], after[body]])),
  ]);
  return Object.fromEntries(entries) as Record<Body, Measured>;
}

const results = SPANS.map((_, span) => measureSpan(span));
const rounded = (value: number): string => (value === 0 ? '0' : String(Number(value.toPrecision(2))));
const [narrow, wide] = results as [Record<Body, Measured>, Record<Body, Measured>];
const columns = ['longitudeArcsec', 'nearestArcsec', 'latitudeArcsec', 'worstArcsec'] as const;
const comparison = bodies.map((body) => {
  const cells = [narrow, wide].map((span) =>
    columns.map((column) => rounded(span[body][column]).padStart(6)).join(''),
  );
  return ` *   ${body.padEnd(9)}${cells.join('    ')}`;
});
const fields = [
  'directionArcsec',
  'directionRateArcsecPerDay',
  'distanceRateAuPerDay',
  'heliocentricArcsec',
  'heliocentricDistanceRateAuPerDay',
] as const;

const table = `import type { Body } from '../bodies/index.js';
import type { Accuracy } from './source.js';

/**
 * How far astronomy-engine 2.1.19 is from JPL DE440 (Park et al. 2021): 95 % half-widths over ${SAMPLES} random instants of
 * ${SPANS[1]}. Written by data/library-accuracy.py and .ts; do not edit.
 * Directions are geometric and of one coordinate, the worse of longitude and right ascension, and the worse of all instants and
 * the tenth at which the body is nearest; rates are differences of the error over a day. Jupiter to Pluto are judged by the
 * barycentre of planet and moons, 0.1″ from the planet at most. What has no meaning (the Earth seen from itself, the Sun
 * from itself) is zero.
 *
 * Geocentric direction, arcseconds: 95 % in longitude, in either coordinate when nearest, in latitude; worst longitude
 *                     ${SPANS[0]}                     ${SPANS[1]}
${comparison.join('\n')}
 */
export const libraryAccuracy: Readonly<Record<Body, Accuracy>> = {
${bodies.map((body) => `  ${body}: {\n${fields.map((field) => `    ${field}: ${rounded(wide[body][field])},`).join('\n')}\n  },`).join('\n')}
};
`;
writeFileSync(new URL('../src/ephemeris/library-accuracy.ts', import.meta.url), table);
