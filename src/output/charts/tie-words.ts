/** Where two ribbons are tied: the instant's place on the axis and the two threads, px. */
export interface Tied {
  readonly at: number;
  readonly upper: number;
  readonly lower: number;
}

export interface WordsPlace {
  readonly x: number;
  readonly y: number;
}

/** Words nearer to each other than this would run together, px. */
const ROOM = 38;
const ABOVE = -12;
const BELOW = 20;

/** A place for the words of each tie: above its upper end, or, where others stand there, below its lower one. */
export function placesOfWords(ties: readonly Tied[], right: number): WordsPlace[] {
  const taken: WordsPlace[] = [];
  return ties.map(({ at, upper, lower }) => {
    const x = Math.min(at, right - ROOM / 2);
    const free = [upper + ABOVE, lower + BELOW].find(
      (y) => !taken.some((other) => other.y === y && Math.abs(other.x - x) < ROOM),
    );
    const place = { x, y: free ?? upper + ABOVE };
    taken.push(place);
    return place;
  });
}
