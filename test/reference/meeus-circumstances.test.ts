import { describe, expect, it } from 'vitest';
import { bodyCircumstances } from '../../src/forecast/circumstances/index.js';
import { viewerLatitudeDeg } from '../../src/forecast/circumstances/poles.js';
import { ttDays } from '../../src/time/index.js';
import { librarySky, ttOfJd } from '../unit/forecast/circumstances/library-sky.js';

/** Worked examples of Meeus, Astronomical Algorithms, 2nd ed. (Willmann-Bell 1998). */
describe("Meeus's worked circumstances", () => {
  it('Venus 1992 December 20: lit to 0.647, phase angle 72.96° (example 41.a)', () => {
    const told = bodyCircumstances('venus', ttOfJd(2448976.5), librarySky);
    // Printed to 0.001 and 0.01°; half a unit of each, and 0.001° for the library's place.
    expect(Math.abs(told.illuminatedFraction - 0.647)).toBeLessThan(0.0005);
    expect(Math.abs(told.phaseAngleDeg - 72.96)).toBeLessThan(0.006);
  });

  it("Saturn's rings 1992 December 16: B 16.442°, B′ 14.679° (example 45.a)", () => {
    const tt = ttOfJd(2448972.5);
    const told = bodyCircumstances('saturn', tt, librarySky);
    // His ring plane leans by 28.0752° to the ecliptic of J2000.0, that of the IAU pole by 28.0522°: of these 0.023°,
    // 0.0034° show at this longitude in B and 0.0022° in B′.
    const POLES_DEG = 0.005;
    expect(Math.abs(told.ringTiltDeg! - 16.442)).toBeLessThan(POLES_DEG);
    const lit = librarySky.heliocentric('saturn', ttDays(tt - told.lightMinutes / 1440));
    expect(Math.abs(viewerLatitudeDeg('saturn', lit, tt) - 14.679)).toBeLessThan(POLES_DEG);
  });

  it('Mercury west of the Sun on 1993 November 22: 19.7506°', () => {
    const told = bodyCircumstances('mercury', ttOfJd(2449314.14), librarySky);
    // His angle is of a series for the instant and the angle; the library is good to 9″ in Mercury.
    expect(Math.abs(told.elongationDeg - 19.7506)).toBeLessThan(0.0025);
    expect(told.elongationSide).toBe('west');
  });
});
