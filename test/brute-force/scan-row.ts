export const planetNames = [
  'mercury',
  'venus',
  'earth',
  'mars',
  'jupiter',
  'saturn',
  'uranus',
  'neptune',
] as const;
export type PlanetName = (typeof planetNames)[number];
/** A planet in the Earth's sky. */
export type SkyName = Exclude<PlanetName, 'earth'>;
export const skyNames = planetNames.filter((name): name is SkyName => name !== 'earth');

export type ScanReckoning = 'longitude' | 'right-ascension';

/** One event that the brute-force scan found. */
export interface ScanRow {
  readonly kind: string;
  /** `null` where the kind has no choice of coordinate. */
  readonly reckoning: ScanReckoning | null;
  readonly bodies: readonly PlanetName[];
  /** Days of TT since J2000.0, rounded to 1e-6 day (0.09 s). */
  readonly tt: number;
  /**
   * What an error is divided by to become an error of time. Roots of a difference: its rate, degrees a day. Stations:
   * the second derivative of the coordinate, degrees a day². Extrema: the second derivative of what is extreme, in au,
   * degrees or magnitudes a day²; for an appulse that of half the squared separation, degrees² a day².
   */
  readonly slope: number;
  /** What is extreme at an extremum, in au, degrees or magnitudes; `null` at roots and stations. */
  readonly value: number | null;
}
