import type { SkyPlanet } from '../bodies/index.js';
import { angleBetween, degreesFromRadians } from '../math/index.js';
import type { TtDays } from '../time/index.js';
import type { Meeting } from './event.js';
import type { KindName } from './kind-names.js';
import { nearest } from './refine.js';
import { separationJet } from './signal.js';
import type { NamedEvent } from './tell-event.js';
import type { TrackedSky } from './tracked-sky.js';

/** Two descents that end this near to each other have found the same least separation. */
const SAME_CLOSEST_DAYS = 0.5;
/** Slow planets take months from a conjunction to their least separation. */
const DESCENT_REACH_DAYS = 400;
/** Nearer to the Sun than this, a meeting is in the table but is not a sight. */
const OBSERVABLE_ELONGATION_DEG = 15;

/** The kinds that are moments of a meeting, the one that names it first. */
export const momentKinds: readonly KindName[] = ['conjunction-longitude', 'conjunction-ra', 'appulse'];

export const isMomentKind = (kind: KindName): boolean => momentKinds.includes(kind);

/** The ids of a meeting's events. */
export const momentsOf = ({ conjunctionsRa, conjunctionsLongitude, appulse }: Meeting): string[] => [
  ...conjunctionsRa,
  ...conjunctionsLongitude,
  ...(appulse === null ? [] : [appulse]),
];

/**
 * Groups the conjunctions and appulses of each pair into meetings: those from which the separation falls to the same
 * local minimum belong together.
 */
export function meetingsOf(events: readonly NamedEvent[], sky: TrackedSky): Meeting[] {
  const approaches = new Map<string, { closest: TtDays; moments: NamedEvent[] }[]>();
  for (const event of events.filter(({ kind }) => isMomentKind(kind))) {
    const closest = closestAfterDescent(event, sky);
    const pair = event.bodies.join('-');
    const ofPair = approaches.get(pair) ?? [];
    approaches.set(pair, ofPair);
    const same = ofPair.find((approach) => Math.abs(approach.closest - closest) < SAME_CLOSEST_DAYS);
    if (same === undefined) ofPair.push({ closest, moments: [event] });
    else same.moments.push(event);
  }
  return [...approaches.values()]
    .flat()
    .map(({ closest, moments }) => describe(closest, moments, sky))
    .sort((a, b) => a.closestTt - b.closestTt || (a.id < b.id ? -1 : 1));
}

function closestAfterDescent(event: NamedEvent, sky: TrackedSky): TtDays {
  if (event.kind === 'appulse') return event.tt;
  const [a, b] = event.bodies;
  const separation = (tt: TtDays) =>
    separationJet(sky.geocentric(a!, 'equator-of-date', tt), sky.geocentric(b!, 'equator-of-date', tt));
  return nearest('minimum', separation, event.tt, DESCENT_REACH_DAYS) ?? event.tt;
}

function describe(closest: TtDays, moments: readonly NamedEvent[], sky: TrackedSky): Meeting {
  const of = (kind: KindName) => moments.filter((event) => event.kind === kind);
  const anchor = momentKinds.flatMap(of)[0]!;
  const bodies = anchor.bodies as readonly [SkyPlanet, SkyPlanet];
  const direction = (body: SkyPlanet | 'sun') => sky.places.apparent(body, closest);
  const conjunctions = [...of('conjunction-longitude'), ...of('conjunction-ra')];
  return {
    id: `meeting.${anchor.id}`,
    bodies,
    cycle: anchor.cycle,
    series: anchor.series,
    conjunctionsRa: of('conjunction-ra').map(({ id }) => id),
    conjunctionsLongitude: of('conjunction-longitude').map(({ id }) => id),
    appulse: of('appulse')[0]?.id ?? null,
    grazing: conjunctions.length === 0,
    leastSeparationDeg: degreesFromRadians(angleBetween(direction(bodies[0]), direction(bodies[1]))),
    closestTt: closest,
    observable: bodies.every(
      (body) =>
        degreesFromRadians(angleBetween(direction(body), direction('sun'))) >= OBSERVABLE_ELONGATION_DEG,
    ),
  };
}
