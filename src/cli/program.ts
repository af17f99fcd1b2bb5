import { Command, Option } from 'commander';
import type { CheckOptions } from './commands/check.js';
import type { EventsOptions } from './commands/events.js';
import type { PeriodOptions } from './commands/period.js';
import type { ResidualsOptions } from './commands/residuals.js';
import type { RunOptions } from './commands/run.js';
import type { SiderealOptions } from './commands/sidereal.js';

const from = (): Option =>
  new Option('--from <date>', 'first instant, included: 2027-01-01 or 2027-01-31T18:30Z');
const to = (): Option => new Option('--to <date>', 'end, not included');
const kind = (): Option =>
  new Option(
    '--kind <kinds>',
    'kinds of event, like opposition,appulse; an unknown one is answered with the list',
  );
const reckoning = (): Option =>
  new Option('--reckoning <coordinate>', 'longitude or right-ascension, for kinds that have a choice');
const site = (): Option => new Option('--site <place>', 'LAT,LON[,ELEVATION], or the id of a site of --plan');
const zone = (): Option =>
  new Option('--zone <name>', 'IANA time zone of --site; else looked up from the coordinates');
const plan = (): Option => new Option('--plan <file>', 'the plan that describes --site');
const format = (choices: string): Option => new Option('--format <name>', choices);
const out = (): Option => new Option('--out <file>', 'write there instead of to standard output');
const quiet = (): Option => new Option('--quiet', 'nothing but the result');

/**
 * The command line: what there is, and which module does it. A command's module is loaded when it is asked for, so
 * that none waits for what only another needs. Options come to it as words, and it reads them itself.
 */
export function makeProgram(version: string): Command {
  const program = new Command('synodos')
    .version(version, '--version', 'which version this is')
    .helpOption('--help', 'how it is used')
    // Faults are told, and the exit status set, in one place: failure.ts.
    .exitOverride()
    .configureOutput({ outputError: () => undefined })
    .description(
      'Forecasts when planets meet, stand opposite the Sun or hide behind it, and how far to trust each date.',
    )
    .addHelpText(
      'after',
      '\nA bare date is 00:00 UTC, or midnight at the site where one is given. Results go to standard output, everything\nelse to standard error. Exit status: 0 done, 1 the tool failed, 2 what was given is wrong.',
    );

  command('run <plan>', 'a whole plan, end to end: calendar, report and tables')
    .option('--into <folder>', 'where to write', 'out')
    .addOption(quiet())
    .action(async (file: string, options: RunOptions) =>
      (await import('./commands/run.js')).run(file, options),
    );

  command('events', 'the forecast')
    .addOption(from())
    .addOption(to())
    .addOption(kind())
    .option('--body <bodies>', 'events that concern any of these planets, set apart by commas')
    .addOption(site())
    .addOption(zone())
    .addOption(plan())
    .addOption(reckoning())
    .option('--within <degrees>', 'appulses up to this separation; 5 by default')
    .addOption(format('table, json, csv, md or ics'))
    .addOption(out())
    .addOption(quiet())
    .action(async (options: EventsOptions) => (await import('./commands/events.js')).events(options));

  command('residuals', 'mean cycle, Kepler orbits and refined instants side by side')
    .option('--pair <bodies>', 'two bodies, like earth,mars')
    .option('--kind <kind>', 'the kind of event; by default the one that the pair is known for')
    .addOption(from())
    .addOption(to())
    .addOption(reckoning())
    .addOption(format('table, json, csv or md'))
    .addOption(out())
    .addOption(quiet())
    .action(async (options: ResidualsOptions) => {
      (await import('./commands/residuals.js')).residuals(options);
    });

  command(
    'period <first> <second>',
    'synodic period of two bodies or periods (687d, 1.88y, 23.93h), and its near-repeats',
  )
    .addOption(format('table, json, csv or md'))
    .addOption(out())
    .addOption(quiet())
    .action(async (first: string, second: string, options: PeriodOptions) => {
      (await import('./commands/period.js')).period(first, second, options);
    });

  command('sidereal', 'sidereal time, what is on the meridian, coordinates J2000 and of date')
    .addOption(site())
    .addOption(zone())
    .addOption(plan())
    .option('--at <date>', 'the instant; now by default')
    .option('--position <ra,dec>', 'a place of J2000.0, hours and degrees, brought to the date and back')
    .addOption(format('table or json'))
    .addOption(out())
    .addOption(quiet())
    .action(async (options: SiderealOptions) => (await import('./commands/sidereal.js')).sidereal(options));

  command('check <plan>', 'what is wrong with a plan, line and column')
    .addOption(format('table or json'))
    .addOption(out())
    .addOption(quiet())
    .action(async (file: string, options: CheckOptions) => {
      (await import('./commands/check.js')).check(file, options);
    });

  return program;

  function command(name: string, description: string): Command {
    return program.command(name).description(description);
  }
}
