import type { BodyCircumstances, Forecast, ForecastEvent } from '../forecast/index.js';
import type { LocalView, Site } from '../sky/index.js';
import { isoUtc, utcFromTt } from '../time/index.js';
import type { TtDays } from '../time/index.js';
import { csv } from './csv.js';
import type { Cell } from './csv.js';
import { bodyCircumstancesOf, seriesWords } from './event-words.js';
import { round, rounded } from './round.js';

type Column = readonly [header: string, cell: (event: ForecastEvent) => Cell];

const isoTt = (tt: TtDays | null): Cell => (tt === null ? null : isoUtc(utcFromTt(tt)));

const eventColumns: readonly Column[] = [
  ['id', ({ id }) => id],
  ['kind', ({ kind }) => kind],
  ['bodies', ({ bodies }) => bodies.join(' ')],
  ['cycle', ({ cycle }) => cycle],
  ['series', (event) => seriesWords(event)],
  ['reckoning', ({ reckoning }) => reckoning],
  ['utc', ({ utc }) => isoUtc(utc)],
  ['tt_days_since_j2000', ({ tt }) => round.ttDays(tt)],
  ['uncertainty_tt_s', ({ uncertaintySeconds }) => round.seconds(uncertaintySeconds.tt)],
  ['uncertainty_utc_s', ({ uncertaintySeconds }) => round.seconds(uncertaintySeconds.utc)],
  ['mean_estimate_utc', ({ estimates }) => isoTt(estimates.mean)],
  ['kepler_estimate_utc', ({ estimates }) => isoTt(estimates.kepler)],
  ['mean_residual_d', ({ residualDays }) => residualDays.mean && rounded(residualDays.mean, 4)],
  ['kepler_residual_d', ({ residualDays }) => residualDays.kepler && rounded(residualDays.kepler, 5)],
  ['meeting', ({ meeting }) => meeting],
  ['certain', ({ certain }) => (certain ? 'yes' : 'no')],
  ['separation_deg', ({ circumstances: c }) => ('separationDeg' in c ? round.deg(c.separationDeg) : null)],
  [
    'position_angle_deg',
    ({ circumstances: c }) => ('positionAngleDeg' in c ? rounded(c.positionAngleDeg, 1) : null),
  ],
];

const bodyColumns: readonly (readonly [string, (body: BodyCircumstances) => Cell])[] = [
  ['distance_au', (b) => round.au(b.distanceAu)],
  ['distance_km', (b) => round.km(b.distanceKm)],
  ['light_min', (b) => round.minutes(b.lightMinutes)],
  ['sun_distance_au', (b) => round.au(b.heliocentricDistanceAu)],
  ['elongation_deg', (b) => round.deg(b.elongationDeg)],
  ['elongation_side', (b) => b.elongationSide],
  ['phase_angle_deg', (b) => round.deg(b.phaseAngleDeg)],
  ['illuminated_fraction', (b) => rounded(b.illuminatedFraction, 4)],
  ['magnitude', (b) => b.magnitude && rounded(b.magnitude, 2)],
  ['diameter_arcsec', (b) => rounded(b.diameterArcsec, 2)],
  ['ring_tilt_deg', (b) => (b.ringTiltDeg === undefined ? null : rounded(b.ringTiltDeg, 2))],
  ['constellation', (b) => b.constellation],
  ['ra_j2000_h', (b) => round.hours(b.rightAscensionJ2000Hours)],
  ['dec_j2000_deg', (b) => round.deg(b.declinationJ2000Deg)],
  ['ra_of_date_h', (b) => round.hours(b.rightAscensionOfDateHours)],
  ['dec_of_date_deg', (b) => round.deg(b.declinationOfDateDeg)],
  ['ecliptic_longitude_deg', (b) => round.deg(b.eclipticLongitudeDeg)],
  ['ecliptic_latitude_deg', (b) => round.deg(b.eclipticLatitudeDeg)],
];

const localColumns: readonly (readonly [string, (view: LocalView) => Cell])[] = [
  ['local_time', (v) => v.localTime],
  ['sun_altitude_deg', (v) => rounded(v.sunAltitudeDeg, 1)],
  ['visible_at_instant', (v) => (v.visibleAtInstant ? 'yes' : 'no')],
  ['best_look', (v) => v.bestLook?.localTime ?? null],
  ['best_altitude_deg', (v) => v.bestLook && rounded(v.bestLook.altitudeDeg, 1)],
  ['best_direction', (v) => v.bestLook?.direction ?? null],
  ['verdict', (v) => v.verdict],
];

/** Every event as a row, units in the headers: the event, its first and second body, and each site. */
export function eventsCsv(forecast: Forecast, sites: readonly Site[]): string {
  const bodies = [0, 1].flatMap((i) =>
    bodyColumns.map(([name, cell]): Column => [
      `body${i + 1}_${name}`,
      (event) => {
        const body = bodyCircumstancesOf(event)[i];
        return body === undefined ? null : cell(body);
      },
    ]),
  );
  const local = sites.flatMap(({ id }, i) =>
    localColumns.map(([name, cell]): Column => [
      `${id}_${name}`,
      (event) => {
        const view = event.local[i];
        return view === undefined ? null : cell(view);
      },
    ]),
  );
  const columns = [...eventColumns, ...bodies, ...local];
  return csv(
    columns.map(([name]) => name),
    forecast.events.map((event) => columns.map(([, cell]) => cell(event))),
  );
}
