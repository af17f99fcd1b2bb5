import type { SkyPlanet } from '../bodies/index.js';

interface DarknessNeeded {
  /**
   * The darkest sky that must be waited for: `bright` twilight shows only what outshines it, from the end of `civil`
   * twilight the other naked-eye planets show, from the end of `nautical` twilight those for the telescope. Common
   * practice.
   */
  readonly sky: 'bright' | 'civil' | 'nautical';
  /**
   * How far below the planet the Sun must be, in altitude, for the naked eye to pick the planet out of the twilight:
   * the arcus visionis, the mean of its values for first and last visibility. Telescopic planets wait for the dark.
   * Source: C. Schoch, in Langdon & Fotheringham, The Venus Tablets of Ammizaduga (1928).
   */
  readonly arcusVisionisDeg: number;
}

export const darknessNeeded: Readonly<Record<SkyPlanet, DarknessNeeded>> = {
  mercury: { sky: 'civil', arcusVisionisDeg: 11 },
  venus: { sky: 'bright', arcusVisionisDeg: 5.7 },
  mars: { sky: 'civil', arcusVisionisDeg: 13.9 },
  jupiter: { sky: 'bright', arcusVisionisDeg: 8.4 },
  saturn: { sky: 'civil', arcusVisionisDeg: 11.5 },
  uranus: { sky: 'nautical', arcusVisionisDeg: 0 },
  neptune: { sky: 'nautical', arcusVisionisDeg: 0 },
  pluto: { sky: 'nautical', arcusVisionisDeg: 0 },
};

/** Whether all of some planets outshine a bright twilight. */
export const outshineTwilight = (bodies: readonly SkyPlanet[]): boolean =>
  bodies.every((body) => darknessNeeded[body].sky === 'bright');
