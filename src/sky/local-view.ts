import type { Body } from '../bodies/index.js';
import type { LocalDate, UtcMillis } from '../time/index.js';

/** One event as it is seen, or not, from one site. */
export interface LocalView {
  /** The site's id. */
  readonly site: string;
  /** ISO 8601 with the offset in force, to the second: `2027-02-19T16:45:12+01:00`. */
  readonly localTime: string;
  readonly zone: string;
  /** Refracted altitude of the Sun's centre at the instant. */
  readonly sunAltitudeDeg: number;
  /** All the bodies above the local horizon, and the Sun below the true one, at the instant itself. */
  readonly visibleAtInstant: boolean;
  readonly bodies: readonly BodyFromSite[];
  /** The evening (noon to noon, local) that holds the instant. */
  readonly evening: LocalDate;
  /** The best moment of that night to look, or why there is none. */
  readonly bestLook: BestLook | null;
  /** One sentence in plain words: when and where to look, or "not visible from here" with the reason. */
  readonly verdict: string;
}

export interface BodyFromSite {
  readonly body: Body;
  /** Topocentric and refracted. */
  readonly altitudeDeg: number;
  /** From north through east. */
  readonly azimuthDeg: number;
  readonly aboveHorizon: boolean;
  /** The rise, upper transit and set of the local noon-to-noon night; null where it does not happen. */
  readonly rise: UtcMillis | null;
  readonly transit: UtcMillis | null;
  readonly set: UtcMillis | null;
}

export interface BestLook {
  readonly utc: UtcMillis;
  readonly localTime: string;
  /** Of the lower body. */
  readonly altitudeDeg: number;
  readonly azimuthDeg: number;
  /** Sixteen-point compass in words: `west-north-west`. */
  readonly direction: string;
  readonly sunAltitudeDeg: number;
}
