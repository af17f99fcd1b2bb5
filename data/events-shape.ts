/**
 * The shape of `synodos events --format json`, once: `events-schema.ts` makes the published JSON Schema of it, and a
 * test holds real output against it. The program itself never loads this.
 */
import { z } from 'zod';
import { planets, skyPlanets } from '../src/bodies/index.js';
import { kindNames } from '../src/forecast/index.js';
import { EVENTS_SCHEMA } from '../src/output/index.js';

const instant = (what: string) =>
  z
    .string()
    .regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}Z$/)
    .describe(`${what}; UTC, ISO 8601, to the second.`);
const localInstant = (what: string) =>
  z
    .string()
    .regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}:\d{2}[+-]\d{2}:\d{2}(:\d{2})?$/)
    .describe(`${what}; local time with its offset from UTC, ISO 8601.`);
const date = (what: string) =>
  z
    .string()
    .regex(/^\d{4}-\d{2}-\d{2}$/)
    .describe(`${what}; local date, ISO 8601.`);
const id = (what: string) =>
  z
    .string()
    .regex(/^[a-z-]+(\.[a-z-]+)+\.[+-]\d+\.[a-z]+$/)
    .describe(what);
const number = (what: string, unit: string, low = -Infinity, high = Infinity) => {
  const bounded = z.number();
  const above = low === -Infinity ? bounded : bounded.min(low);
  return (high === Infinity ? above : above.max(high)).describe(`${what}; ${unit}.`);
};
/** The field, or null and what that means. */
const orNull = <T extends z.ZodType>(field: T, nullMeans: string) =>
  field.nullable().describe(`${field.description ?? ''} Null ${nullMeans}.`);
const degrees = (what: string, low: number, high: number) => number(what, 'degrees', low, high);
const count = (what: string) => z.int().min(1).describe(`${what}; a count.`);
const text = (what: string) => z.string().min(1).describe(what);
const flag = (what: string) => z.boolean().describe(what);
const planet = (what: string) => z.enum(planets).describe(what);
const skyPlanet = (what: string) => z.enum(skyPlanets).describe(what);
const cycleNumber = () =>
  z
    .int()
    .describe('Number of the mean cycle, 0 being the one whose mean instant is nearest J2000.0; a count.');

const series = () =>
  z
    .strictObject({
      index: count('Which one this is, in order of time'),
      of: count('How many the cycle has'),
    })
    .nullable()
    .describe('Which of several of the same cycle this is; null where the cycle has one.');

const bodyFields = {
  body: skyPlanet('The planet that the fields beside this one tell of.'),
  distanceAu: number('Light-time distance from the Earth’s centre', 'astronomical units', 0),
  distanceKm: number('The same distance, to a thousand', 'kilometres', 0),
  lightMinutes: number('The time that light takes from there', 'minutes', 0),
  heliocentricDistanceAu: number('Distance from the Sun’s centre', 'astronomical units', 0),
  elongationDeg: degrees('Apparent angle from the Sun’s centre, seen from the Earth’s', 0, 180),
  elongationSide: z
    .enum(['east', 'west'])
    .describe('The side of the Sun: east is the evening sky, west the morning sky.'),
  phaseAngleDeg: degrees('The angle Sun–planet–Earth', 0, 180),
  illuminatedFraction: number('The lit part of the disc', 'a fraction, 0 … 1', 0, 1),
  magnitude: orNull(
    number('Visual magnitude (Mallama & Hilton 2018)', 'magnitudes'),
    'where the formula does not reach',
  ),
  diameterArcsec: number('Apparent equatorial diameter', 'arcseconds', 0),
  ringTiltDeg: degrees(
    'Saturn only: the Earth’s latitude above the ring plane, north positive',
    -90,
    90,
  ).optional(),
  constellation: text('The constellation it stands in: its Latin name, by the boundaries of the IAU.'),
  rightAscensionJ2000Hours: number(
    'Astrometric right ascension, mean equator and equinox of J2000.0',
    'hours',
    0,
    24,
  ),
  declinationJ2000Deg: degrees('Astrometric declination, mean equator of J2000.0', -90, 90),
  rightAscensionOfDateHours: number(
    'Apparent right ascension, true equator and equinox of date',
    'hours',
    0,
    24,
  ),
  declinationOfDateDeg: degrees('Apparent declination, true equator of date', -90, 90),
  eclipticLongitudeDeg: degrees('Apparent longitude, true ecliptic and equinox of date', 0, 360),
  eclipticLatitudeDeg: degrees('Apparent latitude, true ecliptic of date', -90, 90),
};

