/** Something in a user's file that cannot be: where, what, and what would be right. A value, not an exception. */
export interface Fault {
  /** Counted from 1; 0 where the file as a whole is meant. */
  readonly line: number;
  readonly column: number;
  /** The field as a path, `sites[1].zone`; empty where the file as a whole is meant. */
  readonly field: string;
  /** What is wrong, and after a colon what would be right. */
  readonly problem: string;
}

/** `plan.yaml:12:11: sites[1].zone: …`, one line and harmless to a terminal, whatever it is about. */
export function faultLine(file: string, { line, column, field, problem }: Fault): string {
  const place = line === 0 ? file : `${file}:${line}:${column}`;
  return [place, ...(field === '' ? [] : [field]), problem]
    .join(': ')
    .replace(/\s+/g, ' ')
    .replace(/\p{Cc}/gu, '\u{FFFD}');
}

export const inOrderOfPlace = (a: Fault, b: Fault): number =>
  a.line - b.line || a.column - b.column || (a.field < b.field ? -1 : a.field > b.field ? 1 : 0);
