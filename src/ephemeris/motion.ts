import { dot, rotate, subtract } from '../math/index.js';
import type { Jet, Rotation } from '../math/index.js';
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

/**
 * The longitude about the z axis of a point whose x and y are jets of some parameter, with its derivatives by time.
 * @param perDay what the parameter grows by in a day
 */
export function longitudeOf(x: Jet, y: Jet, perDay: number): Jet {
  const rho2 = x.value * x.value + y.value * y.value;
  const rho2Rate = 2 * (x.value * x.rate + y.value * y.rate);
  const rate = (x.value * y.rate - y.value * x.rate) / rho2;
  const acceleration = (x.value * y.acceleration - y.value * x.acceleration - rate * rho2Rate) / rho2;
  return {
    value: Math.atan2(y.value, x.value),
    rate: rate * perDay,
    acceleration: acceleration * perDay * perDay,
  };
}

/** The longitude of a motion on turned axes that are taken as fixed at the instant. */
export function longitudeOfMotion({ position, velocity, acceleration }: Motion, axes: Rotation): Jet {
  const x = axes[0];
  const y = axes[1];
  return longitudeOf(
    { value: dot(x, position), rate: dot(x, velocity), acceleration: dot(x, acceleration) },
    { value: dot(y, position), rate: dot(y, velocity), acceleration: dot(y, acceleration) },
    1,
  );
}