const oneBody = z.strictObject({
  about: z.literal('one-body').describe('What the circumstances tell of: one planet in the Earth’s sky.'),
  ...bodyFields,
  closeness: z
    .strictObject({
      rank: count('1 is the nearest of those compared'),
      of: count('How many approaches are compared'),
      yearFrom: z.int().describe('The first approach compared; a calendar year.'),
      yearTo: z.int().describe('The last approach compared; a calendar year.'),
      phrase: text('The rank in words.'),
    })
    .optional()
    .describe('Mars only: how near it comes among its neighbouring approaches.'),
  localExtremes: z
    .array(
      z.strictObject({
        utc: instant('The lesser turn of the distance'),
        heliocentricDistanceAu: number('Distance from the Sun’s centre then', 'astronomical units', 0),
      }),
    )
    .optional()
    .describe('Perihelia and aphelia: further turns of a distance that wobbles, because the Sun swings too.'),
});

const twoBodies = z.strictObject({
  about: z.literal('two-bodies').describe('What the circumstances tell of: two planets in the Earth’s sky.'),
  separationDeg: degrees('The angle between the two, seen from the Earth’s centre', 0, 180),
  positionAngleDeg: degrees(
    'Of the second seen from the first, from north through east, true equator of date',
    0,
    360,
  ),
  leastElongationDeg: degrees('The smaller of the two elongations from the Sun', 0, 180),
  bodies: z
    .array(z.strictObject(bodyFields).describe('One of the two.'))
    .length(2)
    .describe('The two, in the order of the event’s bodies.'),
});

const heliocentric = z.strictObject({
  about: z
    .literal('heliocentric')
    .describe('What the circumstances tell of: two planets as seen from the Sun.'),
  separationDeg: degrees('The angle between the two, seen from the Sun’s centre', 0, 180),
  bodies: z
    .array(
      z
        .strictObject({
          body: planet('The planet that the fields beside this one tell of.'),
          heliocentricLongitudeDeg: degrees('Geometric longitude, ecliptic and equinox of date', 0, 360),
          heliocentricLatitudeDeg: degrees('Geometric latitude, ecliptic of date', -90, 90),
          heliocentricDistanceAu: number('Distance from the Sun’s centre', 'astronomical units', 0),
        })
        .describe('One of the two.'),
    )
    .length(2)
    .describe('The two, in the order of the event’s bodies.'),
});

const bestLook = z.strictObject({
  utc: instant('The moment'),
  localTime: localInstant('The moment'),
  altitudeDeg: degrees('Of the lower body, refracted', -90, 90),
  azimuthDeg: degrees('Of the lower body, from north through east', 0, 360),
  direction: text('The same in words, by the sixteen points of the compass.'),
  sunAltitudeDeg: degrees('True altitude of the Sun’s centre', -90, 90),
  separationDeg: orNull(degrees('Between two bodies then, seen from the site', 0, 180), 'for one body'),
  inBrightTwilight: flag('Whether the sky is only as dark as bright twilight allows.'),
});

const moment = (what: string) => orNull(instant(`${what} in that night`), 'where there is none');

const local = z.strictObject({
  site: text('The site’s id.'),
  localTime: localInstant('The event’s instant'),
  zone: text('IANA name of the time zone.'),
  sunAltitudeDeg: degrees('True altitude of the Sun’s centre at the instant', -90, 90),
  visibleAtInstant: flag(
    'All the bodies above the local horizon and the Sun below the true one, at the instant itself.',
  ),
  topocentricSeparationDeg: orNull(
    degrees('Between two bodies at the instant, seen from the site', 0, 180),
    'for one body',
  ),
  evening: date('The evening (noon to noon) that holds the instant'),
  bestLook: bestLook.nullable().describe('The best moment of that night to look; null where there is none.'),
  verdict: text('When and where to look, or why not, in one sentence.'),
  bodies: z
    .array(
      z
        .strictObject({
          body: skyPlanet('The planet that the fields beside this one tell of.'),
          altitudeDeg: degrees('Topocentric and refracted, at the instant', -90, 91),
          azimuthDeg: degrees('From north through east, at the instant', 0, 360),
          aboveHorizon: flag('Whether it stands above the local horizon at the instant.'),
          rise: moment('Its rising'),
          transit: moment('Its upper transit of the meridian'),
          set: moment('Its setting'),
        })
        .describe('One of the event’s bodies.'),
    )
    .describe('The event’s bodies as this site sees them, in their order.'),
});

