import { z } from 'zod';
import { bodies, planets } from '../bodies/index.js';
import { kindNames } from '../forecast/index.js';
import { parseLocalDate } from '../time/index.js';
import { MOST_WITHIN_DEG, quoted, readInstant, readZone } from './words/index.js';
import type { Reading } from './words/index.js';

/** The days of the week as a plan names them, Monday first. */
export const weekdays = [
  'monday',
  'tuesday',
  'wednesday',
  'thursday',
  'friday',
  'saturday',
  'sunday',
] as const;

/** A text in which a check finds a problem in words, or none. */
const checked = (text: z.ZodString, problemOf: (word: string) => string | null) =>
  text.superRefine((word, context) => {
    const problem = problemOf(word);
    if (problem !== null) context.addIssue({ code: 'custom', message: problem });
  });

const problemIn = <T>(reading: Reading<T>): string | null => ('problem' in reading ? reading.problem : null);

/** A text on one line. Control characters are meant for terminals, and no output could show them. */
const text = (most: number) =>
  checked(
    z
      .string()
      .trim()
      .overwrite((word) => word.replace(/\s+/g, ' '))
      .min(1)
      .max(most),
    (word) => (/\p{Cc}/u.test(word) ? `${quoted(word)} holds a control character: remove it` : null),
  );

/** Spans are read again with their zone once the home site is known; here only the form counts. */
const instant = checked(z.string('write a date like 2027-01-31'), (word) =>
  problemIn(readInstant(word, null)),
);
const date = checked(z.string('write a date like 2027-01-31'), (word) => {
  if (parseLocalDate(word) === null) return `${quoted(word)} is not a date of the calendar: write YYYY-MM-DD`;
  return problemIn(readInstant(word, null));
});

const span = z
  .strictObject({
    from: instant.meta({ description: 'The first instant, included: YYYY-MM-DD or 2027-01-31T18:30Z.' }),
    to: instant.meta({ description: 'The end, not included.' }),
  })
  .meta({
    description:
      'A bare date is midnight at the home site, or 00:00 UTC without one. From 1600-01-01 to 2600-01-01.',
  });

const siteId = checked(z.string().max(40), (word) =>
  /^[A-Za-z0-9-]+$/.test(word)
    ? null
    : `${quoted(word)} does not name a site: use letters, digits and hyphens, like north-hill`,
);

/** JSON Schema leaves the length of such a list open unless told. */
const PAIR_FOR_EDITORS = { minItems: 2, maxItems: 2 } as const;

const horizonPoint = z
  .tuple([z.number().min(0).max(360), z.number().min(-10).max(90)], 'write two numbers, [azimuth, altitude]')
  .meta({
    description: 'Azimuth (degrees from north through east) and the altitude of the horizon there.',
    ...PAIR_FOR_EDITORS,
  });

const site = z
  .strictObject({
    id: siteId.meta({ description: 'A short name that never changes: letters, digits and hyphens.' }),
    name: text(120).optional().meta({ description: 'The name as people read it.' }),
    latitude: z.number().min(-90).max(90).meta({ description: 'Degrees, north positive.' }),
    longitude: z.number().min(-180).max(180).meta({ description: 'Degrees, east positive.' }),
    elevation: z.number().min(-500).max(9000).optional().meta({ description: 'Metres above the sea.' }),
    zone: checked(z.string(), (word) => problemIn(readZone(word)))
      .optional()
      .meta({ description: 'IANA time zone; looked up from the coordinates where it is left out.' }),
    horizon: z.array(horizonPoint).min(2).max(720).optional().meta({
      description: 'The local horizon, straight lines between the points; flat where it is left out.',
    }),
    clearShareByMonth: z
      .array(z.number().min(0).max(1))
      .length(12)
      .optional()
      .meta({ description: 'The share of clear evenings, January to December, 0 … 1: a climate average.' }),
  })
  .meta({ description: 'A place with a clock, a horizon and a sky.' });

const bodyPair = z
  .tuple([z.enum(bodies), z.enum(bodies)], 'write two bodies, like [earth, mars]')
  .meta({ description: 'Two planets, or a planet and the Earth.', ...PAIR_FOR_EDITORS });

const dateRange = z.strictObject({
  name: text(120).optional(),
  from: date.meta({ description: 'The first day.' }),
  to: date.meta({ description: 'The last day, included.' }),
});

/** The plan file as a user writes it. What one field alone can tell is checked here, the rest in cross-checks. */
export const planSchema = z
  .strictObject({
    title: text(200).meta({ description: 'The heading of the report and the name of the calendar.' }),
    span,
    home: siteId.optional().meta({
      description:
        'The id of the site whose clock and horizon the report speaks of; the first site by default.',
    }),
    stamp: date.optional().meta({
      description:
        'The date that calendars carry as the time of their making; the start of the span by default.',
    }),
    sites: z.array(site).min(1).max(20).optional().meta({
      description: 'The places to be told of. Without any, the forecast is geocentric and in UTC.',
    }),
    schoolHolidays: z.array(dateRange).max(200).optional().meta({
      description: 'Days on which families can stay up: with them, the school week of the home site.',
    }),
    openingRules: z
      .strictObject({
        weekdays: z.array(z.enum(weekdays)).min(1).max(7).optional().meta({
          description: 'The evenings of the week on which the public may come.',
        }),
      })
      .optional()
      .meta({ description: 'When the home site may open to the public.' }),
    forecast: z
      .strictObject({
        kinds: z.array(z.enum(kindNames)).min(1).optional().meta({ description: 'All by default.' }),
        bodies: z.array(z.enum(planets)).min(1).optional().meta({
          description:
            'Events that concern any of these, with whichever partner; the eight planets by default.',
        }),
        reckoning: z.enum(['longitude', 'right-ascension']).optional().meta({
          description: 'For kinds that have a choice; by default each is reckoned as the almanacs do.',
        }),
        withinDeg: z.number().positive().max(MOST_WITHIN_DEG).optional().meta({
          description: 'Appulses up to this separation, degrees; 5 by default.',
        }),
      })
      .optional()
      .meta({ description: 'What to look for.' }),
    residuals: z
      .strictObject({
        pairs: z.array(bodyPair).min(1).max(36),
        span: span.optional().meta({ description: 'The span of the plan by default; decades tell more.' }),
      })
      .optional()
      .meta({ description: 'Pairs whose first estimates are laid beside the refined instants.' }),
  })
  .meta({ title: 'Synodos plan', description: 'One forecast, written once: where, when and what for.' });

export type PlanWords = z.infer<typeof planSchema>;

/** The fields that a plan may have at a place, for the writer who asked for another. */
export function fieldsAt(path: readonly (string | number)[]): readonly string[] {
  let at: unknown = planSchema;
  for (const step of path) {
    at = withoutOptional(at);
    if (at instanceof z.ZodObject) at = at.shape[step];
    else if (at instanceof z.ZodArray) at = at.element;
  }
  at = withoutOptional(at);
  return at instanceof z.ZodObject ? Object.keys(at.shape) : [];
}

const withoutOptional = (schema: unknown): unknown =>
  schema instanceof z.ZodOptional ? schema.unwrap() : schema;
