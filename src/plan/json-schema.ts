import { z } from 'zod';
import { planSchema } from './schema.js';

/** The schema of plan files as JSON Schema (draft 7, which editors speak). Ends with a newline. */
export const planJsonSchema = (): string =>
  `${JSON.stringify(z.toJSONSchema(planSchema, { target: 'draft-7', io: 'input' }), null, 2)}\n`;
