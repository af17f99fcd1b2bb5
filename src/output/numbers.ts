/** Numbers as they are written in prose and tables: a true minus sign, fixed digits, never "−0". */
export function fixed(value: number, digits: number): string {
  const text = Math.abs(value).toFixed(digits);
  return value < 0 && Number(text) !== 0 ? `−${text}` : text;
}

/** With its sign always written: `+3.2`, `−0.5`. */
export function signed(value: number, digits: number): string {
  const text = fixed(value, digits);
  return text.startsWith('−') ? text : `+${text}`;
}

/** A whole number of the last unit, split by sixties, so that no part ever reads 60. */
function sexagesimal(units: number, perUnit: readonly number[]): number[] {
  const parts: number[] = [];
  let rest = Math.round(units);
  for (const size of [...perUnit].reverse()) {
    parts.unshift(rest % size);
    rest = Math.floor(rest / size);
  }
  return [rest, ...parts];
}

const two = (value: number): string => String(value).padStart(2, '0');

/** `10h 17m 50s`, of a right ascension or a sidereal time in hours. */
export function hoursWords(hours: number): string {
  const [h, m, s] = sexagesimal(hours * 3600, [60, 60]);
  return `${two(h! % 24)}h ${two(m!)}m ${two(s!)}s`;
}

/** `+15° 22′ 11″`, of a declination or a latitude in degrees. */
export function degreesMinutesSeconds(degrees: number): string {
  const [d, m, s] = sexagesimal(Math.abs(degrees) * 3600, [60, 60]);
  return `${degrees < 0 ? '−' : '+'}${two(d!)}° ${two(m!)}′ ${two(s!)}″`;
}

/** A separation in the unit that people picture: `12′`, `1.4°`, `17°`. */
export function angleWords(degrees: number): string {
  if (degrees < 1 / 60) return `${fixed(degrees * 3600, 0)}″`;
  if (degrees < 0.995) return `${fixed(degrees * 60, 0)}′`;
  return `${fixed(degrees, degrees < 9.95 ? 1 : 0)}°`;
}
