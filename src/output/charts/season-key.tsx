import type { ComponentChildren } from 'preact';
import { Diamond } from './season-marks.js';

interface SignProps {
  readonly words: string;
  readonly width?: number;
  readonly children: ComponentChildren;
}

const Sign = ({ words, width = 16, children }: SignProps) => (
  <li>
    <svg width={width} height={16} aria-hidden="true">
      {children}
    </svg>
    {words}
  </li>
);

interface SeasonKeyProps {
  /** What the thickness tells. */
  readonly thickness: string;
  readonly tiedWithin: string;
}

/** What the shapes of the season ribbons mean. */
export const SeasonKey = ({ thickness, tiedWithin }: SeasonKeyProps) => (
  <div class="note">
    <p>{thickness}</p>
    <ul class="key">
      <Sign words="evening sky" width={26}>
        <path class="thread" d="M0 12h26" />
        <path class="fill-dusk" d="M0 12V4h26v8z" />
      </Sign>
      <Sign words="morning sky" width={26}>
        <path class="thread" d="M0 4h26" />
        <path class="fill-dawn" d="M0 4v8h26v-8z" />
      </Sign>
      <Sign words="most of the night" width={26}>
        <path class="fill-full" d="M0 1v14h26v-14z" />
      </Sign>
      <Sign words="too near the Sun" width={26}>
        <path class="glare" d="M3 8h22" />
      </Sign>
      <Sign words="opposition">
        <Diamond x={8} y={8} />
      </Sign>
      <Sign words="greatest elongation, evening">
        <path class="mark" d="M8 4l4.5 8h-9z" />
      </Sign>
      <Sign words="and morning">
        <path class="mark" d="M8 12l4.5 -8h-9z" />
      </Sign>
      <Sign words="conjunction with the Sun">
        <path class="mark line" d="M4 4l8 8m0 -8l-8 8" />
      </Sign>
      <Sign words="stationary">
        <path class="mark line" d="M8 1v14" />
      </Sign>
      <Sign words="greatest brilliancy, and its days">
        <path class="mark" d="M8 0l1.7 4.3l4.3 1.7l-4.3 1.7l-1.7 4.3l-1.7 -4.3l-4.3 -1.7l4.3 -1.7z" />
        <path class="mark line" d="M3 15h10" />
      </Sign>
      <Sign words={tiedWithin}>
        <g class="tie">
          <path d="M5 2Q15 8 5 14" />
          <circle cx={5} cy={3} r={2.6} />
          <circle cx={5} cy={13} r={2.6} />
        </g>
      </Sign>
    </ul>
  </div>
);
