import { LIGHT_AU_PER_DAY } from '../ephemeris/index.js';
import { angleBetween, bracketedRoot, degreesFromRadians, length, scale, subtract } from '../math/index.js';
import { ttDays } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import type { Interval } from './event.js';
import { venusMagnitude } from './circumstances/index.js';
import type { Illumination } from './circumstances/index.js';
import type { Signal, SkyModel } from './signal.js';
import type { SignalErrors } from './uncertainty.js';

/** Half the base of the differences that give the magnitude's derivatives: hours, on a curve that takes weeks. */
const DIFFERENCE_STEP_DAYS = 0.05;
/** A maximum of brightness is no sharper than the last printed digit of a magnitude: half of 0.01. */
const LEVEL_MAGNITUDES = 0.005;
/** No plateau is longer than this on either side. */
const PLATEAU_REACH_DAYS = 15;

/** Venus, as the light shows it to the Earth: where it was the light-time ago. */
function venusLight(sky: SkyModel, tt: TtDays): Illumination {
  const venus = sky.heliocentric('venus', tt);
  const earth = sky.heliocentric('earth', tt).position;
  const lightTimeDays = length(subtract(venus.position, earth)) / LIGHT_AU_PER_DAY;
  const fromSun = subtract(venus.position, scale(venus.velocity, lightTimeDays));
  const fromEarth = subtract(fromSun, earth);
  const [sunDistanceAu, earthDistanceAu] = [length(fromSun), length(fromEarth)];
  return { sunDistanceAu, earthDistanceAu, phaseDeg: degreesFromRadians(angleBetween(fromSun, fromEarth)) };
}

export const phaseAngleOfVenusDeg = (sky: SkyModel, tt: TtDays): number => venusLight(sky, tt).phaseDeg;

const magnitudeAt = (sky: SkyModel, tt: TtDays): number => venusMagnitude(venusLight(sky, tt));

/** The magnitude of Venus; its minima are the greatest brilliancies. */
export function magnitudeSignal(sky: SkyModel): Signal {
  const h = DIFFERENCE_STEP_DAYS;
  return (tt) => {
    const before = magnitudeAt(sky, ttDays(tt - h));
    const value = magnitudeAt(sky, tt);
    const after = magnitudeAt(sky, ttDays(tt + h));
    return { value, rate: (after - before) / (2 * h), acceleration: (after - 2 * value + before) / (h * h) };
  };
}

/** The time in which the parabola through the maximum leaves its level: that is how well the instant can be known. */
export const brilliancyErrors: SignalErrors = (_accuracyOf, _sky, _subject, { acceleration }) => ({
  value: LEVEL_MAGNITUDES,
  rate: Math.sqrt(2 * LEVEL_MAGNITUDES * Math.abs(acceleration)),
});

/** The days about a maximum in which the magnitude is within half of 0.01 of it. */
export function brilliancyPlateau(sky: SkyModel, tt: TtDays): Interval {
  const edge = magnitudeAt(sky, tt) + LEVEL_MAGNITUDES;
  const leaves = (at: number): number => magnitudeAt(sky, ttDays(at)) - edge;
  return {
    from: ttDays(bracketedRoot(leaves, tt - PLATEAU_REACH_DAYS, tt, 1e-4)),
    to: ttDays(bracketedRoot(leaves, tt, tt + PLATEAU_REACH_DAYS, 1e-4)),
    meaning: 'within 0.005 magnitude of the greatest brilliancy',
  };
}
