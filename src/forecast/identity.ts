import type { Body } from '../bodies/index.js';

/** `+13`, `+0`, `-4`: a cycle number as ids write it. */
export const cycleLabel = (cycle: number): string => (cycle < 0 ? `${cycle}` : `+${cycle}`);

/** 0 → a … 25 → z, 26 → aa: the ordinal of a branch or a turn as ids write it. */
export function letterOf(ordinal: number): string {
  const last = String.fromCharCode(97 + (ordinal % 26));
  return ordinal < 26 ? last : letterOf(Math.floor(ordinal / 26) - 1) + last;
}

/** The name of an event for ever: `opposition.mars.+13.a`. */
export const eventId = (kind: string, bodies: readonly Body[], cycle: number, ordinal: number): string =>
  [kind, bodies.join('-'), cycleLabel(cycle), letterOf(ordinal)].join('.');
