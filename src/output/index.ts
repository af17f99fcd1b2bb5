export { CAUTION_ELONGATION_DEG, cautions, cautionsOf, needsSunCaution } from './cautions.js';
export { csv } from './csv.js';
export type { Cell } from './csv.js';
export {
  bodiesWords,
  bodyCircumstancesOf,
  circumstancesLine,
  kindTitles,
  leastElongationDeg,
  seriesWords,
  summaryOf,
} from './event-words.js';
export { eventsCsv } from './events-csv.js';
export {
  EVENTS_SCHEMA,
  RESIDUALS_SCHEMA,
  eventsJson,
  eventsJsonLines,
  residualsJson,
} from './events-json.js';
export { OBSERVABLE_ELONGATION_DEG, headlineOf, isObservable } from './headline.js';
export { eventsMarkdown, markdownTable, markdownText } from './markdown.js';
export { angleWords, degreesMinutesSeconds, fixed, hoursWords, signed } from './numbers.js';
export { residualsCsv } from './residuals-csv.js';
export { terminalLines } from './terminal.js';
export type { TerminalStyle } from './terminal.js';
export {
  dateAndClock,
  grainOf,
  tellInstant,
  uncertaintyShort,
  uncertaintyWords,
} from './uncertainty-words.js';
export type { Grain, ToldInstant } from './uncertainty-words.js';
