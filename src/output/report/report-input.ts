import type { Forecast, ResidualSeries, Season } from '../../forecast/index.js';
import type { Site } from '../../sky/index.js';

/** All that a report is made of. */
export interface ReportInput {
  readonly title: string;
  readonly forecast: Forecast;
  /** The home site first; none for a report that speaks for the Earth's centre. */
  readonly sites: readonly Site[];
  readonly residuals: readonly ResidualSeries[];
  readonly seasons: readonly Season[];
}

/** On whose clocks the report tells the time. */
export const zoneOf = ({ sites }: Pick<ReportInput, 'sites'>): string => sites[0]?.zone ?? 'UTC';
