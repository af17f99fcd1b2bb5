import type {
  BodyCircumstances,
  Circumstances,
  Forecast,
  ForecastEvent,
  Interval,
  Meeting,
  ResidualSeries,
} from '../forecast/index.js';
import type { LocalView, Site } from '../sky/index.js';
import { isoUtc, utcFromTt } from '../time/index.js';
import type { TtDays, UtcMillis } from '../time/index.js';
import { round, rounded } from './round.js';

/** Names the shape of the document, which `data/events.schema.json` describes. */
export const EVENTS_SCHEMA = 'synodos-events-1';
export const RESIDUALS_SCHEMA = 'synodos-residuals-1';

const isoTt = (tt: TtDays | null): string | null => (tt === null ? null : isoUtc(utcFromTt(tt)));
const isoOrNull = (utc: UtcMillis | null): string | null => (utc === null ? null : isoUtc(utc));
const toDigits = (value: number | null, digits: number): number | null =>
  value === null ? null : rounded(value, digits);

/** The forecast as JSON, by `data/events.schema.json`. Ends with a newline. */
export const eventsJson = (forecast: Forecast, sites: readonly Site[]): string =>
  [...eventsJsonLines(forecast, sites)].join('');

/**
 * The same piece by piece, a line an item: two forecasts can be compared line by line, and a century is written
 * without ever standing in memory whole.
 */
export function* eventsJsonLines(forecast: Forecast, sites: readonly Site[]): Generator<string> {
  const span = { from: isoUtc(forecast.from), to: isoUtc(forecast.to) };
  yield `{\n"schema": ${JSON.stringify(EVENTS_SCHEMA)},\n`;
  yield `"span": ${JSON.stringify(span)},\n`;
  yield `"source": ${JSON.stringify(forecast.source)},\n`;
  yield `"bodies": ${JSON.stringify(forecast.bodies)},\n`;
  yield* arrayLines('sites', sites, siteJson);
  yield ',\n';
  yield* arrayLines('events', forecast.events, eventJson);
  yield ',\n';
  yield* arrayLines('meetings', forecast.meetings, meetingJson);
  yield '\n}\n';
}

function* arrayLines<Item>(
  name: string,
  items: readonly Item[],
  shape: (item: Item) => unknown,
): Generator<string> {
  yield `"${name}": [`;
  for (let i = 0; i < items.length; i++) yield `${i === 0 ? '' : ','}\n${JSON.stringify(shape(items[i]!))}`;
  yield items.length === 0 ? ']' : '\n]';
}

const siteJson = (site: Site) => ({
  id: site.id,
  name: site.name,
  latitudeDeg: site.latitudeDeg,
  longitudeDeg: site.longitudeDeg,
  elevationM: site.elevationM,
  zone: site.zone,
  zoneFrom: site.zoneFrom,
});

const eventJson = (event: ForecastEvent) => ({
  id: event.id,
  kind: event.kind,
  bodies: event.bodies,
  cycle: event.cycle,
  series: event.series,
  reckoning: event.reckoning,
  tt: round.ttDays(event.tt),
  utc: isoUtc(event.utc),
  uncertaintySeconds: {
    tt: round.seconds(event.uncertaintySeconds.tt),
    utc: round.seconds(event.uncertaintySeconds.utc),
  },
  estimates: { mean: isoTt(event.estimates.mean), kepler: isoTt(event.estimates.kepler) },
  residualDays: {
    mean: toDigits(event.residualDays.mean, 4),
    kepler: toDigits(event.residualDays.kepler, 5),
  },
  interval: event.interval === null ? null : intervalJson(event.interval),
  meeting: event.meeting,
  certain: event.certain,
  circumstances: circumstancesJson(event.circumstances),
  local: event.local.map(localJson),
});

const intervalJson = ({ from, to, meaning }: Interval) => ({ from: isoTt(from), to: isoTt(to), meaning });

function circumstancesJson(circumstances: Circumstances) {
  switch (circumstances.about) {
    case 'one-body':
      return {
        about: circumstances.about,
        ...bodyJson(circumstances),
        ...(circumstances.closeness === undefined ? {} : { closeness: circumstances.closeness }),
        ...(circumstances.localExtremes === undefined
          ? {}
          : {
              localExtremes: circumstances.localExtremes.map(({ utc, heliocentricDistanceAu }) => ({
                utc: isoUtc(utc),
                heliocentricDistanceAu: round.au(heliocentricDistanceAu),
              })),
            }),
      };
    case 'two-bodies':
      return {
        about: circumstances.about,
        separationDeg: rounded(circumstances.separationDeg, 5),
        positionAngleDeg: rounded(circumstances.positionAngleDeg, 2),
        leastElongationDeg: round.deg(circumstances.leastElongationDeg),
        bodies: circumstances.bodies.map(bodyJson),
      };
    case 'heliocentric':
      return {
        about: circumstances.about,
        separationDeg: round.deg(circumstances.separationDeg),
        bodies: circumstances.bodies.map((place) => ({
          body: place.body,
          heliocentricLongitudeDeg: round.deg(place.heliocentricLongitudeDeg),
          heliocentricLatitudeDeg: round.deg(place.heliocentricLatitudeDeg),
          heliocentricDistanceAu: round.au(place.heliocentricDistanceAu),
        })),
      };
  }
}

