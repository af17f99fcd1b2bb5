import type { Body, Planet } from '../bodies/index.js';
import type { KindName, Reckoning } from '../forecast/index.js';
import { makeSite } from '../sky/index.js';
import type { Site } from '../sky/index.js';
import { utcMillis } from '../time/index.js';
import type { UtcMillis } from '../time/index.js';
import type { PlanWords } from './schema.js';
import { readInstant } from './words/index.js';

/** A plan as the program works with it: sites made, dates turned into instants. */
export interface Plan {
  readonly title: string;
  /** Included. */
  readonly from: UtcMillis;
  /** Not included. */
  readonly to: UtcMillis;
  /** Written into calendars as the time of their making, so that the clock never is. */
  readonly stamp: UtcMillis;
  /** The home site first. */
  readonly sites: readonly Site[];
  readonly kinds?: readonly KindName[];
  readonly bodies?: readonly Planet[];
  readonly reckoning?: Reckoning;
  readonly withinDeg?: number;
  readonly residuals: readonly ResidualWish[];
}

export interface ResidualWish {
  readonly pair: readonly [Body, Body];
  readonly from: UtcMillis;
  readonly to: UtcMillis;
}

/** Makes a plan of words in which no fault was found. */
export function planOf(words: PlanWords): Plan {
  const sites = (words.sites ?? []).map(siteOf);
  const home = sites.find(({ id }) => id === words.home) ?? sites[0];
  const zone = home?.zone ?? null;
  const [from, to] = [instantOf(words.span.from, zone), instantOf(words.span.to, zone)];
  const { kinds, bodies, reckoning, withinDeg } = words.forecast ?? {};
  const residualSpan = words.residuals?.span;
  return {
    title: words.title,
    ...{ from, to },
    stamp: words.stamp === undefined ? from : instantOf(words.stamp, null),
    sites: home === undefined ? [] : [home, ...sites.filter((site) => site !== home)],
    ...(kinds && { kinds }),
    ...(bodies && { bodies }),
    ...(reckoning && { reckoning }),
    ...(withinDeg !== undefined && { withinDeg }),
    residuals: (words.residuals?.pairs ?? []).map((pair) => ({
      pair,
      from: residualSpan === undefined ? from : instantOf(residualSpan.from, zone),
      to: residualSpan === undefined ? to : instantOf(residualSpan.to, zone),
    })),
  };
}

function siteOf(words: NonNullable<PlanWords['sites']>[number]): Site {
  return makeSite({
    id: words.id,
    ...(words.name !== undefined && { name: words.name }),
    latitudeDeg: words.latitude,
    longitudeDeg: words.longitude,
    ...(words.elevation !== undefined && { elevationM: words.elevation }),
    ...(words.zone !== undefined && { zone: words.zone }),
    ...(words.horizon && {
      horizon: words.horizon.map(([azimuthDeg, altitudeDeg]) => ({ azimuthDeg, altitudeDeg })),
    }),
  });
}

/** A date that the schema has read before: only the zone is new here. */
function instantOf(word: string, zone: string | null): UtcMillis {
  const reading = readInstant(word, zone);
  return 'value' in reading ? reading.value : utcMillis(NaN);
}
