import { titleOf } from '../bodies/index.js';
import type { ForecastEvent } from '../forecast/index.js';
import { cycleLabel } from '../forecast/index.js';
import type { Site } from '../sky/index.js';
import { bodiesWords, circumstancesLine, seriesWords } from './event-words.js';
import { signed } from './numbers.js';
import { dateAndClock, uncertaintyShort } from './uncertainty-words.js';

/** How the terminal stresses a word; the identity where colour is unwanted. */
export interface TerminalStyle {
  readonly strong: (text: string) => string;
  readonly quiet: (text: string) => string;
}

interface Column {
  readonly cell: (event: ForecastEvent) => string;
  readonly tone?: keyof TerminalStyle;
}

/** Below this a Kepler residual is told in hours. */
const HOURS_BELOW_DAYS = 2;

const uncertainty: Column = {
  cell: ({ uncertaintySeconds }) => uncertaintyShort(uncertaintySeconds.utc),
  tone: 'quiet',
};
const kind: Column = { cell: (event) => event.kind, tone: 'strong' };
const bodiesAndCircumstances: Column = {
  cell: (event) => `${bodiesWords(event)}, ${circumstancesLine(event)}`,
};
const bodies: Column = { cell: (event) => event.bodies.map(titleOf).join('–') };
const cycleAndSeries: Column = {
  cell: (event) => [cycleWords(event), seriesWords(event)].filter((word) => word !== null).join(', '),
  tone: 'quiet',
};
const cycle: Column = { cell: cycleWords, tone: 'quiet' };
const mean: Column = {
  cell: ({ residualDays }) => (residualDays.mean === null ? '' : `mean ${signed(residualDays.mean, 1)} d`),
  tone: 'quiet',
};
const kepler: Column = { cell: keplerWords, tone: 'quiet' };

/** What a line holds, from the widest terminal to the narrowest: the three answers go before the names do. */
function layoutsFor(zone: string): readonly (readonly Column[])[] {
  const when: Column = { cell: (event) => dateAndClock(event, zone) };
  return [
    [when, uncertainty, kind, bodiesAndCircumstances, cycleAndSeries, mean, kepler],
    [when, uncertainty, kind, bodiesAndCircumstances, cycle, mean, kepler],
    [when, uncertainty, kind, bodies, cycle, mean, kepler],
    [when, uncertainty, kind, bodies, mean, kepler],
    [when, uncertainty, kind, bodies, cycle],
    [when, uncertainty, kind, bodies],
    [when, bodies, kind],
  ];
}

/**
 * One line an event, aligned, at most `width` columns: a narrower terminal gets fewer columns of data, and what is then
 * still too long is cut; no line wraps.
 * @param site on whose clocks times are told; UTC where there is none
 */
export function terminalLines(
  events: readonly ForecastEvent[],
  site: Site | undefined,
  width: number,
  style: TerminalStyle,
): string[] {
  const columns = new Map<Column, FilledColumn>();
  const layouts = layoutsFor(site?.zone ?? 'UTC').map((layout) =>
    layout.map((column) => {
      const once = columns.get(column) ?? filled(column, events);
      columns.set(column, once);
      return once;
    }),
  );
  const chosen = layouts.find((layout) => widthOf(layout) <= width) ?? layouts.at(-1)!;
  return events.map((_, row) => line(chosen, row, width, style));
}

interface FilledColumn {
  readonly cells: readonly string[];
  readonly width: number;
  readonly tone: keyof TerminalStyle | undefined;
}

function filled({ cell, tone }: Column, events: readonly ForecastEvent[]): FilledColumn {
  const cells = events.map(cell);
  return { cells, width: cells.reduce((widest, { length }) => Math.max(widest, length), 0), tone };
}

const GAP = '  ';
const widthOf = (columns: readonly FilledColumn[]): number =>
  columns.reduce((sum, column) => sum + column.width + GAP.length, -GAP.length);

/** Cut first and styled after, so that a style never counts as text. */
function line(columns: readonly FilledColumn[], row: number, width: number, style: TerminalStyle): string {
  const last = columns.findLastIndex(({ cells }) => cells[row] !== '');
  let column = 0;
  return columns
    .slice(0, last + 1)
    .map(({ cells, width: wide, tone }, i) => {
      const text = cells[row]!.slice(0, Math.max(0, width - column));
      const gap = i === last ? '' : ' '.repeat(wide - text.length) + GAP;
      const kept = gap.slice(0, Math.max(0, width - column - text.length));
      column += wide + GAP.length;
      return (tone === undefined || text === '' ? text : style[tone](text)) + kept;
    })
    .join('')
    .trimEnd();
}

function cycleWords({ cycle: number }: ForecastEvent): string {
  return `cycle ${cycleLabel(number)}`;
}

function keplerWords({ residualDays: { kepler: days } }: ForecastEvent): string {
  if (days === null) return '';
  return Math.abs(days) < HOURS_BELOW_DAYS
    ? `kepler ${signed(days * 24, 1)} h`
    : `kepler ${signed(days, 1)} d`;
}
