import type { Planet, SkyPlanet } from '../bodies/index.js';
import type { LocalView } from '../sky/index.js';
import type { TtDays, UtcMillis } from '../time/index.js';
import type { KindName } from './kind-names.js';

export type Reckoning = 'longitude' | 'right-ascension';

/** One event of a forecast. Its identity never depends on the instant that was found. */
export interface ForecastEvent {
  /** `kind.bodies.cycle.letter`, e.g. `opposition.mars.+13.a`. */
  readonly id: string;
  readonly kind: KindName;
  readonly bodies: readonly Planet[];
  /** Number of the mean cycle, 0 being the one whose mean instant is nearest J2000.0. */
  readonly cycle: number;
  /** Which of several roots of the same cycle this is (conjunctions of two planets), in order of time. */
  readonly series: Series | null;
  /** The coordinate whose difference or rate is sought, where the kind has a choice. */
  readonly reckoning: Reckoning | null;
  readonly tt: TtDays;
  readonly utc: UtcMillis;
  readonly uncertaintySeconds: UncertaintySeconds;
  readonly estimates: Estimates;
  readonly residualDays: Residuals;
  /** For flat extrema and grazing approaches: the interval in which the event cannot be told from its neighbours. */
  readonly interval: Interval | null;
  /** The meeting of which this is a moment, for two bodies on the sky. */
  readonly meeting: string | null;
  /** False where another ephemeris of the same quality could lack the event (a grazing pair of roots). */
  readonly certain: boolean;
  readonly circumstances: Circumstances;
  /** As seen from each of the sites asked for, in the order asked. */
  readonly local: readonly LocalView[];
}

export interface Series {
  readonly index: number;
  readonly of: number;
}

/** 95 % half-widths. */
export interface UncertaintySeconds {
  readonly tt: number;
  readonly utc: number;
}

/** First estimates, null where the kind has none. */
export interface Estimates {
  readonly mean: TtDays | null;
  readonly kepler: TtDays | null;
}

/** refined − estimate, days. */
export interface Residuals {
  readonly mean: number | null;
  readonly kepler: number | null;
}

export interface Interval {
  readonly from: TtDays;
  readonly to: TtDays;
  /** What holds throughout, in words: "within 0.01 magnitude of the maximum". */
  readonly meaning: string;
}

export type Circumstances = SingleCircumstances | PairCircumstances | HeliocentricCircumstances;

/** What is true of a planet in the Earth's sky at an instant. */
export interface BodyCircumstances {
  readonly body: SkyPlanet;
  /** Light-time distance from the Earth's centre. */
  readonly distanceAu: number;
  readonly distanceKm: number;
  readonly lightMinutes: number;
  readonly heliocentricDistanceAu: number;
  /** True angle from the Sun, apparent. */
  readonly elongationDeg: number;
  /** East of the Sun: the evening sky; west: the morning sky. */
  readonly elongationSide: 'east' | 'west';
  /** Sun–planet–Earth along the light, without aberration. */
  readonly phaseAngleDeg: number;
  /** 0 … 1. */
  readonly illuminatedFraction: number;
  /** Visual, Mallama & Hilton (2018), Mars averaged over its rotation (−0.06 to +0.05); null where they do not reach. */
  readonly magnitude: number | null;
  /** Apparent equatorial diameter. */
  readonly diameterArcsec: number;
  /** Saturn: latitude of the Earth above the ring plane, north positive. */
  readonly ringTiltDeg?: number;
  /** IAU constellation, Latin nominative. */
  readonly constellation: string;
  /** Astrometric: light-time only, no aberration, axes of J2000.0; what star catalogues compare with. */
  readonly rightAscensionJ2000Hours: number;
  readonly declinationJ2000Deg: number;
  readonly rightAscensionOfDateHours: number;
  readonly declinationOfDateDeg: number;
  /** Apparent, true ecliptic and equinox of date. */
  readonly eclipticLongitudeDeg: number;
  readonly eclipticLatitudeDeg: number;
}

export interface SingleCircumstances extends BodyCircumstances {
  readonly about: 'one-body';
  /** Oppositions and closest approaches of Mars: how near it comes among its neighbours. */
  readonly closeness?: Closeness;
  /** Perihelia and aphelia whose distance turns more than once because the Sun swings too: its lesser turns. */
  readonly localExtremes?: readonly LocalExtreme[];
}

export interface LocalExtreme {
  readonly utc: UtcMillis;
  readonly heliocentricDistanceAu: number;
}

export interface Closeness {
  /** 1 is the nearest of the `of` approaches compared. */
  readonly rank: number;
  readonly of: number;
  readonly yearFrom: number;
  readonly yearTo: number;
  /** In words: "the closest since 2018 and until 2035". */
  readonly phrase: string;
}

export interface PairCircumstances {
  readonly about: 'two-bodies';
  readonly separationDeg: number;
  /** Of the second body seen from the first, from north through east, true equator of date. */
  readonly positionAngleDeg: number;
  /** The smaller of the two elongations from the Sun. */
  readonly leastElongationDeg: number;
  readonly bodies: readonly [BodyCircumstances, BodyCircumstances];
}

export interface HeliocentricCircumstances {
  readonly about: 'heliocentric';
  /** The angle between the two planets as seen from the Sun's centre. */
  readonly separationDeg: number;
  readonly bodies: readonly [HeliocentricPlace, HeliocentricPlace];
}

export interface HeliocentricPlace {
  readonly body: Planet;
  /** Geometric, true ecliptic and equinox of date. */
  readonly heliocentricLongitudeDeg: number;
  readonly heliocentricLatitudeDeg: number;
  readonly heliocentricDistanceAu: number;
}

/** One approach of two bodies on the sky: its moments kept together. Any of them may be missing. */
export interface Meeting {
  /** `meeting.venus-jupiter.+27.a`. */
  readonly id: string;
  readonly bodies: readonly [SkyPlanet, SkyPlanet];
  readonly cycle: number;
  readonly series: Series | null;
  /** Ids of the events that belong to it, in order of time: none, one, or two of a grazing pair of each reckoning. */
  readonly conjunctionsRa: readonly string[];
  readonly conjunctionsLongitude: readonly string[];
  readonly appulse: string | null;
  /** A least separation or least difference without a conjunction. */
  readonly grazing: boolean;
  /** The least separation reached in it, and when. */
  readonly leastSeparationDeg: number;
  readonly closestTt: TtDays;
  /** Both bodies at least 15° from the Sun at that instant. */
  readonly observable: boolean;
}

/** Everything that one run of the forecast found, in order of time. */
export interface Forecast {
  readonly from: UtcMillis;
  readonly to: UtcMillis;
  readonly source: SourceNote;
  /** The planets asked for: every event concerns one of them. */
  readonly bodies: readonly Planet[];
  readonly events: readonly ForecastEvent[];
  readonly meetings: readonly Meeting[];
}

export interface SourceNote {
  readonly name: string;
  readonly description: string;
}
