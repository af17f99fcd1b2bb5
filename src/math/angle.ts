export const TWO_PI = 2 * Math.PI;
export const RADIANS_PER_DEGREE = Math.PI / 180;
export const RADIANS_PER_ARCSEC = Math.PI / 648_000;
export const RADIANS_PER_HOUR = Math.PI / 12;

export const radiansFromDegrees = (degrees: number): number => degrees * RADIANS_PER_DEGREE;
export const degreesFromRadians = (radians: number): number => radians / RADIANS_PER_DEGREE;
export const arcsecFromRadians = (radians: number): number => radians / RADIANS_PER_ARCSEC;
export const hoursFromRadians = (radians: number): number => radians / RADIANS_PER_HOUR;

/** Brings an angle into [0, 2π). Radians. */
export function wrapTwoPi(radians: number): number {
  const wrapped = radians % TWO_PI;
  return wrapped < 0 ? wrapped + TWO_PI : wrapped;
}

/** Brings an angle into (−π, π]. Radians. */
export function wrapPi(radians: number): number {
  const wrapped = wrapTwoPi(radians);
  return wrapped > Math.PI ? wrapped - TWO_PI : wrapped;
}
