import {
  Body,
  GeoVector,
  RotateVector,
  Rotation_EQJ_EQD,
  Rotation_EQJ_ECT,
  AstroTime,
} from 'astronomy-engine';
import { describe, expect, it } from 'vitest';
import { brightLimbAngle } from '../../../../src/output/charts/bright-limb.js';

const DEGREES = 180 / Math.PI;

interface Place {
  readonly longitude: number;
  readonly latitude: number;
}

const placeIn = (rotation: ReturnType<typeof Rotation_EQJ_EQD>, body: Body, time: AstroTime): Place => {
  const { x, y, z } = RotateVector(rotation, GeoVector(body, time, true));
  return { longitude: Math.atan2(y, x), latitude: Math.atan2(z, Math.hypot(x, y)) };
};

/** Position angle of `to` seen from `from`, by the four-parts formula of spherical trigonometry. */
const positionAngle = (from: Place, to: Place): number =>
  Math.atan2(
    Math.sin(to.longitude - from.longitude),
    Math.tan(to.latitude) * Math.cos(from.latitude) -
      Math.sin(from.latitude) * Math.cos(to.longitude - from.longitude),
  );

describe('the bright limb', () => {
  it.each([
    ['Venus', '2028-02-11'],
    ['Venus', '2028-08-10'],
    ['Mercury', '2027-05-28'],
    ['Mercury', '2027-11-04'],
    ['Mars', '2027-06-15'],
    ['Jupiter', '2028-06-10'],
  ] as const)('of %s on %s turns to the Sun', (name, date) => {
    const time = new AstroTime(new Date(`${date}T00:00:00Z`));
    const [equator, ecliptic] = [Rotation_EQJ_EQD(time), Rotation_EQJ_ECT(time)];
    const [here, sun] = [placeIn(equator, Body[name], time), placeIn(equator, Body.Sun, time)];
    const [body, sunOnEcliptic] = [placeIn(ecliptic, Body[name], time), placeIn(ecliptic, Body.Sun, time)];
    const ahead = Math.sin(body.longitude - sunOnEcliptic.longitude);
    const elongation = Math.acos(
      Math.sin(body.latitude) * Math.sin(sunOnEcliptic.latitude) +
        Math.cos(body.latitude) *
          Math.cos(sunOnEcliptic.latitude) *
          Math.cos(body.longitude - sunOnEcliptic.longitude),
    );
    const angle = brightLimbAngle({
      elongationDeg: elongation * DEGREES,
      elongationSide: ahead > 0 ? 'east' : 'west',
      eclipticLongitudeDeg: body.longitude * DEGREES,
      eclipticLatitudeDeg: body.latitude * DEGREES,
    });
    const off = Math.abs(
      Math.atan2(Math.sin(angle - positionAngle(here, sun)), Math.cos(angle - positionAngle(here, sun))),
    );
    // The obliquity is that of J2000.0 and nutation is left out: some hundredths of a degree, of which nobody draws one.
    expect(off * DEGREES).toBeLessThan(0.1);
  });

  it('has an angle where the Sun is in line', () => {
    const angle = brightLimbAngle({
      elongationDeg: 0.5,
      elongationSide: 'west',
      eclipticLongitudeDeg: 10,
      eclipticLatitudeDeg: 0.6,
    });
    expect(Number.isFinite(angle)).toBe(true);
  });
});
