import { titleOf } from '../../bodies/index.js';
import { faultLine, loadPlan } from '../../plan/index.js';
import type { Plan } from '../../plan/index.js';
import { quoted } from '../../plan/words/index.js';
import { isoUtc } from '../../time/index.js';
import { deliver } from '../deliver.js';
import type { DeliveryOptions } from '../deliver.js';
import { Faults } from '../faults.js';
import { readChoice } from '../read-choice.js';

export interface CheckOptions extends DeliveryOptions {
  readonly format?: string;
}

/** Tells what is wrong with a plan; that there are faults is the exit status too. */
export function check(file: string, options: CheckOptions): void {
  const faults = new Faults();
  const format = readChoice('--format', options.format, ['table', 'json'], faults);
  faults.throwIfAny();

  const reading = loadPlan(file);
  const found = 'plan' in reading ? [] : reading.faults;
  const lines = found.map((fault) => faultLine(file, fault));
  const text =
    format === 'json'
      ? `${JSON.stringify({ schema: 'synodos-faults-1', faults: found }, null, 2)}\n`
      : lines.map((line) => `${line}\n`).join('');
  const note =
    'plan' in reading ? `${file}: ${summaryOf(reading.plan)}` : `${file}: ${count(found.length, 'fault')}`;
  deliver(text, [note], options);
  if (found.length > 0) process.exitCode = 2;
}

function summaryOf({ title, from, to, sites, bodies, residuals }: Plan): string {
  return [
    `no faults. ${quoted(title)}, ${isoUtc(from)} to ${isoUtc(to)}`,
    count(sites.length, 'site'),
    ...(bodies === undefined ? [] : [bodies.map(titleOf).join(', ')]),
    `${count(residuals.length, 'pair')} of residuals`,
  ].join(', ');
}

const count = (n: number, what: string): string => `${n} ${n === 1 ? what : `${what}s`}`;
