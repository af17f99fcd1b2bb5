import { readFileSync, statSync } from 'node:fs';
import type { Fault } from './fault.js';
import { readPlan } from './read-plan.js';
import type { PlanReading } from './read-plan.js';

/** Some two hundred times what a long plan needs. */
const MAX_BYTES = 1_000_000;

const wholeFile = (problem: string): { faults: readonly Fault[] } => ({
  faults: [{ line: 0, column: 0, field: '', problem }],
});

/** Reads a plan file. A file that cannot be read at all is a fault like any other. */
export function loadPlan(path: string): PlanReading {
  const there = statSync(path, { throwIfNoEntry: false });
  if (there === undefined)
    return wholeFile('there is no such file: name a plan, such as data/demo/plan.yaml');
  if (!there.isFile()) return wholeFile('is not a file: name the plan file itself');
  if (there.size > MAX_BYTES) {
    return wholeFile(`is ${there.size} bytes long: a plan has at most ${MAX_BYTES}; is this the right file?`);
  }
  const text = utf8(readFileSync(path));
  return text === null ? wholeFile('is not UTF-8: save the plan as UTF-8 text') : readPlan(text);
}

function utf8(bytes: Uint8Array): string | null {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return null;
  }
}
