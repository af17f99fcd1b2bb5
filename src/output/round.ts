const POWERS_OF_TEN = [1, 10, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9] as const;

/** Rounded to a number of decimals (nine at most), as a number: no false precision, and the same bytes everywhere. */
export function rounded(value: number, digits: number): number {
  const scale = POWERS_OF_TEN[digits]!;
  return Math.round(value * scale) / scale + 0;
}

/** How many digits each quantity deserves: a little beyond what the best source knows, and no more. */
export const round = {
  /** 0.09 s. */
  ttDays: (value: number): number => rounded(value, 6),
  seconds: (value: number): number => Number(value.toPrecision(2)),
  au: (value: number): number => rounded(value, 6),
  km: (value: number): number => rounded(value / 1000, 0) * 1000,
  minutes: (value: number): number => rounded(value, 3),
  deg: (value: number): number => rounded(value, 4),
  hours: (value: number): number => rounded(value, 5),
};
