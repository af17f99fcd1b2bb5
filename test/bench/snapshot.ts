import {
  AngleBetween,
  AstroTime,
  Body,
  GeoVector,
  HelioVector,
  RotateVector,
  Rotation_EQJ_ECT,
  Rotation_EQJ_EQD,
} from 'astronomy-engine';
import type { RotationMatrix, Vector } from 'astronomy-engine';

const DEGREE = Math.PI / 180;

/** The baseline's places at one instant of the library's UT, each computed when it is first asked for. */
export class Snapshot {
  private readonly time: AstroTime;
  private readonly apparentPlaces = new Map<Body, Vector>();
  private readonly heliocentricPlaces = new Map<Body, Vector>();
  private readonly longitudes = new Map<Body, number>();
  private readonly rightAscensions = new Map<Body, number>();
  private readonly heliocentricLongitudes = new Map<Body, number>();
  private ecliptic: RotationMatrix | undefined;
  private equator: RotationMatrix | undefined;

  constructor(ut: number) {
    this.time = new AstroTime(ut);
  }

  apparent(body: Body): Vector {
    return kept(this.apparentPlaces, body, () => GeoVector(body, this.time, true));
  }

  heliocentric(body: Body): Vector {
    return kept(this.heliocentricPlaces, body, () => HelioVector(body, this.time));
  }

  longitude(body: Body): number {
    return kept(this.longitudes, body, () => azimuth(this.toEcliptic(), this.apparent(body)));
  }

  rightAscension(body: Body): number {
    return kept(this.rightAscensions, body, () => azimuth(this.toEquator(), this.apparent(body)));
  }

  heliocentricLongitude(body: Body): number {
    return kept(this.heliocentricLongitudes, body, () => azimuth(this.toEcliptic(), this.heliocentric(body)));
  }

  separation(a: Body, b: Body): number {
    return AngleBetween(this.apparent(a), this.apparent(b)) * DEGREE;
  }

  trueDistanceAu(body: Body): number {
    const [planet, earth] = [this.heliocentric(body), this.heliocentric(Body.Earth)];
    return Math.hypot(planet.x - earth.x, planet.y - earth.y, planet.z - earth.z);
  }

  venusPhaseAngle(): number {
    return AngleBetween(this.heliocentric(Body.Venus), this.apparent(Body.Venus)) * DEGREE;
  }

  /** Mallama & Hilton (2018). */
  venusMagnitude(): number {
    const a = this.venusPhaseAngle() / DEGREE;
    const distances = this.heliocentric(Body.Venus).Length() * this.apparent(Body.Venus).Length();
    const phase = a * (-1.044e-3 + a * (3.687e-4 + a * (-2.814e-6 + a * 8.938e-9)));
    return 5 * Math.log10(distances) - 4.384 + phase;
  }

  private toEcliptic(): RotationMatrix {
    return (this.ecliptic ??= Rotation_EQJ_ECT(this.time));
  }

  private toEquator(): RotationMatrix {
    return (this.equator ??= Rotation_EQJ_EQD(this.time));
  }
}

function kept<Value>(known: Map<Body, Value>, body: Body, make: () => Value): Value {
  const old = known.get(body);
  if (old !== undefined) return old;
  const fresh = make();
  known.set(body, fresh);
  return fresh;
}

function azimuth(matrix: RotationMatrix, place: Vector): number {
  const { x, y } = RotateVector(matrix, place);
  return Math.atan2(y, x);
}
