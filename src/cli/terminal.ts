import { styleText } from 'node:util';
import type { TerminalStyle } from '../output/index.js';

const MOST_COLUMNS = 120;

/** How wide a line may be; a terminal that reports no columns counts as a wide one. */
export const terminalWidth = (): number => Math.min(MOST_COLUMNS, process.stdout.columns || MOST_COLUMNS);

/** Stress by weight alone; none in pipes, in files or under NO_COLOR. */
export function terminalStyle(toFile: boolean): TerminalStyle {
  const styled = (format: 'bold' | 'dim') => (text: string) =>
    toFile ? text : styleText(format, text, { stream: process.stdout });
  return { strong: styled('bold'), quiet: styled('dim') };
}
