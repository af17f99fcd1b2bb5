import type { Body } from '../../../src/bodies/index.js';
import { ApparentPlaces, Tracks, geometryOf, librarySource } from '../../../src/ephemeris/index.js';
import type { Frame, Motion, Paths } from '../../../src/ephemeris/index.js';
import type { Vector } from '../../../src/math/index.js';
import { SkyOverSite, makeSite } from '../../../src/sky/index.js';
import type { Site, SiteWords } from '../../../src/sky/index.js';
import { ttFromUtc, utcMillis } from '../../../src/time/index.js';
import type { TtDays } from '../../../src/time/index.js';

/** The real paths, shared by the tests of one file. */
export const paths = new Tracks(new ApparentPlaces(geometryOf(librarySource)));

export const siteAt = (latitudeDeg: number, longitudeDeg: number, more: Partial<SiteWords> = {}): Site =>
  makeSite({ id: 'here', latitudeDeg, longitudeDeg, zone: 'UTC', ...more });

export const skyAt = (
  latitudeDeg: number,
  longitudeDeg: number,
  more: Partial<SiteWords> = {},
): SkyOverSite => new SkyOverSite(siteAt(latitudeDeg, longitudeDeg, more), paths);

export const utcOf = (iso: string) => utcMillis(Date.parse(iso));
export const ttOf = (iso: string): TtDays => ttFromUtc(utcOf(iso));

/** Paths on which every body stands where the test puts it. */
export function pathsAt(place: (body: Body, tt: TtDays) => Vector): Paths {
  const unasked = (): never => {
    throw new Error('the sky of a site reads positions only');
  };
  return {
    position: (body: Body, _frame: Frame, tt: TtDays) => place(body, tt),
    motion: (): Motion => unasked(),
    longitude: unasked,
  };
}
