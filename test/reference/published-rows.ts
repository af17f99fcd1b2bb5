import { readFileSync } from 'node:fs';

/** The rows of a tab-separated table with a `#` header, by column name. */
export function readTable(name: string): Record<string, string>[] {
  const lines = readFileSync(new URL(name, import.meta.url), 'utf8')
    .split('\n')
    .filter((line) => line !== '' && !line.startsWith('#'));
  const [header, ...rows] = lines.map((line) => line.split('\t'));
  return rows.map((cells) => {
    if (cells.length !== header!.length)
      throw new Error(`${name}: a row has ${cells.length} cells: ${cells.join(' | ')}`);
    return Object.fromEntries(header!.map((column, i) => [column, cells[i]!]));
  });
}
