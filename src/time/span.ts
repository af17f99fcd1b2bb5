import { utcMillis } from './instants.js';
import type { UtcMillis } from './instants.js';

/** The span in which the sources are proven; the end itself is not in it. */
export const SUPPORTED_FROM = utcMillis(Date.UTC(1600, 0, 1));
export const SUPPORTED_TO = utcMillis(Date.UTC(2600, 0, 1));

/** Why an instant cannot be served, as one sentence for the user; null if it can. An end that is not included may be 2600-01-01. */
export function spanRefusal(utc: UtcMillis): string | null {
  if (utc >= SUPPORTED_FROM && utc <= SUPPORTED_TO) return null;
  const side = utc < SUPPORTED_FROM ? 'before 1600-01-01' : 'after 2600-01-01';
  return `lies ${side}: the positions are proven against an independent ephemeris only from 1600-01-01 to 2600-01-01.`;
}
