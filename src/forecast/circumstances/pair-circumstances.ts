import type { Planet, SkyPlanet } from '../../bodies/index.js';
import { angleBetween, degreesFromRadians, length, sphericalOf, wrapTwoPi } from '../../math/index.js';
import type { Spherical } from '../../math/index.js';
import type { TtDays } from '../../time/index.js';
import type { HeliocentricCircumstances, HeliocentricPlace, PairCircumstances } from '../event.js';
import { bodyCircumstances } from './body-circumstances.js';
import type { SkyGeometry } from './sky-geometry.js';

/** What is true of two planets in the Earth's sky at an instant of TT. */
export function pairCircumstances(
  a: SkyPlanet,
  b: SkyPlanet,
  tt: TtDays,
  sky: SkyGeometry,
): PairCircumstances {
  const first = sky.apparent(a, 'equator-of-date', tt);
  const second = sky.apparent(b, 'equator-of-date', tt);
  const bodies = [bodyCircumstances(a, tt, sky), bodyCircumstances(b, tt, sky)] as const;
  return {
    about: 'two-bodies',
    separationDeg: degreesFromRadians(angleBetween(first, second)),
    positionAngleDeg: degreesFromRadians(positionAngle(sphericalOf(first), sphericalOf(second))),
    leastElongationDeg: Math.min(...bodies.map(({ elongationDeg }) => elongationDeg)),
    bodies,
  };
}

/** Of `to` seen from `from`, radians from north through east. Source: Meeus, Astronomical Algorithms (1998), ch. 17. */
function positionAngle(from: Spherical, to: Spherical): number {
  const turn = to.longitude - from.longitude;
  return wrapTwoPi(
    Math.atan2(
      Math.sin(turn),
      Math.cos(from.latitude) * Math.tan(to.latitude) - Math.sin(from.latitude) * Math.cos(turn),
    ),
  );
}

/** What is true of two planets as seen from the Sun. */
export function heliocentricCircumstances(
  a: Planet,
  b: Planet,
  tt: TtDays,
  sky: SkyGeometry,
): HeliocentricCircumstances {
  const place = (body: Planet): HeliocentricPlace => {
    const vector = sky.heliocentricEclipticOfDate(body, tt);
    const { longitude, latitude } = sphericalOf(vector);
    return {
      body,
      heliocentricLongitudeDeg: degreesFromRadians(wrapTwoPi(longitude)),
      heliocentricLatitudeDeg: degreesFromRadians(latitude),
      heliocentricDistanceAu: length(vector),
    };
  };
  return {
    about: 'heliocentric',
    separationDeg: degreesFromRadians(angleBetween(sky.heliocentric(a, tt), sky.heliocentric(b, tt))),
    bodies: [place(a), place(b)],
  };
}
