export { MOST_WITHIN_DEG } from './limits.js';
export { didYouMean, nearestName, oneOf } from './nearest-name.js';
export { quoted } from './quoted.js';
export { readInstant } from './read-instant.js';
export type { Reading } from './read-instant.js';
export { readBody, readKind, readPlanet, readZone } from './read-names.js';
