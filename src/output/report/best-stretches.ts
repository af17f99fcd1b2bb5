import type { Season, SeasonSample } from '../../forecast/index.js';

/** A stretch of the span in which a planet is worth showing. */
export interface BestStretch {
  readonly body: Season['body'];
  readonly from: SeasonSample;
  readonly to: SeasonSample;
  readonly peak: SeasonSample;
  /** It began before the span, or lasts beyond it. */
  readonly opensBefore: boolean;
  readonly endsAfter: boolean;
}

/** A planet is at its best while it can be shown for at least this part of the longest time of that apparition. */
const BEST_PART = 0.8;
/** An apparition much poorer than the planet's best one of the span is not named. */
const WORTH_PART = 0.6;

/** The best stretch of each of a planet's apparitions, in order of time; none where it never shows. */
export function bestStretches({ body, samples }: Season): BestStretch[] {
  const most = Math.max(0, ...samples.map(shownHours));
  return apparitionsOf(samples).flatMap(([first, last]): BestStretch[] => {
    let top = first;
    for (let i = first; i <= last; i++) if (hoursAt(samples, i) > hoursAt(samples, top)) top = i;
    const longest = hoursAt(samples, top);
    if (longest === 0 || longest < WORTH_PART * most) return [];
    let [from, to] = [top, top];
    while (from > first && hoursAt(samples, from - 1) >= BEST_PART * longest) from--;
    while (to < last && hoursAt(samples, to + 1) >= BEST_PART * longest) to++;
    return [
      {
        body,
        from: samples[from]!,
        to: samples[to]!,
        peak: samples[top]!,
        opensBefore: from === 0,
        endsAfter: to === samples.length - 1,
      },
    ];
  });
}

/** For how long a planet can be shown in a night, hours. */
export const shownHours = ({ state, eveningHours, morningHours }: SeasonSample): number =>
  state === 'sun' || state === 'none' ? 0 : eveningHours + morningHours;

const hoursAt = (samples: readonly SeasonSample[], i: number): number => shownHours(samples[i]!);

/** First and last index of each run of samples in which the planet shows. */
function apparitionsOf(samples: readonly SeasonSample[]): [number, number][] {
  const runs: [number, number][] = [];
  samples.forEach((sample, i) => {
    if (shownHours(sample) === 0) return;
    const last = runs.at(-1);
    if (last?.[1] === i - 1) last[1] = i;
    else runs.push([i, i]);
  });
  return runs;
}