const bodyJson = (body: BodyCircumstances) => ({
  body: body.body,
  distanceAu: round.au(body.distanceAu),
  distanceKm: round.km(body.distanceKm),
  lightMinutes: round.minutes(body.lightMinutes),
  heliocentricDistanceAu: round.au(body.heliocentricDistanceAu),
  elongationDeg: round.deg(body.elongationDeg),
  elongationSide: body.elongationSide,
  phaseAngleDeg: round.deg(body.phaseAngleDeg),
  illuminatedFraction: rounded(body.illuminatedFraction, 4),
  magnitude: toDigits(body.magnitude, 2),
  diameterArcsec: rounded(body.diameterArcsec, 2),
  ...(body.ringTiltDeg === undefined ? {} : { ringTiltDeg: rounded(body.ringTiltDeg, 2) }),
  constellation: body.constellation,
  rightAscensionJ2000Hours: round.hours(body.rightAscensionJ2000Hours),
  declinationJ2000Deg: round.deg(body.declinationJ2000Deg),
  rightAscensionOfDateHours: round.hours(body.rightAscensionOfDateHours),
  declinationOfDateDeg: round.deg(body.declinationOfDateDeg),
  eclipticLongitudeDeg: round.deg(body.eclipticLongitudeDeg),
  eclipticLatitudeDeg: round.deg(body.eclipticLatitudeDeg),
});

const localJson = (view: LocalView) => ({
  site: view.site,
  localTime: view.localTime,
  zone: view.zone,
  sunAltitudeDeg: rounded(view.sunAltitudeDeg, 1),
  visibleAtInstant: view.visibleAtInstant,
  topocentricSeparationDeg: toDigits(view.topocentricSeparationDeg, 5),
  evening: view.evening,
  bestLook:
    view.bestLook === null
      ? null
      : {
          utc: isoUtc(view.bestLook.utc),
          localTime: view.bestLook.localTime,
          altitudeDeg: rounded(view.bestLook.altitudeDeg, 1),
          azimuthDeg: rounded(view.bestLook.azimuthDeg, 1),
          direction: view.bestLook.direction,
          sunAltitudeDeg: rounded(view.bestLook.sunAltitudeDeg, 1),
          separationDeg: toDigits(view.bestLook.separationDeg, 5),
          inBrightTwilight: view.bestLook.inBrightTwilight,
        },
  verdict: view.verdict,
  bodies: view.bodies.map((body) => ({
    body: body.body,
    altitudeDeg: rounded(body.altitudeDeg, 1),
    azimuthDeg: rounded(body.azimuthDeg, 1),
    aboveHorizon: body.aboveHorizon,
    rise: isoOrNull(body.rise),
    transit: isoOrNull(body.transit),
    set: isoOrNull(body.set),
  })),
});

const meetingJson = (meeting: Meeting) => ({
  id: meeting.id,
  bodies: meeting.bodies,
  cycle: meeting.cycle,
  series: meeting.series,
  conjunctionsRa: meeting.conjunctionsRa,
  conjunctionsLongitude: meeting.conjunctionsLongitude,
  appulse: meeting.appulse,
  grazing: meeting.grazing,
  leastSeparationDeg: rounded(meeting.leastSeparationDeg, 5),
  closest: isoTt(meeting.closestTt),
  observable: meeting.observable,
});

/** Residual series as JSON. Ends with a newline. */
export function residualsJson(series: ResidualSeries): string {
  const spread = (s: ResidualSeries['mean']) =>
    s && { count: s.count, rmsDays: rounded(s.rmsDays, 5), worstDays: rounded(s.worstDays, 5) };
  const document = {
    schema: RESIDUALS_SCHEMA,
    kind: series.kind,
    bodies: series.bodies,
    span: { from: isoUtc(series.from), to: isoUtc(series.to) },
    source: series.source,
    mean: spread(series.mean),
    keplerTable1: spread(series.keplerTable1),
    keplerTable2: spread(series.keplerTable2),
    beyondTable1: series.beyondTable1,
    rows: series.rows.map((row) => ({
      id: row.event.id,
      cycle: row.event.cycle,
      utc: isoUtc(row.event.utc),
      uncertaintySeconds: {
        tt: round.seconds(row.event.uncertaintySeconds.tt),
        utc: round.seconds(row.event.uncertaintySeconds.utc),
      },
      mean: isoTt(row.mean),
      keplerTable1: isoTt(row.keplerTable1),
      keplerTable2: isoTt(row.keplerTable2),
      meanDays: toDigits(row.meanDays, 5),
      keplerTable1Days: toDigits(row.keplerTable1Days, 5),
      keplerTable2Days: toDigits(row.keplerTable2Days, 5),
    })),
  };
  return `${JSON.stringify(document, null, 1)}\n`;
}
