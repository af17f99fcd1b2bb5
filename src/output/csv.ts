/** A cell: text is quoted and disarmed, numbers are written as they are, null is empty. */
export type Cell = string | number | null;

/** What a spreadsheet would take for a formula, also in the wide forms of East Asian keyboards. */
const FORMULA_START = /^[=+\-@\t\r\n＝＋－＠]/;

function cellText(cell: Cell): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return String(cell);
  const harmless = FORMULA_START.test(cell) ? `'${cell}` : cell;
  return /[",\r\n]/.test(harmless) ? `"${harmless.replaceAll('"', '""')}"` : harmless;
}

/** RFC 4180: CRLF after every row, the header first. */
export function csv(header: readonly string[], rows: readonly (readonly Cell[])[]): string {
  return [header, ...rows].map((row) => `${row.map(cellText).join(',')}\r\n`).join('');
}
