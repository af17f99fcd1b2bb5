import type { Meeting } from '../../forecast/index.js';
import { utcFromTt } from '../../time/index.js';
import { angleWords } from '../numbers.js';
import { px } from './px.js';
import type { TimeScale } from './time-axis.js';

interface MeetingTieProps {
  readonly meeting: Meeting;
  readonly x: TimeScale;
  /** The threads of its two planets. */
  readonly threads: readonly [number, number];
}

/** Room that half of the separation's words needs, px. */
const WORD_ROOM = 18;

/** An arc that ties two ribbons where their planets meet, with how near they come. */
export function MeetingTie({ meeting, x, threads }: MeetingTieProps) {
  const at = x(utcFromTt(meeting.closestTt));
  const [upper, lower] = [Math.min(...threads), Math.max(...threads)];
  const bulge = 9 + (lower - upper) * 0.06;
  const right = x.range()[1]!;
  // Near the right edge of the picture the arc bulges the other way.
  const side = at + bulge > right ? -1 : 1;
  return (
    <g class="tie">
      <path
        d={`M${px(at)} ${upper}Q${px(at + 2 * side * bulge)} ${px((upper + lower) / 2)} ${px(at)} ${lower}`}
      />
      <circle cx={px(at)} cy={upper} r={3.2} />
      <circle cx={px(at)} cy={lower} r={3.2} />
      <text x={px(Math.min(at, right - WORD_ROOM))} y={upper - 12} class="word middle">
        {angleWords(meeting.leastSeparationDeg)}
      </text>
    </g>
  );
}
