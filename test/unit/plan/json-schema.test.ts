import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { planJsonSchema } from '../../../src/plan/json-schema.js';

describe('the JSON Schema of plans', () => {
  it('is what data/plan-schema.ts would write now', () => {
    expect(readFileSync('data/plan.schema.json', 'utf8')).toBe(planJsonSchema());
  });

  it('is what the first line of the demo plan points editors to', () => {
    const [first] = readFileSync('data/demo/plan.yaml', 'utf8').split('\n');
    expect(first).toBe('# yaml-language-server: $schema=../plan.schema.json');
  });

  it('tells of every field of the top level what it is for', () => {
    const { properties } = JSON.parse(planJsonSchema()) as {
      properties: Record<string, { description?: string }>;
    };
    const silent = Object.entries(properties).filter(([, { description }]) => description === undefined);
    expect(silent.map(([name]) => name)).toEqual([]);
  });
});
