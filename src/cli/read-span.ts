import { readInstant } from '../plan/words/index.js';
import type { UtcMillis } from '../time/index.js';
import type { Faults } from './faults.js';

export interface SpanWords {
  readonly from?: string;
  readonly to?: string;
}

/** Reads --from (included) and --to (not included). Bare dates are local midnights where a zone is given. */
export function readSpan(
  { from, to }: SpanWords,
  zone: string | null,
  faults: Faults,
): { from: UtcMillis; to: UtcMillis } | undefined {
  const read = (where: string, word: string | undefined): UtcMillis | undefined => {
    if (word !== undefined) return faults.take(where, readInstant(word, zone));
    faults.add(where, 'is missing: write a date like 2027-01-01');
    return undefined;
  };
  const [start, end] = [read('--from', from), read('--to', to)];
  if (start === undefined || end === undefined) return undefined;
  if (end > start) return { from: start, to: end };
  faults.add('--to', `${to ?? ''} is not after ${from ?? ''}: the end is not in the span, write a later one`);
  return undefined;
}
