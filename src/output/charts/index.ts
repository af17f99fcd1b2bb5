export { CloseUp } from './close-up.js';
export { OcStems } from './oc-stems.js';
export { SeasonRibbons } from './season-ribbons.js';
export { SurenessStrip } from './sureness-strip.js';
