import type { Body } from '../bodies/index.js';
import { add, cross, dot, length, scale, subtract } from '../math/index.js';
import type { Vector } from '../math/index.js';
import { ttDays } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import type { Geometry } from './geometry.js';

/** Speed of light, au a day (IAU 2012 au, 2019 SI). */
export const LIGHT_AU_PER_DAY = 173.144_632_684_669_3;
/** 2GM☉/c², au: the Sun's Schwarzschild radius (IAU 2015 nominal solar mass parameter). */
const SUN_SCHWARZSCHILD_AU = 1.974_125_743_36e-8;
const MAX_LIGHT_TIME_STEPS = 8;
/** In which the fastest planet moves by 0.00002″. */
const LIGHT_TIME_TOLERANCE_DAYS = 2e-9;

/** Where the Earth's centre is, and how fast it moves, at one instant: what all places of that instant share. */
export interface Observer {
  readonly tt: TtDays;
  /** From the Sun's centre, au. */
  readonly earthFromSun: Vector;
  /** Of the Sun about the barycentre, au a day. */
  readonly sunVelocity: Vector;
  /** Of the Earth about the barycentre, in units of the speed of light. */
  readonly velocity: Vector;
}

/** Geocentric places on the axes of J2000.0, and a count of them. */
export class ApparentPlaces {
  private computed = 0;
  private lastObserver: Observer | null = null;
  /** The circumstances of an event ask for one place in several frames. */
  private readonly lastPlaces = new Map<Body, { readonly tt: TtDays; readonly place: Vector }>();

  constructor(private readonly geometry: Geometry) {}

  /** How many apparent places have been computed so far: the effort of a search. */
  get count(): number {
    return this.computed;
  }

  observer(tt: TtDays): Observer {
    if (this.lastObserver?.tt === tt) return this.lastObserver;
    const earth = this.geometry.heliocentricMotion('earth', tt);
    const sun = this.geometry.sunMotion(tt);
    this.lastObserver = {
      tt,
      earthFromSun: earth.position,
      sunVelocity: sun.velocity,
      velocity: scale(add(earth.velocity, sun.velocity), 1 / LIGHT_AU_PER_DAY),
    };
    return this.lastObserver;
  }

  /**
   * The astrometric place: from the Earth's centre now to the body's centre when the light left it, au. What star
   * catalogues of J2000.0 compare with.
   */
  astrometric(body: Body, tt: TtDays): Vector {
    return this.retarded(body, this.observer(tt));
  }

  /**
   * The apparent place: light-time, deflection by the Sun and aberration applied; its direction is the apparent
   * one, its length the light-time distance, au.
   *
   * Source: Urban & Seidelmann (eds.), Explanatory Supplement, 3rd ed. (2013), §7.2.2–7.2.4; deflection and
   * aberration in the vector form of the IAU SOFA routines `ld` and `ab`.
   */
  apparent(body: Body, tt: TtDays): Vector {
    const observer = this.observer(tt);
    const place = this.retarded(body, observer);
    return this.aberrated(body === 'sun' ? place : deflectBySun(place, observer.earthFromSun), observer);
  }

  /**
   * The apparent place without the Sun's deflection: smooth even where a body passes behind the Sun, and within
   * 0.03″ of the apparent one from 15° off it (1.75″ at its limb).
   */
  undeflected(body: Body, observer: Observer): Vector {
    return this.aberrated(this.retarded(body, observer), observer);
  }

  /**
   * From the Earth now to the body when the light left it. Both are taken from the barycentre by letting the Sun move
   * evenly in the meantime, which is true to 30 m in the light-time of Neptune.
   */
  private retarded(body: Body, observer: Observer): Vector {
    const last = this.lastPlaces.get(body);
    if (last?.tt === observer.tt) return last.place;
    const place = this.retard(body, observer);
    this.lastPlaces.set(body, { tt: observer.tt, place });
    return place;
  }

  private retard(body: Body, { tt, earthFromSun, sunVelocity }: Observer): Vector {
    let lightTimeDays = 0;
    let place = earthFromSun;
    for (let step = 0; step < MAX_LIGHT_TIME_STEPS; step++) {
      const fromSun = body === 'sun' ? ORIGIN : this.geometry.heliocentric(body, ttDays(tt - lightTimeDays));
      place = {
        x: fromSun.x - earthFromSun.x - sunVelocity.x * lightTimeDays,
        y: fromSun.y - earthFromSun.y - sunVelocity.y * lightTimeDays,
        z: fromSun.z - earthFromSun.z - sunVelocity.z * lightTimeDays,
      };
      const next = length(place) / LIGHT_AU_PER_DAY;
      const settled = Math.abs(next - lightTimeDays) < LIGHT_TIME_TOLERANCE_DAYS;
      lightTimeDays = next;
      if (settled) break;
    }
    return place;
  }

  private aberrated(place: Vector, { earthFromSun, velocity }: Observer): Vector {
    this.computed++;
    const distanceAu = length(place);
    return scale(aberrate(scale(place, 1 / distanceAu), velocity, length(earthFromSun)), distanceAu);
  }
}

const ORIGIN: Vector = { x: 0, y: 0, z: 0 };

/** Bends a geocentric place (au) past the Sun; nothing is bent more than at 3.4′ from its centre. */
function deflectBySun(place: Vector, earthFromSun: Vector): Vector {
  const distanceAu = length(place);
  const earthDistanceAu = length(earthFromSun);
  const direction = scale(place, 1 / distanceAu);
  const e = scale(earthFromSun, 1 / earthDistanceAu);
  const bodyFromSun = add(place, earthFromSun);
  const q = scale(bodyFromSun, 1 / length(bodyFromSun));
  const limit = 1e-6 / Math.max(earthDistanceAu ** 2, 1);
  const weight = SUN_SCHWARZSCHILD_AU / earthDistanceAu / Math.max(dot(q, add(q, e)), limit);
  return scale(add(direction, scale(cross(direction, cross(e, q)), weight)), distanceAu);
}

/** Tilts a unit direction by the observer's velocity (in units of c): special relativity and the Sun's potential. */
function aberrate(direction: Vector, velocity: Vector, sunDistanceAu: number): Vector {
  const inverseLorentz = Math.sqrt(1 - dot(velocity, velocity));
  const along = dot(direction, velocity);
  const potential = SUN_SCHWARZSCHILD_AU / sunDistanceAu;
  const tilted = add(
    add(scale(direction, inverseLorentz), scale(velocity, 1 + along / (1 + inverseLorentz))),
    scale(subtract(velocity, scale(direction, along)), potential),
  );
  return scale(tilted, 1 / length(tilted));
}
