import { describe, expect, it } from 'vitest';
import {
  angleBetween,
  rotate,
  sphericalOf,
  transpose,
  unitVector,
  wrapPi,
  wrapTwoPi,
} from '../../../src/math/index.js';
import type { Rotation } from '../../../src/math/index.js';

describe('vectors and angles', () => {
  it('measures tiny and nearly opposite angles without loss', () => {
    const a = unitVector(1, 0.2);
    expect(angleBetween(a, unitVector(1 + 1e-9, 0.2))).toBeCloseTo(1e-9 * Math.cos(0.2), 15);
    expect(angleBetween(a, unitVector(1 + Math.PI, -0.2))).toBeCloseTo(Math.PI, 12);
  });

  it('turns a vector and back', () => {
    const turn: Rotation = [
      { x: 0, y: -1, z: 0 },
      { x: 1, y: 0, z: 0 },
      { x: 0, y: 0, z: 1 },
    ];
    const v = { x: 1, y: 2, z: 3 };
    expect(rotate(turn, v)).toEqual({ x: -2, y: 1, z: 3 });
    expect(rotate(transpose(turn), rotate(turn, v))).toEqual(v);
  });

  it('gives longitude, latitude and distance', () => {
    const { longitude, latitude, distance } = sphericalOf({ x: 0, y: -2, z: 2 });
    expect([longitude, latitude, distance]).toEqual([-Math.PI / 2, Math.PI / 4, Math.sqrt(8)]);
  });

  it.each([
    [0, 0, 0],
    [-0.5, 2 * Math.PI - 0.5, -0.5],
    [Math.PI, Math.PI, Math.PI],
    [7, 7 - 2 * Math.PI, 7 - 2 * Math.PI],
  ])('wraps %d', (angle, twoPi, pi) => {
    expect(wrapTwoPi(angle)).toBeCloseTo(twoPi, 14);
    expect(wrapPi(angle)).toBeCloseTo(pi, 14);
  });
});
