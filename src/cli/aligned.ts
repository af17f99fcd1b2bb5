/** A small table of words and numbers: the header, then rows of the same length. */
export interface Sheet {
  readonly header: readonly string[];
  readonly rows: readonly (readonly string[])[];
}

/** What is set flush right: numbers, with their sign and unit. */
const NUMBER = /^[+−-]?\d[\d.]*(?: ?[a-z°]+)?$/;

/** The sheet as text in columns, numbers flush right, no line ending in spaces. */
export function aligned({ header, rows }: Sheet): string {
  const lines = [header, ...rows];
  const widths = header.map((_, column) => Math.max(...lines.map((line) => line[column]!.length)));
  const isNumeric = header.map((_, column) => rows.some((row) => NUMBER.test(row[column]!)));
  return lines
    .map((line) =>
      line
        .map((cell, i) => (isNumeric[i] === true ? cell.padStart(widths[i]!) : cell.padEnd(widths[i]!)))
        .join('  ')
        .trimEnd(),
    )
    .map((line) => `${line}\n`)
    .join('');
}
