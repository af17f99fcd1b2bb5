import { eventsCsv, eventsJson, residualsCsv } from '../../output/index.js';
import { eventsCalendar } from '../../output/calendar/index.js';
import { renderReport, renderReportMarkdown } from '../../output/report/index.js';
import type { ReportInput } from '../../output/report/index.js';
import type { UtcMillis } from '../../time/index.js';

/** All that a plan's run found: what every output is made of. */
export interface PlanResults extends ReportInput {
  /** What calendars carry as the time of their making. */
  readonly stamp: UtcMillis;
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
    render: ({ title, forecast, sites, stamp }) =>
      eventsCalendar({ name: title, description: forecast.source.description }, forecast, sites, stamp),
  },
  {
    name: 'events.csv',
    what: 'every event as a row (CSV, RFC 4180)',
    render: ({ forecast, sites }) => eventsCsv(forecast, sites),
  },
  {
    name: 'events.json',
    what: 'every event with all that is known of it (JSON by events.schema.json)',
    render: ({ forecast, sites }) => eventsJson(forecast, sites),
  },
  {
    name: 'residuals.csv',
    what: 'refined instants beside their first estimates (CSV, RFC 4180)',
    render: ({ residuals }) => residualsCsv(residuals),
  },
  {
    name: 'report.html',
    what: 'the report: open it in a browser, or print it',
    render: renderReport,
  },
  {
    name: 'report.md',
    what: 'the report as Markdown',
    render: renderReportMarkdown,
  },
];
