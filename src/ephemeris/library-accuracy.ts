import { bodies } from '../bodies/index.js';
import type { Body } from '../bodies/index.js';
import type { Accuracy } from './source.js';
const a: Accuracy = {
  directionArcsec: 6,
  directionRateArcsecPerDay: 0.3,
  distanceRateAuPerDay: 1e-6,
  heliocentricArcsec: 6,
  heliocentricDistanceRateAuPerDay: 1e-7,
};
export const libraryAccuracy = Object.fromEntries(bodies.map((b) => [b, a])) as Record<Body, Accuracy>;
