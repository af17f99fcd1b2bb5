import { describe, expect, it } from 'vitest';
import { refractionDeg } from '../../../src/sky/index.js';

describe('refractionDeg', () => {
  it('is about 34′ where a body stands on the apparent horizon; common practice', () => {
    expect(Math.abs((-34 / 60 + refractionDeg(-34 / 60)) * 60)).toBeLessThan(1);
  });

  it('never changes the order of two altitudes, vanishes at zenith and nadir and is never negative', () => {
    let before = -Infinity;
    for (let altitudeDeg = -90; altitudeDeg <= 90; altitudeDeg += 0.01) {
      const bend = refractionDeg(altitudeDeg);
      expect(bend).toBeGreaterThanOrEqual(0);
      expect(altitudeDeg + bend).toBeGreaterThan(before);
      before = altitudeDeg + bend;
    }
    expect(refractionDeg(90)).toBeLessThan(1e-4);
    expect(refractionDeg(-90)).toBeCloseTo(0, 12);
  });

  it('has no step where the formula ends', () => {
    expect(refractionDeg(-1.000001)).toBeCloseTo(refractionDeg(-0.999999), 5);
  });
});
