import type { ForecastEvent } from '../../forecast/index.js';
import type { LocalView, Site } from '../../sky/index.js';
import { localDateTime } from '../../time/index.js';
import { leastElongationDeg } from '../event-words.js';
import { isObservable } from '../headline.js';
import { fixed } from '../numbers.js';
import { tellInstant } from '../uncertainty-words.js';
import { SkySign } from './sky-sign.js';

/** Without a site: on which side of the Sun, and how far from it. */
export function GeocentricCell({ event }: { event: ForecastEvent }) {
  const elongationDeg = leastElongationDeg(event);
  if (elongationDeg === null) return <>Not in the Earth’s sky</>;
  const from = `${fixed(elongationDeg, 0)}° from the Sun`;
  return isObservable(event) ? (
    <>
      <SkySign event={event} />
      <br />
      <span class="place">{from}</span>
    </>
  ) : (
    <span class="place">Not observable, {from}</span>
  );
}

interface SitesCellProps {
  readonly event: ForecastEvent;
  readonly sites: readonly Site[];
}

/** The home site in full; the partners that see it in a line each, those that do not in one together. */
export function SitesCell({ event, sites }: SitesCellProps) {
  const views = event.local.map((view, i) => ({ view, name: sites[i]!.name }));
  const [home, ...partners] = views;
  const blind = partners.filter(({ view }) => view.bestLook === null);
  if (home === undefined) return <>Not in the Earth’s sky</>;
  return (
    <ul>
      <li class={home.view.bestLook === null ? 'place' : undefined}>{home.view.verdict}</li>
      {partners
        .filter(({ view }) => view.bestLook !== null)
        .map(({ view, name }) => (
          <li key={view.site} class="place">
            {name}, {clockAt(event, view.zone)}; {lookIn(view)}.
          </li>
        ))}
      {blind.length === 0 || views.every(({ view }) => view.bestLook === null) ? null : (
        <li class="place">Not visible from {blind.map(({ name }) => name).join(' or ')}.</li>
      )}
    </ul>
  );
}

function clockAt(event: ForecastEvent, zone: string): string {
  const { time } = tellInstant(event.utc, event.uncertaintySeconds.utc, zone);
  const date = localDateTime(event.utc, zone).toFormat('d LLL');
  return time === '' ? date : `${time} on ${date}`;
}

/** `best 06:15 on 24 Apr, east-north-east 17° up`. */
function lookIn({ bestLook, zone }: LocalView): string {
  if (bestLook === null) return 'not visible';
  const { utc, direction, altitudeDeg } = bestLook;
  return `best ${localDateTime(utc, zone).toFormat("HH:mm 'on' d LLL")}, ${direction} ${fixed(altitudeDeg, 0)}° up`;
}
