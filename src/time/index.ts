export * from './instants.js';
