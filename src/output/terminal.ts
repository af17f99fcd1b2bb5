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
  readonly style: keyof TerminalStyle | null;
  /** The first to go on a narrow terminal is the one with the highest number. */
  readonly sacrifice: number;
}

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
  const zone = site?.zone ?? 'UTC';
  const columns: readonly TerminalColumn[] = [
    { cell: (event) => when(event, zone), style: null, sacrifice: 0 },
    {
      cell: ({ uncertaintySeconds }) => uncertaintyShort(uncertaintySeconds.utc),
      style: 'quiet',
      sacrifice: 2,
    },
    { cell: ({ kind }) => kind, style: 'strong', sacrifice: 0 },
    { cell: bodiesWords, style: null, sacrifice: 0 },
    { cell: circumstancesLine, style: null, sacrifice: 1 },
    { cell: cycleWords, style: 'quiet', sacrifice: 4 },
    { cell: ({ residualDays }) => residualWords('mean', residualDays.mean), style: 'quiet', sacrifice: 5 },
    {
      cell: ({ residualDays }) => residualWords('kepler', residualDays.kepler),
      style: 'quiet',
      sacrifice: 6,
    },
  ];
  const table = columns.map((column) => {
    const cells = events.map(column.cell);
    return { ...column, cells, width: Math.max(0, ...cells.map((cell) => cell.length)) };
  });
  const kept = [...table];
  const total = () => kept.reduce((sum, column) => sum + column.width + 2, -2);
  while (total() > width) {
    const last = kept.reduce((worst, column) => (column.sacrifice > worst.sacrifice ? column : worst));
    if (last.sacrifice === 0) break;
    kept.splice(kept.indexOf(last), 1);
  }
  return events.map((_, row) => {
    let room = width;
    return kept
      .map(({ cells, width: wide, style: tone }) => {
        const text = cells[row]!.padEnd(wide).slice(0, Math.max(0, room));
        room -= wide + 2;
        return tone === null ? text : style[tone](text);
      })
      .join('  ')
      .trimEnd();
  });
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