const event = z.strictObject({
  id: id('The event’s name for ever, whatever ephemeris finds it: kind.bodies.cycle.letter.'),
  kind: z.enum(kindNames).describe('The kind of event.'),
  bodies: z.array(planet('A planet.')).min(1).max(2).describe('The planets it concerns.'),
  cycle: cycleNumber(),
  series: series(),
  reckoning: z
    .enum(['longitude', 'right-ascension'])
    .nullable()
    .describe('The coordinate that defines the event, where its kind has a choice; else null.'),
  tt: number('The refined instant, Terrestrial Time', 'days since J2000.0 (JD 2451545.0 TT)'),
  utc: instant('The refined instant (UT1 before 1972)'),
  uncertaintySeconds: z
    .strictObject({
      tt: number('Of the instant in TT, 95 % half-width', 'seconds', 0),
      utc: number('Of the instant in UTC, 95 % half-width', 'seconds', 0),
    })
    .describe('How far the instant may be off; seconds.'),
  estimates: z
    .strictObject({
      mean: orNull(instant('By the mean cycle'), 'where there is none'),
      kepler: orNull(instant('By Kepler orbits'), 'where there is none'),
    })
    .describe('The first estimates of the instant.'),
  residualDays: z
    .strictObject({
      mean: orNull(number('Refined minus mean-cycle instant', 'days'), 'where there is no estimate'),
      kepler: orNull(number('Refined minus Kepler-orbit instant', 'days'), 'where there is no estimate'),
    })
    .describe('Refined minus first estimate; days.'),
  interval: z
    .strictObject({
      from: instant('Its beginning'),
      to: instant('Its end'),
      meaning: text('What holds throughout, in words.'),
    })
    .nullable()
    .describe(
      'For flat maxima and grazing approaches: the interval in which the event cannot be told from its neighbours.',
    ),
  meeting: orNull(
    id('The id of the meeting of which this is a moment.'),
    'for what is no moment of a meeting',
  ),
  certain: flag('False where another ephemeris of the same quality could lack the event.'),
  circumstances: z
    .discriminatedUnion('about', [oneBody, twoBodies, heliocentric])
    .describe('What is true at the instant.'),
  local: z
    .array(local.describe('The event as one site sees it.'))
    .describe('The event from each site, in their order; empty for what is not in the Earth’s sky.'),
});

const meeting = z.strictObject({
  id: id('The meeting’s name for ever.'),
  bodies: z.array(skyPlanet('A planet.')).length(2).describe('The two planets.'),
  cycle: cycleNumber(),
  series: series(),
  conjunctionsRa: z.array(id('An event’s id.')).describe('Its conjunctions in right ascension, by event id.'),
  conjunctionsLongitude: z
    .array(id('An event’s id.'))
    .describe('Its conjunctions in ecliptic longitude, by event id.'),
  appulse: orNull(id('Its appulse, by event id.'), 'where the separation has no minimum below the limit'),
  grazing: flag('A least separation or least difference without a conjunction.'),
  leastSeparationDeg: degrees('The least separation reached', 0, 180),
  closest: instant('When it is reached'),
  observable: flag('Whether both bodies are then at least 15° from the Sun.'),
});

export const eventsShape = z
  .strictObject({
    schema: z.literal(EVENTS_SCHEMA).describe('The name of this shape; it changes when a field does.'),
    span: z
      .strictObject({ from: instant('Included'), to: instant('Not included') })
      .describe('The time that was searched.'),
    source: z
      .strictObject({ name: text('Its short name.'), description: text('What it is.') })
      .describe('The ephemeris that was used.'),
    bodies: z.array(planet('A planet.')).describe('The planets asked for: every event concerns one of them.'),
    sites: z
      .array(
        z
          .strictObject({
            id: text('Short name, used wherever a site is meant.'),
            name: text('The name as people read it.'),
            latitudeDeg: degrees('Geodetic latitude, north positive', -90, 90),
            longitudeDeg: degrees('Longitude, east positive', -180, 180),
            elevationM: number('Above sea level', 'metres'),
            zone: text('IANA name of the time zone.'),
            zoneFrom: z
              .enum(['user', 'coordinates'])
              .describe('Whether the zone was given or looked up from the coordinates.'),
          })
          .describe('One site.'),
      )
      .describe('The sites asked for.'),
    events: z.array(event.describe('One event.')).describe('All events of the span, in order of time.'),
    meetings: z
      .array(meeting.describe('One approach of two planets, its moments kept together.'))
      .describe('The meetings to which the events belong.'),
  })
  .describe('A forecast of planetary events by Synodos.');

/** The published schema, draft 2020-12, as a text. */
export function eventsJsonSchema(): string {
  const { $schema, ...schema } = z.toJSONSchema(eventsShape, { target: 'draft-2020-12' });
  const document = {
    $schema,
    $id: `urn:${EVENTS_SCHEMA.replace('-', ':')}`,
    title: 'Synodos events',
    ...schema,
  };
  return `${JSON.stringify(document, null, 2)}\n`;
}
