import type { ForecastEvent } from '../forecast/index.js';
import type { Site } from '../sky/index.js';
import { zoneAbbreviation } from '../time/index.js';
import { bodiesWords, circumstancesLine, seriesWords } from './event-words.js';
import { cycleLabel } from '../forecast/index.js';
import { signed } from './numbers.js';
import { tellInstant, uncertaintyShort } from './uncertainty-words.js';

/** How the terminal stresses a word; the identity where colour is unwanted. */
export interface TerminalStyle {
  readonly strong: (text: string) => string;
  readonly quiet: (text: string) => string;
}

/** Below this a residual is told in hours. */
const HOURS_BELOW_DAYS = 2;

interface TerminalColumn {
  readonly cell: (event: ForecastEvent) => string;
  /** What is written instead on a narrow terminal; nothing by default. */
  readonly short?: (event: ForecastEvent) => string;
  readonly tone: keyof TerminalStyle | null;
}

/** The columns by the order in which a narrow terminal gives them up, the first to go last. */
const columnsFor = (zone: string): readonly TerminalColumn[] => [
  { cell: (event) => when(event, zone), tone: null },
  { cell: ({ uncertaintySeconds }) => uncertaintyShort(uncertaintySeconds.utc), tone: 'quiet' },
  { cell: ({ kind }) => kind, tone: 'strong' },
  { cell: (event) => `${bodiesWords(event)}, ${circumstancesLine(event)}`, short: bodiesWords, tone: null },
  { cell: cycleWords, tone: 'quiet' },
  { cell: ({ residualDays }) => residualWords('mean', residualDays.mean), tone: 'quiet' },
  { cell: ({ residualDays }) => residualWords('kepler', residualDays.kepler), tone: 'quiet' },
];
/** The first columns stay whatever happens. */
const ALWAYS_KEPT = 4;

/**
 * One line an event, aligned, at most `width` columns: a narrower terminal loses columns of data, and what is still
 * too long is cut; no line wraps.
 */
export function terminalLines(
  events: readonly ForecastEvent[],
  site: Site | undefined,
  width: number,
  style: TerminalStyle,
): string[] {
  const columns = columnsFor(site?.zone ?? 'UTC');
  const full = columns.map(({ cell, tone }) => filled(events.map(cell), tone));
  const short = columns.map(({ cell, short: shorter, tone }) => filled(events.map(shorter ?? cell), tone));
  const choices = [
    ...columns.map((_, i) => full.slice(0, columns.length - i)).filter((kept) => kept.length >= ALWAYS_KEPT),
    short.slice(0, ALWAYS_KEPT),
  ];
  const chosen = choices.find((kept) => widthOf(kept) <= width) ?? short.slice(0, ALWAYS_KEPT);
  return events.map((_, row) => line(chosen, row, width, style));
}

interface FilledColumn {
  readonly cells: readonly string[];
  readonly width: number;
  readonly tone: keyof TerminalStyle | null;
}

const filled = (cells: readonly string[], tone: keyof TerminalStyle | null): FilledColumn => ({
  cells,
  width: cells.reduce((widest, cell) => Math.max(widest, cell.length), 0),
  tone,
});

const GAP = '  ';
const widthOf = (columns: readonly FilledColumn[]): number =>
  columns.reduce((sum, { width }) => sum + width + GAP.length, -GAP.length);

function line(columns: readonly FilledColumn[], row: number, width: number, style: TerminalStyle): string {
  let room = width;
  return columns
    .map(({ cells, width: wide, tone }) => {
      const text = cells[row]!.padEnd(wide).slice(0, Math.max(0, room));
      room -= wide + GAP.length;
      return tone === null ? text : style[tone](text);
    })
    .join(GAP)
    .trimEnd();
}

function when({ utc, uncertaintySeconds }: ForecastEvent, zone: string): string {
  const { isoDate, weekday, time } = tellInstant(utc, uncertaintySeconds.utc, zone);
  const clock = zone === 'UTC' ? 'UTC' : zoneAbbreviation(utc, zone);
  return `${isoDate} ${weekday} ${time} ${clock}`;
}

function cycleWords(event: ForecastEvent): string {
  const series = seriesWords(event);
  return `cycle ${cycleLabel(event.cycle)}${series === null ? '' : `, ${series}`}`;
}

function residualWords(name: string, days: number | null): string {
  if (days === null) return '';
  return Math.abs(days) < HOURS_BELOW_DAYS && name === 'kepler'
    ? `${name} ${signed(days * 24, 1)} h`
    : `${name} ${signed(days, 1)} d`;
}
