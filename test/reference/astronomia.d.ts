/** The part of the npm package astronomia (it carries no types) that the judges here use. */
declare module 'astronomia/planetposition' {
  export interface Vsop87Series {
    readonly name: string;
  }
  export class Planet {
    constructor(series: Vsop87Series);
    /** Heliocentric, radians and au, on the ecliptic and equinox of J2000. */
    position2000(jde: number): { lon: number; lat: number; range: number };
  }
}

declare module 'astronomia/data/vsop87B*' {
  import type { Vsop87Series } from 'astronomia/planetposition';
  const series: Vsop87Series;
  export default series;
}
