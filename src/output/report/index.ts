export type { ReportInput } from './report-input.js';
export { renderReportMarkdown } from './render-markdown.js';
export { renderReport } from './render-report.js';
