import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { majorPlanets } from '../../src/bodies/index.js';
import { librarySource } from '../../src/ephemeris/index.js';
import { keplerSky } from '../../src/forecast/kepler-sky.js';
import { kinds } from '../../src/forecast/kinds.js';
import { search } from '../../src/forecast/search.js';
import { trackedSky } from '../../src/forecast/tracked-sky.js';
import { ttDays } from '../../src/time/index.js';
import { handWrittenScan } from './hand-written-scan.js';

/**
 * What the method buys, as ratios taken in one run against what a user would write by hand on the same library: a
 * half-day scan with bisection, places shared between pairs, no tracks. Absolute times are the machine's.
 */
const CENTURY = { from: ttDays(-18_262.5), to: ttDays(18_262.5) };
const DECADE = { from: ttDays(0), to: ttDays(3652.5) };
const ROUNDS = 3;
const COMMAND = 'dist/cli.js';

const say = (line: string): void => {
  process.stdout.write(`${line}\n`);
};
const timed = (work: () => unknown): number => {
  const start = performance.now();
  work();
  return performance.now() - start;
};
const median = (values: readonly number[]): number =>
  [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)]!;

function searchAll(span: typeof CENTURY): number {
  const sky = trackedSky(librarySource);
  const context = { sky, kepler: keplerSky('by-date'), limits: { withinDeg: 5 } };
  return kinds
    .flatMap((kind) => kind.subjects(majorPlanets).map((subject) => ({ kind, subject })))
    .reduce(
      (sum, { kind, subject }) =>
        sum +
        search({ kind, subject, reckoning: kind.reckoning?.byDefault ?? 'longitude' }, span, context).length,
      0,
    );
}

/** Apparent places a body for each alignment with the Sun, when nothing else is asked for. */
function placesPerAlignment(): { mean: number; most: number; events: number } {
  const counts: number[] = [];
  for (const kind of kinds.filter(
    ({ circumstances, search: method }) => circumstances === 'one-body' && method === 'one-a-cycle',
  )) {
    for (const subject of kind.subjects(majorPlanets)) {
      const sky = trackedSky(librarySource);
      const context = { sky, kepler: keplerSky('by-date'), limits: { withinDeg: 5 } };
      const found = search({ kind, subject, reckoning: 'longitude' }, CENTURY, context).length;
      counts.push(sky.places.count / 2 / found);
    }
  }
  return {
    mean: counts.reduce((a, b) => a + b, 0) / counts.length,
    most: Math.max(...counts),
    events: counts.length,
  };
}

interface Run {
  readonly milliseconds: number;
  readonly peakMegabytes: number;
}

/** A whole process, with the peak of its resident memory as the process itself last saw it. */
function run(args: readonly string[]): Run {
  const report = 'process.on("exit",()=>process.stderr.write("peak "+process.resourceUsage().maxRSS))';
  const start = performance.now();
  const { stderr, status } = spawnSync(
    process.execPath,
    ['--import', `data:text/javascript,${encodeURIComponent(report)}`, ...args],
    {
      encoding: 'utf8',
      maxBuffer: 1 << 28,
    },
  );
  const milliseconds = performance.now() - start;
  if (status !== 0) throw new Error(`${args.join(' ')} ended with ${status}: ${stderr}`);
  return { milliseconds, peakMegabytes: Number(/peak (\d+)/.exec(stderr)?.[1] ?? NaN) / 1024 };
}

const folder = mkdtempSync(join(tmpdir(), 'bench-'));
const json = join(folder, 'events.json');

searchAll(DECADE);
handWrittenScan(DECADE.from, DECADE.to);
const ours: number[] = [];
const theirs: number[] = [];
let events = 0;
for (let round = 0; round < ROUNDS; round++) {
  // One by one, so that a machine that slows down slows both.
  ours.push(timed(() => (events = searchAll(CENTURY))));
  theirs.push(timed(() => handWrittenScan(CENTURY.from, CENTURY.to)));
}
const baseline = median(theirs);
const ratio = median(theirs.map((time, round) => time / ours[round]!));
say(`events of 1950–2050                       ${events}`);
say(`hand-written scan                         ${(baseline / 1000).toFixed(2)} s`);
say(
  `search and refinement                     ${(median(ours) / 1000).toFixed(2)} s   ${ratio.toFixed(1)} times faster (wanted: 10)`,
);

const century = [
  'events',
  '--from',
  '1950-01-01',
  '--to',
  '2050-01-01',
  '--format',
  'json',
  '--out',
  json,
  '--quiet',
];
const whole = [0, 1, 2].map(() => run([COMMAND, ...century]));
const wholeTime = median(whole.map(({ milliseconds }) => milliseconds));
say(
  `whole command, circumstances and JSON     ${(wholeTime / 1000).toFixed(2)} s   ${(baseline / wholeTime).toFixed(1)} times faster (wanted: 5); ${(statSync(json).size / 1e6).toFixed(1)} MB written`,
);
say(
  `peak memory of that command               ${Math.max(...whole.map(({ peakMegabytes }) => peakMegabytes)).toFixed(0)} MB (wanted: under 300)`,
);

const { mean, most } = placesPerAlignment();
say(
  `apparent places a body and alignment      ${mean.toFixed(2)} on average, ${most.toFixed(2)} for the hungriest kind and planet (wanted: 4 at most)`,
);

const empty = median(Array.from({ length: 9 }, () => run(['-e', '']).milliseconds));
const year = median(
  Array.from(
    { length: 9 },
    () => run([COMMAND, 'events', '--from', '2027-01-01', '--to', '2028-01-01']).milliseconds,
  ),
);
say(
  `events of one year, from start to end     ${year.toFixed(0)} ms   ${(year / empty).toFixed(2)} times an empty script of ${empty.toFixed(0)} ms (wanted: 3 at most)`,
);
rmSync(folder, { recursive: true });
