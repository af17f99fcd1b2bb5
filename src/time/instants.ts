declare const ttBrand: unique symbol;
declare const utcBrand: unique symbol;
declare const dateBrand: unique symbol;

/** Days of Terrestrial Time since J2000.0 (JD 2451545.0 TT). The only time that the core computes in. */
export type TtDays = number & { readonly [ttBrand]: true };

/** Milliseconds of UTC since 1970-01-01T00:00:00Z, leap seconds not counted (POSIX). The time of the edge. */
export type UtcMillis = number & { readonly [utcBrand]: true };

/** A civil date `YYYY-MM-DD` at a site, naming the local day (or the evening that begins on it). */
export type LocalDate = string & { readonly [dateBrand]: true };

export const ttDays = (days: number): TtDays => days as TtDays;
export const utcMillis = (milliseconds: number): UtcMillis => milliseconds as UtcMillis;
export const localDate = (text: string): LocalDate => text as LocalDate;

export const SECONDS_PER_DAY = 86_400;
export const MILLIS_PER_DAY = 86_400_000;
export const DAYS_PER_JULIAN_YEAR = 365.25;
export const DAYS_PER_JULIAN_CENTURY = 36_525;
/** The Julian Date of J2000.0. */
export const JD_J2000 = 2_451_545;

/** Julian centuries since J2000.0. */
export const centuriesOf = (tt: TtDays): number => tt / DAYS_PER_JULIAN_CENTURY;
