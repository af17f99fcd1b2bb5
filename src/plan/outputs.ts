import type { Forecast, ResidualSeries } from '../forecast/index.js';
import { eventsCsv, eventsJson, residualsCsv } from '../output/index.js';
import { eventsCalendar } from '../output/calendar/index.js';
import type { Plan } from './plan.js';

/** All that a plan's run found: what every output is made of. */
export interface PlanResults {
  readonly plan: Plan;
  readonly forecast: Forecast;
  readonly residuals: readonly ResidualSeries[];
}

export interface Output {
  /** The bare name of its file. */
  readonly name: string;
  /** What it is, for the manifest. */
  readonly what: string;
  readonly render: (results: PlanResults) => string;
}

/** Every file that a plan is written into. A new output is one more entry. */
export const outputs: readonly Output[] = [
  {
    name: 'events.ics',
    what: 'every event as a calendar entry (iCalendar, RFC 5545)',
    render: ({ plan, forecast }) =>
      eventsCalendar(
        { name: plan.title, description: forecast.source.description },
        forecast,
        plan.sites,
        plan.stamp,
      ),
  },
  {
    name: 'events.csv',
    what: 'every event as a row (CSV, RFC 4180)',
    render: ({ plan, forecast }) => eventsCsv(forecast, plan.sites),
  },
  {
    name: 'events.json',
    what: 'every event with all that is known of it (JSON by events.schema.json)',
    render: ({ plan, forecast }) => eventsJson(forecast, plan.sites),
  },
  {
    name: 'residuals.csv',
    what: 'refined instants beside their first estimates (CSV, RFC 4180)',
    render: ({ residuals }) => residualsCsv(residuals),
  },
];
