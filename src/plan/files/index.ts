export { MANIFEST_NAME, MANIFEST_SCHEMA } from './manifest.js';
export type { OutputFile } from './manifest.js';
export { OutputError, writeOutputs } from './write-outputs.js';
export { writeWhole } from './write-whole.js';
