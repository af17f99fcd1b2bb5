import { crossFaults } from './cross-checks.js';
import { inOrderOfPlace } from './fault.js';
import type { Fault } from './fault.js';
import { fieldOf, issueWords, unknownKeyWords } from './issue-words.js';
import { planOf } from './plan.js';
import type { Plan } from './plan.js';
import { fieldsAt, planSchema } from './schema.js';
import { readYaml } from './yaml-document.js';
import type { Path, YamlDocument } from './yaml-document.js';

/** A plan, or everything that is wrong with it. */
export type PlanReading = { readonly plan: Plan } | { readonly faults: readonly Fault[] };

/** Reads the text of a plan file. Finds all its faults at once, in the order in which they stand in the file. */
export function readPlan(text: string): PlanReading {
  const refusal = refusalOf(text);
  if (refusal !== null) return { faults: [{ line: 0, column: 0, field: '', problem: refusal }] };
  const document = readYaml(text);
  if (!document.sound) return { faults: [...document.faults].sort(inOrderOfPlace) };

  const parsed = planSchema.safeParse(document.value);
  const faults = [
    ...document.faults,
    ...(parsed.error?.issues ?? []).flatMap((issue) =>
      issue.code === 'unrecognized_keys'
        ? issue.keys.map((key) => unknownKeyFault(document, issue.path as Path, key))
        : [faultAt(document, issue.path as Path, issueWords(issue, document.value))],
    ),
    ...crossFaults(document.value).map(({ path, problem }) => faultAt(document, path, problem)),
  ].sort(inOrderOfPlace);
  return parsed.success && faults.length === 0 ? { plan: planOf(parsed.data) } : { faults };
}

function refusalOf(text: string): string | null {
  if (text.includes('\0')) return 'holds a NUL character: a plan is a text file (UTF-8) in YAML';
  if (!/^[^#\s]/m.test(text.replace(/^\s+/gm, ''))) return 'is empty: write at least title and span';
  return null;
}

function faultAt(document: YamlDocument, path: Path, problem: string): Fault {
  return { ...document.placeOf(path), field: fieldOf(path), problem };
}

function unknownKeyFault(document: YamlDocument, path: Path, key: string): Fault {
  const place = document.placeOfKey([...path, key]);
  return { ...place, field: fieldOf(path), problem: unknownKeyWords(key, fieldsAt(path)) };
}
