import type { BodyCircumstances } from '../../forecast/index.js';

const RADIANS = Math.PI / 180;
/** Obliquity of the ecliptic, mean of J2000.0 (IAU 2006). It changes by 0.13° in ten centuries, less than a picture shows. */
const OBLIQUITY = 23.4393 * RADIANS;

type Place = Pick<
  BodyCircumstances,
  'elongationDeg' | 'elongationSide' | 'eclipticLongitudeDeg' | 'eclipticLatitudeDeg'
>;

/**
 * The position angle of the Sun as seen from a body, where its bright limb is, radians from north through east. The Sun
 * is found from the body's elongation, since it stands on the ecliptic. Good to about a degree, for drawing.
 */
export function brightLimbAngle(body: Place): number {
  const latitude = body.eclipticLatitudeDeg * RADIANS;
  const longitude = body.eclipticLongitudeDeg * RADIANS;
  const ahead = Math.acos(clamped(Math.cos(body.elongationDeg * RADIANS) / Math.cos(latitude)));
  const sun = equatorial(body.elongationSide === 'east' ? longitude - ahead : longitude + ahead, 0);
  const here = equatorial(longitude, latitude);
  const turn = sun.rightAscension - here.rightAscension;
  return Math.atan2(
    Math.cos(sun.declination) * Math.sin(turn),
    Math.sin(sun.declination) * Math.cos(here.declination) -
      Math.cos(sun.declination) * Math.sin(here.declination) * Math.cos(turn),
  );
}

function equatorial(longitude: number, latitude: number): { rightAscension: number; declination: number } {
  const [sinL, cosL] = [Math.sin(longitude), Math.cos(longitude)];
  const [sinE, cosE] = [Math.sin(OBLIQUITY), Math.cos(OBLIQUITY)];
  return {
    rightAscension: Math.atan2(sinL * cosE - Math.tan(latitude) * sinE, cosL),
    declination: Math.asin(clamped(Math.sin(latitude) * cosE + Math.cos(latitude) * sinE * sinL)),
  };
}

const clamped = (value: number): number => Math.max(-1, Math.min(1, value));
