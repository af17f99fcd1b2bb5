import { quoted } from '../plan/words/index.js';
import type { Reading } from '../plan/words/index.js';
import type { EquatorialPlace } from '../sky/index.js';

const HOW = 'write RA,DEC of J2000.0: hours and degrees, like 6.7525,-16.716 or 6:45:09,-16:42:58';

/** Reads a right ascension in hours and a declination in degrees, decimal or sexagesimal. */
export function readPosition(words: string): Reading<EquatorialPlace> {
  const parts = words.split(',');
  const [rightAscensionHours, declinationDeg] = parts.map(sexagesimal);
  if (parts.length !== 2 || rightAscensionHours == null || declinationDeg == null) {
    return { problem: `${quoted(words)} is not a position: ${HOW}` };
  }
  if (!(rightAscensionHours >= 0 && rightAscensionHours < 24)) {
    return {
      problem: `right ascension ${rightAscensionHours} h is out of range: write hours from 0 to 24, not degrees`,
    };
  }
  if (Math.abs(declinationDeg) > 90) {
    return { problem: `declination ${declinationDeg}° is out of range: write degrees from -90 to 90` };
  }
  return { value: { rightAscensionHours, declinationDeg } };
}

/** `6.7525`, `6:45.15`, `6:45:09.1`, `-16:42:58`; null for anything else. */
function sexagesimal(word: string): number | null {
  const match =
    /^([+-]?)(\d{1,3}(?:\.\d{1,12})?)(?::(\d{1,2}(?:\.\d{1,12})?)(?::(\d{1,2}(?:\.\d{1,9})?))?)?$/.exec(
      word.trim(),
    );
  if (match === null) return null;
  const [, sign, whole = '', minutes, seconds] = match;
  // Only the last part may have decimals.
  if (whole.includes('.') && minutes !== undefined) return null;
  if (minutes?.includes('.') === true && seconds !== undefined) return null;
  const [m, s] = [Number(minutes ?? 0), Number(seconds ?? 0)];
  if (m >= 60 || s >= 60) return null;
  return (sign === '-' ? -1 : 1) * (Number(whole) + m / 60 + s / 3600);
}
