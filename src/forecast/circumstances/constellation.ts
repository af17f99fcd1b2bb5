import { Constellation } from 'astronomy-engine';

/**
 * The constellation, Latin nominative, in whose IAU boundaries a place of J2000.0 lies.
 * Source of the boundaries: Roman, Publ. Astron. Soc. Pacific 99 (1987) 695, on the equator of B1875.0.
 */
export const constellationOf = (rightAscensionJ2000Hours: number, declinationJ2000Deg: number): string =>
  Constellation(rightAscensionJ2000Hours, declinationJ2000Deg).name;
