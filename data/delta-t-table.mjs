/**
 * Writes src/time/delta-t-table.ts: the measured ΔT of 1657–1972 at half-year steps.
 *
 *   node data/delta-t-table.mjs > src/time/delta-t-table.ts
 *
 * Source: the U.S. Naval Observatory's table historic_deltat.data (TDT − UT1, after McCarthy & Babcock 1986), a work of the
 * United States government and so in the public domain, as carried by the npm package astronomia 4.2.0 (MIT).
 */
import { createHash } from 'node:crypto';
import data from 'astronomia/data';

const { table, first, last } = data.deltat.historic;
const UTC_BEGINS = 1972;
const stepYears = (last - first) / (table.length - 1);
if (first !== 1657 || stepYears !== 0.5)
  throw new Error(`unexpected layout: from ${first} in steps of ${stepYears} years`);

const measured = table.slice(0, (UTC_BEGINS - first) / stepYears);
const hundredths = measured.map((seconds) => Math.round(seconds * 100));
const checksum = createHash('sha256').update(JSON.stringify(measured)).digest('hex');
const rows = [];
for (let i = 0; i < hundredths.length; i += 20) rows.push(`  ${hundredths.slice(i, i + 20).join(', ')},`);

process.stdout.write(`/**
 * Measured ΔT = TT − UT1 on 1 January and 1 July of each year from 1657 to 1971, hundredths of a second.
 * Written by data/delta-t-table.mjs; do not edit.
 * Source: U.S. Naval Observatory, historic_deltat.data (after McCarthy & Babcock 1986, Phys. Earth Planet. Inter. 44, 281),
 * public domain, as carried by the npm package astronomia 4.2.0 (MIT); later digits rounded away.
 * SHA-256 of the source's values as JSON: ${checksum}
 */
// prettier-ignore
export const measuredDeltaTHundredths: readonly number[] = [
${rows.join('\n')}
];

export const MEASURED_FIRST_YEAR = ${first};
export const MEASURED_STEP_YEARS = ${stepYears};
`);
