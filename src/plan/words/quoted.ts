/** Longer words are cut in messages. */
const LONGEST = 60;

/** A user's own word as a message repeats it: in quotes, on one line, without control characters, not endless. */
export function quoted(word: string): string {
  const cut = word.length > LONGEST ? `${word.slice(0, LONGEST)}…` : word;
  return `"${cut.replace(/[\p{Cc}\p{Cf}\u2028\u2029]/gu, '\u{FFFD}')}"`;
}
