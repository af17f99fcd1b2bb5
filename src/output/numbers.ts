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

/** A whole number of sixtieths of sixtieths, so that no part ever reads 60. */
function sexagesimal(seconds: number): readonly [whole: number, minutes: number, seconds: number] {
  return [Math.floor(seconds / 3600), Math.floor(seconds / 60) % 60, seconds % 60];
}

const two = (value: number): string => String(value).padStart(2, '0');

/** `10h 17m 50s`, of a right ascension or a sidereal time in hours, 0 … 24 or any turns beyond. */
export function hoursWords(hours: number): string {
  const daySeconds = 86_400;
  const [h, m, s] = sexagesimal(((Math.round(hours * 3600) % daySeconds) + daySeconds) % daySeconds);
  return `${two(h)}h ${two(m)}m ${two(s)}s`;
}

/** `+15° 22′ 11″`, of a declination or a latitude in degrees. */
export function degreesMinutesSeconds(degrees: number): string {
  const arcsec = Math.round(degrees * 3600);
  const [d, m, s] = sexagesimal(Math.abs(arcsec));
  return `${arcsec < 0 ? '−' : '+'}${two(d)}° ${two(m)}′ ${two(s)}″`;
}

/** A separation in the unit that people picture: `9″`, `1.4′`, `12′`, `1.4°`, `17°`. */
export function angleWords(degrees: number): string {
  const arcsec = degrees * 3600;
  if (arcsec < 59.5) return `${fixed(arcsec, 0)}″`;
  if (arcsec < 59.5 * 60) return `${compact(arcsec / 60)}′`;
  return `${compact(degrees)}°`;
}

/** Two figures below ten, whole numbers above. */
const compact = (value: number): string => fixed(value, value < 9.95 ? 1 : 0);
