import type { Reading } from '../plan/words/index.js';
import type { Faults } from './faults.js';

/** Reads words set apart by commas, each by itself; undefined where the option was not given. */
export function readList<T>(
  where: string,
  words: string | undefined,
  read: (word: string) => Reading<T>,
  faults: Faults,
): T[] | undefined {
  if (words === undefined) return undefined;
  const values = words
    .split(',')
    .map((word) => word.trim())
    .map((word) => (word === '' ? undefined : faults.take(where, read(word))));
  if (words.split(',').some((word) => word.trim() === '')) {
    faults.add(where, 'a name is missing beside a comma: write names like mars,jupiter');
  }
  return values.filter((value) => value !== undefined);
}
