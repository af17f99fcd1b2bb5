import { bodies, planets } from '../../bodies/index.js';
import type { Body, Planet } from '../../bodies/index.js';
import { kindNames } from '../../forecast/index.js';
import type { KindName } from '../../forecast/index.js';
import { isZone } from '../../time/index.js';
import { didYouMean, oneOf } from './nearest-name.js';
import { quoted } from './quoted.js';
import type { Reading } from './read-instant.js';

/** Reads one name of a closed list; capitals do not matter. */
function readName<T extends string>(word: string, what: string, names: readonly T[]): Reading<T> {
  const name = names.find((candidate) => candidate === word.toLowerCase());
  if (name !== undefined) return { value: name };
  return { problem: `${quoted(word)} is not a ${what}.${oneOf(word, names)}` };
}

/** The Sun or a planet. */
export const readBody = (word: string): Reading<Body> => readName(word, 'body', bodies);

/** A planet, as the bodies of a forecast are. */
export const readPlanet = (word: string): Reading<Planet> => readName(word, 'planet', planets);

export const readKind = (word: string): Reading<KindName> => readName(word, 'kind of event', kindNames);

/** An IANA time zone. */
export function readZone(word: string): Reading<string> {
  if (isZone(word)) return { value: word };
  const meant = didYouMean(word, Intl.supportedValuesOf('timeZone'));
  return {
    problem: `${quoted(word)} is not a time zone.${meant === '' ? ' Write an IANA name like Europe/Vienna' : meant}`,
  };
}
