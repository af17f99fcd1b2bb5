import { describe, expect, it } from 'vitest';
import { uranusGraphicLatitudeDeg, viewerLatitudeDeg } from '../../../../src/forecast/circumstances/poles.js';
import { RADIANS_PER_DEGREE, scale, unitVector } from '../../../../src/math/index.js';
import { ttDays } from '../../../../src/time/index.js';

const saturnPole = unitVector(40.589 * RADIANS_PER_DEGREE, 83.537 * RADIANS_PER_DEGREE);

describe('latitudes on a planet', () => {
  it('is 90° north for a viewer above the north pole, who looks against it', () => {
    expect(viewerLatitudeDeg('saturn', scale(saturnPole, -9.5), ttDays(0))).toBeCloseTo(90, 5);
    expect(viewerLatitudeDeg('saturn', scale(saturnPole, 9.5), ttDays(0))).toBeCloseTo(-90, 5);
  });

  it('is 0 for a viewer in the plane of the equator', () => {
    const inPlane = { x: -saturnPole.y, y: saturnPole.x, z: 0 };
    expect(viewerLatitudeDeg('saturn', inPlane, ttDays(0))).toBeCloseTo(0, 12);
  });

  it('grows on the flattened Uranus, by 1.33° at 45°, and keeps poles, equator and sign', () => {
    // tan φ′ = tan φ · (25,559 km / 24,973 km)², radii of Archinal et al. (2018).
    const steeper = (Math.atan((25_559 / 24_973) ** 2) * 180) / Math.PI;
    expect(steeper).toBeCloseTo(46.33, 2);
    expect(uranusGraphicLatitudeDeg(45)).toBeCloseTo(steeper, 4);
    expect(uranusGraphicLatitudeDeg(-45)).toBeCloseTo(-steeper, 4);
    expect(uranusGraphicLatitudeDeg(0)).toBe(0);
    expect(uranusGraphicLatitudeDeg(90)).toBeCloseTo(90, 9);
  });
});
