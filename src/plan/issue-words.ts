import type { z } from 'zod';
import { oneOf, quoted } from './words/index.js';
import type { Path } from './yaml-document.js';

type Issue = z.core.$ZodIssue;

/** `sites[1].zone` */
export const fieldOf = (path: Path): string =>
  path.reduce<string>(
    (field, step) =>
      typeof step === 'number' ? `${field}[${step}]` : field === '' ? step : `${field}.${step}`,
    '',
  );

/** The value that a path leads to in what was read; undefined where it leads nowhere. */
export function valueAt(value: unknown, path: Path): unknown {
  return path.reduce<unknown>((at, step) => {
    if (typeof at !== 'object' || at === null || !Object.hasOwn(at, step)) return undefined;
    return (at as Readonly<Record<string | number, unknown>>)[step];
  }, value);
}

/** A message of the schema that begins so says what would be right; what is wrong is told here. */
const REMEDY = 'write ';

/** What is wrong with a field and what would be right, in words for its writer. */
export function issueWords(issue: Issue, root: unknown): string {
  const value = valueAt(root, issue.path as Path);
  const ownRemedy = issue.message.startsWith(REMEDY) ? issue.message : null;
  switch (issue.code) {
    case 'invalid_type':
      return `is ${value === undefined ? 'missing' : described(value)}: ${ownRemedy ?? `${REMEDY}${kindOfValue[issue.expected] ?? issue.expected}`}`;
    case 'invalid_value':
      return notOneOf(value, issue.values.map(String));
    case 'too_small':
    case 'too_big':
      return outOfRange(issue, value, ownRemedy);
    case 'custom':
    // The schema has nothing that could raise the rest.
    case 'invalid_format':
    case 'not_multiple_of':
    case 'unrecognized_keys':
    case 'invalid_union':
    case 'invalid_key':
    case 'invalid_element':
      return issue.message;
  }
}

/** What is wrong with a key that no plan has. */
export const unknownKeyWords = (key: string, known: readonly string[]): string =>
  `${quoted(key)} is no field here.${oneOf(key, known)}`;

const kindOfValue: Readonly<Partial<Record<string, string>>> = {
  string: 'a text',
  number: 'a number',
  array: 'a list (one - a line, or [ , ])',
  tuple: 'a list of two, like [a, b]',
  object: 'fields, each on its own line with its name and a colon',
};

function described(value: unknown): string {
  if (value === null) return 'empty';
  if (Array.isArray(value)) return 'a list';
  if (typeof value === 'number')
    return Number.isFinite(value) ? `a number (${value})` : `no plain number (${value})`;
  if (typeof value === 'string') return `a text (${quoted(value)})`;
  if (typeof value === 'boolean') return `${value}, neither text nor number`;
  return 'a group of fields';
}

function notOneOf(value: unknown, names: readonly string[]): string {
  if (value === undefined) return `is missing: write one of ${names.join(', ')}`;
  if (typeof value !== 'string') return `is ${described(value)}: write one of ${names.join(', ')}`;
  return `${quoted(value)} is not known.${oneOf(value, names)}`;
}

function outOfRange(
  issue: Extract<Issue, { code: 'too_small' | 'too_big' }>,
  value: unknown,
  ownRemedy: string | null,
): string {
  const isLeast = issue.code === 'too_small';
  const bound = isLeast ? issue.minimum : issue.maximum;
  if (issue.origin === 'number') {
    const strictly = issue.inclusive === false;
    const most = isLeast ? (strictly ? 'more than' : 'at least') : strictly ? 'less than' : 'at most';
    return `${String(value)} is out of range: write ${most} ${bound}`;
  }
  if (issue.origin === 'string' && isLeast) return 'is empty: write a text';
  const count = Array.isArray(value) || typeof value === 'string' ? value.length : 0;
  if (count === 0)
    return `is an empty list: ${ownRemedy ?? 'write at least one entry, or leave the field out'}`;
  const things = issue.origin === 'string' ? 'characters' : count === 1 ? 'entry' : 'entries';
  const wanted = issue.exact === true ? 'exactly' : isLeast ? 'at least' : 'at most';
  return `has ${count} ${things}: ${ownRemedy ?? `write ${wanted} ${bound}`}`;
}
