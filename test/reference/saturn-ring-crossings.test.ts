import { describe, expect, it } from 'vitest';
import { bodyCircumstances } from '../../src/forecast/circumstances/index.js';
import { viewerLatitudeDeg } from '../../src/forecast/circumstances/poles.js';
import { ttFromUtc, utcMillis } from '../../src/time/index.js';
import type { TtDays } from '../../src/time/index.js';
import { librarySky } from '../unit/forecast/circumstances/library-sky.js';

/**
 * The days on which the Earth and the Sun passed through the plane of Saturn's rings, as the almanacs gave them
 * (*from memory*). The tilt changes by 0.03° a day or more; the pole is known to 0.005°, so a day either way shows.
 */
const on = (date: string, plusDays: number): TtDays =>
  ttFromUtc(utcMillis(Date.parse(`${date}T12:00:00Z`) + plusDays * 86_400_000));
const earthTilt = (tt: TtDays): number => bodyCircumstances('saturn', tt, librarySky).ringTiltDeg!;
const sunTilt = (tt: TtDays): number =>
  viewerLatitudeDeg('saturn', librarySky.heliocentric('saturn', tt), tt);

describe("passages through the plane of Saturn's rings", () => {
  it.each([
    ['1995-05-22', 'southward'],
    ['1995-08-10', 'northward'],
    ['1996-02-11', 'southward'],
    ['2009-09-04', 'northward'],
    ['2025-03-23', 'southward'],
  ] as const)('the Earth on %s, %s', (date, way) => {
    const sense = way === 'northward' ? 1 : -1;
    expect(Math.sign(earthTilt(on(date, -1)))).toBe(-sense);
    expect(Math.sign(earthTilt(on(date, 1)))).toBe(sense);
  });

  it.each([
    ['2009-08-11', 'northward'],
    ['2025-05-06', 'southward'],
  ] as const)('the Sun on %s, %s', (date, way) => {
    const sense = way === 'northward' ? 1 : -1;
    expect(Math.sign(sunTilt(on(date, -1)))).toBe(-sense);
    expect(Math.sign(sunTilt(on(date, 1)))).toBe(sense);
  });

  it('the northern face was widest open in October 2017, at 27.0°', () => {
    expect(Math.abs(earthTilt(on('2017-10-16', 0)) - 27)).toBeLessThan(0.05);
  });
});
