import { quoted } from '../plan/words/index.js';
import type { Reading } from '../plan/words/index.js';

/** Reads a plain decimal number, and nothing that merely begins with one. */
export function readNumber(word: string): Reading<number> {
  return /^[+-]?\d{1,15}(?:\.\d{1,15})?$/.test(word.trim())
    ? { value: Number(word) }
    : { problem: `${quoted(word)} is not a number: write one like 48.2` };
}
