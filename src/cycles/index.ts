export { anomalisticCycle, heliocentricCycle, pairCycle, sunCycle } from './configurations.js';
export type { PairCycle, SunConfiguration } from './configurations.js';
export { keplerTableFor, meanElements } from './elements.js';
export type { ElementTable, MeanElements } from './elements.js';
export { eccentricAnomaly, keplerMotion } from './kepler.js';
export type { OrbitalMotion } from './kepler.js';
export { cycleNumberAt, cyclesOverlapping, meanInstant, stretchOf } from './mean-cycle.js';
export type { MeanCycle } from './mean-cycle.js';
