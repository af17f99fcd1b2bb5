import { ttDays } from '../time/index.js';
import type { TtDays } from '../time/index.js';

/** Mean instants `T(n) = epoch + n · period`; cycle 0 is the one nearest J2000.0. */
export interface MeanCycle {
  readonly epoch: TtDays;
  readonly periodDays: number;
}

/**
 * The cycle of an angle that grows evenly.
 * @param angleDeg its value at J2000.0
 * @param ratePerDayDeg degrees a day, positive
 * @param targetDeg the value, modulo a turn, that makes a mean instant
 */
export function meanCycleOf(angleDeg: number, ratePerDayDeg: number, targetDeg: number): MeanCycle {
  const behindDeg = targetDeg - angleDeg;
  const nearestDeg = behindDeg - 360 * Math.round(behindDeg / 360);
  return { epoch: ttDays(nearestDeg / ratePerDayDeg), periodDays: 360 / ratePerDayDeg };
}

export const meanInstant = ({ epoch, periodDays }: MeanCycle, n: number): TtDays =>
  ttDays(epoch + n * periodDays);

/** The number of the cycle whose mean instant is nearest. */
export const cycleNumberAt = ({ epoch, periodDays }: MeanCycle, tt: TtDays): number =>
  Math.round((tt - epoch) / periodDays) || 0;

/** The half cycle before a mean instant (included) and the half cycle after it (not included): stretches tile time. */
export function stretchOf({ epoch, periodDays }: MeanCycle, n: number): { from: TtDays; to: TtDays } {
  const edge = (k: number): TtDays => ttDays(epoch + (k - 0.5) * periodDays);
  return { from: edge(n), to: edge(n + 1) };
}

/** The numbers of all cycles whose stretch has a part in [from, to), rising; none for an empty span. */
export function cyclesOverlapping(cycle: MeanCycle, from: TtDays, to: TtDays): number[] {
  if (to <= from) return [];
  // The nearest mean instants lie in the first and the last stretch, but for a rounding on their very edge.
  const first = cycleNumberAt(cycle, from) - 1;
  const last = cycleNumberAt(cycle, to) + 1;
  return Array.from({ length: last - first + 1 }, (_, i) => first + i).filter((n) => {
    const stretch = stretchOf(cycle, n);
    return stretch.from < to && stretch.to > from;
  });
}
