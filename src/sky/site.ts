import zoneOfPlace from '@photostructure/tz-lookup';
import { isZone } from '../time/index.js';

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
  /** Local horizon, by rising azimuth; empty is flat. */
  readonly horizon: readonly HorizonPoint[];
}

export interface HorizonPoint {
  /** Degrees from north through east, 0 … 360. */
  readonly azimuthDeg: number;
  readonly altitudeDeg: number;
}

/** What a user says of a site. */
export interface SiteWords {
  readonly id: string;
  readonly name?: string;
  readonly latitudeDeg: number;
  readonly longitudeDeg: number;
  readonly elevationM?: number;
  readonly zone?: string;
  readonly horizon?: readonly HorizonPoint[];
}

/** A site that cannot be. Its message says what is wrong and what would be right. */
export class SiteError extends Error {
  override readonly name = 'SiteError';
}

/** Makes a site of a user's words; the zone comes from the coordinates where none is given. */
export function makeSite(words: SiteWords): Site {
  const { id, name = id, latitudeDeg, longitudeDeg, elevationM = 0, zone, horizon = [] } = words;
  check(/^[A-Za-z0-9-]+$/.test(id), `site id "${id}": use letters, digits and hyphens only`);
  checkRange('latitude', latitudeDeg, -90, 90, 'degrees, north positive');
  checkRange('longitude', longitudeDeg, -180, 180, 'degrees, east positive');
  checkRange('elevation', elevationM, -500, 9000, 'metres above sea level');
  for (const { azimuthDeg, altitudeDeg } of horizon) {
    checkRange('horizon azimuth', azimuthDeg, 0, 360, 'degrees from north through east');
    checkRange('horizon altitude', altitudeDeg, -10, 90, 'degrees');
  }
  check(
    zone === undefined || isZone(zone),
    `zone "${zone ?? ''}" is not an IANA zone: write one like Europe/Paris`,
  );
  return {
    ...{ id, name, latitudeDeg, longitudeDeg, elevationM },
    zone: zone ?? zoneOfPlace(latitudeDeg, longitudeDeg),
    zoneFrom: zone === undefined ? 'coordinates' : 'user',
    horizon: [...horizon].sort((a, b) => a.azimuthDeg - b.azimuthDeg),
  };
}

/** The altitude of the local horizon in a direction, degrees: straight lines between the points given, around the circle. */
export function horizonAltitudeDeg({ horizon }: Site, azimuthDeg: number): number {
  const first = horizon[0];
  const last = horizon.at(-1);
  if (first === undefined || last === undefined) return 0;
  const after = horizon.find((point) => point.azimuthDeg >= azimuthDeg) ?? turned(first, 360);
  const before = horizon.findLast((point) => point.azimuthDeg <= azimuthDeg) ?? turned(last, -360);
  const width = after.azimuthDeg - before.azimuthDeg;
  if (width === 0) return after.altitudeDeg;
  const part = (azimuthDeg - before.azimuthDeg) / width;
  return before.altitudeDeg + part * (after.altitudeDeg - before.altitudeDeg);
}

const turned = (point: HorizonPoint, byDeg: number): HorizonPoint => ({
  ...point,
  azimuthDeg: point.azimuthDeg + byDeg,
});

function check(holds: boolean, message: string): void {
  if (!holds) throw new SiteError(message);
}

function checkRange(what: string, value: number, low: number, high: number, meaning: string): void {
  check(value >= low && value <= high, `${what} ${value} is outside ${low} … ${high} (${meaning})`);
}
