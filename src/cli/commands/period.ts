import {
  CALENDAR_YEAR_DAYS,
  PeriodError,
  nearRepeats,
  synodicPeriodDays,
  synodicPeriodOf,
} from '../../cycles/index.js';
import type { NearRepeat } from '../../cycles/index.js';
import { csv, fixed, markdownTable, signed } from '../../output/index.js';
import { DAYS_PER_JULIAN_YEAR } from '../../time/index.js';
import { aligned } from '../aligned.js';
import type { Sheet } from '../aligned.js';
import { deliver } from '../deliver.js';
import type { DeliveryOptions } from '../deliver.js';
import { Faults } from '../faults.js';
import { readChoice } from '../read-choice.js';
import { readPeriod } from '../read-period.js';
import type { NamedPeriod } from '../read-period.js';
import { UsageError } from '../usage-error.js';

export interface PeriodOptions extends DeliveryOptions {
  readonly format?: string;
}

type Format = 'table' | 'json' | 'csv' | 'md';
const formats: readonly [Format, ...Format[]] = ['table', 'json', 'csv', 'md'];

export function period(firstWord: string, secondWord: string, options: PeriodOptions): void {
  const faults = new Faults();
  const first = faults.take('first period', readPeriod(firstWord));
  const second = faults.take('second period', readPeriod(secondWord));
  const format = readChoice('--format', options.format, formats, faults);
  faults.throwIfAny();

  const synodicDays = synodicOf(first!, second!);
  const repeats = nearRepeats(synodicDays, CALENDAR_YEAR_DAYS);
  deliver(
    written(first!, second!, synodicDays, repeats, format),
    [
      `near-repeats are counted in mean Gregorian years of ${CALENDAR_YEAR_DAYS} days, so that they come back at the same date`,
    ],
    options,
  );
}

function synodicOf(first: NamedPeriod, second: NamedPeriod): number {
  try {
    return first.body !== null && second.body !== null
      ? synodicPeriodOf(first.body, second.body)
      : synodicPeriodDays(first.periodDays, second.periodDays);
  } catch (fault) {
    if (fault instanceof PeriodError) throw new UsageError([`period: ${fault.message}`]);
    throw fault;
  }
}

function written(
  first: NamedPeriod,
  second: NamedPeriod,
  synodicDays: number,
  repeats: readonly NearRepeat[],
  format: Format,
): string {
  switch (format) {
    case 'table':
      return [
        aligned({
          header: ['period', 'days', 'Julian years'],
          rows: [
            [first.name, fixed(first.periodDays, 3), fixed(first.periodDays / DAYS_PER_JULIAN_YEAR, 4)],
            [second.name, fixed(second.periodDays, 3), fixed(second.periodDays / DAYS_PER_JULIAN_YEAR, 4)],
            ['synodic', fixed(synodicDays, 3), fixed(synodicDays / DAYS_PER_JULIAN_YEAR, 4)],
          ],
        }),
        repeats.length === 0 ? 'No near-repeat within 300 years.\n' : aligned(repeatSheet(repeats)),
      ].join('\n');
    case 'md': {
      const { header, rows } = repeatSheet(repeats);
      return markdownTable(header, rows);
    }
    case 'csv':
      return csv(
        ['years', 'cycles', 'misfit_d', 'misfit_deg'],
        repeats.map(({ years, cycles, misfitDays, misfitDeg }) => [
          years,
          cycles,
          Number(misfitDays.toFixed(2)),
          Number(misfitDeg.toFixed(2)),
        ]),
      );
    case 'json':
      return `${JSON.stringify(
        {
          schema: 'synodos-period-1',
          periods: [first, second],
          synodicPeriodDays: synodicDays,
          yearDays: CALENDAR_YEAR_DAYS,
          nearRepeats: repeats,
        },
        null,
        2,
      )}\n`;
  }
}

const repeatSheet = (repeats: readonly NearRepeat[]): Sheet => ({
  header: ['near-repeat', 'cycles', 'later by', 'along the zodiac'],
  rows: repeats.map(({ years, cycles, misfitDays, misfitDeg }) => [
    `${years} ${years === 1 ? 'year' : 'years'}`,
    String(cycles),
    `${signed(misfitDays, 1)} d`,
    `${signed(misfitDeg, 1)}°`,
  ]),
});
