/**
 * The brute-force judge: every event of 1900–2100 found by sampling at a fixed step on the ephemeris library alone.
 * `npx tsx test/brute-force/scan.ts [FROM TO FILE]` (TT days since J2000.0) writes the table that the tests read.
 */
import { writeFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { gzipSync } from 'node:zlib';
import { conjunctions, heliocentricAlignments, sunAlignments } from './alignments.js';
import {
  appulses,
  apsides,
  greatestBrilliancies,
  greatestElongations,
  nearestAndFarthest,
  stations,
} from './extrema.js';
import { sampleSky } from './sampled-sky.js';
import type { ScanRow } from './scan-row.js';

/** 1900-01-01 and 2100-01-01, 00:00 TT. */
const SPAN = [-36_524.5, 36_524.5] as const;
const STEP_DAYS = 0.25;
/** Sampled beyond the span at either end, so that differences and brackets reach across its ends. */
const MARGIN_DAYS = 20;
const TT_DECIMALS = 6;
const FILE = fileURLToPath(new URL('scan-1900-2100.tsv.gz', import.meta.url));

function scan(from: number, to: number): ScanRow[] {
  const count = Math.ceil((to - from + 2 * MARGIN_DAYS) / STEP_DAYS) + 1;
  const sampled = sampleSky({ start: from - MARGIN_DAYS, step: STEP_DAYS, count });
  return [
    ...sunAlignments(sampled),
    ...greatestElongations(sampled),
    ...stations(sampled),
    ...nearestAndFarthest(sampled),
    ...apsides(sampled.grid),
    ...greatestBrilliancies(sampled),
    ...conjunctions(sampled),
    ...appulses(sampled),
    ...heliocentricAlignments(sampled),
  ]
    .filter(({ tt }) => from <= tt && tt < to)
    .sort(byKindBodiesTime);
}

const keyOf = ({ kind, reckoning, bodies }: ScanRow): string => [kind, bodies.join(), reckoning].join(' ');

function byKindBodiesTime(a: ScanRow, b: ScanRow): number {
  const [keyA, keyB] = [keyOf(a), keyOf(b)];
  return keyA < keyB ? -1 : keyA > keyB ? 1 : a.tt - b.tt;
}

const header = (from: number, to: number): string[] => [
  '# Every configuration of the planets found by a brute-force scan; the judge of the completeness tests.',
  '# Made by test/brute-force/scan.ts on astronomy-engine 2.1.19 alone (positions, precession, nutation, obliquity).',
  `# Span: TT days since J2000.0 from ${from} (included) to ${to} (not); sampled every ${STEP_DAYS} day.`,
  '# Roots by bisection to 1e-7 day; every least |difference| below 1 degree, and every rate near zero, refined and',
  '# tested for a hidden pair of roots. Extrema and stations: roots of five-point differences over ±0.5 day (appulses ±0.02).',
  '# Apparent places: barycentric, light-time to 1e-9 day, deflection by the Sun (ERFA ld, true direction of the planet',
  '# from the Sun, limiter 1e-6), relativistic aberration (ERFA ab, no potential term), true equator or ecliptic of date.',
  '# Closest, farthest: geometric distance at the same TT. Perihelion, aphelion: the absolute one of each revolution.',
  '# Heliocentric kinds: geometric longitude on the ecliptic of date. Brilliancy: Mallama & Hilton (2018), light-time.',
  '# slope: deg/day at roots; at stations deg/day2; at extrema the second derivative in au, deg or mag per day2 (appulse:',
  '# of half the squared separation, deg2/day2). value: au, deg or mag at the extremum.',
  '# kind\treckoning\tbodies\ttt\tslope\tvalue',
];

const lineOf = ({ kind, reckoning, bodies, tt, slope, value }: ScanRow): string =>
  [
    kind,
    reckoning ?? '',
    bodies.join(','),
    tt.toFixed(TT_DECIMALS),
    slope.toPrecision(3),
    value?.toPrecision(7) ?? '',
  ].join('\t');

const [from = SPAN[0], to = SPAN[1]] = process.argv.slice(2, 4).map(Number);
const rows = scan(from, to);
const text = [...header(from, to), ...rows.map(lineOf), ''].join('\n');
writeFileSync(process.argv[4] ?? FILE, gzipSync(text, { level: 9 }));

const counts = new Map<string, number>();
for (const { kind, reckoning } of rows) {
  const name = reckoning ? `${kind} (${reckoning})` : kind;
  counts.set(name, (counts.get(name) ?? 0) + 1);
}
for (const [name, count] of counts) console.log(`${String(count).padStart(6)}  ${name}`);
console.log(`${String(rows.length).padStart(6)}  in all`);
