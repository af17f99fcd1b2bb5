import type { Body } from '../bodies/index.js';
import type { Paths } from '../ephemeris/index.js';
import {
  degreesFromRadians,
  dot,
  length,
  radiansFromDegrees,
  scale,
  subtract,
  wrapTwoPi,
} from '../math/index.js';
import type { Vector } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import { greenwichApparentSidereal, localSidereal } from './sidereal.js';
import type { Site } from './site.js';

/** WGS 84. */
const EARTH_RADIUS_AU = 6378.137 / 149_597_870.7;
const EARTH_FLATTENING = 1 / 298.257_223_563;

export interface Horizontal {
  /** Topocentric, without refraction. */
  readonly altitudeDeg: number;
  /** From north through east, [0, 360). */
  readonly azimuthDeg: number;
  /** Topocentric direction, true equator of date, unit length. */
  readonly direction: Vector;
  /** West positive, radians in [0, 2π). */
  readonly hourAngle: number;
}

/** The sky over one site: where apparent places stand above its horizon. */
export class SkyOverSite {
  private last: { readonly tt: TtDays; readonly axes: Axes } | null = null;
  private readonly observer: { readonly cosAu: number; readonly sinAu: number };

  constructor(
    readonly site: Site,
    readonly paths: Paths,
  ) {
    this.observer = geodetic(site);
  }

  /**
   * Altitude and azimuth of a body, diurnal parallax included.
   * Source: Urban & Seidelmann (eds.), Explanatory Supplement, 3rd ed. (2013), §7.1.3 and §7.2.5 (polar motion and the
   * diurnal aberration of 0.3″ left out).
   */
  horizontal(body: Body, tt: TtDays): Horizontal {
    const axes = this.axes(tt);
    const topocentric = subtract(this.paths.position(body, 'equator-of-date', tt), axes.observer);
    const direction = scale(topocentric, 1 / length(topocentric));
    const rightAscension = Math.atan2(direction.y, direction.x);
    return {
      altitudeDeg: degreesFromRadians(Math.asin(dot(direction, axes.zenith))),
      azimuthDeg: degreesFromRadians(
        wrapTwoPi(Math.atan2(dot(direction, axes.east), dot(direction, axes.north))),
      ),
      direction,
      hourAngle: wrapTwoPi(axes.sidereal - rightAscension),
    };
  }

  private axes(tt: TtDays): Axes {
    if (this.last?.tt !== tt) this.last = { tt, axes: axesAt(this.site, this.observer, tt) };
    return this.last.axes;
  }
}

interface Axes {
  /** Local apparent sidereal time, radians. */
  readonly sidereal: number;
  readonly zenith: Vector;
  readonly north: Vector;
  readonly east: Vector;
  /** From the Earth's centre, true equator of date, au. */
  readonly observer: Vector;
}

function axesAt(site: Site, { cosAu, sinAu }: { cosAu: number; sinAu: number }, tt: TtDays): Axes {
  const sidereal = localSidereal(greenwichApparentSidereal(tt), site.longitudeDeg);
  const latitude = radiansFromDegrees(site.latitudeDeg);
  const [cs, ss] = [Math.cos(sidereal), Math.sin(sidereal)];
  const [cl, sl] = [Math.cos(latitude), Math.sin(latitude)];
  return {
    sidereal,
    zenith: { x: cl * cs, y: cl * ss, z: sl },
    north: { x: -sl * cs, y: -sl * ss, z: cl },
    east: { x: -ss, y: cs, z: 0 },
    observer: { x: cosAu * cs, y: cosAu * ss, z: sinAu },
  };
}

/** The site's distances from the Earth's axis and from its equator, au. */
function geodetic({ latitudeDeg, elevationM }: Site): { cosAu: number; sinAu: number } {
  const latitude = radiansFromDegrees(latitudeDeg);
  const squeeze = (1 - EARTH_FLATTENING) ** 2;
  const curvature = 1 / Math.sqrt(Math.cos(latitude) ** 2 + squeeze * Math.sin(latitude) ** 2);
  const heightRadii = elevationM / 6_378_137;
  return {
    cosAu: (curvature + heightRadii) * Math.cos(latitude) * EARTH_RADIUS_AU,
    sinAu: (squeeze * curvature + heightRadii) * Math.sin(latitude) * EARTH_RADIUS_AU,
  };
}
