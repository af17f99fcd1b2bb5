import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { eventsJsonSchema, eventsShape } from '../../data/events-shape.js';
import { forecast } from '../../src/forecast/index.js';
import { eventsJson } from '../../src/output/index.js';
import {
  aForecast,
  aSite,
  at,
  heliocentricEvent,
  pairEvent,
  seenFrom,
  soloEvent,
} from '../fixtures/events.js';

type Node = Record<string, unknown>;
type JsonSchema = Parameters<typeof z.fromJSONSchema>[0];
const published = readFileSync(new URL('../../data/events.schema.json', import.meta.url), 'utf8');
const schema = JSON.parse(published) as Exclude<JsonSchema, boolean>;

/** Every property of the schema, wherever it is nested: its name and what is said of it. */
function propertiesOf(node: unknown, path = ''): { path: string; name: string; description: string }[] {
  if (Array.isArray(node)) return node.flatMap((item) => propertiesOf(item, path));
  if (typeof node !== 'object' || node === null) return [];
  return Object.entries(node as Node).flatMap(([key, value]) => {
    if (key !== 'properties') return propertiesOf(value, path);
    return Object.entries(value as Record<string, { description?: string }>).flatMap(([name, property]) => [
      { path: `${path}/${name}`, name, description: property.description ?? '' },
      ...propertiesOf(property, `${path}/${name}`),
    ]);
  });
}
const properties = propertiesOf(schema);

/** What the description of a field must say, by the unit in its name. */
const unitWords: readonly [RegExp, RegExp][] = [
  [/Deg$/, /degrees/],
  [/Arcsec$/, /arcseconds/],
  [/Au$/, /astronomical units/],
  [/Km$/, /kilometres/],
  [/Minutes$/, /minutes/],
  [/Hours$/, /hours/],
  [/Seconds$/, /seconds/],
  [/Days$/, /days/],
  [/M$/, /metres/],
  [/^tt$/, /days since J2000\.0|seconds/],
  [/^utc$/, /ISO 8601|seconds/],
  [/^(rise|transit|set|closest|from|to|localTime|evening)$/, /ISO 8601/],
  [/^magnitude$/, /magnitudes/],
  [/^illuminatedFraction$/, /fraction/],
];

const site = aSite();
const invented = aForecast([
  soloEvent({ series: { index: 1, of: 3 } }, { body: 'saturn', ringTiltDeg: -12.3456, magnitude: null }),
  seenFrom(pairEvent(), site),
  seenFrom(pairEvent({ kind: 'appulse' }), site, { bestLook: null }),
  heliocentricEvent(),
]);

describe('data/events.schema.json', () => {
  it('is what its builder makes of the one definition', () => {
    expect(published, 'out of date: npx tsx data/events-schema.ts').toBe(eventsJsonSchema());
  });

  it('is of draft 2020-12 and closed: no field goes out that it does not tell of', () => {
    expect(schema.$schema).toBe('https://json-schema.org/draft/2020-12/schema');
    const objects = JSON.stringify(schema).match(/"properties":/g)!.length;
    expect(JSON.stringify(schema).match(/"additionalProperties":false/g)).toHaveLength(objects);
  });

  it('tells what every property is, with its unit', () => {
    expect(properties.length).toBeGreaterThan(120);
    expect(properties.filter(({ description }) => !/^\S.{5,}\.( Null .*\.)?$/.test(description))).toEqual([]);
    for (const [named, said] of unitWords) {
      const measured = properties.filter(({ name }) => named.test(name));
      expect(measured.length, String(named)).toBeGreaterThan(0);
      expect(measured.filter(({ description }) => !said.test(description))).toEqual([]);
    }
  });

  it('holds for events of every shape, both as definition and as published', () => {
    const document: unknown = JSON.parse(eventsJson(invented, [site]));
    for (const judge of [eventsShape, z.fromJSONSchema(schema)]) {
      expect(judge.safeParse(document).error?.issues).toBeUndefined();
    }
  });

  it('holds for a real year of all kinds at two sites', () => {
    const sites = [
      site,
      aSite({ id: 'south', latitudeDeg: -33.4, longitudeDeg: -70.6, zone: 'America/Santiago' }),
    ];
    const real = forecast({ from: at('2028-01-01T00:00:00Z'), to: at('2029-01-01T00:00:00Z'), sites });
    const document: unknown = JSON.parse(eventsJson(real, sites));
    const judge = z.fromJSONSchema(schema);
    expect(judge.safeParse(document).error?.issues).toBeUndefined();
    expect(real.events.length).toBeGreaterThan(150);
  });

  it.each([
    ['a field that is not told of', (event: Node) => (event['extra'] = 1)],
    ['a missing field', (event: Node) => delete event['utc']],
    ['a kind that is not in the list', (event: Node) => (event['kind'] = 'alignment')],
    ['a local instant for UTC', (event: Node) => (event['utc'] = '2027-02-19T16:45:12+01:00')],
    ['text for a number', (event: Node) => (event['tt'] = '9911')],
    [
      'circumstances of no known shape',
      (event: Node) => (event['circumstances'] = { about: 'three-bodies' }),
    ],
  ])('refuses %s', (_, spoil) => {
    const document = JSON.parse(eventsJson(invented, [site])) as { events: Node[] };
    spoil(document.events[0]!);
    expect(z.fromJSONSchema(schema).safeParse(document).success).toBe(false);
  });
});
