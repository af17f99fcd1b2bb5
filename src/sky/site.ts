/** A place with a clock, a horizon and a sky. */
export interface Site {
  /** Stable short name: letters, digits and hyphens; used in ids and file names. */
  readonly id: string;
  /** The name as people read it. */
  readonly name: string;
  /** Degrees, north positive. */
  readonly latitudeDeg: number;
  /** Degrees, east positive, −180 … 180. */
  readonly longitudeDeg: number;
  /** Metres above sea level. */
  readonly elevationM: number;
  /** IANA zone name. */
  readonly zone: string;
  /** Whether the zone was the user's word or looked up from the coordinates. */
  readonly zoneFrom: 'user' | 'coordinates';
  /** Local horizon: altitude in degrees by azimuth in degrees (north 0, east 90), rising azimuths; empty is flat. */
  readonly horizon: readonly HorizonPoint[];
}

export interface HorizonPoint {
  readonly azimuthDeg: number;
  readonly altitudeDeg: number;
}
