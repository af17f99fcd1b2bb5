import { parseInstantUtc, parseLocalDate, spanRefusal, utcOfLocal } from '../../time/index.js';
import type { UtcMillis } from '../../time/index.js';
import { quoted } from './quoted.js';

/** What a user's word means, or what is wrong with it and what would be right. */
export type Reading<T> = { readonly value: T } | { readonly problem: string };

/**
 * Reads a date or an instant. A bare date is midnight at the site whose zone is given, else 00:00 UTC.
 * Dates outside 1600–2600 are refused, with the reason.
 */
export function readInstant(word: string, zone: string | null): Reading<UtcMillis> {
  const utc = parseInstantUtc(word);
  if (utc === null) {
    return {
      problem: `${quoted(word)} is not a date of the calendar: write YYYY-MM-DD, or an instant with its offset like 2027-01-31T18:30Z`,
    };
  }
  const refusal = spanRefusal(utc);
  if (refusal !== null) return { problem: `${quoted(word)} ${refusal.replace(/\.$/, '')}` };
  const date = parseLocalDate(word);
  return { value: zone !== null && date !== null ? utcOfLocal(date, 0, 0, zone) : utc };
}
