import type { ComponentChildren } from 'preact';

export interface Column<Row> {
  readonly title: string;
  readonly cell: (row: Row) => ComponentChildren;
  readonly class?: string;
}

interface TableProps<Row> {
  readonly id?: string;
  readonly caption: string;
  readonly columns: readonly Column<Row>[];
  readonly rows: readonly Row[];
  readonly keyOf: (row: Row) => string;
}

/** A table that becomes a list of cards on a phone: every cell then carries its column's name. */
export function Table<Row>({ id, caption, columns, rows, keyOf }: TableProps<Row>) {
  return (
    <table class="stack" id={id}>
      <caption>{caption}</caption>
      <thead>
        <tr>
          {columns.map((column) => (
            <th key={column.title} scope="col" class={column.class}>
              {column.title}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={keyOf(row)}>
            {columns.map((column) => (
              <td key={column.title} class={column.class} data-label={column.title}>
                {column.cell(row)}
              </td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
