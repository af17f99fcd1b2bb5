export { ApparentPlaces, LIGHT_AU_PER_DAY } from './apparent.js';
export { rotationTo } from './frames.js';
export { geometryOf } from './geometry.js';
export type { Geometry } from './geometry.js';
export { librarySource, libraryTime } from './library.js';
export { longitudeOfMotion, rotateMotion, subtractMotions } from './motion.js';
export type { Frame, Motion, Paths } from './paths.js';
export type { Accuracy, EphemerisSource } from './source.js';
export { Tracks } from './tracks.js';
