import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { faultLine, readPlan } from '../../../src/plan/index.js';
import { badPlans } from './bad-plans.js';

const linesOf = (text: string): string[] => {
  const reading = readPlan(text);
  return 'plan' in reading ? [] : reading.faults.map((fault) => faultLine('p.yaml', fault));
};
const demo = readFileSync('data/demo/plan.yaml', 'utf8');

describe('a bad plan', () => {
  it.each(badPlans)('$what', ({ text, lines }) => {
    expect(linesOf(text)).toEqual(lines);
  });

  it('is told whole in one run, in the order of the file', () => {
    const lines = linesOf(demo.replaceAll('latitude', 'latitud').replace('Europe/Vienna', 'Europe/Wien'));
    expect(lines.filter((line) => line.includes('Did you mean latitude?'))).toHaveLength(3);
    const places = lines.map((line) => Number(line.split(':')[1]));
    expect(places).toEqual([...places].sort((a, b) => a - b));
  });

  it('is nested as deep as it likes without harm', () => {
    expect(linesOf('['.repeat(50_000))[0]).toMatch(/^p\.yaml:\d+:\d+: brackets are nested too deeply/);
  });

  it('keeps its messages on one line and free of control characters', () => {
    const lines = linesOf('title: T\nspan: { from: "a\\nb\\e[31m", to: 2028-01-01 }\n');
    expect(lines).toHaveLength(1);
    expect(lines[0]).not.toMatch(/\p{Cc}/u);
  });
});

describe('a plan', () => {
  it('has its texts on one line each', () => {
    const text = 'title: "two\\nlines\\tof\\r\\n it"\nspan: { from: 2027-01-01, to: 2028-01-01 }\n';
    expect(readPlan(text)).toMatchObject({ plan: { title: 'two lines of it' } });
  });

  it('may end a moment after midnight has come to its home', () => {
    const text =
      'title: T\nspan: { from: 2027-01-01, to: 2027-01-01T03:01Z }\nsites: [{ id: a, latitude: -31, longitude: -70, zone: America/Santiago }]\n';
    expect(readPlan(text)).toMatchObject({ plan: { from: Date.parse('2027-01-01T03:00Z') } });
  });
});

describe('any text', () => {
  it('is a plan or has faults, and never throws', () => {
    const yamlish = fc.string({
      unit: fc.constantFrom(...Array.from('ab:[]{}-&*!#"\' \n\t,|>%@0')),
      maxLength: 60,
    });
    fc.assert(
      fc.property(yamlish, (text) => {
        const reading = readPlan(text);
        expect('plan' in reading || reading.faults.length > 0).toBe(true);
      }),
    );
  });

  it('cut out of the demo plan anywhere is still told of', () => {
    fc.assert(
      fc.property(fc.nat({ max: demo.length }), fc.nat({ max: 40 }), (at, length) => {
        const reading = readPlan(demo.slice(0, at) + demo.slice(at + length));
        expect('plan' in reading || reading.faults.every(({ problem }) => problem.length > 0)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });
});

describe('the demo plan', () => {
  it('has no faults, and its home comes first', () => {
    const reading = readPlan(demo);
    expect(reading).toMatchObject({
      plan: { sites: [{ id: 'amselgrat' }, { id: 'quillamora' }, { id: 'marlagong' }] },
    });
  });

  it('begins at midnight on the clocks of its home, and carries its stamp in UTC', () => {
    const reading = readPlan(demo);
    expect(reading).toMatchObject({
      plan: { from: Date.parse('2026-12-31T23:00Z'), stamp: Date.parse('2026-12-01T00:00Z') },
    });
  });
});
