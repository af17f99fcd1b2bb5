/** Rounded to a number of decimals, as a number: no false precision, and the same bytes everywhere. */
export const rounded = (value: number, digits: number): number => Number(value.toFixed(digits));

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
