/**
 * Writes `data/plan.schema.json`, by which editors complete and check plan files, from the schema that the program
 * itself reads them with: `npx tsx data/plan-schema.ts`. A test says when it is out of date.
 */
import { writeFileSync } from 'node:fs';
import { planJsonSchema } from '../src/plan/json-schema.js';

writeFileSync(new URL('plan.schema.json', import.meta.url), planJsonSchema());
