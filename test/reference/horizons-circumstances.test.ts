import { describe, expect, it } from 'vitest';
import type { SkyPlanet } from '../../src/bodies/index.js';
import { bodyCircumstances } from '../../src/forecast/circumstances/index.js';
import { ttFromUtc, utcMillis } from '../../src/time/index.js';
import { librarySky } from '../unit/forecast/circumstances/library-sky.js';

/**
 * Circumstances printed by JPL Horizons, read in the tests of general libraries. The places come from
 * astronomy-engine, whose own errors these tolerances allow for; what is judged here is what we make of them.
 */
const on = (date: string) => ttFromUtc(utcMillis(Date.parse(`${date}T00:00:00Z`)));

/**
 * Date (0 h UT), distance from the Sun and from the Earth (au), phase angle (degrees). Horizons prints magnitudes
 * too, but these rows were made before it took up the formulae of Mallama & Hilton: its Neptune is 0.13 fainter.
 */
const nearest: readonly [SkyPlanet, string, number, number, number][] = [
  ['mars', '2012-03-05', 1.664349768043, 0.67373388770543, 2.6578],
  ['mars', '2014-04-14', 1.617262394774, 0.6175945438203, 4.5497],
  ['mars', '2016-05-31', 1.510638416731, 0.50322369920795, 7.5339],
  ['mars', '2018-08-01', 1.396708281636, 0.38499875432607, 6.3798],
  ['mars', '2020-10-07', 1.410157333819, 0.41492231438136, 6.8785],
  ['mars', '2022-12-02', 1.526300515952, 0.54454701099014, 5.7773],
  ['mars', '2029-03-30', 1.642759019602, 0.64725096612776, 4.3562],
  ['jupiter', '2010-09-20', 4.957786140014, 3.95404849923145, 0.4689],
  ['jupiter', '2011-10-27', 4.962973955745, 3.96984594011837, 0.5613],
  ['jupiter', '2012-12-02', 5.054166232396, 4.06855627597042, 0.2915],
  ['jupiter', '2014-01-04', 5.193278665924, 4.21051342462047, 0.4185],
  ['jupiter', '2016-03-08', 5.427791654336, 4.43543559889026, 0.2877],
  ['jupiter', '2017-04-08', 5.455919013518, 4.45502333390212, 0.2906],
  ['jupiter', '2018-05-11', 5.408970328761, 4.39986696784807, 0.4619],
  ['jupiter', '2021-08-21', 5.024635224821, 4.01329012761241, 0.3178],
  ['jupiter', '2024-12-07', 5.074444738073, 4.0894154770092, 0.24],
  ['jupiter', '2026-01-09', 5.214790278259, 4.23170341691611, 0.3064],
  ['jupiter', '2027-02-11', 5.347866908823, 4.36114030397283, 0.1949],
  ['jupiter', '2029-04-13', 5.45117743812, 4.44892347466957, 0.3305],
  ['uranus', '2010-09-20', 20.09212801278, 19.0882755777358, 0.1011],
  ['uranus', '2011-09-25', 20.08035039498, 19.0774704008458, 0.0695],
  ['uranus', '2012-09-29', 20.06292615761, 19.0613278417689, 0.0434],
  ['uranus', '2013-10-02', 20.04050713806, 19.0399987568472, 0.095],
  ['uranus', '2014-10-07', 20.01347166141, 19.0140809683596, 0.062],
  ['uranus', '2016-10-14', 19.9482192658, 18.9512072457594, 0.087],
  ['uranus', '2019-10-27', 19.82668680159, 18.8329342500503, 0.0807],
  ['uranus', '2020-10-31', 19.78025753891, 18.7876094648119, 0.0473],
  ['uranus', '2021-11-05', 19.73068156683, 18.7390903997641, 0.0222],
  ['uranus', '2022-11-10', 19.6776498233, 18.687314451076, 0.0334],
  ['uranus', '2023-11-13', 19.62124057078, 18.6315244655502, 0.0475],
  ['uranus', '2024-11-17', 19.56086327487, 18.5721825133809, 0.0183],
  ['uranus', '2025-11-22', 19.49720832932, 18.5094473649245, 0.0219],
  ['uranus', '2026-11-25', 19.43131524379, 18.4442419445044, 0.0575],
  ['uranus', '2027-11-30', 19.36321225982, 18.376826568112, 0.0278],
  ['uranus', '2028-12-04', 19.29401043789, 18.3084261244666, 0.002],
  ['uranus', '2029-12-09', 19.22440445832, 18.2394908983261, 0.0293],
  ['neptune', '2011-08-22', 30.00663033893, 28.995207282976, 0.0431],
  ['neptune', '2012-08-24', 29.99482268187, 28.9839116659649, 0.0317],
  ['neptune', '2014-08-28', 29.97236498813, 28.9625617031584, 0.0652],
  ['neptune', '2015-08-31', 29.96263928206, 28.9533520707443, 0.0526],
  ['neptune', '2017-09-05', 29.94689088209, 28.9387944629022, 0.0346],
  ['neptune', '2019-09-09', 29.93468471062, 28.9276685053642, 0.0616],
  ['neptune', '2020-09-11', 29.92881166479, 28.9223789937669, 0.0513],
  ['neptune', '2023-09-18', 29.90638227038, 28.9018419450003, 0.0705],
  ['neptune', '2024-09-20', 29.89699255598, 28.8931217416033, 0.0602],
  ['neptune', '2025-09-23', 29.88737780951, 28.8841355558391, 0.0522],
  ['neptune', '2026-09-26', 29.87817467511, 28.8757409167818, 0.0484],
  ['neptune', '2027-09-27', 29.86991830347, 28.8680437888377, 0.0778],
  ['neptune', '2028-09-29', 29.86282629045, 28.8616321024736, 0.0671],
  ['neptune', '2029-10-02', 29.85704456255, 28.8564976713027, 0.0589],
];

