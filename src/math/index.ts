export * from './angle.js';
export * from './chebyshev.js';
export * from './roots.js';
export * from './vector.js';
