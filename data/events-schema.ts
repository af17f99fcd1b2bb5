/**
 * Writes `data/events.schema.json`, which describes the JSON that `synodos events` gives, from `events-shape.ts`:
 * `npx tsx data/events-schema.ts`. A test says when it is out of date.
 */
import { writeFileSync } from 'node:fs';
import { eventsJsonSchema } from './events-shape.js';

writeFileSync(new URL('events.schema.json', import.meta.url), eventsJsonSchema());
