import type { ForecastEvent, KindName } from '../../forecast/index.js';
import { kindNames } from '../../forecast/index.js';

/** The 95 % half-widths of one kind's instants, in UTC. */
export interface KindSureness {
  readonly kind: KindName;
  readonly count: number;
  readonly bestSeconds: number;
  readonly middleSeconds: number;
  readonly worstSeconds: number;
}

/** How sure the dates of each kind are, the surest kinds first. */
export function surenessByKind(events: readonly ForecastEvent[]): KindSureness[] {
  return kindNames
    .flatMap((kind): KindSureness[] => {
      const seconds = events
        .filter((event) => event.kind === kind)
        .map(({ uncertaintySeconds }) => uncertaintySeconds.utc)
        .sort((a, b) => a - b);
      if (seconds.length === 0) return [];
      return [
        {
          kind,
          count: seconds.length,
          bestSeconds: seconds[0]!,
          middleSeconds: seconds[Math.floor(seconds.length / 2)]!,
          worstSeconds: seconds.at(-1)!,
        },
      ];
    })
    .sort((a, b) => a.middleSeconds - b.middleSeconds);
}
