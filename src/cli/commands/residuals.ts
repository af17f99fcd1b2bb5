import { NoSuchPairError, residuals as residualsOf } from '../../forecast/index.js';
import type { ResidualRequest, ResidualSeries } from '../../forecast/index.js';
import { markdownTable, residualsCsv, residualsJson } from '../../output/index.js';
import { readBody, readKind } from '../../plan/words/index.js';
import { aligned } from '../aligned.js';
import { deliver } from '../deliver.js';
import type { DeliveryOptions } from '../deliver.js';
import { Faults } from '../faults.js';
import { readChoice } from '../read-choice.js';
import { readList } from '../read-list.js';
import { readSpan } from '../read-span.js';
import type { SpanWords } from '../read-span.js';
import { residualSheet, spreadSheet } from '../residual-sheet.js';
import { UsageError } from '../usage-error.js';

export interface ResidualsOptions extends SpanWords, DeliveryOptions {
  readonly pair?: string;
  readonly kind?: string;
  readonly reckoning?: string;
  readonly format?: string;
}

type Format = 'table' | 'json' | 'csv' | 'md';
const formats: readonly [Format, ...Format[]] = ['table', 'json', 'csv', 'md'];

export function residuals(options: ResidualsOptions): void {
  const faults = new Faults();
  const pair = readPair(options.pair, faults);
  const kind = options.kind === undefined ? undefined : faults.take('--kind', readKind(options.kind));
  const span = readSpan(options, null, faults);
  const reckoning =
    options.reckoning === undefined
      ? undefined
      : readChoice('--reckoning', options.reckoning, ['longitude', 'right-ascension'], faults);
  const format = readChoice('--format', options.format, formats, faults);
  faults.throwIfAny();

  const series = seriesOf({ pair: pair!, ...span!, ...(kind && { kind }), ...(reckoning && { reckoning }) });
  deliver(written(series, format), notesOf(series), options);
}

function readPair(words: string | undefined, faults: Faults): ResidualRequest['pair'] | undefined {
  if (words === undefined) {
    faults.add('--pair', 'is missing: write two bodies like earth,mars');
    return undefined;
  }
  const bodies = readList('--pair', words, readBody, faults) ?? [];
  const [a, b] = bodies;
  const named = words.split(',').length;
  if (named === 2 && a !== undefined && b !== undefined) {
    if (a !== b) return [a, b];
    faults.add('--pair', `${a} twice: a pair is two different bodies`);
  } else if (named !== 2) {
    faults.add('--pair', `names ${named} ${named === 1 ? 'body' : 'bodies'}: write two, like earth,mars`);
  }
  return undefined;
}

function seriesOf(request: ResidualRequest): ResidualSeries {
  try {
    return residualsOf(request);
  } catch (fault) {
    if (fault instanceof NoSuchPairError) throw new UsageError([`--pair: ${fault.message}`]);
    throw fault;
  }
}

const notesOf = ({ rows, beyondTable1 }: ResidualSeries): string[] => [
  `${rows.length} ${rows.length === 1 ? 'event' : 'events'}`,
  ...(beyondTable1 ? ['Table 1 of the mean elements is made for 1800–2050 and used beyond it'] : []),
];

function written(series: ResidualSeries, format: Format): string {
  const sheets = [spreadSheet(series), residualSheet(series)] as const;
  switch (format) {
    case 'table':
      return sheets.map(aligned).join('\n');
    case 'json':
      return residualsJson(series);
    case 'csv':
      return residualsCsv([series]);
    case 'md':
      return sheets.map(({ header, rows }) => markdownTable(header, rows)).join('\n');
  }
}
