import type { Body, Planet } from '../bodies/index.js';
import type { Accuracy } from '../ephemeris/index.js';
import { RADIANS_PER_ARCSEC, dot } from '../math/index.js';
import type { Jet } from '../math/index.js';
import { SECONDS_PER_DAY } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import type { SkyModel } from './signal.js';
import { relativeDirection } from './signal.js';

/** How far the source may be off in a signal's value and rate: 95 % half-widths in the signal's own units. */
export interface ErrorOfSignal {
  readonly value: number;
  readonly rate: number;
}

/** What the errors of a kind's signal are, from the accuracy of the source for each body. */
export type SignalErrors = (
  accuracyOf: (body: Body) => Accuracy,
  sky: SkyModel,
  subject: readonly [Planet] | readonly [Planet, Planet],
  jet: Jet,
  tt: TtDays,
) => ErrorOfSignal;

/** Difference of the longitudes of two bodies, or of one and the Sun. */
export const differenceErrors: SignalErrors = (accuracyOf, _sky, [a, b]) => {
  const first = accuracyOf(a);
  const second = accuracyOf(b ?? 'sun');
  return {
    value: Math.hypot(first.directionArcsec, second.directionArcsec) * RADIANS_PER_ARCSEC,
    rate: Math.hypot(first.directionRateArcsecPerDay, second.directionRateArcsecPerDay) * RADIANS_PER_ARCSEC,
  };
};

export const ownLongitudeErrors: SignalErrors = (accuracyOf, _sky, [planet]) => ({
  value: accuracyOf(planet).directionArcsec * RADIANS_PER_ARCSEC,
  rate: accuracyOf(planet).directionRateArcsecPerDay * RADIANS_PER_ARCSEC,
});

/** Of half the squared chord d²/2: its rate d·v is off by |d|·(error of v) and |v|·(error of d). */
export const separationErrors: SignalErrors = (accuracyOf, sky, subject, jet, tt) => {
  const difference = differenceErrors(accuracyOf, sky, subject, jet, tt);
  const [a, b] = subject;
  const { position, velocity } = relativeDirection(
    sky.geocentric(a, 'equator-of-date', tt),
    sky.geocentric(b ?? 'sun', 'equator-of-date', tt),
  );
  const chord = Math.sqrt(dot(position, position));
  const speed = Math.sqrt(dot(velocity, velocity));
  return {
    value: chord * difference.value,
    rate: Math.hypot(chord * difference.rate, speed * difference.value),
  };
};

/** Of half the squared distance: its rate is distance × rate of distance. */
export const distanceErrors: SignalErrors = (accuracyOf, _sky, [planet], jet) => ({
  value: 0,
  rate: Math.sqrt(2 * jet.value) * accuracyOf(planet).distanceRateAuPerDay,
});

export const heliocentricDistanceErrors: SignalErrors = (accuracyOf, _sky, [planet], jet) => ({
  value: 0,
  rate: Math.sqrt(2 * jet.value) * accuracyOf(planet).heliocentricDistanceRateAuPerDay,
});

export const heliocentricDifferenceErrors: SignalErrors = (accuracyOf, _sky, [a, b]) => ({
  value:
    Math.hypot(accuracyOf(a).heliocentricArcsec, b === undefined ? 0 : accuracyOf(b).heliocentricArcsec) *
    RADIANS_PER_ARCSEC,
  rate: 0,
});

export interface Timing {
  /** 95 % half-width, seconds of TT. */
  readonly seconds: number;
  /** Whether the event happens at all, whatever the error. */
  readonly certain: boolean;
}

/**
 * How far a zero can move when the signal is off by `valueError`: the half-width of |s| ≤ error about it, with the
 * signal followed to second order. Where the signal turns back before it has left the error band, the two zeros of
 * a grazing pair cannot be told apart, and another ephemeris may have neither.
 */
export function zeroTiming({ rate, acceleration }: Jet, valueError: number): Timing {
  const r = Math.abs(rate);
  const a = Math.abs(acceleration);
  const certain = r * r > 2 * a * valueError;
  // The smaller root of r·t − a·t²/2 = error, written so that a → 0 is harmless; beyond the turn, the far side.
  const days = certain
    ? (2 * valueError) / (r + Math.sqrt(r * r - 2 * a * valueError))
    : (r + Math.sqrt(r * r + 2 * a * valueError)) / a;
  return { seconds: days * SECONDS_PER_DAY, certain };
}

/** How far a turning point can move when the signal's rate is off by `rateError`. */
export function turnTiming({ acceleration }: Jet, rateError: number): Timing {
  return { seconds: (rateError / Math.abs(acceleration)) * SECONDS_PER_DAY, certain: true };
}
