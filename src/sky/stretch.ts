import type { TtDays } from '../time/index.js';

/** A stretch of time, both ends included. */
export interface Stretch {
  readonly from: TtDays;
  readonly to: TtDays;
}

/** What two lists of stretches have in common. */
export const inBoth = (some: readonly Stretch[], others: readonly Stretch[]): Stretch[] =>
  some.flatMap((a) =>
    others
      .map((b) => ({ from: a.from > b.from ? a.from : b.from, to: a.to < b.to ? a.to : b.to }))
      .filter(({ from, to }) => from <= to),
  );
