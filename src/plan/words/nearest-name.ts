/** More than one slip in three letters is another word. */
const LETTERS_A_SLIP = 3;

/** Of the names that exist the one that a misspelt word most likely meant; null where none is near. */
export function nearestName(word: string, names: readonly string[]): string | null {
  const written = word.toLowerCase();
  const ranked = names
    .map((name) => ({ name, slips: slipsBetween(written, name.toLowerCase()) }))
    .sort((a, b) => a.slips - b.slips);
  const best = ranked[0];
  return best !== undefined && best.slips <= Math.max(1, Math.floor(word.length / LETTERS_A_SLIP))
    ? best.name
    : null;
}

/** ` Did you mean mars?`, or nothing. */
export function didYouMean(word: string, names: readonly string[]): string {
  const name = nearestName(word, names);
  return name === null ? '' : ` Did you mean ${name}?`;
}

/** What to write instead: the name that was meant, or else all that there are. */
export const oneOf = (word: string, names: readonly string[]): string =>
  didYouMean(word, names) || ` There are: ${names.join(', ')}`;

/** Letters put in, left out, changed or swapped with their neighbour: the optimal-string-alignment distance. */
function slipsBetween(a: string, b: string): number {
  let [beforeLast, last] = [[] as number[], Array.from({ length: b.length + 1 }, (_, j) => j)];
  for (let i = 1; i <= a.length; i++) {
    const row = [i];
    for (let j = 1; j <= b.length; j++) {
      const change = a[i - 1] === b[j - 1] ? 0 : 1;
      const swap = i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1];
      row[j] = Math.min(
        last[j]! + 1,
        row[j - 1]! + 1,
        last[j - 1]! + change,
        swap ? beforeLast[j - 2]! + 1 : Infinity,
      );
    }
    [beforeLast, last] = [last, row];
  }
  return last[b.length]!;
}
