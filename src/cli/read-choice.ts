import { oneOf, quoted } from '../plan/words/index.js';
import type { Faults } from './faults.js';

/** Reads one of a few words; the first is meant where none is given. */
export function readChoice<T extends string>(
  where: string,
  word: string | undefined,
  choices: readonly [T, ...T[]],
  faults: Faults,
): T {
  const choice = word === undefined ? choices[0] : choices.find((candidate) => candidate === word);
  if (choice === undefined)
    faults.add(where, `${quoted(word ?? '')} is not one of its choices.${oneOf(word ?? '', choices)}`);
  return choice ?? choices[0];
}
