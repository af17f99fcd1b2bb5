export { KM_PER_AU, bodyCircumstances } from './body-circumstances.js';
export { closenessOf } from './closeness.js';
export type { Approach } from './closeness.js';
export { venusMagnitude } from './magnitude.js';
export type { Illumination } from './magnitude.js';
export { heliocentricCircumstances, pairCircumstances } from './pair-circumstances.js';
export type { SkyGeometry } from './sky-geometry.js';
