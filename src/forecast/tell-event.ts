import type { SkyPlanet } from '../bodies/index.js';
import { length, rotate } from '../math/index.js';
import { localViewer } from '../sky/index.js';
import type { Site } from '../sky/index.js';
import { SECONDS_PER_DAY, ttDays, utcFromTt, utcUncertaintySeconds } from '../time/index.js';
import { brilliancyPlateau } from './brilliancy.js';
import { bodyCircumstances, heliocentricCircumstances, pairCircumstances } from './circumstances/index.js';
import type { SkyGeometry } from './circumstances/index.js';
import type { Circumstances, ForecastEvent, Interval } from './event.js';
import { eventId } from './identity.js';
import type { KindName } from './kind-names.js';
import { marsCloseness } from './mars-closeness.js';
import type { Finding } from './search.js';
import type { TrackedSky } from './tracked-sky.js';
import { turnTiming, zeroTiming } from './uncertainty.js';
import type { Timing } from './uncertainty.js';

/** What names an event, before anything else is known of it. */
export type NamedEvent = Pick<ForecastEvent, 'id' | 'kind' | 'bodies' | 'cycle' | 'series' | 'tt'>;

export const nameOf = ({ kind, subject, cycle, ordinal, index, of, tt }: Finding): NamedEvent => ({
  id: eventId(kind.name, subject, cycle, ordinal),
  kind: kind.name,
  bodies: subject,
  cycle,
  series: of > 1 && kind.sought === 'zero' ? { index, of } : null,
  tt,
});

export type EventTeller = (finding: Finding, meeting: string | null) => ForecastEvent;

/** Makes of each finding the whole event: its identity, how sure it is, and what is true at its instant. */
export function eventTeller(sky: TrackedSky, sites: readonly Site[]): EventTeller {
  const viewers = sites.map((site) => localViewer(site, sky.tracks));
  return (finding, meeting) => {
    const { kind, subject, tt } = finding;
    const timing = timingOf(finding, sky);
    return {
      ...nameOf(finding),
      reckoning: kind.reckoning === null ? null : finding.reckoning,
      utc: utcFromTt(tt),
      uncertaintySeconds: {
        tt: timing.seconds,
        utc: Math.hypot(timing.seconds, utcUncertaintySeconds(tt)),
      },
      estimates: { mean: finding.mean, kepler: finding.kepler },
      residualDays: {
        mean: finding.mean === null ? null : tt - finding.mean,
        kepler: finding.kepler === null ? null : tt - finding.kepler,
      },
      interval: intervalOf(finding, sky, timing),
      meeting,
      certain: timing.certain,
      circumstances: circumstancesOf(finding, sky),
      local:
        kind.circumstances === 'heliocentric'
          ? []
          : viewers.map((view) => view(subject as readonly SkyPlanet[], tt)),
    };
  };
}

function timingOf({ kind, subject, reckoning, tt }: Finding, sky: TrackedSky): Timing {
  const jet = kind.signal(sky, subject, reckoning)(tt);
  const errors = kind.errors((body) => sky.source.accuracy(body), sky, subject, jet, tt);
  return kind.sought === 'zero' ? zeroTiming(jet, errors.value) : turnTiming(jet, errors.rate);
}

/** Flat maxima and grazing zeros are told as an interval beside the instant. */
function intervalOf({ kind, tt }: Finding, sky: TrackedSky, { seconds, certain }: Timing): Interval | null {
  if (kind.name === 'greatest-brilliancy') return brilliancyPlateau(sky, tt);
  if (certain) return null;
  const days = seconds / SECONDS_PER_DAY;
  return {
    from: ttDays(tt - days),
    to: ttDays(tt + days),
    meaning: 'the two come so near to level that the source cannot tell whether they pass',
  };
}

function circumstancesOf({ kind, subject, tt, localTurns }: Finding, sky: TrackedSky): Circumstances {
  const [a, b] = subject;
  switch (kind.circumstances) {
    case 'one-body':
      return {
        about: 'one-body',
        ...bodyCircumstances(a as SkyPlanet, tt, geometryFor(sky)),
        ...(closenessKinds.includes(kind.name) && a === 'mars' ? { closeness: marsCloseness(tt) } : {}),
        ...(localTurns.length === 0
          ? {}
          : {
              localExtremes: localTurns.map((turn) => ({
                utc: utcFromTt(turn),
                heliocentricDistanceAu: length(sky.geometry.heliocentric(a, turn)),
              })),
            }),
      };
    case 'two-bodies':
      return pairCircumstances(a as SkyPlanet, b as SkyPlanet, tt, geometryFor(sky));
    case 'heliocentric':
      return heliocentricCircumstances(a, b!, tt, geometryFor(sky));
  }
}

/** Where it matters how near Mars comes. */
const closenessKinds: readonly KindName[] = ['opposition', 'closest-approach'];

/** What circumstances read, on exact places. */
export const geometryFor = (sky: TrackedSky): SkyGeometry => ({
  apparent: (body, frame, tt) => sky.apparent(body, frame, tt),
  astrometric: (body, tt) => sky.places.astrometric(body, tt),
  heliocentric: (planet, tt) => sky.geometry.heliocentric(planet, tt),
  heliocentricEclipticOfDate: (planet, tt) =>
    rotate(sky.tracks.rotation('ecliptic-of-date', tt), sky.geometry.heliocentric(planet, tt)),
});
