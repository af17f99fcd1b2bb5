import { rotate, subtract } from '../math/index.js';
import type { Rotation } from '../math/index.js';
import type { Motion } from './paths.js';

/** A motion on axes that are taken as fixed at the instant. */
export const rotateMotion = (rotation: Rotation, motion: Motion): Motion => ({
  position: rotate(rotation, motion.position),
  velocity: rotate(rotation, motion.velocity),
  acceleration: rotate(rotation, motion.acceleration),
});

export const subtractMotions = (a: Motion, b: Motion): Motion => ({
  position: subtract(a.position, b.position),
  velocity: subtract(a.velocity, b.velocity),
  acceleration: subtract(a.acceleration, b.acceleration),
});
