import { px } from './px.js';
import type { Tied, WordsPlace } from './tie-words.js';

interface MeetingTieProps {
  readonly tied: Tied;
  /** How near the two come. */
  readonly words: string;
  readonly wordsAt: WordsPlace;
  /** The end of the axis, px: near it the arc bulges the other way. */
  readonly right: number;
}

/** An arc that ties two ribbons where their planets meet, with how near they come. */
export function MeetingTie({ tied: { at, upper, lower }, words, wordsAt, right }: MeetingTieProps) {
  const bulge = 9 + (lower - upper) * 0.06;
  const side = at + bulge > right ? -1 : 1;
  return (
    <g class="tie">
      <path
        d={`M${px(at)} ${upper}Q${px(at + 2 * side * bulge)} ${px((upper + lower) / 2)} ${px(at)} ${lower}`}
      />
      <circle cx={px(at)} cy={upper} r={3.2} />
      <circle cx={px(at)} cy={lower} r={3.2} />
      <text x={px(wordsAt.x)} y={wordsAt.y} class="word middle">
        {words}
      </text>
    </g>
  );
}
