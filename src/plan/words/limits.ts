/** Wider than this, degrees, an appulse is none. */
export const MOST_WITHIN_DEG = 20;