/** Set by the library's truncated series, at worst 3.5e-5, 2.5e-4, 5.0e-4 and 6.8e-4 here. */
const distanceToleranceAu: Partial<Record<SkyPlanet, number>> = {
  mars: 5e-5,
  jupiter: 3e-4,
  uranus: 6e-4,
  neptune: 8e-4,
};

/**
 * Horizons takes the angle between apparent directions, shifted by the aberration of the Earth (20.5″) and of the
 * planet (16.6″ for Mars, less farther out), together at most 0.0103°. Ours is the angle by which the light turned.
 */
const PHASE_TOLERANCE_DEG = 0.0105;

describe('distances and phase angles of Horizons', () => {
  it.each(nearest)('%s on %s', (body, date, sunDistanceAu, earthDistanceAu, phaseDeg) => {
    const told = bodyCircumstances(body, on(date), librarySky);
    const tolerance = distanceToleranceAu[body]!;
    expect(Math.abs(told.heliocentricDistanceAu - sunDistanceAu)).toBeLessThan(tolerance);
    expect(Math.abs(told.distanceAu - earthDistanceAu)).toBeLessThan(tolerance);
    expect(Math.abs(told.phaseAngleDeg - phaseDeg)).toBeLessThan(PHASE_TOLERANCE_DEG);
  });
});

describe('places of Horizons and of the U.S. Naval Observatory', () => {
  const hours = (h: number, m: number, s: number) => h + m / 60 + s / 3600;
  const degrees = (sign: 1 | -1, d: number, m: number, s: number) => sign * (d + m / 60 + s / 3600);
  /** 15″, the library's worst in this century; a wrong frame or a missing aberration would be 20″ to 1000″. */
  const PLACE_TOLERANCE_DEG = 15 / 3600;
  const expectHours = (got: number, expected: number) => {
    expect(Math.abs(got - expected) * 15).toBeLessThan(PLACE_TOLERANCE_DEG);
  };
  const expectDegrees = (got: number, expected: number) => {
    expect(Math.abs(got - expected)).toBeLessThan(PLACE_TOLERANCE_DEG);
  };

  it('gives J2000 as the astrometric place, of date as the apparent one: Mars 2003-12-16', () => {
    const told = bodyCircumstances('mars', on('2003-12-16'), librarySky);
    expectHours(told.rightAscensionJ2000Hours, hours(23, 59, 12.53));
    expectDegrees(told.declinationJ2000Deg, degrees(-1, 0, 29, 9));
    expectHours(told.rightAscensionOfDateHours, hours(23, 59, 24.03));
    expectDegrees(told.declinationOfDateDeg, degrees(-1, 0, 27, 54.2));
    // Printed to 0.001″.
    expect(Math.abs(told.diameterArcsec - 9.635)).toBeLessThan(0.001);
  });

  it('Jupiter 2008-07-25, apparent', () => {
    const told = bodyCircumstances('jupiter', on('2008-07-25'), librarySky);
    expectHours(told.rightAscensionOfDateHours, hours(19, 7, 26.047));
    expectDegrees(told.declinationOfDateDeg, degrees(-1, 22, 45, 58.37));
  });

  it('Mercury 2006-06-19 and Neptune 2006-02-03, astrometric', () => {
    const mercury = bodyCircumstances('mercury', on('2006-06-19'), librarySky);
    expectHours(mercury.rightAscensionJ2000Hours, hours(7, 37, 13.637));
    expectDegrees(mercury.declinationJ2000Deg, degrees(1, 22, 36, 52.66));
    const neptune = bodyCircumstances('neptune', on('2006-02-03'), librarySky);
    expectHours(neptune.rightAscensionJ2000Hours, hours(21, 18, 20.161));
    expectDegrees(neptune.declinationJ2000Deg, degrees(-1, 15, 52, 9.81));
  });

  it('light-minutes of Mercury and Jupiter 1980-03-25', () => {
    // Printed to 1e-6; the library is off by 4e-5 au in Mercury, 3e-4 au in Jupiter at worst.
    const minutes = (body: SkyPlanet) => bodyCircumstances(body, on('1980-03-25'), librarySky).lightMinutes;
    expect(Math.abs(minutes('mercury') - 6.323037)).toBeLessThan(4e-4);
    expect(Math.abs(minutes('jupiter') - 37.694557)).toBeLessThan(2.5e-3);
  });

  it('elongation of Mars 2020-06-02, west of the Sun', () => {
    const told = bodyCircumstances('mars', on('2020-06-02'), librarySky);
    expectDegrees(told.elongationDeg, 88.5698);
    expect(told.elongationSide).toBe('west');
  });
});
