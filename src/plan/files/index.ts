export { MANIFEST_NAME, MANIFEST_SCHEMA } from './manifest.js';
export type { OutputFile } from './manifest.js';
export { OutputError } from './output-error.js';
export { readyFolder, writeOutputs } from './write-outputs.js';
export { inChunks, writeWhole } from './write-whole.js';
