import { SiteError, makeSite } from '../sky/index.js';
import { fieldOf, valueAt } from './issue-words.js';
import { oneOf, quoted, readInstant, readZone } from './words/index.js';
import type { Path } from './yaml-document.js';

/** A fault between fields, at the field that should change. */
export interface CrossFault {
  readonly path: Path;
  readonly problem: string;
}

/**
 * What no single field can tell. Runs on the values as they were read, whatever else is wrong with them: a field that
 * is itself at fault is passed over here.
 */
export function crossFaults(root: unknown): CrossFault[] {
  return [
    ...spansThatEndTooSoon(root),
    ...spanTooLong(root),
    ...holidaysThatEndTooSoon(root),
    ...siteIdsTwice(root),
    ...homeNowhere(root),
    ...impossiblePairs(root),
  ];
}

/** Bare dates are midnights at home, and beside an instant with its own offset that decides which comes first. */
function spansThatEndTooSoon(root: unknown): CrossFault[] {
  const zone = homeZone(root);
  return [['span'], ['residuals', 'span']].flatMap((path) => {
    const [from, to] = [wordAt(root, [...path, 'from']), wordAt(root, [...path, 'to'])];
    if (from === null || to === null) return [];
    const [start, end] = [readInstant(from, zone), readInstant(to, zone)];
    return 'value' in start && 'value' in end && end.value <= start.value
      ? [
          {
            path: [...path, 'to'],
            problem: `${quoted(to)} is not after ${quoted(from)}: the end of a span is not in it, write a later one`,
          },
        ]
      : [];
  });
}

/** A report of more years than this is a ream of paper that nobody reads, and needs gigabytes to make. */
const LONGEST_PLAN_YEARS = 25;

function spanTooLong(root: unknown): CrossFault[] {
  const words = [wordAt(root, ['span', 'from']), wordAt(root, ['span', 'to'])];
  const [start, end] = words.map((word) => (word === null ? { problem: '' } : readInstant(word, 'UTC')));
  if (start === undefined || end === undefined || !('value' in start) || !('value' in end)) return [];
  const years = (end.value - start.value) / (365.25 * 86_400_000);
  return years > LONGEST_PLAN_YEARS + 0.01
    ? [
        {
          path: ['span', 'to'],
          problem: `the span is ${Math.round(years)} years long: a plan covers at most ${LONGEST_PLAN_YEARS}; for more, ask \`synodos events\` for tables alone`,
        },
      ]
    : [];
}

/** The zone of the home site; null where there is none, or where it cannot be told for another fault. */
function homeZone(root: unknown): string | null {
  const site = ['sites', Math.max(0, siteIds(root).indexOf(wordAt(root, ['home'])))];
  const zone = valueAt(root, [...site, 'zone']);
  if (typeof zone === 'string') return 'value' in readZone(zone) ? zone : null;
  const [latitudeDeg, longitudeDeg] = ['latitude', 'longitude'].map((field) =>
    valueAt(root, [...site, field]),
  );
  if (typeof latitudeDeg !== 'number' || typeof longitudeDeg !== 'number') return null;
  try {
    return makeSite({ id: 'home', latitudeDeg, longitudeDeg }).zone;
  } catch (fault) {
    if (fault instanceof SiteError) return null;
    throw fault;
  }
}

function holidaysThatEndTooSoon(root: unknown): CrossFault[] {
  return listAt(root, ['schoolHolidays']).flatMap((_, i) => {
    const path = ['schoolHolidays', i];
    const [from, to] = [wordAt(root, [...path, 'from']), wordAt(root, [...path, 'to'])];
    return from !== null && to !== null && to < from
      ? [
          {
            path: [...path, 'to'],
            problem: `${quoted(to)} is before ${quoted(from)}: write the last day of the holidays`,
          },
        ]
      : [];
  });
}

function siteIdsTwice(root: unknown): CrossFault[] {
  const first = new Map<string, number>();
  return siteIds(root).flatMap((id, i) => {
    if (id === null) return [];
    const before = first.get(id);
    first.set(id, before ?? i);
    return before === undefined
      ? []
      : [
          {
            path: ['sites', i, 'id'],
            problem: `${quoted(id)} is the id of ${fieldOf(['sites', before])} already: give every site its own`,
          },
        ];
  });
}

function homeNowhere(root: unknown): CrossFault[] {
  const home = wordAt(root, ['home']);
  const ids = siteIds(root).filter((id) => id !== null);
  if (home === null || ids.includes(home)) return [];
  return [
    {
      path: ['home'],
      problem: `${quoted(home)} is the id of no site.${ids.length === 0 ? ' The plan has no sites' : oneOf(home, ids)}`,
    },
  ];
}

function impossiblePairs(root: unknown): CrossFault[] {
  return listAt(root, ['residuals', 'pairs']).flatMap((pair, i) => {
    if (!Array.isArray(pair)) return [];
    const path = ['residuals', 'pairs', i];
    const [a, b] = pair as unknown[];
    if (a === b && typeof a === 'string') {
      return [{ path, problem: `${quoted(a)} twice: a pair is two different bodies` }];
    }
    return pair.includes('sun') && pair.includes('earth')
      ? [{ path, problem: 'sun and earth mirror one motion: pair one of them with another planet' }]
      : [];
  });
}

const siteIds = (root: unknown): (string | null)[] =>
  listAt(root, ['sites']).map((_, i) => wordAt(root, ['sites', i, 'id']));

function wordAt(root: unknown, path: Path): string | null {
  const value = valueAt(root, path);
  return typeof value === 'string' ? value : null;
}

function listAt(root: unknown, path: Path): unknown[] {
  const value = valueAt(root, path);
  return Array.isArray(value) ? value : [];
}
