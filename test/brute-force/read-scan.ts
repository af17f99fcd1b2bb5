import { readFileSync } from 'node:fs';
import { gunzipSync } from 'node:zlib';
import { planetNames } from './scan-row.js';
import type { PlanetName, ScanReckoning, ScanRow } from './scan-row.js';

export type { ScanRow } from './scan-row.js';

const FILE = new URL('scan-1900-2100.tsv.gz', import.meta.url);

/** The stored scan of 1900–2100, by kind, bodies, reckoning and time. */
export function readScan(file: string | URL = FILE): ScanRow[] {
  return gunzipSync(readFileSync(file))
    .toString('utf8')
    .split('\n')
    .filter((line) => line !== '' && !line.startsWith('#'))
    .map(rowOf);
}

function rowOf(line: string): ScanRow {
  const [kind, reckoning, bodies, tt, slope, value, ...rest] = line.split('\t');
  if (
    !kind ||
    reckoning === undefined ||
    !bodies ||
    !tt ||
    !slope ||
    value === undefined ||
    rest.length > 0
  ) {
    throw new Error(`A row of the scan needs six columns: "${line}".`);
  }
  return {
    kind,
    reckoning: reckoningOf(reckoning),
    bodies: bodies.split(',').map(planetOf),
    tt: Number(tt),
    slope: Number(slope),
    value: value === '' ? null : Number(value),
  };
}

function reckoningOf(text: string): ScanReckoning | null {
  if (text === '') return null;
  if (text === 'longitude' || text === 'right-ascension') return text;
  throw new Error(`"${text}" is no reckoning: longitude or right-ascension.`);
}

function planetOf(text: string): PlanetName {
  const planet = planetNames.find((name) => name === text);
  if (!planet) throw new Error(`"${text}" is no planet of the scan.`);
  return planet;
}
