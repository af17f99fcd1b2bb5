import { LineCounter, isMap, isNode, isScalar, isSeq, parseDocument, visit } from 'yaml';
import type { Document, Node, YAMLError } from 'yaml';
import type { Fault } from './fault.js';

export type Path = readonly (string | number)[];

export interface Place {
  readonly line: number;
  readonly column: number;
}

/** A YAML text with its values, what is wrong with its writing, and where each field stands. */
export interface YamlDocument {
  readonly value: unknown;
  readonly faults: readonly Fault[];
  /** Whether the values can be trusted to be where the writer meant them. */
  readonly sound: boolean;
  /** Where the value of a field stands, or the nearest thing around it that does. */
  placeOf(path: Path): Place;
  /** Where the key of a field stands. */
  placeOfKey(path: Path): Place;
}

/** A plan never needs as many. */
const MAX_ALIASES = 50;

/** In place of the parser's own words, which speak of grammar, what to do. */
const remedies: Readonly<Partial<Record<string, string>>> = {
  TAB_AS_INDENT: 'a tab indents this line: YAML is indented with spaces only',
  DUPLICATE_KEY: 'this key stands twice in the same place: keep one of them',
  BLOCK_AS_IMPLICIT_KEY:
    'a second key or a colon on this line: put text that holds a colon in quotes, and every key on its own line',
  MULTILINE_IMPLICIT_KEY: 'this line does not stand under the key above it: indent both alike',
  BAD_INDENT: 'the indentation does not fit, or a bracket is not closed: indent alike what belongs together',
  UNEXPECTED_TOKEN:
    'this does not stand in line with what is above it: begin keys of one level in one column',
  MISSING_CHAR: 'a quote or a bracket is opened and not closed: close it',
  BAD_SCALAR_START: 'a text cannot begin with this character: put it in quotes',
  MULTIPLE_DOCS: 'a second document begins here: a plan is one document, remove the line ---',
  RESOURCE_EXHAUSTION: 'brackets are nested too deeply: a plan needs four levels at most',
  TAG_RESOLVE_FAILED: 'a tag (!…) stands here: plans have plain values only, remove it',
};
/** After these alone the values are still where the writer meant them. */
const HARMLESS: readonly string[] = ['TAB_AS_INDENT', 'DUPLICATE_KEY', 'TAG_RESOLVE_FAILED'];

export function readYaml(text: string): YamlDocument {
  const lines = new LineCounter();
  const document = parseDocument(text, { lineCounter: lines, prettyErrors: false, schema: 'core' });
  const place = (offset: number): Place => {
    const { line, col } = lines.linePos(offset);
    return { line: Math.max(1, line), column: Math.max(1, col) };
  };
  const complaints = [...document.errors, ...document.warnings];
  const faults = firstOfEachLine(complaints, place);
  faults.push(...removeNamelessFields(document, place));
  const aliases = aliasFault(document.contents, place);
  if (aliases !== null) faults.push(aliases);
  const sound = aliases === null && complaints.every(({ code }) => HARMLESS.includes(code));
  return {
    value: sound ? (document.toJS({ maxAliasCount: -1 }) as unknown) : null,
    faults,
    sound,
    placeOf: (path) => place(offsetOf(document.contents, path, 'value')),
    placeOfKey: (path) => place(offsetOf(document.contents, path, 'key')),
  };
}

/** One slip often makes the parser complain several times of a line: the first complaint is the one that helps. */
function firstOfEachLine(complaints: readonly YAMLError[], place: (offset: number) => Place): Fault[] {
  const byLine = new Map<number, Fault>();
  for (const { code, message, pos } of complaints) {
    const { line, column } = place(pos[0]);
    if (byLine.has(line)) continue;
    byLine.set(line, { line, column, field: '', problem: remedies[code] ?? `not YAML: ${message}` });
  }
  return [...byLine.values()];
}

/** Fields whose key is no plain name. Takes them out, so that what is left can still be read. */
function removeNamelessFields(document: Document, place: (offset: number) => Place): Fault[] {
  const faults: Fault[] = [];
  visit(document, {
    Pair: (_, { key, value }) => {
      if (isScalar(key) && key.value !== null) return undefined;
      const problem =
        key === null || isScalar(key)
          ? 'a field without a name stands here: write its name before the colon'
          : 'a list, a group or an alias stands where a name should: write a plain name before the colon';
      faults.push({ ...place(startOf(key, startOf(value, 0))), field: '', problem });
      return visit.REMOVE;
    },
  });
  return faults;
}

/** An alias to nowhere or to what it stands in itself, or more of them than a plan needs. */
function aliasFault(contents: Node | null, place: (offset: number) => Place): Fault | null {
  const anchored = new Map<string, Node>();
  let count = 0;
  let fault: Fault | null = null;
  visit(contents, {
    Node: (_, node) => {
      if ('anchor' in node && typeof node.anchor === 'string') anchored.set(node.anchor, node);
    },
    Alias: (_, { source, range }, parents) => {
      count++;
      const target = anchored.get(source);
      const problem =
        target === undefined
          ? `*${source} stands for nothing: write the value itself, or mark it with &${source} further up`
          : parents.includes(target) || holdsAlias(target)
            ? `*${source} stands for something that holds an alias itself: write the value itself`
            : count > MAX_ALIASES
              ? `more than ${MAX_ALIASES} aliases (*…): write the values themselves`
              : null;
      if (problem === null) return undefined;
      fault = { ...place(range?.[0] ?? 0), field: '', problem };
      return visit.BREAK;
    },
  });
  return fault;
}

/** Aliases of aliases are how a short text is blown up to fill the memory. */
function holdsAlias(node: Node): boolean {
  let found = false;
  visit(node, {
    Alias: () => {
      found = true;
      return visit.BREAK;
    },
  });
  return found;
}

/** Where a field stands in the text; a missing one, where the map or list stands that should hold it. */
function offsetOf(contents: Node | null, path: Path, part: 'key' | 'value'): number {
  let node: unknown = contents;
  let offset = startOf(contents, 0);
  for (const [i, step] of path.entries()) {
    if (isMap(node)) {
      const pair = node.items.find(({ key }) => isScalar(key) && String(key.value) === String(step));
      if (pair === undefined) return offset;
      const isKey = part === 'key' && i === path.length - 1;
      offset = startOf(pair.key, offset);
      if (!isKey) offset = startOf(pair.value, offset);
      node = pair.value;
    } else if (isSeq(node) && typeof step === 'number') {
      node = node.items[step];
      offset = startOf(node, offset);
    } else {
      return offset;
    }
  }
  return offset;
}

const startOf = (node: unknown, otherwise: number): number =>
  isNode(node) ? (node.range?.[0] ?? otherwise) : otherwise;
