import type { ComponentChildren } from 'preact';

export interface Column<Row> {
  readonly title: string;
  readonly cell: (row: Row) => ComponentChildren;
  readonly class?: string;
}

interface TableProps<Row> {
  readonly id?: string;
  readonly class?: string;
  /** What it shows; a table under a heading of its own is named by that instead. */
  readonly caption?: string;
  readonly labelledBy?: string;
  /** The first one names the row. */
  readonly columns: readonly Column<Row>[];
  readonly rows: readonly Row[];
  readonly keyOf: (row: Row) => string;
}

/**
 * A table that becomes a list of cards on a phone: every cell then carries its column's name. The roles are written
 * out because browsers forget them where a style sheet lays a table out as blocks.
 */
export function Table<Row>({ id, class: name, caption, labelledBy, columns, rows, keyOf }: TableProps<Row>) {
  return (
    <table
      class={name === undefined ? 'stack' : `stack ${name}`}
      role="table"
      id={id}
      aria-labelledby={labelledBy}
    >
      {caption === undefined ? null : <caption>{caption}</caption>}
      <thead role="rowgroup">
        <tr role="row">
          {columns.map((column) => (
            <th key={column.title} scope="col" role="columnheader" class={column.class}>
              {column.title}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup">
        {rows.map((row) => (
          <tr key={keyOf(row)} role="row">
            {columns.map((column, i) =>
              i === 0 ? (
                <th key={column.title} scope="row" role="rowheader" class={column.class}>
                  {column.cell(row)}
                </th>
              ) : (
                <td key={column.title} role="cell" class={column.class} data-label={column.title}>
                  {column.cell(row)}
                </td>
              ),
            )}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
