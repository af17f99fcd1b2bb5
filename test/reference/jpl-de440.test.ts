import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { planets } from '../../src/bodies/index.js';
import type { Body, Planet } from '../../src/bodies/index.js';
import { librarySource } from '../../src/ephemeris/index.js';
import { arcsecFromRadians, sphericalOf, subtract, wrapPi } from '../../src/math/index.js';
import type { Vector } from '../../src/math/index.js';
import { ttDays } from '../../src/time/index.js';

/** Judge: JPL DE440 on 41 instants from 1600 to 2599; source and script in the file. */
const { samples } = JSON.parse(readFileSync(new URL('jpl-de440.json', import.meta.url), 'utf8')) as {
  samples: readonly { tt: number; heliocentricAu: readonly (readonly [number, number, number])[] }[];
};

/** In right ascension as an arc on the sky, geocentric and geometric, arcseconds. */
function errorsOf(body: Exclude<Body, 'earth'>): readonly number[] {
  return samples.map(({ tt, heliocentricAu }) => {
    const truthOf = (planet: Planet): Vector => {
      const [x, y, z] = heliocentricAu[planets.indexOf(planet)]!;
      return { x, y, z };
    };
    const sun: Vector = { x: 0, y: 0, z: 0 };
    const ours = body === 'sun' ? sun : librarySource.heliocentric(body, ttDays(tt));
    const truth = body === 'sun' ? sun : truthOf(body);
    const seen = subtract(ours, librarySource.heliocentric('earth', ttDays(tt)));
    const real = subtract(truth, truthOf('earth'));
    const [a, b] = [sphericalOf(seen), sphericalOf(real)];
    const arc = wrapPi(a.longitude - b.longitude) * Math.cos(b.latitude);
    return Math.abs(arcsecFromRadians(arc));
  });
}

describe('the library source against JPL DE440', () => {
  const seen = ['sun', ...planets.filter((planet) => planet !== 'earth')] as const;

  it('dropped no sample', () => {
    expect(samples).toHaveLength(41);
    expect(samples.every(({ heliocentricAu }) => heliocentricAu.length === planets.length)).toBe(true);
    expect([samples[0]!.tt, samples.at(-1)!.tt]).toEqual([-146_000, 219_000]);
  });

  it.each(seen)('sees %s in right ascension within the stated half-width', (body) => {
    const { directionArcsec } = librarySource.accuracy(body);
    const errors = errorsOf(body);
    // 95 % inside means two of 41 outside on average; more than five would be a chance of 1 in 60.
    expect(errors.filter((arcsec) => arcsec > directionArcsec).length).toBeLessThanOrEqual(5);
    expect(Math.max(...errors)).toBeLessThan(3 * directionArcsec);
    // And the stated width is not a comfortable one: somewhere at least a quarter of it is reached.
    expect(Math.max(...errors)).toBeGreaterThan(directionArcsec / 4);
  });
});
