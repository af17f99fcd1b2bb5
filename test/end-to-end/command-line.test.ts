import { spawn, spawnSync } from 'node:child_process';
import { closeSync, existsSync, mkdtempSync, openSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { COMMAND, ensureBuilt, synodos } from './command.js';

const DATES = ['--from', '2027-01-01', '--to', '2027-04-01'];
const oppositions = ['events', ...DATES, '--kind', 'opposition'];

let folder: string;
beforeAll(() => {
  ensureBuilt();
  folder = mkdtempSync(join(tmpdir(), 'synodos-'));
  writeFileSync(join(folder, 'bad.yaml'), 'titel: T\nspan: { from: 2028-01-01, to: 2027-01-01 }\n');
  writeFileSync(join(folder, 'binary.yaml'), Buffer.from([0x74, 0xff, 0xfe]));
  writeFileSync(join(folder, 'big.yaml'), `title: T\n${'#'.repeat(1_000_000)}\n`);
});
afterAll(() => {
  rmSync(folder, { recursive: true });
});

/** A wrong command line and all the lines that it is answered with. */
const wrong: readonly (readonly [args: readonly string[], lines: readonly string[]])[] = [
  [['evnts'], ["unknown command 'evnts' (Did you mean events?)"]],
  [['events', '--form', '2027-01-01'], ["unknown option '--form' (Did you mean --from?)"]],
  [['events', '--from'], ["option '--from <date>' argument missing"]],
  [['run'], ["missing required argument 'plan'"]],
  [['check'], ["missing required argument 'plan'"]],
  [['period', 'mars'], ["missing required argument 'second'"]],
  [
    ['period', 'mars', 'earth', 'venus'],
    ["too many arguments for 'period'. Expected 2 arguments but got 3."],
  ],
  [
    ['events'],
    ['--from: is missing: write a date like 2027-01-01', '--to: is missing: write a date like 2027-01-01'],
  ],
  [
    ['events', '--from', '2027-13-01', '--to', 'tomorrow'],
    [
      '--from: "2027-13-01" is not a date of the calendar: write YYYY-MM-DD, or an instant with its offset like 2027-01-31T18:30Z',
      '--to: "tomorrow" is not a date of the calendar: write YYYY-MM-DD, or an instant with its offset like 2027-01-31T18:30Z',
    ],
  ],
  [
    ['events', '--from', '1500-01-01', '--to', '1501-01-01'],
    [
      '--from: "1500-01-01" lies before 1600-01-01: the positions are proven against an independent ephemeris only from 1600-01-01 to 2600-01-01',
      '--to: "1501-01-01" lies before 1600-01-01: the positions are proven against an independent ephemeris only from 1600-01-01 to 2600-01-01',
    ],
  ],
  [
    ['events', '--from', '2028-01-01', '--to', '2027-01-01'],
    ['--to: 2027-01-01 is not after 2028-01-01: the end is not in the span, write a later one'],
  ],
  [
    ['events', ...DATES, '--kind', 'oposition,apulse', '--body', 'marz,'],
    [
      '--kind: "oposition" is not a kind of event. Did you mean opposition?',
      '--kind: "apulse" is not a kind of event. Did you mean appulse?',
      '--body: "marz" is not a planet. Did you mean mars?',
      '--body: a name is missing beside a comma: write names like mars,jupiter',
    ],
  ],
  [
    ['events', ...DATES, '--body', 'moon'],
    [
      '--body: "moon" is not a planet. There are: mercury, venus, earth, mars, jupiter, saturn, uranus, neptune, pluto',
    ],
  ],
  [
    ['events', ...DATES, '--format', 'xml'],
    ['--format: "xml" is not one of its choices. There are: table, json, csv, md, ics'],
  ],
  [
    ['events', ...DATES, '--reckoning', 'latitude'],
    ['--reckoning: "latitude" is not one of its choices. There are: longitude, right-ascension'],
  ],
  [['events', ...DATES, '--within', '12abc'], ['--within: "12abc" is not a number: write one like 48.2']],
  [
    ['events', ...DATES, '--within', '0'],
    ['--within: 0 is out of range: write degrees, more than 0 and at most 20'],
  ],
  [
    ['events', ...DATES, '--site', '48.2'],
    [
      '--site: "48.2" is not a place: write LAT,LON or LAT,LON,ELEVATION, like 48.2,11.6,520, or the id of a site with --plan FILE',
    ],
  ],
  [
    ['events', ...DATES, '--site', '98.2,11.6'],
    ['--site: latitude 98.2 is outside -90 … 90 (degrees, north positive)'],
  ],
  [
    ['events', ...DATES, '--site', '48.2,11.6', '--zone', 'Europe/Viena'],
    ['--zone: "Europe/Viena" is not a time zone. Did you mean Europe/Vienna?'],
  ],
  [
    ['events', ...DATES, '--zone', 'Europe/Vienna'],
    ['--zone: stands alone: give the site with --site LAT,LON'],
  ],
  [
    ['events', ...DATES, '--site', '48.2,11.6', '--plan', 'data/demo/plan.yaml'],
    ['--plan: goes with the id of a site: coordinates need no plan'],
  ],
  [
    ['events', ...DATES, '--site', 'amselgrat', '--plan', 'data/demo/plan.yaml', '--zone', 'UTC'],
    ['--zone: goes with coordinates: a site of a plan has its zone there'],
  ],
  [
    ['events', ...DATES, '--site', 'amselgrad', '--plan', 'data/demo/plan.yaml'],
    ['--site: "amselgrad" is the id of no site of data/demo/plan.yaml. Did you mean amselgrat?'],
  ],
  [
    ['residuals', '--from', '2027-01-01', '--to', '2028-01-01'],
    ['--pair: is missing: write two bodies like earth,mars'],
  ],
  [
    ['residuals', '--pair', 'mars', '--from', '2027-01-01', '--to', '2028-01-01'],
    ['--pair: names 1 body: write two, like earth,mars'],
  ],
  [
    ['residuals', '--pair', 'mars,mars', '--from', '2027-01-01', '--to', '2028-01-01'],
    ['--pair: mars twice: a pair is two different bodies'],
  ],
  [
    ['residuals', '--pair', 'mars,moon', '--from', '2027-01-01', '--to', '2028-01-01'],
    [
      '--pair: "moon" is not a body. There are: sun, mercury, venus, earth, mars, jupiter, saturn, uranus, neptune, pluto',
    ],
  ],
  [['period', '687', 'earth'], ['first period: "687" has no unit: write 687d, 687y or 687h']],
  [['period', 'mars', 'mars'], ['period: mars twice: a synodic period is between two different bodies']],
  [
    ['period', '365d', '365d'],
    [
      'period: two equal periods of 365 days never gain on each other: the synodic period is for two that differ',
    ],
  ],
  [['period', '0d', '365d'], ['period: a period of 0 days is not a turn: write a length greater than zero']],
  [['sidereal'], ['--site: is missing: write LAT,LON like 48.2,11.6']],
  [
    ['sidereal', '--site', '48.2,11.6', '--at', 'now', '--position', '400,5'],
    [
      '--at: "now" is not a date of the calendar: write YYYY-MM-DD, or an instant with its offset like 2027-01-31T18:30Z',
      '--position: right ascension 400 h is out of range: write hours from 0 to 24, not degrees',
    ],
  ],
  [
    ['run', 'no-such.yaml'],
    ['no-such.yaml: there is no such file: name a plan, such as data/demo/plan.yaml'],
  ],
  [['run', 'data'], ['data: is not a file: name the plan file itself']],
  [
    ['events', ...DATES, '--out', '/no/such/folder/x.csv'],
    ['/no/such/folder/x.csv: there is no such folder: make it, or name another'],
  ],
  [['events', ...DATES, '--out', 'data'], ['data: is a folder: name a file in it']],
];

describe('a wrong command line', () => {
  it.each(wrong)('synodos %j', (args, lines) => {
    const { status, stdout, stderr } = synodos(args);
    const told = stderr.trimEnd().split('\n');
    expect(told).toEqual(lines);
    expect(stdout).toBe('');
    expect(status).toBe(2);
  });

  it('without a command shows the usage and is a fault', () => {
    const { status, stdout, stderr } = synodos([]);
    expect(stderr).toMatch(/^Usage: synodos/);
    expect(stdout).toBe('');
    expect(status).toBe(2);
  });
});

describe('a bad plan file', () => {
  it('is told fault by fault by check, on standard output', () => {
    const { status, stdout } = synodos(['check', 'bad.yaml'], { cwd: folder });
    expect(stdout.trimEnd().split('\n')).toEqual([
      'bad.yaml:1:1: "titel" is no field here. Did you mean title?',
      'bad.yaml:1:1: title: is missing: write a text',
      'bad.yaml:2:31: span.to: "2027-01-01" is not after "2028-01-01": the end of a span is not in it, write a later one',
    ]);
    expect(status).toBe(2);
  });

  it('is told as JSON on request', () => {
    const { status, stdout } = synodos(['check', 'bad.yaml', '--format', 'json'], { cwd: folder });
    const { faults } = JSON.parse(stdout) as { faults: { line: number; field: string }[] };
    expect(faults.map(({ line }) => line)).toEqual([1, 1, 2]);
    expect(status).toBe(2);
  });

  it('is not run: its faults go to standard error and nothing is written', () => {
    const { status, stdout, stderr } = synodos(['run', 'bad.yaml', '--into', 'never'], { cwd: folder });
    expect(stderr.trimEnd().split('\n')).toHaveLength(3);
    expect(stdout).toBe('');
    expect(status).toBe(2);
    expect(() => readFileSync(join(folder, 'never', 'manifest.json'))).toThrow('ENOENT');
  });

  it.each([
    ['binary.yaml', 'binary.yaml: is not UTF-8: save the plan as UTF-8 text\n'],
    ['big.yaml', 'big.yaml: is 1000010 bytes long: a plan has at most 1000000; is this the right file?\n'],
  ])('%s is refused', (file, message) => {
    const { status, stdout } = synodos(['check', file], { cwd: folder });
    expect(stdout).toBe(message);
    expect(status).toBe(2);
  });
});

describe('a bad plan named beside --site', () => {
  it('is told together with what is wrong with the command line', () => {
    const { status, stderr } = synodos(
      [
        'events',
        '--from',
        'today',
        '--to',
        '2027-04-01',
        '--site',
        '1',
        '--plan',
        'bad.yaml',
        '--format',
        'xml',
      ],
      { cwd: folder },
    );
    expect(
      stderr
        .trimEnd()
        .split('\n')
        .map((line) => line.split(' ')[0]),
    ).toEqual(['bad.yaml:1:1:', 'bad.yaml:1:1:', 'bad.yaml:2:31:', '--from:', '--format:']);
    expect(status).toBe(2);
  });
});

describe('an output folder that cannot be', () => {
  it('is named with what to do instead', () => {
    const { status, stderr } = synodos(
      ['run', join(process.cwd(), 'data/demo/plan.yaml'), '--into', 'bad.yaml'],
      {
        cwd: folder,
      },
    );
    expect(stderr).toBe('bad.yaml: a file stands where a folder should be: name another\n');
    expect(status).toBe(2);
  });
});

describe('the command line', () => {
  it.each([['--help'], ['help'], ['events', '--help'], ['help', 'period']])('shows help: %s', (...args) => {
    const { status, stdout, stderr } = synodos(args);
    expect(stdout).toMatch(/^Usage: synodos/);
    expect(stderr).toBe('');
    expect(status).toBe(0);
  });

  it('knows its version', () => {
    const { version } = JSON.parse(readFileSync('package.json', 'utf8')) as { version: string };
    expect(synodos(['--version'])).toEqual({ status: 0, stdout: `${version}\n`, stderr: '' });
  });

  it('puts results on standard output and everything else on standard error, or nowhere', () => {
    const loud = synodos(oppositions);
    expect(loud.status).toBe(0);
    expect(loud.stdout).toMatch(/^2027-02-11 .*opposition +Jupiter.*\n2027-02-19 .*opposition +Mars.*\n$/);
    expect(loud.stderr).toBe('2 events\n');
    expect(synodos([...oppositions, '--quiet'])).toEqual({ ...loud, stderr: '' });
  });

  it('writes no colour into a pipe, and none where it is not wanted', () => {
    expect(synodos(oppositions).stdout).not.toContain('\u001b');
    expect(synodos(oppositions, { env: { NO_COLOR: '1' } }).stdout).not.toContain('\u001b');
    expect(synodos(oppositions, { env: { FORCE_COLOR: '1' } }).stdout).toContain('\u001b');
  });

  it('keeps every line within 120 columns', () => {
    const lines = synodos(['events', ...DATES]).stdout.split('\n');
    expect(lines.length).toBeGreaterThan(20);
    expect(Math.max(...lines.map((line) => line.length))).toBeLessThanOrEqual(120);
  });

  it('includes --from and excludes --to', () => {
    const [event] = (
      JSON.parse(synodos([...oppositions, '--body', 'mars', '--format', 'json']).stdout) as {
        events: { utc: string }[];
      }
    ).events;
    const at = event!.utc;
    const after = new Date(Date.parse(at) + 1000).toISOString();
    const from = (start: string, end: string): number =>
      (
        JSON.parse(
          synodos([
            'events',
            '--from',
            start,
            '--to',
            end,
            '--kind',
            'opposition',
            '--body',
            'mars',
            '--format',
            'json',
          ]).stdout,
        ) as { events: unknown[] }
      ).events.length;
    expect(from('2027-02-01', after)).toBe(1);
    expect(from('2027-02-01', new Date(Date.parse(at) - 1000).toISOString())).toBe(0);
    expect(from(after, '2027-03-01')).toBe(0);
  });

  it('takes a bare date as midnight at the site, where one is given', () => {
    const args = [...oppositions, '--format', 'json', '--site', '48.2,16.4', '--zone', 'Europe/Vienna'];
    const { span } = JSON.parse(synodos(args).stdout) as { span: { from: string; to: string } };
    expect(span).toEqual({ from: '2026-12-31T23:00:00Z', to: '2027-03-31T22:00:00Z' });
  });

  it('says where a zone was looked up from coordinates', () => {
    expect(synodos([...oppositions, '--site', '48.2,16.4']).stderr).toBe(
      '2 events\n48.2, 16.4: times of Europe/Vienna, looked up from the coordinates; name the zone to have another\n',
    );
  });

  it('knows the sites of a plan by their ids', () => {
    const { status, stdout } = synodos([
      ...oppositions,
      '--format',
      'json',
      '--site',
      'quillamora',
      '--plan',
      'data/demo/plan.yaml',
    ]);
    expect(status).toBe(0);
    expect(stdout).toContain('America/Santiago');
  });

  it.each([
    ['csv', /^id,kind,/],
    ['md', /^\| when \|/],
    ['ics', /^BEGIN:VCALENDAR\r\n/],
    ['json', /^\{\n/],
  ])('writes %s into a file, whole', (format, start) => {
    const file = join(folder, `events.${format}`);
    writeFileSync(file, 'old');
    const { status, stdout, stderr } = synodos([...oppositions, '--format', format, '--out', file]);
    expect([status, stdout, stderr]).toEqual([0, '', `2 events\nwritten to ${file}\n`]);
    expect(readFileSync(file, 'utf8')).toMatch(start);
  });

  it('can write into a device', () => {
    expect(synodos([...oppositions, '--out', '/dev/null']).status).toBe(0);
  });

  it('ends quietly where its reader has seen enough', async () => {
    const run = spawn(process.execPath, [
      COMMAND,
      'events',
      '--from',
      '2027-01-01',
      '--to',
      '2029-01-01',
      '--format',
      'json',
    ]);
    let told = '';
    run.stderr.on('data', (part: Buffer) => (told += part.toString()));
    run.stdout.destroy();
    const status = await new Promise((resolve) => run.on('close', resolve));
    expect(told).not.toMatch(/EPIPE|Error|failed/);
    expect(status).toBe(0);
  });

  it.skipIf(!existsSync('/dev/full'))('tells in one line that its output cannot be written', () => {
    const full = openSync('/dev/full', 'w');
    const { status, stderr } = spawnSync(process.execPath, [COMMAND, 'period', 'mars', 'earth', '--quiet'], {
      stdio: ['ignore', full, 'pipe'],
      encoding: 'utf8',
    });
    closeSync(full);
    expect(stderr).toMatch(/^synodos failed, through no fault of yours: ENOSPC[^\n]*\n$/);
    expect(status).toBe(1);
  });

  it.each([
    [0, oppositions],
    [2, ['events']],
  ])('ends with status %i whether or not somebody reads its notes', async (wanted, args) => {
    const run = spawn(process.execPath, [COMMAND, ...args]);
    run.stdout.resume();
    run.stderr.destroy();
    expect(await new Promise((resolve) => run.on('close', resolve))).toBe(wanted);
  });

  it('tells of a failure that is the tool’s own with exit status 1', () => {
    const broken = join(folder, 'broken.mjs');
    // A host without calendar arithmetic: nothing that a user could mend.
    writeFileSync(broken, "Date.UTC = () => { throw new Error('no calendar here'); };\n");
    const { status, stderr } = synodos(['period', 'mars', 'earth'], { node: ['--import', broken] });
    expect(stderr).toContain('synodos failed, through no fault of yours: no calendar here');
    expect(status).toBe(1);
  });
});

describe('period', () => {
  it('tells the synodic period and the years after which it nearly repeats', () => {
    const { stdout } = synodos(['period', 'mars', 'earth']);
    expect(stdout).toContain('synodic  779.936');
    for (const years of [15, 32, 47, 79]) expect(stdout).toMatch(new RegExp(`^ *${years} years `, 'm'));
  });

  it('takes plain periods in days, years and hours', () => {
    const { stdout } = synodos(['period', '144h', '4.5d', '--format', 'json']);
    expect(JSON.parse(stdout)).toMatchObject({ schema: 'synodos-period-1', synodicPeriodDays: 18 });
  });

  it.each(['csv', 'md'])('writes %s', (format) => {
    expect(synodos(['period', 'venus', 'earth', '--format', format]).stdout).toMatch(/243/);
  });
});

describe('residuals', () => {
  it.each([
    ['table', /mean cycle +5 +17\.\d\d d +24\.\d\d d/],
    ['csv', /^kind,bodies,/],
    ['json', /"synodos-residuals-1"/],
    ['md', /^\| first estimate \|/],
  ])('are told as %s', (format, pattern) => {
    const args = [
      'residuals',
      '--pair',
      'earth,mars',
      '--from',
      '2020-01-01',
      '--to',
      '2030-01-01',
      '--format',
      format,
    ];
    expect(synodos(args)).toMatchObject({ status: 0, stdout: expect.stringMatching(pattern) as string });
  });

  it('of a mean cycle are 18.24 days rms and 26.13 at worst for Mars over 1900–2100', () => {
    const args = [
      'residuals',
      '--pair',
      'earth,mars',
      '--from',
      '1900-01-01',
      '--to',
      '2100-01-01',
      '--format',
      'json',
    ];
    const { mean } = JSON.parse(synodos(args).stdout) as { mean: { rmsDays: number; worstDays: number } };
    // Within 2 %: the prototype refined on the same library, with another ΔT.
    expect(Math.abs(mean.rmsDays / 18.24 - 1)).toBeLessThan(0.02);
    expect(Math.abs(mean.worstDays / 26.13 - 1)).toBeLessThan(0.02);
  });

  it('say when Table 1 is used beyond the years it is made for', () => {
    const args = ['residuals', '--pair', 'earth,mars', '--from', '2040-01-01', '--to', '2060-01-01'];
    expect(synodos(args).stderr).toContain('Table 1 of the mean elements is made for 1800–2050');
  });
});

describe('sidereal', () => {
  const args = ['sidereal', '--site', '48.2,15', '--zone', 'Europe/Vienna', '--at', '2027-01-01'];

  it('is near 6 h 40 min at midnight of the new year in the middle of a zone (common practice)', () => {
    const { localMeanSiderealHours } = JSON.parse(synodos([...args, '--format', 'json']).stdout) as {
      localMeanSiderealHours: number;
    };
    expect(localMeanSiderealHours).toBeCloseTo(6 + 41.5 / 60, 1);
  });

  it('takes a position of J2000.0 to the date and back, a fraction of a degree away', () => {
    const { stdout } = synodos([...args, '--position', '6:45:09,-16:42:58']);
    expect(stdout).toMatch(/J2000\.0 +06h 45m 09s +−16° 42′ 58″/);
    expect(stdout).toMatch(/of date, true equator +06h 46m \d\ds/);
    expect(stdout).toMatch(/back to J2000\.0 +06h 45m 09s +−16° 42′ 58″/);
  });

  it('asks the clock only where no instant is given', () => {
    const clock = join(folder, 'clock.mjs');
    writeFileSync(clock, 'Date.now = () => Date.UTC(2033, 2, 20, 12);\n');
    const { stdout } = synodos(['sidereal', '--site', '0,0', '--zone', 'UTC'], { node: ['--import', clock] });
    expect(stdout).toMatch(/^2033-03-20T12:00:00\+00:00 = 2033-03-20T12:00:00Z/);
  });
});
